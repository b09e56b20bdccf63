// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/quaternion.h"

#include <cmath>

#include "rotcore/number_text.h"

namespace rotcore {

Result<Normalised> normalised(const Eigen::Quaterniond& quaternion)
{
    if (!quaternion.coeffs().allFinite())
        return Fault{Fault::Kind::notFinite,
                     "a component of the quaternion is not a finite number"};
    const double largest = quaternion.coeffs().cwiseAbs().maxCoeff();
    if (largest == 0.0)
        return Fault{Fault::Kind::zeroLength,
                     "all four components of the quaternion are zero, so it names no rotation"};
    // Scaling by a power of two is exact and keeps the squares in range.
    int exponent = 0;
    std::frexp(largest, &exponent);
    Eigen::Vector4d scaled = quaternion.coeffs();
    for (double& component : scaled)
        component = std::ldexp(component, -exponent);
    const double norm = scaled.norm();
    return Normalised{Eigen::Quaterniond(Eigen::Vector4d(scaled / norm)),
                      std::ldexp(norm, exponent)};
}

Eigen::Quaterniond hamiltonOf(const QuaternionNumbers& given)
{
    const auto& n = given.numbers;
    const Eigen::Quaterniond q = given.scalar == ScalarPlace::first
                                     ? Eigen::Quaterniond(n[0], n[1], n[2], n[3])
                                     : Eigen::Quaterniond(n[3], n[0], n[1], n[2]);
    return given.algebra == Algebra::hamilton ? q : q.conjugate();
}

QuaternionNumbers numbersOf(const Eigen::Quaterniond& quaternion, ScalarPlace scalar,
                            Algebra algebra)
{
    const Eigen::Quaterniond q = algebra == Algebra::hamilton ? quaternion : quaternion.conjugate();
    if (scalar == ScalarPlace::first) return {scalar, algebra, {q.w(), q.x(), q.y(), q.z()}};
    return {scalar, algebra, {q.x(), q.y(), q.z(), q.w()}};
}

Eigen::Quaterniond continued(const Eigen::Quaterniond& quaternion,
                             const Eigen::Quaterniond& previous)
{
    if (quaternion.dot(previous) >= 0.0) return quaternion;
    return Eigen::Quaterniond(Eigen::Vector4d(-quaternion.coeffs()));
}

Eigen::Quaterniond canonical(const Eigen::Quaterniond& quaternion)
{
    for (const double component :
         {quaternion.w(), quaternion.x(), quaternion.y(), quaternion.z()}) {
        if (component > 0.0) return quaternion;
        if (component < 0.0) return Eigen::Quaterniond(Eigen::Vector4d(-quaternion.coeffs()));
    }
    return quaternion;
}

double angleBetween(const Eigen::Quaterniond& first, const Eigen::Quaterniond& second)
{
    const Eigen::Quaterniond difference = first.conjugate() * second;
    return 2.0 * std::atan2(difference.vec().stableNorm(), std::abs(difference.w()));
}

Result<Eigen::Quaterniond> quaternionFrom(const Eigen::Matrix3d& R)
{
    if (!R.allFinite())
        return Fault{Fault::Kind::notFinite, "an element of the matrix is not a finite number"};
    const double error = (R * R.transpose() - Eigen::Matrix3d::Identity()).cwiseAbs().maxCoeff();
    if (!(error <= kOrthonormalTolerance))
        return Fault{Fault::Kind::notOrthonormal,
                     "the matrix is not a rotation: R R^T differs from I by " +
                         roundedText(error, 3) + ", more than " +
                         roundedText(kOrthonormalTolerance, 3)};
    if (R.determinant() < 0.0)
        return Fault{Fault::Kind::leftHanded,
                     "the matrix mirrors: its determinant is -1, so it is not a rotation"};

    // Column n of 4 q q^T (w, x, y, z), n the component of the largest square.
    const double xx = R(0, 0);
    const double yy = R(1, 1);
    const double zz = R(2, 2);
    const Eigen::Vector4d squares(1 + xx + yy + zz, 1 + xx - yy - zz, 1 - xx + yy - zz,
                                  1 - xx - yy + zz);
    const Eigen::Vector3d skew(R(2, 1) - R(1, 2), R(0, 2) - R(2, 0), R(1, 0) - R(0, 1));
    const Eigen::Vector3d even(R(2, 1) + R(1, 2), R(0, 2) + R(2, 0), R(1, 0) + R(0, 1));
    Eigen::Index largest = 0;
    squares.maxCoeff(&largest);
    Eigen::Vector4d column;
    switch (largest) {
        case 0:
            column << squares[0], skew;
            break;
        case 1:
            column << skew[0], squares[1], even[2], even[1];
            break;
        case 2:
            column << skew[1], even[2], squares[2], even[0];
            break;
        default:
            column << skew[2], even[1], even[0], squares[3];
            break;
    }
    column.normalize();
    return canonical(Eigen::Quaterniond(column[0], column[1], column[2], column[3]));
}

}  // namespace rotcore
