// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/lock/rates.h"

#include <cmath>

#include "rotcore/rotation/euler_solutions.h"

namespace rotcore {
namespace {

// R(axis, angle) v for a coordinate axis, without building the matrix.
Eigen::Vector3d turned(const Eigen::Vector3d& v, Axis axis, double angle)
{
    const int j = (indexOf(axis) + 1) % 3;
    const int k = (indexOf(axis) + 2) % 3;
    const double cosine = std::cos(angle);
    const double sine = std::sin(angle);
    Eigen::Vector3d result = v;
    result[j] = cosine * v[j] - sine * v[k];
    result[k] = sine * v[j] + cosine * v[k];
    return result;
}

// Columns listed as the angles of `euler` are; `columns` are outer, middle, inner.
Eigen::Matrix3d asListed(const Eigen::Matrix3d& columns, About about)
{
    if (about == About::body) return columns;
    return columns.rowwise().reverse();
}

EulerAngles outerFirst(const EulerAngles& euler)
{
    return euler.about == About::body ? euler : aboutTheOther(euler);
}

}  // namespace

Eigen::Matrix3d rateMatrixBody(const EulerAngles& euler)
{
    const EulerAngles rings = outerFirst(euler);
    const auto [i, j, k] = axesOf(rings.order);
    Eigen::Matrix3d columns;
    columns.col(0) = turned(turned(unitVector(i), j, -rings.angles[1]), k, -rings.angles[2]);
    columns.col(1) = turned(unitVector(j), k, -rings.angles[2]);
    columns.col(2) = unitVector(k);
    return asListed(columns, euler.about);
}

Eigen::Matrix3d rateMatrixSpace(const EulerAngles& euler)
{
    const EulerAngles rings = outerFirst(euler);
    const auto [i, j, k] = axesOf(rings.order);
    Eigen::Matrix3d columns;
    columns.col(0) = unitVector(i);
    columns.col(1) = turned(unitVector(j), i, rings.angles[0]);
    columns.col(2) = turned(turned(unitVector(k), j, rings.angles[1]), i, rings.angles[0]);
    return asListed(columns, euler.about);
}

Result<Eigen::Vector3d> angleRates(const EulerAngles& euler, const Eigen::Vector3d& w_WB_B)
{
    const Eigen::Matrix3d J = rateMatrixBody(euler);
    const Eigen::Vector3d cross01 = J.col(0).cross(J.col(1));
    const double determinant = cross01.dot(J.col(2));
    // At lock the cosine or sine of the middle angle, a double next to the lock's, is still about
    // 1e-16.
    if (std::abs(determinant) < kLockTolerance)
        return Fault{Fault::Kind::singular,
                     "at lock the rates of the angles are not determined by the angular velocity"};
    // Rows of the inverse are cross products of the columns over the determinant (Cramer's rule).
    return Eigen::Vector3d(Eigen::Vector3d(J.col(1).cross(J.col(2)).dot(w_WB_B),
                                           J.col(2).cross(J.col(0)).dot(w_WB_B),
                                           cross01.dot(w_WB_B)) /
                           determinant);
}

}  // namespace rotcore
