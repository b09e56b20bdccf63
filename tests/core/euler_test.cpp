// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/quaternion.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;
using Eigen::Vector3d;

constexpr std::array<About, 2> kBothAbouts{About::body, About::space};

// Pose to angles to pose: the stated limit of the core, anywhere. Each way costs about ten
// roundings of 1.1e-16 in a half angle; at lock up to kLockTolerance of distance is dropped on top.
constexpr double kRoundTrip = 4e-15;

Quaterniond product(
    const EulerAngles& euler)  // a second formula: three turns multiplied one by one
{
    const auto [i, j, k] = axesOf(euler.order);
    const auto turn = [](Axis axis, double angle) {
        return Quaterniond(Eigen::AngleAxisd(angle, unitVector(axis)));
    };
    const auto& [a, b, c] = euler.angles;
    return euler.about == About::body ? turn(i, a) * turn(j, b) * turn(k, c)
                                      : turn(k, c) * turn(j, b) * turn(i, a);
}

TEST(EulerAngles, QuarterTurnAboutZCarriesBodyXToWorldY)  // by hand: fixes active against passive
{
    const Quaterniond q_WB = pose({Order::zyx, About::body, {90_deg, 0.0, 0.0}});
    EXPECT_NEAR((q_WB * Vector3d::UnitX() - Vector3d::UnitY()).norm(), 0.0,
                1e-15);  // roundings near 1
}

TEST(EulerAngles, SecondTurnIsAboutTheTurnedAxisAboutBodyAndTheStillAxisAboutSpace)  // by hand
{
    // z by 90, then x by 90: about body, body z ends along world x; about space, along world -y.
    const Quaterniond body = pose({Order::zxy, About::body, {90_deg, 90_deg, 0.0}});
    const Quaterniond space = pose({Order::zxy, About::space, {90_deg, 90_deg, 0.0}});
    EXPECT_NEAR((body * Vector3d::UnitZ() - Vector3d::UnitX()).norm(), 0.0, 1e-15);
    EXPECT_NEAR((space * Vector3d::UnitZ() + Vector3d::UnitY()).norm(), 0.0, 1e-15);
}

TEST(EulerAngles, PoseIsTheProductOfItsTurns)
{
    std::mt19937_64 generator(11);
    std::uniform_real_distribution<double> angle(-2 * kPi, 2 * kPi);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int n = 0; n < 200; ++n) {
                const EulerAngles euler{
                    order, about, {angle(generator), angle(generator), angle(generator)}};
                EXPECT_POSE_NEAR(pose(euler), product(euler), 2e-15);  // a dozen roundings each way
            }
}

TEST(EulerAngles, AboutSpaceIsTheReversedOrderAboutBody)
{
    const EulerAngles space{Order::xyz, About::space, {10_deg, 20_deg, 30_deg}};
    EXPECT_EQ(aboutTheOther(space),
              (EulerAngles{Order::zyx, About::body, {30_deg, 20_deg, 10_deg}}));
    EXPECT_POSE_NEAR(product(space), product(aboutTheOther(space)), 1e-15);
    for (const Order order : kAllOrders) {
        const EulerAngles body{order, About::body, {0.3, -1.1, 2.9}};
        EXPECT_POSE_NEAR(product(body), pose(aboutTheOther(body)), 2e-15);
        EXPECT_EQ(aboutTheOther(aboutTheOther(body)), body);
    }
}

TEST(EulerSolutions, RoundTripIsExactForRandomPosesInAll24Conventions)
{
    std::mt19937_64 generator(12);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int n = 0; n < 4000; ++n) {
                const Quaterniond q = tests::randomPose(generator);
                const EulerSolutions solved = solveEuler(q, order, about);
                EXPECT_FALSE(solved.locked());
                for (const EulerAngles& solution : solved.solutions)
                    EXPECT_POSE_NEAR(product(solution), q, kRoundTrip);
            }
}

TEST(EulerSolutions, RoundTripIsExactAtAndNearEveryLock)
{
    std::mt19937_64 generator(13);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int repeat = 0; repeat < 40; ++repeat)
                for (const EulerAngles& euler : tests::anglesNearLock(order, about, generator)) {
                    const Quaterniond q = product(euler).normalized();
                    for (const EulerAngles& solution : solveEuler(q, order, about).solutions)
                        EXPECT_POSE_NEAR(product(solution), q, kRoundTrip);
                }
}

TEST(EulerSolutions, RoundTripIsExactThroughTheMatrixToo)
{
    std::mt19937_64 generator(14);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (const EulerAngles& euler : tests::anglesNearLock(order, about, generator)) {
                const Eigen::Matrix3d R = product(euler).normalized().toRotationMatrix();
                const auto q = quaternionFrom(R);
                ASSERT_TRUE(q);
                for (const EulerAngles& solution : solveEuler(*q, order, about).solutions)
                    EXPECT_NEAR(tests::largestDifference(product(solution).toRotationMatrix(), R),
                                0.0, kRoundTrip);
            }
}

TEST(EulerSolutions, RangesAreCanonical)
{
    std::mt19937_64 generator(15);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int n = 0; n < 1000; ++n) {
                const EulerSolutions solved =
                    solveEuler(tests::randomPose(generator), order, about);
                const double middle = solved.solutions[0].angles[1];
                EXPECT_GE(middle, isRepeating(order) ? 0.0 : -kPi / 2);
                EXPECT_LE(middle, isRepeating(order) ? kPi : kPi / 2);
                for (const EulerAngles& solution : solved.solutions)
                    for (const double angle : solution.angles) {
                        EXPECT_GT(angle, -kPi);
                        EXPECT_LE(angle, kPi);
                    }
            }
}

