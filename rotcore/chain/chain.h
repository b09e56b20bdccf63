// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/result.h"
#include "rotcore/rotation/euler_angles.h"

namespace rotcore {

/// One rotation by an angle about an axis.
struct Turn {
    Eigen::Vector3d axis = Eigen::Vector3d::UnitZ();  ///< of any length but zero
    double angle = 0.0;                               ///< radians, right-handed about the axis
    About about = About::body;  ///< whose axes the three components of `axis` belong to
    bool muted = false;         ///< a muted turn stays listed and does nothing
    std::string name = {};
    friend bool operator==(const Turn&, const Turn&) = default;
};

/// Turns applied one after another, as listed: a turn about body multiplies the pose so far from
/// the right, a turn about space from the left. So turns A, B, C make R_A R_B R_C about body and
/// R_C R_B R_A about space; the two may be mixed.
using Chain = std::vector<Turn>;

/// The three turns of Euler angles, in listed order.
Chain chainOf(const EulerAngles& euler);

/// The pose after each turn, one for each turn (a muted one repeats the pose before it), starting
/// from the pose `q_WS`. Each is of unit length. Faults: notFinite, zeroLength, naming the turn
/// from 1.
Result<std::vector<Eigen::Quaterniond>> partialPoses(
    const Chain& chain, const Eigen::Quaterniond& q_WS = Eigen::Quaterniond::Identity());

/// The pose that the whole chain makes. Faults as above.
Result<Eigen::Quaterniond> pose(const Chain& chain,
                                const Eigen::Quaterniond& q_WS = Eigen::Quaterniond::Identity());

/// The chain whose pose is the inverse: the list backwards with negated angles; where body and
/// space turns are mixed, the list as it is with negated angles and body and space exchanged, for
/// there the backward list would undo the turns but not, taken by itself, make the inverse pose.
Chain inverse(const Chain& chain);

}  // namespace rotcore
