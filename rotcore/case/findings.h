// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/case/case.h"
#include "rotcore/lock/gauge.h"
#include "rotcore/reading/reading.h"
#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/rodrigues.h"
#include "rotcore/rotation/rotation_vector.h"

namespace rotcore {

/// Everything computed from a case. The pose is body to world, active, Hamilton.
struct Findings {
    Convention shown;                          ///< the case's
    std::optional<Interpretation> start;       ///< present if the case has start numbers
    std::vector<Eigen::Quaterniond> partials;  ///< the pose after each turn of the chain

    Eigen::Quaterniond q_WB = Eigen::Quaterniond::Identity();  ///< of unit length, canonical sign
    Eigen::Matrix3d R_WB = Eigen::Matrix3d::Identity();
    AxisAngle axisAngle;
    std::optional<Eigen::Vector3d> gibbs;  ///< none at a half turn
    ModifiedRodrigues modifiedRodrigues;
    EulerSolutions euler;  ///< in the convention shown, radians
    /// The angles to show: as they were turned, if the case is nothing but three turns in the
    /// convention shown (they may then pass 180 deg, and lock); else the first of
    /// `euler.solutions`.
    EulerAngles angles;

    LockGauge lock;                          ///< of `euler`
    std::array<OrderStanding, 12> orders{};  ///< all 12, farthest from lock first
};

/// Pure: the same case gives the same findings. Faults: those of interpret() and partialPoses().
Result<Findings> examine(const Case& subject);

}  // namespace rotcore
