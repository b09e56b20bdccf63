// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/rotation/euler_angles.h"

namespace rotcore {

/// How near a pose is to lock in one order, and what that costs.
struct LockGauge {
    Order order = Order::zyx;
    About about = About::body;
    /// Radians in [0, pi/2], between the pose and the nearest one at lock: also the angle between
    /// the outer and inner ring axes, taken as lines.
    double distance = 0.0;
    /// Degrees that a ring system turns per degree of the body, in the worst direction:
    /// 1/sqrt(1 - cos distance), infinite at lock.
    double amplification = 1.0;
    /// Of the Euler-rate Jacobian: sqrt(1 + s), 1, sqrt(1 - s) with s = cos distance.
    Eigen::Vector3d singularValues = Eigen::Vector3d::Ones();
    /// The axis (unit, either sign will do) about which the body turns at that worst cost, or not
    /// at all at lock. At right angles to the middle ring's axis. Any direction would do if
    /// distance is a quarter turn, where all three cost the same.
    Eigen::Vector3d lostDirectionBody = Eigen::Vector3d::UnitX();
    Eigen::Vector3d lostDirectionSpace = Eigen::Vector3d::UnitX();
    double crowding = 1.0;  ///< |det J| = sin(distance), see crowding()
};

/// The gauge of a pose q_WB of unit length, in closed form; `angles` are those that give it, of the
/// order and about that are gauged. Distances keep all digits down to 1e-16, for they come from the
/// quaternion.
LockGauge gaugeLock(const Eigen::Quaterniond& q_WB, const EulerAngles& angles);

/// One order's standing at a pose.
struct OrderStanding {
    Order order = Order::zyx;
    double distance = 0.0;       ///< radians
    double amplification = 1.0;  ///< infinite at lock
};

/// All 12 orders at the pose q_WB, the one farthest from lock first; equals keep the order of
/// kAllOrders.
std::array<OrderStanding, 12> rankOrders(const Eigen::Quaterniond& q_WB, About about);

/// How densely the triples of equal angle steps crowd at a middle angle: |det J| = |cos b| (all
/// axes different) or |sin b| (first repeated), the volume of rotations per volume of angles. It is
/// 0 at lock, as the length of a degree of longitude is at the pole. `middle` in radians.
double crowding(Order order, double middle);

/// The crowding over the plane of two angles for a map: the middle angle runs over the rows from
/// its lowest to its highest (see EulerSolutions), values at the centres of `rows` equal steps.
std::vector<double> crowdingProfile(Order order, int rows);

}  // namespace rotcore
