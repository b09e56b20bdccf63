// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "ui/stage/qt3d/solid.h"
#include "ui/stage/scene.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// What a ring's place in the rig says of it, in stage units.
struct RingMeasures {
    double thickness = 0.03;   ///< half width of its tube
    double outerRadius = 1.0;  ///< how far out its pins reach
    friend bool operator==(const RingMeasures&, const RingMeasures&) = default;
};

/// The Qt3D side of one ring: its tube, the degree ticks on it and its two pins. Nothing reads back
/// from it.
class RingEntity {
public:
    /// The nodes belong to `parent`.
    RingEntity(Qt3DCore::QEntity* parent, StageEffect* effect);

    /// True if a surface changed, so that the next picture may be incomplete.
    bool show(const RingShape& ring, const RingMeasures& measures, Scheme scheme);

private:
    /// What the surfaces were made for.
    struct Build {
        double radius = 0.0;
        rotcore::Axis axis = rotcore::Axis::x;
        RingMeasures measures;
        friend bool operator==(const Build&, const Build&) = default;
    };

    void build(const Build& wanted);

    Solid* m_tube;
    Solid* m_ticks;
    Solid* m_pins;
    std::optional<Build> m_built;
};

}  // namespace ui
