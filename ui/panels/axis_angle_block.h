// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "ui/panels/number_block.h"

namespace ui {

/// The one turn that makes the pose: its angle and its axis.
class AxisAngleBlock : public NumberBlock {
    Q_OBJECT

public:
    AxisAngleBlock(CaseModel& model, QWidget* parent);

protected:
    void present() override;

private:
    void edit(NumberField* changed, double number);

    NumberField* m_angle;
    std::array<NumberField*, 3> m_axis{};
};

}  // namespace ui