TEST(EulerSolutions, GenericAnglesComeBackAsTheyWere)
{
    // 0.3 rad and more from every lock: amplification below 5, so 5 * 2e-15 per angle.
    const std::array<double, 3> different{0.7, -0.4, 2.1};
    const std::array<double, 3> repeating{0.7, 0.4, 2.1};
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts) {
            const auto& angles = isRepeating(order) ? repeating : different;
            const EulerSolutions solved = solveEuler(product({order, about, angles}), order, about);
            for (std::size_t n = 0; n < 3; ++n)
                EXPECT_NEAR(solved.solutions[0].angles[n], angles[n], 1e-14) << nameOf(order) << n;
        }
}

TEST(EulerSolutions,
     TwinOfYawPitchRollIsPastTheVertical)  // by hand: (30, 20, 10) = (-150, 160, -170)
{
    const EulerAngles twin = twinOf({Order::zyx, About::body, {30_deg, 20_deg, 10_deg}});
    EXPECT_NEAR(twin.angles[0], -150_deg, 1e-15);
    EXPECT_NEAR(twin.angles[1], 160_deg, 1e-15);
    EXPECT_NEAR(twin.angles[2], -170_deg, 1e-15);
    const EulerAngles repeating = twinOf({Order::zxz, About::body, {30_deg, 20_deg, 10_deg}});
    EXPECT_NEAR(repeating.angles[1], -20_deg, 1e-15);
}

TEST(EulerSolutions, TheNearerOneFollowsABodyThroughTheRangeEnd)
{
    // Pitch from 80 to 100 deg in steps of 1 deg: the canonical triple jumps to the twin at 90, the
    // nearer one does not. Lock itself, at 90, is passed by keeping the outer angle.
    EulerAngles shown{Order::zyx, About::body, {30_deg, 80_deg, 10_deg}};
    for (int degrees = 81; degrees <= 100; ++degrees) {
        const EulerAngles turned{Order::zyx, About::body, {30_deg, fromDegrees(degrees), 10_deg}};
        shown =
            nearerTo(shown, solveEuler(product(turned), Order::zyx, About::body, shown.angles[0]));
        for (std::size_t n = 0; n < 3; ++n)
            EXPECT_NEAR(shown.angles[n], turned.angles[n], 1e-13) << degrees;
    }
}

TEST(EulerSolutions, AtLockTheWholeFamilyGivesThePose)
{
    std::mt19937_64 generator(16);
    std::uniform_real_distribution<double> angle(-kPi, kPi);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts) {
            const double lock = isRepeating(order) ? 0.0 : kPi / 2;
            for (const double middle : {lock, lock - kPi}) {
                const EulerAngles euler{order, about, {angle(generator), middle, angle(generator)}};
                const EulerSolutions solved = solveEuler(product(euler).normalized(), order, about);
                ASSERT_TRUE(solved.locked()) << nameOf(order);
                for (int n = 0; n < 50; ++n)
                    EXPECT_POSE_NEAR(
                        product(memberOf(*solved.family, order, about, angle(generator))),
                        product(euler), kRoundTrip);
            }
        }
}

TEST(EulerSolutions, AtLockTheOuterAngleIsKept)
{
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts) {
            const double lock = isRepeating(order) ? kPi : -kPi / 2;
            const auto outer = static_cast<std::size_t>(outerIndex(about));
            const Quaterniond q = product({order, about, {0.5, lock, 0.9}}).normalized();
            EXPECT_EQ(solveEuler(q, order, about).solutions[0].angles[outer], 0.0);
            EXPECT_EQ(solveEuler(q, order, about, 0.4).solutions[0].angles[outer], 0.4);
        }
}

TEST(EulerSolutions, JustOutsideTheLockToleranceTheAnglesAreTheirOwn)
{
    // 1e-13 rad from lock there is still a unique answer and no family; 1e-16 rad is lock.
    const auto at = [](double offset) {
        return solveEuler(
            product({Order::zyx, About::body, {0.4, kPi / 2 - offset, 1.2}}).normalized(),
            Order::zyx, About::body);
    };
    EXPECT_TRUE(at(1e-16).locked());
    EXPECT_FALSE(at(1e-13).locked());
    // The angle of a direction 1e-13/2 long, known to about 2e-16: 4e-3 rad.
    EXPECT_NEAR(at(1e-13).solutions[0].angles[0], 0.4, 1e-2);
    EXPECT_NEAR(at(1e-6).solutions[0].angles[0], 0.4, 1e-9);
}

TEST(EulerSolutions, LockDistanceKeepsItsDigitsWhenTiny)
{
    for (const double offset : {1e-3, 1e-6, 1e-9, 1e-12}) {
        const Quaterniond q = product({Order::zxz, About::body, {0.4, offset, 1.2}});
        // Rounding of the pose itself, 2e-16 rad.
        EXPECT_NEAR(lockDistance(q, Order::zxz, About::body), offset, 3e-16);
    }
    EXPECT_NEAR(lockDistance(Quaterniond::Identity(), Order::zyx, About::body), kPi / 2, 1e-15);
}

TEST(Angle, WrapsIntoTheHalfOpenTurn)
{
    EXPECT_EQ(wrapped(kPi), kPi);
    EXPECT_EQ(wrapped(-kPi), kPi);
    EXPECT_EQ(wrapped(0.0), 0.0);
    EXPECT_NEAR(wrapped(370_deg), 10_deg, 1e-15);
    EXPECT_NEAR(wrapped(-190_deg), 170_deg, 1e-15);
}

}  // namespace
