// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/window/theme.h"

#include <QApplication>
#include <QStyle>
#include <QStyleFactory>

#include "ui/stage/palette.h"

namespace ui {

Scheme schemeOfDesktop()
{
    // The palette before ours was set: kept by the style's own factory, read once.
    static const bool dark = QApplication::palette().color(QPalette::Window).lightness() < 128;
    return dark ? Scheme::dark : Scheme::light;
}

QPalette widgetPaletteOf(Scheme scheme)
{
    const Palette& inks = paletteOf(scheme);
    QPalette palette;
    palette.setColor(QPalette::Window, inks.paper);
    palette.setColor(QPalette::WindowText, inks.ink);
    palette.setColor(QPalette::Base, inks.sheet);
    palette.setColor(QPalette::AlternateBase, inks.paper);
    palette.setColor(QPalette::Text, inks.ink);
    palette.setColor(QPalette::PlaceholderText, inks.quietInk);
    palette.setColor(QPalette::Button, inks.sheet);
    palette.setColor(QPalette::ButtonText, inks.ink);
    palette.setColor(QPalette::ToolTipBase, inks.sheet);
    palette.setColor(QPalette::ToolTipText, inks.ink);
    palette.setColor(QPalette::Highlight, inks.accent);
    palette.setColor(QPalette::HighlightedText, inks.sheet);
    palette.setColor(QPalette::Link, inks.accent);
    palette.setColor(QPalette::Mid, inks.hairline);
    palette.setColor(QPalette::Dark, inks.hairline);
    palette.setColor(QPalette::Midlight, inks.hairline);
    palette.setColor(QPalette::Light, inks.sheet);
    palette.setColor(QPalette::Shadow, inks.hairline);
    for (const auto role : {QPalette::WindowText, QPalette::Text, QPalette::ButtonText})
        palette.setColor(QPalette::Disabled, role, inks.quietInk);
    return palette;
}

void applyScheme(Scheme scheme)
{
    schemeOfDesktop();  // before the palette is ours
    QApplication::setStyle(QStyleFactory::create("Fusion"));
    QApplication::setPalette(widgetPaletteOf(scheme));
}

}  // namespace ui
