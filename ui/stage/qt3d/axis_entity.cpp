// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/axis_entity.h"

#include <algorithm>
#include <cmath>

#include "ui/stage/palette.h"

namespace ui {

using Eigen::Vector3d;

namespace {

// Half widths and lengths, stage units.
constexpr double kBodyLine = 0.014;
constexpr double kWorldLine = 0.010;
constexpr double kDashPitch = 0.1;
constexpr double kDashShare = 0.58;

/// An axis line with where it starts and which way it goes.
struct Placed {
    AxisLine line;
    Vector3d origin_W;
    Vector3d direction_W;
};

Placed placedLine(const AxisShape& axis, const Scene& scene)
{
    if (axis.frame == AxisShape::Frame::body) {
        return {{{{{0.0, axis.length}}}, false}, Vector3d::Zero(), axis.direction_W};
    }
    if (std::abs(axis.direction_W.dot(scene.up_W)) < 0.5) {
        const double height = scene.groundHeight + 1.5 * kWorldLine;  // on the ground, not in it
        return {{{{{0.0, axis.length}}}, true}, height * scene.up_W, axis.direction_W};
    }
    const double outside = scene.rings[0].radius;
    return {{{{{scene.groundHeight, -outside}, {outside, axis.length}}}, true},
            Vector3d::Zero(),
            scene.up_W};
}

void addStretch(Surface& surface, double from, double to, bool dashed)
{
    if (to <= from) return;
    const Vector3d along = Vector3d::UnitZ();
    if (!dashed) {
        addCylinder(surface, from * along, to * along, kBodyLine, 10);
        return;
    }
    const int dashes = std::max(1, static_cast<int>((to - from) / kDashPitch));
    const double pitch = (to - from) / dashes;
    for (int n = 0; n < dashes; ++n) {
        const double start = from + n * pitch;
        addCylinder(surface, start * along, (start + kDashShare * pitch) * along, kWorldLine, 8);
    }
}

}  // namespace

AxisEntity::AxisEntity(Qt3DCore::QEntity* parent, StageEffect* effect)
    : m_line(new Solid(parent, effect, {.shade = 0.35F}))
{
    m_line->setEnabled(false);
}

bool AxisEntity::show(const AxisShape& axis, const Scene& scene, Scheme scheme)
{
    const Placed placed = placedLine(axis, scene);
    const bool rebuilt = placed.line != m_built;
    if (rebuilt) {
        Surface surface;
        for (const auto& [from, to] : placed.line.stretches) {
            addStretch(surface, from, to, placed.line.dashed);
        }
        m_line->setSurface(surface);
        m_built = placed.line;
    }
    m_line->setColour(paletteOf(scheme).axis(axis.axis));
    m_line->setPose(Eigen::Quaterniond::FromTwoVectors(Vector3d::UnitZ(), placed.direction_W),
                    placed.origin_W);
    m_line->setEnabled(true);
    return rebuilt;
}

}  // namespace ui
