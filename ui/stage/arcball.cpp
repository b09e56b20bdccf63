// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/arcball.h"

#include <algorithm>
#include <cmath>

namespace ui {

using Eigen::Quaterniond;
using Eigen::Vector3d;

namespace {
constexpr double kLeastRadius = 0.2;  // stage units; the body has no surface nearer to its centre
constexpr double kMostRoll = 1.4;     // radians beyond the rim, short of the ball's far pole
}  // namespace

Arcball::Arcball(const Quaterniond& q_WB, const Vector3d& grabbed_W, const QPointF& press,
                 const Projection& projection)
    : m_pressed_WB(q_WB), m_radius(std::max(grabbed_W.norm(), kLeastRadius))
{
    if (grabbed_W.dot(projection.rayThrough(press).direction) > 0) m_side = 1.0;
    m_press_W = onBall(press, projection);
}

Vector3d Arcball::onBall(const QPointF& point, const Projection& projection) const
{
    const Ray ray = projection.rayThrough(point);
    const Vector3d nearest = ray.origin - ray.origin.dot(ray.direction) * ray.direction;
    const double miss = nearest.norm();
    if (miss <= m_radius)
        return nearest + m_side * std::sqrt(m_radius * m_radius - miss * miss) * ray.direction;
    const double roll = std::min((miss - m_radius) / m_radius, kMostRoll);
    return m_radius * (std::cos(roll) * nearest / miss - m_side * std::sin(roll) * ray.direction);
}

Quaterniond Arcball::poseAt(const QPointF& point, const Projection& projection) const
{
    const Quaterniond q_drag = Quaterniond::FromTwoVectors(m_press_W, onBall(point, projection));
    return (q_drag * m_pressed_WB).normalized();
}

}  // namespace ui
