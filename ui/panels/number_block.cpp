// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/number_block.h"

namespace ui {
namespace {

constexpr int kSide = 16;
constexpr int kAbove = 10;
constexpr int kBetween = 4;

}  // namespace

NumberBlock::NumberBlock(CaseModel& model, const QString& title, QWidget* parent)
    : QWidget(parent),
      m_model(model),
      m_header(new QHBoxLayout),
      m_body(new QVBoxLayout),
      m_note(InkLabel::note({}, this))
{
    auto* column = new QVBoxLayout(this);
    column->setContentsMargins(kSide, kAbove, kSide, kAbove);
    column->setSpacing(kBetween);
    m_header->setSpacing(kBetween);
    if (!title.isEmpty()) m_header->addWidget(InkLabel::title(title, this));
    m_header->addStretch(1);
    m_body->setSpacing(0);
    m_note->setWordWrap(true);
    m_note->hide();
    column->addLayout(m_header);
    column->addLayout(m_body);
    column->addWidget(m_note);
}

QString NumberBlock::note() const
{
    return m_note->isHidden() ? QString() : m_note->text();
}

void NumberBlock::follow()
{
    connect(&m_model, &CaseModel::findingsChanged, this, &NumberBlock::present);
    connect(&m_model, &CaseModel::viewChanged, this, &NumberBlock::present);
    present();
}

void NumberBlock::say(const QString& sentence, Tone tone)
{
    m_note->setText(sentence);
    m_note->setTone(tone);
    m_note->setVisible(!sentence.isEmpty());
}

NumberField* NumberBlock::addField(Quantity quantity, const FieldWays& ways)
{
    auto* field = new NumberField(quantity, ways, this);
    field->setFont(figureFont(*this, 1.0));
    connect(field, &NumberField::steppingBegan, &m_model, &CaseModel::beginGesture);
    connect(field, &NumberField::steppingEnded, &m_model, &CaseModel::endGesture);
    return field;
}

}  // namespace ui
