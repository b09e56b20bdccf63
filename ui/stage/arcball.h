// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>

#include "ui/stage/camera.h"

namespace ui {

/// A free turn of the body by the hand: an invisible ball about the centre, through the grabbed
/// point, that follows the pointer (Shoemake 1992, "ARCBALL", Graphics Interface '92, 151-156).
/// Unlike there, the ball turns by the arc and not by twice the arc, so that what was grabbed stays
/// under the pointer; and beyond the ball's rim it rolls on.
class Arcball {
public:
    /// `grabbed_W` is the point of the body under `press`.
    Arcball(const Eigen::Quaterniond& q_WB, const Eigen::Vector3d& grabbed_W, const QPointF& press,
            const Projection& projection);

    /// The pose with the pointer at `point`: the turn in world coordinates, after the pose at the
    /// press.
    Eigen::Quaterniond poseAt(const QPointF& point, const Projection& projection) const;

private:
    Eigen::Vector3d onBall(const QPointF& point, const Projection& projection) const;

    Eigen::Quaterniond m_pressed_WB;
    double m_radius;
    double m_side =
        -1.0;  ///< -1: the grabbed point is on the near side of the ball; +1: on the far side
    Eigen::Vector3d m_press_W;
};

}  // namespace ui
