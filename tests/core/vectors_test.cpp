// SPDX-License-Identifier: GPL-3.0-or-later
// Rotation vectors, axis and angle, Gibbs vectors and modified Rodrigues parameters.
#include <cmath>
#include <limits>

#include "rotcore/rotation/rodrigues.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;
using Eigen::Vector3d;

// A vector representation and its pose differ by a few roundings of 1.1e-16 in a half angle.
constexpr double kFewRoundings = 1.5e-15;

TEST(RotationVector, OfATinyTurnKeepsEveryDigit)
{
    for (const double size : {1e-300, 1e-160, 1e-20, 1e-8}) {
        const Vector3d v(size, -2 * size, 0.5 * size);
        const Vector3d back = rotationVectorOf(*poseOfRotationVector(v));
        EXPECT_NEAR((back - v).norm() / size, 0.0, 1e-15);
    }
}

TEST(RotationVector, RoundTripsUpToAHalfTurn)
{
    std::mt19937_64 generator(31);
    std::uniform_real_distribution<double> component(-1, 1);
    for (int n = 0; n < 5000; ++n) {
        const Vector3d axis =
            Vector3d(component(generator), component(generator), component(generator)).normalized();
        for (const double angle : {1e-9, 0.1, 1.0, 2.0, 3.0, kPi - 1e-9}) {
            const Vector3d back = rotationVectorOf(*poseOfRotationVector(angle * axis));
            EXPECT_NEAR((back - angle * axis).norm(), 0.0, 3e-15);  // an ulp of pi is 4.4e-16
        }
    }
}

TEST(RotationVector,
     LongerThanAHalfTurnComesBackShort)  // by hand: 270 deg about z is -90 deg about z
{
    const Vector3d back = rotationVectorOf(*poseOfRotationVector(Vector3d(0, 0, 270_deg)));
    EXPECT_NEAR((back - Vector3d(0, 0, -90_deg)).norm(), 0.0, kFewRoundings);
}

TEST(AxisAngle, AtZeroAndAtAHalfTurnItSaysWhatIsNotDetermined)
{
    const AxisAngle none = axisAngleOf(Quaterniond::Identity());
    EXPECT_EQ(none.angle, 0.0);
    EXPECT_FALSE(none.axisIsUnique);
    EXPECT_EQ(none.axis, Vector3d::UnitX());

    const AxisAngle half = axisAngleOf(Quaterniond(0, 0, -0.6, 0.8));
    EXPECT_NEAR(half.angle, kPi, 1e-15);
    EXPECT_TRUE(half.oppositeIsSame);
    EXPECT_NEAR((half.axis - Vector3d(0, 0.6, -0.8)).norm(), 0.0, 1e-15);
    // cos(pi/2) is 6e-17 in doubles: a typed half turn counts as one.
    EXPECT_TRUE(axisAngleOf(*poseOfAxisAngle(Vector3d(1, 2, 3), 180_deg)).oppositeIsSame);
    EXPECT_FALSE(axisAngleOf(*poseOfAxisAngle(Vector3d(1, 2, 3), 180_deg - 1e-12)).oppositeIsSame);
}

TEST(AxisAngle, TakesAnAxisOfAnyLengthButZero)
{
    for (const double size : {1e-300, 1.0, 1e300}) {
        const auto q = poseOfAxisAngle(Vector3d(0, size, 0), 90_deg);
        ASSERT_TRUE(q);
        EXPECT_NEAR((*q * Vector3d::UnitZ() - Vector3d::UnitX()).norm(), 0.0, 1e-15);
    }
    EXPECT_EQ(poseOfAxisAngle(Vector3d::Zero(), 1.0).error().kind, Fault::Kind::zeroLength);
    EXPECT_EQ(poseOfAxisAngle(Vector3d::UnitX(), INFINITY).error().kind, Fault::Kind::notFinite);
    EXPECT_EQ(poseOfRotationVector(Vector3d(0, NAN, 0)).error().kind, Fault::Kind::notFinite);
    EXPECT_EQ(poseOfRotationVector(Vector3d::Constant(1.7e308)).error().kind,
              Fault::Kind::notFinite);
}

TEST(GibbsVector, IsTheTangentOfTheHalfAngleAndRefusesTheHalfTurn)
{
    const Vector3d axis = Vector3d(2, -1, 2) / 3.0;
    for (const double angle : {1e-12, 0.3, 2.0, 3.1}) {
        const Quaterniond q = *poseOfAxisAngle(axis, angle);
        const Vector3d gibbs = *gibbsVectorOf(q);
        // Near pi the tangent amplifies the rounding of its angle: relative 1e-15 / (pi - angle).
        EXPECT_NEAR((gibbs - std::tan(angle / 2) * axis).norm() / std::tan(angle / 2), 0.0, 2e-14);
        EXPECT_POSE_NEAR(*poseOfGibbsVector(gibbs), q, kFewRoundings);
    }
    EXPECT_EQ(gibbsVectorOf(Quaterniond(0, 0, 1, 0)).error().kind, Fault::Kind::singular);
    EXPECT_TRUE(gibbsVectorOf(*poseOfAxisAngle(axis, kPi - 1e-12)));
    EXPECT_POSE_NEAR(*poseOfGibbsVector(Vector3d(1e200, 0, 0)), Quaterniond(0, 1, 0, 0),
                     kFewRoundings);
}

TEST(ModifiedRodrigues, BothSetsGiveThePoseEverywhere)
{
    std::mt19937_64 generator(32);
    std::uniform_real_distribution<double> component(-1, 1);
    for (int n = 0; n < 2000; ++n) {
        const Vector3d axis =
            Vector3d(component(generator), component(generator), component(generator)).normalized();
        for (const double angle : {1e-12, 0.3, 2.0, kPi - 1e-9, kPi}) {
            const Quaterniond q = *poseOfAxisAngle(axis, angle);
            const ModifiedRodrigues mrp = modifiedRodriguesOf(q);
            EXPECT_LE(mrp.principal.norm(), 1.0 + 1e-15);
            EXPECT_NEAR(mrp.principal.norm(), std::tan(angle / 4), 2e-15);
            EXPECT_POSE_NEAR(*poseOfModifiedRodrigues(mrp.principal), q, kFewRoundings);
            ASSERT_TRUE(mrp.shadow);
            EXPECT_POSE_NEAR(*poseOfModifiedRodrigues(*mrp.shadow), q, kFewRoundings);
        }
    }
}

TEST(ModifiedRodrigues, ShadowOfNoTurnDoesNotExist)
{
    EXPECT_FALSE(modifiedRodriguesOf(Quaterniond::Identity()).shadow);
    EXPECT_EQ(modifiedRodriguesOf(Quaterniond::Identity()).principal, Vector3d::Zero());
    EXPECT_POSE_NEAR(*poseOfModifiedRodrigues(Vector3d(0, 1e300, 0)), Quaterniond::Identity(),
                     kFewRoundings);
    EXPECT_EQ(poseOfModifiedRodrigues(Vector3d(0, NAN, 0)).error().kind, Fault::Kind::notFinite);
}

}  // namespace
