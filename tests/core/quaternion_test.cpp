// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/quaternion.h"

#include <cmath>
#include <limits>

#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;

TEST(Quaternion, LayoutsPlaceTheScalar)
{
    const Quaterniond q(0.1, 0.2, 0.3, 0.4);
    const auto first = numbersOf(q, ScalarPlace::first, Algebra::hamilton);
    const auto last = numbersOf(q, ScalarPlace::last, Algebra::hamilton);
    EXPECT_EQ(first.numbers, (std::array{0.1, 0.2, 0.3, 0.4}));
    EXPECT_EQ(last.numbers, (std::array{0.2, 0.3, 0.4, 0.1}));
    for (const ScalarPlace scalar : {ScalarPlace::first, ScalarPlace::last})
        for (const Algebra algebra : {Algebra::hamilton, Algebra::jpl})
            EXPECT_EQ(hamiltonOf(numbersOf(q, scalar, algebra)).coeffs(), q.coeffs());
}

TEST(Quaternion, JplProductIsTheHamiltonProductSwapped)
{
    // Gohlke's and transforms3d's example: (4; 1,-2,3)(8; -5,6,7) = (28; -44,-14,48), swapped (28;
    // 20,30,56). Turning by p then q in one algebra is q p in Hamilton's and p q in JPL's, so
    // conjugation reverses.
    const Quaterniond p(4, 1, -2, 3);
    const Quaterniond q(8, -5, 6, 7);
    const auto jpl = [](const Quaterniond& hamilton) {
        const auto n = numbersOf(hamilton, ScalarPlace::first, Algebra::jpl).numbers;
        return Quaterniond(n[0], n[1], n[2], n[3]);
    };
    EXPECT_EQ((p * q).coeffs(), Quaterniond(28, -44, -14, 48).coeffs());
    EXPECT_EQ((jpl(q) * jpl(p)).coeffs(), jpl(p * q).coeffs());
    EXPECT_EQ((q * p).coeffs(), Quaterniond(28, 20, 30, 56).coeffs());
}

TEST(Quaternion, NormalisingReportsTheLengthAtAnyScale)
{
    for (const double scale : {1.0, 5.0, 1e-300, 1e300, 5e-324 * 64}) {
        const auto unit = normalised(Quaterniond(0.0, 3 * scale, 0.0, 4 * scale));
        ASSERT_TRUE(unit);
        EXPECT_NEAR(unit->length / scale, 5.0, 1e-15);
        EXPECT_NEAR(unit->quaternion.x(), 0.6, 1e-15);
        EXPECT_NEAR(unit->quaternion.z(), 0.8, 1e-15);
    }
    EXPECT_EQ(normalised(Quaterniond(0, 0, 0, 0)).error().kind, Fault::Kind::zeroLength);
    EXPECT_EQ(normalised(Quaterniond(1, 0, NAN, 0)).error().kind, Fault::Kind::notFinite);
    EXPECT_EQ(normalised(Quaterniond(1, 0, INFINITY, 0)).error().kind, Fault::Kind::notFinite);
}

TEST(Quaternion, ContinuityChoosesTheNearSideAndCanonicalThePositiveOne)
{
    const Quaterniond q(-0.5, 0.5, 0.5, 0.5);
    EXPECT_EQ(continued(q, Quaterniond(1, 0, 0, 0)).w(), 0.5);
    EXPECT_EQ(continued(q, Quaterniond(-1, 0, 0, 0)).w(), -0.5);
    EXPECT_EQ(canonical(q).w(), 0.5);
    EXPECT_EQ(canonical(Quaterniond(0, 0, -1, 0)).y(), 1.0);
}

TEST(Quaternion, AngleBetweenSeesTheSmallestTurns)
{
    const Quaterniond still = Quaterniond::Identity();
    for (const double angle : {1e-300, 1e-12, 1e-3, 1.0, 3.0}) {
        const Quaterniond turned(std::cos(angle / 2), 0, std::sin(angle / 2), 0);
        EXPECT_NEAR(angleBetween(still, turned) / angle, 1.0, 1e-15);
        const Quaterniond opposite(-turned.w(), 0, -turned.y(), 0);  // the same pose
        EXPECT_NEAR(angleBetween(still, opposite) / angle, 1.0, 1e-15);
    }
}

TEST(Quaternion, OfAMatrixIsExactInAllFourBranches)
{
    std::mt19937_64 generator(21);
    for (int n = 0; n < 20000; ++n) {
        Quaterniond q = tests::randomPose(generator);
        // Every fourth: close to half turns about the axes, where one component rules.
        if (n % 4 != 0) q.vec()[n % 4 - 1] += 10.0;
        q.normalize();
        const auto back = quaternionFrom(q.toRotationMatrix());
        ASSERT_TRUE(back);
        EXPECT_POSE_NEAR(*back, q, 1.5e-15);  // matrix elements carry 2 roundings each
        EXPECT_GE(back->w(), 0.0);
    }
    for (const Quaterniond& half :
         {Quaterniond(0, 1, 0, 0), Quaterniond(0, 0, 1, 0), Quaterniond(0, 0, 0, 1)})
        EXPECT_EQ(quaternionFrom(half.toRotationMatrix())->coeffs(), half.coeffs());
}

TEST(Quaternion, OfAMatrixIsRefusedJustOutsideTheTolerance)
{
    Eigen::Matrix3d R = Eigen::Matrix3d::Identity();
    R(0, 0) = 1.0 + 0.49 * kOrthonormalTolerance;  // R R^T - I is twice the excess
    EXPECT_TRUE(quaternionFrom(R));
    R(0, 0) = 1.0 + 0.51 * kOrthonormalTolerance;
    EXPECT_EQ(quaternionFrom(R).error().kind, Fault::Kind::notOrthonormal);
    EXPECT_EQ(quaternionFrom(Eigen::Vector3d(1, 1, -1).asDiagonal()).error().kind,
              Fault::Kind::leftHanded);
    R(1, 2) = std::numeric_limits<double>::quiet_NaN();
    EXPECT_EQ(quaternionFrom(R).error().kind, Fault::Kind::notFinite);
    EXPECT_EQ(quaternionFrom(Eigen::Matrix3d::Zero()).error().kind, Fault::Kind::notOrthonormal);
}

}  // namespace
