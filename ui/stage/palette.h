// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <array>

#include "rotcore/rotation/axis.h"
#include "ui/stage/scene.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The colours of one scheme. Text in any of them reaches 4.5 to 1 on the sheet.
struct Palette {
    QColor paper, sheet, stageTop, stageBottom, ink, quietInk, hairline, accent;
    std::array<QColor, 3> axes;  ///< x, y, z, after Okabe & Ito (2008)
    QColor nearingLock;          ///< also "nearing lock" in words: never by colour alone
    QColor atLock;
    QColor ground, groundLine;
    std::array<QColor, 4> materials;  ///< by Mesh::Material

    const QColor& axis(rotcore::Axis axis) const
    {
        return axes[static_cast<std::size_t>(rotcore::indexOf(axis))];
    }
    const QColor& material(Mesh::Material material) const
    {
        return materials[static_cast<std::size_t>(material)];
    }
};

const Palette& paletteOf(Scheme scheme);

/// `share` of `over` on top of the rest of `under`, opaque.
QColor mixed(const QColor& under, const QColor& over, double share);

}  // namespace ui
