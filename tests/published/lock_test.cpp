// SPDX-License-Identifier: GPL-3.0-or-later
// Gimbal lock: what libraries of general use answer there (each observed, or in its documentation),
// and the rates of the angles. At lock only poses can be compared; which member of the family of
// angles a library picks is its own affair.
//
// Left for when the product reads recordings: a logged passage through lock.
#include <cmath>

#include <Eigen/SVD>

#include "rotcore/lock/gauge.h"
#include "rotcore/lock/rates.h"
#include "rotcore/rotation/euler_solutions.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

/// Numbers of libraries at lock carry rounding of some 1e-8 where a square root of 1e-16 is taken.
constexpr double kAtLock = 1e-8;

EulerAngles memberDeg(const EulerSolutions& locked, Order order, About about, double outer)
{
    return memberOf(*locked.family, order, about, fromDegrees(outer));
}

TEST(Lock, OfZyxLeavesOnlyTheDifferenceOfYawAndRoll)  // (50, 90, 20): yaw - roll = 30
{
    const Quaterniond q_WB = aboutBody(Order::zyx, {50, 90, 20});
    const EulerSolutions angles = solveEuler(q_WB, Order::zyx, About::body);
    ASSERT_TRUE(angles.locked());
    EXPECT_EQ(angles.family->sign, -1);
    EXPECT_NEAR(toDegrees(angles.family->fixed), 30.0, 1e-12);
    // SciPy 1.10.1 'ZYX' answers (30, 90, 0); transforms3d 'rzyx' (0, 90, -30); KDL 1.5.1 and SPICE
    // the first; Eigen 3.4.0 eulerAngles(2, 1, 0) what rounding gave it, at the same difference.
    for (const Vector3d& answer :
         {Vector3d(30, 90, 0), Vector3d(0, 90, -30), Vector3d(9.462322, 90, -20.537678)}) {
        EXPECT_POSE_NEAR(aboutBody(Order::zyx, {answer.x(), answer.y(), answer.z()}), q_WB,
                         kAtLock);
        EXPECT_ELEMENTS_NEAR(degreesOf(memberDeg(angles, Order::zyx, About::body, answer.x())),
                             answer, kAtLock);
    }
}

TEST(Lock, OfXyzAboutSpaceIsTheSame)  // SciPy 1.10.1 'xyz' answers (-30, 90, 0)
{
    const Quaterniond q_WB = aboutBody(Order::zyx, {50, 90, 20});
    const EulerSolutions angles = solveEuler(q_WB, Order::xyz, About::space);
    ASSERT_TRUE(angles.locked());
    EXPECT_POSE_NEAR(aboutSpace(Order::xyz, {-30, 90, 0}), q_WB, kAtLock);
    EXPECT_ELEMENTS_NEAR(degreesOf(memberDeg(angles, Order::xyz, About::space, 0)),
                         Vector3d(-30, 90, 0), kAtLock);
}

TEST(Lock, ReadingTwoZeroElementsGivesAnotherRotation)
{
    // tf2 (geometry2, Feb 2024): setRPY(20, 90, 50) and getRPY give roll 20, pitch 90, yaw 0,
    // observed. That is another rotation: an element is off by 0.842, so a comparison of the angles
    // kept would have passed it.
    const Quaterniond q_WB = aboutSpace(Order::xyz, {20, 90, 50});
    const Quaterniond wrong = aboutSpace(Order::xyz, {20, 90, 0});
    EXPECT_NEAR((q_WB.toRotationMatrix() - wrong.toRotationMatrix()).cwiseAbs().maxCoeff(), 0.842,
                5e-4);
    for (const EulerAngles& ours : solveEuler(q_WB, Order::xyz, About::space, 0.0).solutions)
        EXPECT_POSE_NEAR(pose(ours), q_WB, kPoseRounding);
}

TEST(Lock, SignOfTheAngleThatIsLeft)  // Rz(45) Ry(-90): nalgebra once returned (-45, -90, 0), seen
{
    const Matrix3d R_WB = (frameY(-90_deg) * frameZ(45_deg)).transpose();
    const Quaterniond q_WB = read({.kind = Kind::matrix}, typed(R_WB));
    EXPECT_ELEMENTS_NEAR(degreesOf(solveEuler(q_WB, Order::zyx, About::body, 45_deg).solutions[0]),
                         Vector3d(45, -90, 0), kAtLock);
    EXPECT_GT(tests::poseDistance(q_WB, aboutBody(Order::zyx, {-45, -90, 0})), 1.0);
}

TEST(Lock, EigenAnswersTheOtherSolution)
{
    // Eigen 3.4.0 eulerAngles: ranges [0, pi], [-pi, pi], [-pi, pi], so headings past 180 fold.
    const Quaterniond q_WB = aboutBody(Order::zyx, {-30, 10, 20});
    const EulerSolutions angles = solveEuler(q_WB, Order::zyx, About::body);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]), Vector3d(-30, 10, 20), 1e-12);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[1]), Vector3d(150, 170, -160), 1e-12);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[1]),
                         inDegrees(q_WB.toRotationMatrix().eulerAngles(2, 1, 0)), 1e-12);
}

