// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/ring_drag.h"

#include <cmath>

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr double kReach = 1.0;  // radians: how far round one event may take the ring
constexpr int kSamples = 40;    // on either side; 1.4 degrees apart
constexpr double kLeastLever =
    0.4;  // of the ring's radius: grabbed at a pin, a ring still turns gently
constexpr double kStayPenalty =
    4.0;  // squared pixels per squared radian: of two equals, the nearer

/// The grabbed point, moved away from the pins if it is too near them to turn the ring by.
Vector3d handleOf(const RingShape& ring, const Vector3d& grabbed_W)
{
    const Vector3d foot = grabbed_W.dot(ring.pin_W) * ring.pin_W;
    const Vector3d lever = grabbed_W - foot;
    const double least = kLeastLever * ring.radius;
    if (lever.norm() >= least) return grabbed_W;
    const Vector3d direction = ring.q_WR * Vector3d::UnitY();
    return foot + least * (lever.dot(direction) < 0 ? -direction : direction);
}

}  // namespace

Vector3d turnedAbout(const Vector3d& pin_W, double turn, const Vector3d& point_W)
{
    return Eigen::AngleAxisd(turn, pin_W) * point_W;
}

RingDrag::RingDrag(const RingShape& ring, const Vector3d& grabbed_W, const QPointF& press,
                   const Projection& projection)
    : m_pin_W(ring.pin_W),
      m_handle_W(handleOf(ring, grabbed_W)),
      m_angleAtPress(ring.angle),
      m_shown(ring.angle)
{
    if (const auto handle = projection.project(m_handle_W)) m_offset = handle->at - press;
}

double RingDrag::missOf(double turn, const QPointF& target, const Projection& projection) const
{
    const auto handle = projection.project(turnedAbout(m_pin_W, turn, m_handle_W));
    if (!handle) return HUGE_VAL;
    const QPointF miss = handle->at - target;
    const double moved = turn - m_followed;
    return QPointF::dotProduct(miss, miss) + kStayPenalty * moved * moved;
}

double RingDrag::moveTo(const QPointF& point, const Projection& projection, DragGrain grain)
{
    const QPointF target = point + m_offset;
    double best = m_followed;
    double least = missOf(best, target, projection);
    for (int n = -kSamples; n <= kSamples; ++n) {
        const double turn = m_followed + kReach * n / kSamples;
        const double miss = missOf(turn, target, projection);
        if (miss < least) {
            least = miss;
            best = turn;
        }
    }
    for (double step = kReach / kSamples / 2; step > 1e-9; step /= 2)
        for (const double turn : {best - step, best + step}) {
            const double miss = missOf(turn, target, projection);
            if (miss < least) {
                least = miss;
                best = turn;
            }
        }
    m_turned += (best - m_followed) * (grain == DragGrain::fine ? kFineShare : 1.0);
    m_followed = best;
    m_shown = m_angleAtPress + m_turned;
    if (grain == DragGrain::snapped) m_shown = std::round(m_shown / kSnapStep) * kSnapStep;
    return m_shown;
}

}  // namespace ui
