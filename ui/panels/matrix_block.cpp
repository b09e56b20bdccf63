// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/matrix_block.h"

#include <QGridLayout>
#include <algorithm>

#include "ui/panels/figure_text.h"

namespace ui {
namespace {

constexpr int kColumnGap = 8;

QString meaningOf(int row, int column)
{
    const QString letters = QStringLiteral("xyz");
    return MatrixBlock::tr(
               "R_WB row %1, column %2: how far the body's %3 axis reaches along the world's %4")
        .arg(row + 1)
        .arg(column + 1)
        .arg(letters[column], letters[row]);
}

}  // namespace

MatrixBlock::MatrixBlock(CaseModel& model, QWidget* parent)
    : NumberBlock(model, QStringLiteral("Matrix R<sub>WB</sub>"), parent),
      m_state(InkLabel::note({}, this))
{
    m_header->addWidget(m_state);
    m_state->setToolTip(
        tr("R R^T differs from the identity by no more than this, and the determinant is +1."));
    setToolTip(tr("R_WB takes body coordinates to world coordinates."));
    auto* grid = new QGridLayout;
    grid->setHorizontalSpacing(kColumnGap);
    grid->setVerticalSpacing(2);
    grid->setColumnStretch(3, 1);
    for (int n = 0; n < 9; ++n) {
        auto* field = addField(Quantity::matrix, {.steps = false, .commitsOnLeave = false});
        field->setObjectName(QStringLiteral("matrix%1").arg(n));
        field->setMeaning(meaningOf(n / 3, n % 3));
        connect(field, &NumberField::entered, this, &MatrixBlock::handOver);
        connect(field, &NumberField::restored, this, &MatrixBlock::restoreAll);
        connect(field, &QLineEdit::textEdited, this, &MatrixBlock::tellWaiting);
        grid->addWidget(field, n / 3, n % 3);
        m_fields[static_cast<std::size_t>(n)] = field;
    }
    m_body->addLayout(grid);
    follow();
}

void MatrixBlock::present()
{
    const Eigen::Matrix3d& R_WB = m_model.findings().R_WB;
    for (int n = 0; n < 9; ++n)
        m_fields[static_cast<std::size_t>(n)]->setValue(R_WB(n / 3, n % 3));
    if (const auto check = rotcore::checkMatrix(R_WB)) m_state->setText(rotationText(*check));
    m_state->setTone(Tone::quiet);
    const bool isWaiting =
        std::any_of(m_fields.begin(), m_fields.end(),
                    [](const NumberField* field) { return field->isModified() || field->isBad(); });
    if (!isWaiting) say({}, Tone::quiet);
}

void MatrixBlock::tellWaiting()
{
    say(tr("Not applied yet: Enter applies all nine, Escape puts them back."), Tone::quiet);
}

void MatrixBlock::handOver()
{
    rotcore::SentNumbers sent;
    sent.reading.kind = rotcore::Kind::matrix;
    for (NumberField* field : m_fields) {
        const auto number = field->typed();
        if (!number) {
            field->refuse(sentenceOf(number.error().message));
            return say(sentenceOf(number.error().message), Tone::bad);
        }
        sent.values.push_back(*number);
    }
    const bool isTouched =
        std::any_of(m_fields.begin(), m_fields.end(),
                    [](const NumberField* field) { return field->isModified() || field->isBad(); });
    if (!isTouched) return;
    const auto meaning = rotcore::interpret(sent);  // for its warnings
    if (const auto fault = m_model.setNumbers(sent, tr("change the matrix"))) {
        const QString why = sentenceOf(fault->message);
        for (NumberField* field : m_fields)
            field->refuse(why);
        m_state->setText(tr("not a rotation"));
        m_state->setTone(Tone::bad);
        return say(
            why + QStringLiteral(" ") + tr("Nothing was changed; Escape puts the nine back."),
            Tone::bad);
    }
    restoreAll();
    if (meaning && !meaning->warnings.empty())
        say(sentenceOf(meaning->warnings.front()), Tone::quiet);
}

void MatrixBlock::restoreAll()
{
    for (NumberField* field : m_fields)
        field->restore();
    present();
}

}  // namespace ui
