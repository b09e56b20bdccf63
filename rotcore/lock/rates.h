// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <Eigen/Core>

#include "rotcore/result.h"
#include "rotcore/rotation/euler_angles.h"

namespace rotcore {

/// The axes of the three rings as they stand, one a column, listed as the angles are. They are the
/// Euler-rate Jacobian: the angular velocity is J (a', b', c').
/// (Kinematics of 12 sequences: Hughes 1986, Spacecraft Attitude Dynamics, table 2.3; Diebel 2006.)
///
/// `rateMatrixBody` gives w_WB_B, the angular velocity in the body's axes; `rateMatrixSpace` gives
/// w_WB_W, the same in the world's. Their determinants are equal, +-cos b (all axes different) or
/// +-sin b (first repeated). Radians; angles finite.
Eigen::Matrix3d rateMatrixBody(const EulerAngles& euler);
Eigen::Matrix3d rateMatrixSpace(const EulerAngles& euler);

/// The rates (a', b', c') of the angles, listed as they are, for an angular velocity w_WB_B in the
/// body's axes, in closed form. Fault: singular, at lock, where some velocities need infinite
/// rates.
Result<Eigen::Vector3d> angleRates(const EulerAngles& euler, const Eigen::Vector3d& w_WB_B);

}  // namespace rotcore
