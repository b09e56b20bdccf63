// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPalette>

#include "ui/stage/stage_renderer.h"

namespace ui {

/// What the desktop asks for, judged by the lightness of the palette it gave the application.
Scheme schemeOfDesktop();

/// Paper, sheet, ink and accent of a scheme as a palette for all widgets.
QPalette widgetPaletteOf(Scheme scheme);

/// Gives the application the style and palette of a scheme.
void applyScheme(Scheme scheme);

}  // namespace ui
