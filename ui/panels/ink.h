// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <QPalette>

#include "rotcore/rotation/axis.h"
#include "ui/stage/palette.h"

namespace ui {

/// The colours in which panels write, for light paper or dark.
struct Ink {
    QColor text;
    QColor quiet;
    QColor hairline;
    QColor accent;
    QColor warning;  ///< near lock, and what a person should look at
    QColor bad;      ///< at lock, and what was refused
    QColor x, y, z;

    const QColor& of(rotcore::Axis axis) const
    {
        return axis == rotcore::Axis::x ? x : axis == rotcore::Axis::y ? y : z;
    }
};

/// By the lightness of the palette's window.
inline Ink inkOn(const QPalette& palette)
{
    const bool dark = palette.color(QPalette::Window).lightness() < 128;
    const Palette& colours = paletteOf(dark ? Scheme::dark : Scheme::light);
    return {.text = colours.ink,
            .quiet = colours.quietInk,
            .hairline = colours.hairline,
            .accent = colours.accent,
            .warning = colours.nearingLock,
            .bad = colours.atLock,
            .x = colours.axis(rotcore::Axis::x),
            .y = colours.axis(rotcore::Axis::y),
            .z = colours.axis(rotcore::Axis::z)};
}

}  // namespace ui
