// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "ui/stage/qt3d/solid.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The disc everything stands above.
struct GroundShape {
    double height = -2.0;  ///< along `up_W`
    double radius = 2.0;
    Eigen::Vector3d up_W = Eigen::Vector3d::UnitZ();
    bool fromAbove = true;  ///< else only its lines are drawn, so that nothing is hidden
};

/// The Qt3D side of the ground: a disc with circles and, at its rim, ticks every 15 degrees.
class GroundEntity {
public:
    /// The nodes belong to `parent`.
    GroundEntity(Qt3DCore::QEntity* parent, StageEffect* effect);

    /// True if a surface changed, so that the next picture may be incomplete.
    bool show(const GroundShape& ground, Scheme scheme);

private:
    Solid* m_disc;
    Solid* m_circles;
    Solid* m_rim;
    std::optional<double> m_radius;  ///< what the surfaces were made for
};

}  // namespace ui
