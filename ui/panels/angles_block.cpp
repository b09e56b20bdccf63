// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/angles_block.h"

#include <QGridLayout>

#include "ui/panels/figure_text.h"

namespace ui {
namespace {

constexpr double kFigureSize = 1.15;  // these are the figures being worked on
constexpr int kRowGap = 2;
constexpr int kColumnGap = 12;

}  // namespace

AnglesBlock::AnglesBlock(CaseModel& model, QWidget* parent)
    : NumberBlock(model, tr("Angles"), parent),
      m_twinWords(InkLabel::note(tr("the twin says the same"), this))
{
    m_twinWords->setToolTip(
        tr("Every pose away from lock has two triples of angles; this is the other one."));
    m_header->addWidget(m_twinWords);
    auto* grid = new QGridLayout;
    grid->setVerticalSpacing(kRowGap);
    grid->setHorizontalSpacing(kColumnGap);
    grid->setColumnStretch(2, 1);
    for (int listed = 0; listed < 3; ++listed) {
        Row& row = m_rows[static_cast<std::size_t>(listed)];
        row.letter = new InkLabel({}, Tone::text, this);
        QFont bold = row.letter->font();
        bold.setBold(true);
        row.letter->setFont(bold);
        row.angle = addField(Quantity::degrees);
        row.angle->setFont(figureFont(*this, kFigureSize));
        row.angle->setObjectName(QStringLiteral("angle%1").arg(listed));
        row.twin = new InkLabel({}, Tone::quiet, this);
        row.twin->setFont(figureFont(*this, 1.0));
        row.twin->setAlignment(Qt::AlignRight | Qt::AlignVCenter);
        row.twin->setTextInteractionFlags(Qt::TextSelectableByMouse);
        connect(row.angle, &NumberField::committed, this, [this, listed](double shown) {
            m_model.setAngle(listed, rotcore::toRadians(shown, m_model.findings().shown.unit));
        });
        grid->addWidget(row.letter, listed, 0);
        grid->addWidget(row.angle, listed, 1);
        grid->addWidget(row.twin, listed, 2);
    }
    m_body->addLayout(grid);
    follow();
}

void AnglesBlock::present()
{
    const rotcore::Findings& found = m_model.findings();
    const rotcore::AngleUnit unit = found.shown.unit;
    const Quantity quantity = quantityOf(unit);
    const auto axes = rotcore::axesOf(found.angles.order);
    const rotcore::EulerAngles twin = rotcore::twinOf(found.angles);
    for (int listed = 0; listed < 3; ++listed) {
        const auto index = static_cast<std::size_t>(listed);
        const Row& row = m_rows[index];
        const QString words = turnWords(found.angles, listed);
        row.letter->setText(QString::fromUtf8(rotcore::nameOf(axes[index])));
        row.letter->setTone(toneOf(axes[index]));
        row.letter->setToolTip(words);
        row.angle->setMeaning(words);
        row.angle->setValue(shownAngle(found.angles.angles[index], unit), quantity);
        row.twin->setText(figureText(rotcore::inUnit(twin.angles[index], unit), quantity));
        row.twin->setToolTip(tr("The twin's %1").arg(words));
    }
    say(lockText(found), Tone::bad);
}

}  // namespace ui