TEST(Lock, IsWhereCosineOrSineOfTheMiddleAngleVanishes)  // common practice
{
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space})
            for (double middle = -180.0; middle <= 180.0; middle += 15.0) {
                const bool expected = isRepeating(order)
                                          ? std::abs(std::sin(middle * kPi / 180)) < 0.1
                                          : std::abs(std::cos(middle * kPi / 180)) < 0.1;
                const EulerAngles euler{order, about, {0.3, fromDegrees(middle), -1.1}};
                EXPECT_EQ(solveEuler(pose(euler), order, about).locked(), expected)
                    << nameOf(order) << " " << middle;
            }
}

/// The condition number and determinant of a rate matrix, by a numeric decomposition.
double conditionOf(const Matrix3d& J)
{
    const Vector3d values = Eigen::JacobiSVD<Matrix3d>(J).singularValues();
    return values[0] / values[2];
}

TEST(Rates, MatrixOfZyxAtThirtySixtyFortyFive)  // derived; columns yaw, pitch, roll
{
    const EulerAngles euler{Order::zyx, About::body, {30_deg, 60_deg, 45_deg}};
    const Matrix3d J = rateMatrixBody(euler);
    EXPECT_ELEMENTS_NEAR(
        J, rows({-0.866025404, 0, 1, 0.353553391, 0.707106781, 0, 0.353553391, -0.707106781, 0}),
        5.001e-10);
    EXPECT_NEAR(J.determinant(), -0.5, 1e-15);
    EXPECT_NEAR(conditionOf(J), 3.732050808, 5.001e-10);
    const LockGauge gauge = gaugeLock(pose(euler), euler);
    const double s = std::sqrt(3.0) / 2.0;
    EXPECT_ELEMENTS_NEAR(gauge.singularValues,
                         Vector3d(std::sqrt(1.0 + s), 1.0, std::sqrt(1.0 - s)), 1e-15);
    EXPECT_NEAR(gauge.amplification, 1.0 / std::sqrt(1.0 - s), 1e-14);
    EXPECT_NEAR(gauge.crowding, 0.5, 1e-15);
    EXPECT_NEAR(toDegrees(gauge.distance), 30.0, 1e-13);
}

struct NearLock {
    double middleDeg, determinant, condition, conditionTolerance;
};

TEST(Rates, ConditionGrowsTowardsLock)  // derived: ZYX with a middle angle of 85 and 89.9 deg
{
    for (const auto& [middleDeg, determinant, condition, tolerance] :
         {NearLock{85.0, 0.087155743, 22.903766, 5.001e-7},
          NearLock{89.9, 0.001745328, 1145.9153, 5.001e-5}}) {
        const EulerAngles euler{Order::zyx, About::body, {0.4, fromDegrees(middleDeg), -0.9}};
        const Matrix3d J = rateMatrixBody(euler);
        EXPECT_NEAR(std::abs(J.determinant()), determinant, 5.001e-10);
        EXPECT_NEAR(conditionOf(J), condition, tolerance);
        const Vector3d values = gaugeLock(pose(euler), euler).singularValues;
        EXPECT_NEAR(values[0] / values[2], condition, tolerance);
        EXPECT_NEAR(crowding(Order::zyx, euler.angles[1]), determinant, 5.001e-10);
    }
}

TEST(Rates, DeterminantAndConditionFollowFromTheMiddleAngleAlone)  // derived rule, all orders
{
    std::mt19937_64 generator(1601);
    std::uniform_real_distribution<double> angle(-3.1, 3.1);
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space})
            for (int n = 0; n < 50; ++n) {
                const EulerAngles euler{
                    order, about, {angle(generator), angle(generator), angle(generator)}};
                const double cosine = std::abs(std::cos(euler.angles[1]));
                const double sine = std::abs(std::sin(euler.angles[1]));
                const double determinant = isRepeating(order) ? sine : cosine;
                const double s = isRepeating(order) ? cosine : sine;
                const double condition = std::sqrt((1.0 + s) / (1.0 - s));
                const Matrix3d J = rateMatrixBody(euler);
                EXPECT_NEAR(std::abs(J.determinant()), determinant, kRounding);
                EXPECT_NEAR(crowding(order, euler.angles[1]), determinant, kRounding);
                const LockGauge gauge = gaugeLock(pose(euler), euler);
                const Vector3d values = gauge.singularValues;
                // 1 - s is left of two numbers near 1, so its share of rounding grows.
                const double tolerance = kRounding * condition * condition * condition;
                EXPECT_NEAR(conditionOf(J), condition, tolerance);
                EXPECT_NEAR(values[0] / values[2], condition, tolerance);
                EXPECT_NEAR(gauge.crowding, determinant, kRounding);
            }
}

}  // namespace
