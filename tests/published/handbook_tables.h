// SPDX-License-Identifier: GPL-3.0-or-later
// Two tables of the handbooks, written out element by element, as they are used to check rotcore.
#pragma once
#include <array>

#include <Eigen/Core>

#include "rotcore/rotation/order.h"

namespace published {

/// Sines and cosines of three angles, named as the tables have them.
struct TrigOfThree {
    double s1, c1, s2, c2, s3, c3;
    explicit TrigOfThree(const std::array<double, 3>& radians);
};

/// One of the twelve sequences: the angles are listed in the order in which they are applied.
struct HandbookRow {
    rotcore::Order order;  ///< 321 of the handbook is zyx
    /// [BN], world coordinates to body coordinates.
    Eigen::Matrix3d (*attitude)(const TrigOfThree&);
    /// [B]^-1, the rates of the three angles to angular velocity in body axes.
    Eigen::Matrix3d (*rates)(const TrigOfThree&);
};

/// Direction cosines and kinematics of all twelve sequences: Junkins & Turner 1986, Optimal
/// Spacecraft Rotational Maneuvers, and Schaub & Junkins, Analytical Mechanics of Space Systems,
/// appendix B; second-hand, from H. Schaub's routines that go with the latter. (Hughes 1986, table
/// 2.3, and Wertz 1978, tables E-1 and E-2, have the same by repute; not seen.)
extern const std::array<HandbookRow, 12> kHandbook;

}  // namespace published
