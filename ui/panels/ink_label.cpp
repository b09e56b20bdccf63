// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/ink_label.h"

#include <QEvent>
#include <QFontDatabase>

namespace ui {
namespace {

constexpr double kQuietSize = 0.85;

const QColor& colourOf(Tone tone, const Ink& ink)
{
    switch (tone) {
        case Tone::text:
            return ink.text;
        case Tone::quiet:
            return ink.quiet;
        case Tone::warning:
            return ink.warning;
        case Tone::bad:
            return ink.bad;
        case Tone::x:
            return ink.x;
        case Tone::y:
            return ink.y;
        case Tone::z:
            return ink.z;
    }
    return ink.text;
}

void scale(QFont& font, double factor)
{
    if (font.pointSizeF() > 0.0)
        font.setPointSizeF(font.pointSizeF() * factor);
    else
        font.setPixelSize(qRound(font.pixelSize() * factor));
}

}  // namespace

Tone toneOf(rotcore::Axis axis)
{
    switch (axis) {
        case rotcore::Axis::x:
            return Tone::x;
        case rotcore::Axis::y:
            return Tone::y;
        case rotcore::Axis::z:
            return Tone::z;
    }
    return Tone::text;
}

InkLabel::InkLabel(const QString& text, Tone tone, QWidget* parent)
    : QLabel(text, parent), m_tone(tone)
{
    applyTone();
}

void InkLabel::setTone(Tone tone)
{
    if (tone == m_tone) return;
    m_tone = tone;
    applyTone();
}

void InkLabel::setRelativeSize(double factor)
{
    QFont scaled = font();
    scale(scaled, factor);
    setFont(scaled);
}

InkLabel* InkLabel::title(const QString& text, QWidget* parent)
{
    auto* label = new InkLabel(text, Tone::text, parent);
    QFont font = label->font();
    font.setBold(true);
    scale(font, kQuietSize);
    label->setFont(font);
    return label;
}

InkLabel* InkLabel::note(const QString& text, QWidget* parent)
{
    auto* label = new InkLabel(text, Tone::quiet, parent);
    label->setRelativeSize(kQuietSize);
    return label;
}

void InkLabel::changeEvent(QEvent* event)
{
    QLabel::changeEvent(event);
    if (event->type() == QEvent::PaletteChange) applyTone();
}

void InkLabel::applyTone()
{
    const QColor colour = colourOf(m_tone, inkOn(palette()));
    if (palette().color(QPalette::WindowText) == colour) return;
    QPalette inked = palette();
    inked.setColor(QPalette::WindowText, colour);
    // Only this role is the label's own; all others keep following the window.
    QPalette::ResolveMask mask = 0;
    for (const int group : {QPalette::Active, QPalette::Inactive, QPalette::Disabled})
        mask |= QPalette::ResolveMask(1) << (group * QPalette::NColorRoles + QPalette::WindowText);
    inked.setResolveMask(mask);
    setPalette(inked);
}

QFont figureFont(const QWidget& widget, double factor)
{
    QFont font = QFontDatabase::systemFont(QFontDatabase::FixedFont);
    font.setPointSizeF(widget.font().pointSizeF() > 0.0 ? widget.font().pointSizeF()
                                                        : font.pointSizeF());
    if (widget.font().pointSizeF() <= 0.0) font.setPixelSize(widget.font().pixelSize());
    scale(font, factor);
    return font;
}

}  // namespace ui
