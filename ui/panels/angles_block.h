// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "ui/panels/number_block.h"

namespace ui {

/// The three angles as turned, their twin beside them, and at lock what is still fixed.
class AnglesBlock : public NumberBlock {
    Q_OBJECT

public:
    AnglesBlock(CaseModel& model, QWidget* parent);

protected:
    void present() override;

private:
    struct Row {
        InkLabel* letter = nullptr;
        NumberField* angle = nullptr;
        InkLabel* twin = nullptr;
    };

    InkLabel* m_twinWords;
    std::array<Row, 3> m_rows;
};

}  // namespace ui
