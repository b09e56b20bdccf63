// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "ui/panels/choice_word.h"
#include "ui/panels/number_block.h"

namespace ui {

/// The four numbers of the quaternion, in the layout and algebra of the view.
class QuaternionBlock : public NumberBlock {
    Q_OBJECT

public:
    QuaternionBlock(CaseModel& model, QWidget* parent);

protected:
    void present() override;

private:
    struct Cell {
        InkLabel* letter = nullptr;
        NumberField* number = nullptr;
    };
    void addWords();
    void edit(std::size_t place, double number);

    ChoiceWord* m_layout;
    ChoiceWord* m_algebra;
    std::array<Cell, 4> m_cells;
};

}  // namespace ui
