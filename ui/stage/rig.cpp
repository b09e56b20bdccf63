// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/euler_angles.h"
#include "ui/stage/scene.h"

namespace ui {

using Eigen::Quaterniond;
using Eigen::Vector3d;
using rotcore::About;
using rotcore::Axis;
using rotcore::EulerAngles;

namespace {

/// Takes x to `own` and y to `next`, which are different axes.
Quaterniond frameOf(Axis own, Axis next)
{
    const Vector3d x = rotcore::unitVector(own);
    const Vector3d y = rotcore::unitVector(next);
    Eigen::Matrix3d columns;
    columns << x, y, x.cross(y);
    return Quaterniond(columns);
}

}  // namespace

std::array<RingShape, 3> ringsOf(const EulerAngles& angles)
{
    const bool listedOuterFirst = angles.about == About::body;
    const EulerAngles rig = listedOuterFirst ? angles : rotcore::aboutTheOther(angles);
    const auto axes = rotcore::axesOf(rig.order);
    std::array<RingShape, 3> rings;
    Quaterniond q_WO = Quaterniond::Identity();  // O: what holds the ring's pins
    for (std::size_t n = 0; n < 3; ++n) {
        const Quaterniond q_WI = q_WO * rotcore::turnAbout(axes[n], rig.angles[n]);
        RingShape& ring = rings[n];
        ring.q_WR = q_WI * frameOf(axes[n], axes[n == 2 ? 1 : n + 1]);
        ring.radius = kRingRadii[n];
        ring.axis = axes[n];
        ring.listed = static_cast<int>(listedOuterFirst ? n : 2 - n);
        ring.angle = rig.angles[n];
        ring.pin_W = q_WO * rotcore::unitVector(axes[n]);
        q_WO = q_WI;
    }
    return rings;
}

}  // namespace ui
