// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <utility>

#include "ui/stage/qt3d/solid.h"
#include "ui/stage/scene.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// What an axis line is drawn from: stretches of one line, in stage units along it.
struct AxisLine {
    std::array<std::pair<double, double>, 2> stretches{};  ///< from and to; empty if they are equal
    bool dashed = false;
    friend bool operator==(const AxisLine&, const AxisLine&) = default;
};

/// The Qt3D side of one axis line: a thin tube, dashed if it is the world's. Level axes of the
/// world lie on the ground, the upright one stands below and above the outer ring, those of the
/// body begin at its centre.
class AxisEntity {
public:
    /// The nodes belong to `parent`.
    AxisEntity(Qt3DCore::QEntity* parent, StageEffect* effect);

    /// True if a surface changed, so that the next picture may be incomplete.
    bool show(const AxisShape& axis, const Scene& scene, Scheme scheme);
    void hide() { m_line->setEnabled(false); }

private:
    Solid* m_line;
    std::optional<AxisLine> m_built;  ///< what the surface was made for
};

}  // namespace ui
