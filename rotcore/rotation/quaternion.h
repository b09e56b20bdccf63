// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include <Eigen/Geometry>

#include "rotcore/names.h"
#include "rotcore/result.h"

namespace rotcore {

/// Where the scalar stands among four numbers.
enum class ScalarPlace { first, last };

/// Hamilton: ij = k, and v -> q v q* turns v by the rotation vector of q. JPL: ij = -k, so that the
/// same expression turns v the other way (Breckenridge 1979; compared in Sommer et al. 2018,
/// Aerospace 5(3):72).
enum class Algebra { hamilton, jpl };

template <>
struct Names<ScalarPlace> {
    static constexpr std::string_view kWhat = "a layout of four numbers";
    static constexpr NameTable<ScalarPlace, 2> kTable{
        {{ScalarPlace::first, "wxyz"}, {ScalarPlace::last, "xyzw"}}};
};
template <>
struct Names<Algebra> {
    static constexpr std::string_view kWhat = "a quaternion algebra";
    static constexpr NameTable<Algebra, 2> kTable{
        {{Algebra::hamilton, "hamilton"}, {Algebra::jpl, "jpl"}}};
};

/// Four numbers as they stand in some layout, and how to read them.
struct QuaternionNumbers {
    ScalarPlace scalar = ScalarPlace::first;
    Algebra algebra = Algebra::hamilton;
    std::array<double, 4> numbers{};
    friend bool operator==(const QuaternionNumbers&, const QuaternionNumbers&) = default;
};

/// A quaternion brought to unit length, and how long it was.
struct Normalised {
    Eigen::Quaterniond quaternion;
    double length = 1.0;
};

/// Scaled to unit length, without overflow or underflow on the way.
/// Faults: notFinite; zeroLength (all four are zero).
Result<Normalised> normalised(const Eigen::Quaterniond& quaternion);

/// The Hamilton quaternion, not normalised, that turns vectors as `given` does in its own algebra.
Eigen::Quaterniond hamiltonOf(const QuaternionNumbers& given);

/// The numbers that `quaternion` (Hamilton) has in a layout and algebra.
QuaternionNumbers numbersOf(const Eigen::Quaterniond& quaternion, ScalarPlace scalar,
                            Algebra algebra);

/// Of q and -q, which are one pose, the one on the same side as `previous` (dot product >= 0).
Eigen::Quaterniond continued(const Eigen::Quaterniond& quaternion,
                             const Eigen::Quaterniond& previous);

/// Of q and -q, the one whose first component other than zero, in the order w, x, y, z, is
/// positive.
Eigen::Quaterniond canonical(const Eigen::Quaterniond& quaternion);

/// The angle in [0, pi] of the rotation between two poses, radians; exact down to the smallest
/// angles.
double angleBetween(const Eigen::Quaterniond& first, const Eigen::Quaterniond& second);

/// A matrix from outside is a rotation if no element of R R^T - I exceeds this.
inline constexpr double kOrthonormalTolerance = 1e-9;

/// The unit quaternion q_WB, canonical sign, of a matrix from outside. Of the four columns of the
/// outer product 4 q q^T, which are linear in R, it normalises the largest, so nothing is divided
/// by a number near zero and all nine elements count (Markley 2008, J. Guid. Control Dyn. 31(2),
/// 440-442). Faults: notFinite; notOrthonormal; leftHanded (det < 0). It never repairs what it was
/// given.
Result<Eigen::Quaterniond> quaternionFrom(const Eigen::Matrix3d& R_WB);

}  // namespace rotcore
