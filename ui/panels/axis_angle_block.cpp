// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/axis_angle_block.h"

#include "ui/panels/figure_text.h"

namespace ui {
namespace {

constexpr int kColumnGap = 8;

}  // namespace

AxisAngleBlock::AxisAngleBlock(CaseModel& model, QWidget* parent)
    : NumberBlock(model, tr("Axis and angle"), parent), m_angle(addField(Quantity::degrees))
{
    m_angle->setObjectName(QStringLiteral("axisAngle"));
    m_angle->setMeaning(tr("Angle of the one turn that makes the pose"));
    connect(m_angle, &NumberField::committed, this,
            [this](double number) { edit(m_angle, number); });
    auto* turn = new QHBoxLayout;
    turn->setSpacing(kColumnGap);
    turn->addWidget(m_angle);
    auto* about = new InkLabel(tr("about"), Tone::quiet, this);
    about->setToolTip(tr("The axis has the same components in the body and in the world."));
    turn->addWidget(about);
    turn->addStretch(1);
    auto* axis = new QHBoxLayout;
    axis->setSpacing(kColumnGap);
    for (int n = 0; n < 3; ++n) {
        NumberField*& field = m_axis[static_cast<std::size_t>(n)];
        field = addField(Quantity::length);
        field->setObjectName(QStringLiteral("axis%1").arg(n));
        field->setMeaning(
            tr("%1 of the axis, in the body as in the world").arg(QStringLiteral("xyz")[n]));
        connect(field, &NumberField::committed, this,
                [this, field](double number) { edit(field, number); });
        axis->addWidget(field);
    }
    axis->addStretch(1);
    m_body->addLayout(turn);
    m_body->addLayout(axis);
    follow();
}

void AxisAngleBlock::present()
{
    const rotcore::Findings& found = m_model.findings();
    const rotcore::AngleUnit unit = found.shown.unit;
    m_angle->setValue(shownAngle(found.axisAngle.angle, unit), quantityOf(unit));
    for (int n = 0; n < 3; ++n)
        m_axis[static_cast<std::size_t>(n)]->setValue(found.axisAngle.axis[n]);
    say(!found.axisAngle.axisIsUnique    ? tr("No turn, so any axis would do; x stands for all.")
        : found.axisAngle.oppositeIsSame ? tr("A half turn: the opposite axis gives the same pose.")
                                         : QString(),
        Tone::quiet);
}

void AxisAngleBlock::edit(NumberField* changed, double number)
{
    rotcore::SentNumbers sent;
    sent.reading.kind = rotcore::Kind::axisAngle;
    sent.reading.unit = m_model.findings().shown.unit;
    for (const NumberField* field : m_axis)
        sent.values.push_back(field == changed ? number : field->value());
    sent.values.push_back(changed == m_angle ? number : m_angle->value());
    const auto meaning = rotcore::interpret(sent);  // for its warnings
    if (const auto fault = m_model.setNumbers(sent, tr("change axis and angle"))) {
        changed->refuse(sentenceOf(fault->message));
        return say(sentenceOf(fault->message), Tone::bad);
    }
    if (meaning && !meaning->warnings.empty())
        say(sentenceOf(meaning->warnings.front()), Tone::quiet);
}

}  // namespace ui
