// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>
#include <array>

#include "ui/panels/number_block.h"

namespace ui {

/// The numbers fewer people need, folded away at first: rotation vector, Gibbs vector, modified
/// Rodrigues parameters.
class MoreBlock : public NumberBlock {
    Q_OBJECT

public:
    MoreBlock(CaseModel& model, QWidget* parent);

    void setUnfolded(bool unfolded);

protected:
    void present() override;

private:
    using Triple = std::array<NumberField*, 3>;
    enum class Vector { rotationVector, gibbs, modifiedRodrigues };

    void addTriple(QVBoxLayout* column, Vector vector, const QString& title,
                   const QString& formula);
    void edit(Vector vector, const Triple& triple, NumberField* changed, double number);
    Triple& fieldsOf(Vector vector);

    QAbstractButton* m_fold;
    QWidget* m_folded;
    InkLabel* m_noGibbs;
    InkLabel* m_shadow;
    std::array<Triple, 3> m_triples{};
};

}  // namespace ui
