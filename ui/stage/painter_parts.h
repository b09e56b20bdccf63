// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>

#include "ui/stage/camera.h"
#include "ui/stage/palette.h"
#include "ui/stage/scene.h"

namespace ui {

/// What the parts of one painted picture have in common.
struct PaintContext {
    QPainter& painter;
    const Scene& scene;
    const Projection& projection;
    const Palette& palette;
    Eigen::Vector3d eye_W;
};

/// The half of a ring that is behind the body's centre, or before it.
enum class Half { back, front };

void paintBody(const PaintContext& to);

/// Half of ring `n`, 0 outer to 2 inner, with its ticks, and those of its pins that are on that
/// half.
void paintRing(const PaintContext& to, int n, Half half);
void paintPins(const PaintContext& to, int n, Half half);

}  // namespace ui
