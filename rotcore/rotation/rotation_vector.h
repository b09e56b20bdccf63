// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <Eigen/Geometry>

#include "rotcore/result.h"

namespace rotcore {

/// One turn that takes the body from the world's axes to its pose. The axis has the same
/// coordinates in the body and in the world, for the turn leaves it where it is.
struct AxisAngle {
    Eigen::Vector3d axis = Eigen::Vector3d::UnitX();  ///< of unit length
    double angle = 0.0;                               ///< radians, in [0, pi]
    /// Whether the pose determines the axis: not at angle 0, where x stands for any other.
    bool axisIsUnique = true;
    /// Whether the opposite axis would do as well: at a half turn, to the last digit of a double.
    /// The axis given is then the one whose first component other than zero is positive.
    bool oppositeIsSame = false;
};

/// Axis and angle of a unit quaternion, by 2 atan2(|v|, |w|), exact also where arccosine is blind.
AxisAngle axisAngleOf(const Eigen::Quaterniond& q_WB);

/// The rotation vector, axis times angle, radians, of length in [0, pi]. At a half turn one of two.
Eigen::Vector3d rotationVectorOf(const Eigen::Quaterniond& q_WB);

/// The pose of a rotation vector, radians, of any finite length. Faults: notFinite.
Result<Eigen::Quaterniond> poseOfRotationVector(const Eigen::Vector3d& rotationVector);

/// The pose after a turn by `angle`, radians, about an axis of any length but zero.
/// Faults: notFinite; zeroLength.
Result<Eigen::Quaterniond> poseOfAxisAngle(const Eigen::Vector3d& axis, double angle);

}  // namespace rotcore
