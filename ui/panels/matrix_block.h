// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "ui/panels/number_block.h"

namespace ui {

/// The nine elements of R_WB. What is typed waits for Enter, which hands over all nine.
class MatrixBlock : public NumberBlock {
    Q_OBJECT

public:
    MatrixBlock(CaseModel& model, QWidget* parent);

protected:
    void present() override;

private:
    void handOver();
    void restoreAll();
    void tellWaiting();

    InkLabel* m_state;
    std::array<NumberField*, 9> m_fields{};
};

}  // namespace ui
