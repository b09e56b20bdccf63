// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QString>
#include <optional>

#include "ui/stage/camera.h"
#include "ui/stage/scene.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The grabbed point's way about its pins: what a drag has swept, or all that one could sweep.
struct SweepMark {
    Eigen::Vector3d pin_W = Eigen::Vector3d::UnitZ();
    Eigen::Vector3d from_W = Eigen::Vector3d::UnitX();  ///< the grabbed point at the press
    std::optional<double> turned;                       ///< radians since the press; none before it
    int ring = 0;                                       ///< 0 outer to 2 inner
    QPointF pointer;                                    ///< logical pixels
};

/// What is painted over the picture, whichever renderer drew it.
struct OverlayState {
    QString hint;
    std::optional<SweepMark> sweep;
};

/// Paints labels, chips, lock marks, the sweep and the hint in logical pixels, in the painter's
/// font.
void paintOverlay(QPainter& painter, const Scene& scene, const Projection& projection,
                  Scheme scheme, const OverlayState& state);

}  // namespace ui
