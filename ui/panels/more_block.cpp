// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/more_block.h"

#include <QKeyEvent>
#include <QPainter>

#include "ui/panels/figure_text.h"

namespace ui {
namespace {

constexpr int kColumnGap = 8;
constexpr int kTripleGap = 8;
constexpr int kFoldRoom = 2;

Eigen::Vector3d shownIn(const Eigen::Vector3d& radians, rotcore::AngleUnit unit)
{
    return {rotcore::inUnit(radians[0], unit), rotcore::inUnit(radians[1], unit),
            rotcore::inUnit(radians[2], unit)};
}

void showIn(const std::array<NumberField*, 3>& fields, const Eigen::Vector3d& values,
            Quantity quantity)
{
    for (int n = 0; n < 3; ++n)
        fields[static_cast<std::size_t>(n)]->setValue(values[n], quantity);
}

// A line of quiet text that unfolds what is beneath it.
class FoldButton : public QAbstractButton {
public:
    FoldButton(const QString& text, QWidget* parent) : QAbstractButton(parent)
    {
        setText(text);
        setCheckable(true);
        setFocusPolicy(Qt::StrongFocus);
        setCursor(Qt::PointingHandCursor);
    }

    QSize sizeHint() const override
    {
        return {fontMetrics().horizontalAdvance(line()), fontMetrics().height() + 2 * kFoldRoom};
    }

protected:
    void paintEvent(QPaintEvent*) override
    {
        const Ink ink = inkOn(palette());
        QPainter painter(this);
        painter.setPen(hasFocus() || underMouse() ? ink.accent : ink.quiet);
        painter.drawText(rect(), Qt::AlignLeft | Qt::AlignVCenter,
                         fontMetrics().elidedText(line(), Qt::ElideRight, width()));
        if (hasFocus()) painter.fillRect(0, height() - kFoldRoom, width(), kFoldRoom, ink.accent);
    }

    void keyPressEvent(QKeyEvent* event) override
    {
        if (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter) return click();
        QAbstractButton::keyPressEvent(event);
    }

private:
    QString line() const
    {
        return (isChecked() ? QStringLiteral("▾  ") : QStringLiteral("▸  ")) + text();
    }
};

}  // namespace

MoreBlock::MoreBlock(CaseModel& model, QWidget* parent)
    : NumberBlock(model, {}, parent),
      m_fold(new FoldButton(tr("Rotation vector, Gibbs, modified Rodrigues"), this)),
      m_folded(new QWidget(this)),
      m_noGibbs(InkLabel::note(tr("At a half turn the Gibbs vector is infinite."), m_folded)),
      m_shadow(InkLabel::note({}, m_folded))
{
    m_fold->setFont(InkLabel::note({}, this)->font());
    connect(m_fold, &QAbstractButton::toggled, this, &MoreBlock::setUnfolded);
    m_header->insertWidget(0, m_fold);
    auto* column = new QVBoxLayout(m_folded);
    column->setContentsMargins({});
    column->setSpacing(2);
    addTriple(column, Vector::rotationVector, tr("Rotation vector"), tr("axis × angle"));
    addTriple(column, Vector::gibbs, tr("Gibbs vector"), tr("axis × tan(angle / 2)"));
    column->addWidget(m_noGibbs);
    addTriple(column, Vector::modifiedRodrigues, tr("Modified Rodrigues"),
              tr("axis × tan(angle / 4)"));
    column->addWidget(m_shadow);
    for (InkLabel* remark : {m_noGibbs, m_shadow})
        remark->setWordWrap(true);
    m_body->addWidget(m_folded);
    setUnfolded(false);
    follow();
}

void MoreBlock::setUnfolded(bool unfolded)
{
    m_fold->setChecked(unfolded);
    m_folded->setVisible(unfolded);
}

MoreBlock::Triple& MoreBlock::fieldsOf(Vector vector)
{
    return m_triples[static_cast<std::size_t>(vector)];
}

void MoreBlock::addTriple(QVBoxLayout* column, Vector vector, const QString& title,
                          const QString& formula)
{
    auto* heading = new QHBoxLayout;
    heading->setContentsMargins(0, kTripleGap, 0, 0);
    heading->addWidget(InkLabel::note(title, m_folded));
    heading->addStretch(1);
    heading->addWidget(InkLabel::note(formula, m_folded));
    column->addLayout(heading);
    auto* row = new QHBoxLayout;
    row->setSpacing(kColumnGap);
    Triple& fields = fieldsOf(vector);
    for (int n = 0; n < 3; ++n) {
        NumberField* field = addField(Quantity::length);
        field->setMeaning(title + QStringLiteral(", ") + QStringLiteral("xyz")[n]);
        field->setObjectName(QStringLiteral("more%1%2").arg(static_cast<int>(vector)).arg(n));
        connect(field, &NumberField::committed, this, [this, vector, field](double number) {
            edit(vector, fieldsOf(vector), field, number);
        });
        fields[static_cast<std::size_t>(n)] = field;
        row->addWidget(field);
    }
    row->addStretch(1);
    column->addLayout(row);
}

void MoreBlock::present()
{
    const rotcore::Findings& found = m_model.findings();
    const rotcore::AngleUnit unit = found.shown.unit;
    showIn(fieldsOf(Vector::rotationVector), shownIn(rotcore::rotationVectorOf(found.q_WB), unit),
           quantityOf(unit));
    m_noGibbs->setVisible(!found.gibbs);
    for (NumberField* field : fieldsOf(Vector::gibbs))
        field->setVisible(found.gibbs.has_value());
    if (found.gibbs) showIn(fieldsOf(Vector::gibbs), *found.gibbs, Quantity::length);
    showIn(fieldsOf(Vector::modifiedRodrigues), found.modifiedRodrigues.principal,
           Quantity::length);
    if (const auto& shadow = found.modifiedRodrigues.shadow)
        m_shadow->setText(tr("The long way round: %1  %2  %3")
                              .arg(fixedText((*shadow)[0], 4), fixedText((*shadow)[1], 4),
                                   fixedText((*shadow)[2], 4)));
    m_shadow->setVisible(found.modifiedRodrigues.shadow.has_value());
    say({}, Tone::quiet);
}

void MoreBlock::edit(Vector vector, const Triple& triple, NumberField* changed, double number)
{
    std::vector<double> values;
    for (const NumberField* field : triple)
        values.push_back(field == changed ? number : field->value());
    const QString what = tr("change the vector");
    if (vector == Vector::rotationVector) {
        rotcore::SentNumbers sent;
        sent.reading.kind = rotcore::Kind::rotationVector;
        sent.reading.unit = m_model.findings().shown.unit;
        sent.values = values;
        if (const auto fault = m_model.setNumbers(sent, what))
            changed->refuse(sentenceOf(fault->message));
        return;
    }
    const Eigen::Vector3d given(values[0], values[1], values[2]);
    const auto q_WB = vector == Vector::gibbs ? rotcore::poseOfGibbsVector(given)
                                              : rotcore::poseOfModifiedRodrigues(given);
    if (!q_WB) return changed->refuse(sentenceOf(q_WB.error().message));
    m_model.setPose(*q_WB, what);
}

}  // namespace ui
