// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include <Eigen/Geometry>

#include "rotcore/result.h"

namespace rotcore {

/// The Gibbs (Rodrigues) vector axis * tan(angle / 2) = v / w of a unit quaternion
/// (Shuster 1993, J. Astronaut. Sci. 41(4), 439-517, section on the Rodrigues parameters).
/// Fault: singular, at a half turn, where it is infinite.
Result<Eigen::Vector3d> gibbsVectorOf(const Eigen::Quaterniond& q_WB);

/// The pose of a Gibbs vector. Fault: notFinite.
Result<Eigen::Quaterniond> poseOfGibbsVector(const Eigen::Vector3d& gibbs);

/// Modified Rodrigues parameters axis * tan(angle / 4), both sets that give the pose
/// (Marandi & Modi 1987, Acta Astronautica 15(11); Schaub & Junkins 1996, J. Astronaut. Sci.
/// 44(1)).
struct ModifiedRodrigues {
    Eigen::Vector3d principal = Eigen::Vector3d::Zero();  ///< of length at most 1
    /// The same pose by the long way round, -principal / |principal|^2; none at angle 0, where
    /// infinite.
    std::optional<Eigen::Vector3d> shadow;
};

ModifiedRodrigues modifiedRodriguesOf(const Eigen::Quaterniond& q_WB);

/// The pose of modified Rodrigues parameters of either set. Fault: notFinite.
Result<Eigen::Quaterniond> poseOfModifiedRodrigues(const Eigen::Vector3d& parameters);

}  // namespace rotcore
