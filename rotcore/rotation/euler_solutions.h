// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>

#include <Eigen/Geometry>

#include "rotcore/rotation/euler_angles.h"

namespace rotcore {

/// Nearer to lock than this, in radians, a pose held in doubles no longer says which of its angles
/// turn the outer and which the inner ring: the distance itself is rounding (a few times 2.2e-16).
inline constexpr double kLockTolerance = 1.5e-15;

/// All triples that give a pose at lock: the outer angle may be anything, the inner one follows it.
struct LockFamily {
    double middle = 0.0;  ///< radians, exactly the angle of the lock
    int sign = 1;         ///< the pose fixes `outer + sign * inner` and nothing else of the two
    double fixed = 0.0;   ///< the value of that combination, radians, in (-pi, pi]
    friend bool operator==(const LockFamily&, const LockFamily&) = default;
};

/// Every way to write one pose in an order: two triples, or at lock a family and a member of it.
struct EulerSolutions {
    /// Two triples of one pose. The first has its middle angle in [-pi/2, pi/2] (all axes
    /// different) or [0, pi] (first axis repeated), the other is its twin (a + pi, pi - b, c + pi)
    /// or (a + pi, -b, c + pi). All angles are in (-pi, pi]. At lock they are two members of the
    /// family: the one whose outer angle was asked for, and its twin.
    std::array<EulerAngles, 2> solutions;
    double lockDistance = 0.0;         ///< radians in [0, pi/2], from the nearest pose at lock
    std::optional<LockFamily> family;  ///< present exactly when lockDistance < kLockTolerance

    bool locked() const { return family.has_value(); }
};

/// The outer ring is the one that the world carries: it turns by the first listed angle about body
/// and by the last listed about space. 0 or 2.
constexpr int outerIndex(About about)
{
    return about == About::body ? 0 : 2;
}

/// The twin of a triple: the other angles, all in (-pi, pi], that give the same pose.
EulerAngles twinOf(const EulerAngles& euler);

/// The member of a family whose outer angle is `outer`, radians.
EulerAngles memberOf(const LockFamily& family, Order order, About about, double outer);

/// All angles that give the pose q_WB (of unit length). Half-angle sums and differences come
/// straight from the quaternion by arctangents of pairs, which are exact at and near lock
/// (Bernardes & Viollet 2022, PLoS ONE 17(11): e0276302, with 2 atan2(hypot, hypot) for the middle
/// angle instead of their arccosine). At lock the outer angle is `outerAtLock`, for instance what
/// it was before.
EulerSolutions solveEuler(const Eigen::Quaterniond& q_WB, Order order, About about,
                          double outerAtLock = 0.0);

/// Of the two solutions, the one whose angles are nearer to `previous`, whole turns aside; so that
/// angles that are followed as a body moves do not jump to the twin without need. At lock: solve
/// with `outerAtLock` set to the previous outer angle, and its member is the nearer one.
EulerAngles nearerTo(const EulerAngles& previous, const EulerSolutions& solved);

/// How far the pose is from the nearest lock of `order`, radians in [0, pi/2]; 2 x the smaller
/// arctangent of the two half-angle pairs, so small distances keep all their digits. The same about
/// body and space only for the reversed order: `lockDistance(q, zyx, body)` is that of `xyz` about
/// space.
double lockDistance(const Eigen::Quaterniond& q_WB, Order order, About about);

}  // namespace rotcore
