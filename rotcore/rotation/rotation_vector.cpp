// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/rotation_vector.h"

#include <cmath>
#include <limits>

#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/quaternion.h"

namespace rotcore {
namespace {

// A scalar part this small is rounding: the half turn cannot be told from a half turn the other
// way.
constexpr double kHalfTurnScalar = std::numeric_limits<double>::epsilon();

Eigen::Quaterniond shortWay(const Eigen::Quaterniond& q)
{
    if (std::abs(q.w()) > kHalfTurnScalar)
        return q.w() > 0.0 ? q : Eigen::Quaterniond(Eigen::Vector4d(-q.coeffs()));
    for (const double component : q.vec()) {
        if (component > kHalfTurnScalar) return q;
        if (component < -kHalfTurnScalar) return Eigen::Quaterniond(Eigen::Vector4d(-q.coeffs()));
    }
    return q;
}

}  // namespace

AxisAngle axisAngleOf(const Eigen::Quaterniond& q_WB)
{
    const Eigen::Quaterniond q = shortWay(q_WB);
    const double sine = q.vec().stableNorm();
    AxisAngle turn;
    turn.angle = 2.0 * std::atan2(sine, std::abs(q.w()));
    turn.axisIsUnique = sine > 0.0;
    turn.oppositeIsSame = std::abs(q.w()) <= kHalfTurnScalar;
    if (turn.axisIsUnique) turn.axis = q.vec().stableNormalized();
    return turn;
}

Eigen::Vector3d rotationVectorOf(const Eigen::Quaterniond& q_WB)
{
    const AxisAngle turn = axisAngleOf(q_WB);
    return turn.angle * turn.axis;
}

Result<Eigen::Quaterniond> poseOfRotationVector(const Eigen::Vector3d& rotationVector)
{
    if (!rotationVector.allFinite())
        return Fault{Fault::Kind::notFinite,
                     "a component of the rotation vector is not a finite number"};
    const double angle = rotationVector.stableNorm();
    if (!std::isfinite(angle))
        return Fault{Fault::Kind::notFinite,
                     "the length of the rotation vector is beyond any double"};
    if (angle == 0.0) return Eigen::Quaterniond::Identity();
    Eigen::Quaterniond q;
    q.w() = std::cos(0.5 * angle);
    q.vec() = std::sin(0.5 * angle) * (rotationVector / angle);
    return q;
}

Result<Eigen::Quaterniond> poseOfAxisAngle(const Eigen::Vector3d& axis, double angle)
{
    if (!axis.allFinite() || !std::isfinite(angle))
        return Fault{Fault::Kind::notFinite, "the axis or the angle is not a finite number"};
    const Eigen::Vector3d unit = axis.stableNormalized();
    if (!(unit.squaredNorm() > 0.5))
        return Fault{Fault::Kind::zeroLength,
                     "the axis has no length, so it names no direction to turn about"};
    Eigen::Quaterniond q;
    q.w() = std::cos(0.5 * angle);
    q.vec() = std::sin(0.5 * angle) * unit;
    return q;
}

}  // namespace rotcore
