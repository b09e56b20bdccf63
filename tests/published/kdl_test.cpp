// SPDX-License-Identifier: GPL-3.0-or-later
// Against Orocos KDL 1.5.1, linked: its Rotation class (conventions from its header, seen). KDL is
// active with column vectors, as we are; RPY turns about the old axes x, y, z, EulerZYX and
// EulerZYZ about the new ones.
#include <cmath>

#include <kdl/frames.hpp>

#include "rotcore/chain/chain.h"
#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;
using tests::randomPose;

constexpr int kPoses = 5000;

Matrix3d matrixOf(const KDL::Rotation& rotation)
{
    Matrix3d M;
    for (int row = 0; row < 3; ++row)
        for (int column = 0; column < 3; ++column)
            M(row, column) = rotation(row, column);
    return M;
}

KDL::Rotation kdlOf(const Quaterniond& q)
{
    return KDL::Rotation::Quaternion(q.x(), q.y(), q.z(), q.w());
}

/// The angle by which two angles differ, over whole turns.
double turnsApart(double first, double second)
{
    return std::abs(std::remainder(first - second, 2.0 * kPi));
}

/// How far KDL's angles may be from ours: it takes them from elements of a matrix with rounding of
/// some 5e-16, which near lock are as small as the distance from it.
double angleTolerance(double lockDistance)
{
    return 5e-15 / lockDistance;
}

TEST(Kdl, AnglesGiveTheSameMatrix)
{
    std::mt19937_64 generator(15101);
    std::uniform_real_distribution<double> angle(-7.0, 7.0);
    for (int n = 0; n < kPoses; ++n) {
        const double a = angle(generator);
        const double b = angle(generator);
        const double c = angle(generator);
        EXPECT_ELEMENTS_NEAR(pose({Order::xyz, About::space, {a, b, c}}).toRotationMatrix(),
                             matrixOf(KDL::Rotation::RPY(a, b, c)), kRounding);
        EXPECT_ELEMENTS_NEAR(pose({Order::zyx, About::body, {a, b, c}}).toRotationMatrix(),
                             matrixOf(KDL::Rotation::EulerZYX(a, b, c)), kRounding);
        EXPECT_ELEMENTS_NEAR(pose({Order::zyz, About::body, {a, b, c}}).toRotationMatrix(),
                             matrixOf(KDL::Rotation::EulerZYZ(a, b, c)), kRounding);
    }
}

TEST(Kdl, RollPitchYawAreReadBackAlike)
{
    std::mt19937_64 generator(15102);
    for (int n = 0; n < kPoses; ++n) {
        const Quaterniond q_WB = randomPose(generator);
        double roll = 0.0;
        double pitch = 0.0;
        double yaw = 0.0;
        kdlOf(q_WB).GetRPY(roll, pitch, yaw);
        const EulerSolutions ours = solveEuler(q_WB, Order::xyz, About::space);
        const auto& [a, b, c] = ours.solutions[0].angles;
        const double tolerance = angleTolerance(ours.lockDistance);
        EXPECT_LE(turnsApart(a, roll), tolerance);
        EXPECT_LE(turnsApart(b, pitch), tolerance);
        EXPECT_LE(turnsApart(c, yaw), tolerance);
        double alpha = 0.0;
        double beta = 0.0;
        double gamma = 0.0;
        kdlOf(q_WB).GetEulerZYX(alpha, beta, gamma);
        const EulerSolutions bodyFixed = solveEuler(q_WB, Order::zyx, About::body);
        EXPECT_LE(turnsApart(bodyFixed.solutions[0].angles[0], alpha), tolerance);
        EXPECT_LE(turnsApart(bodyFixed.solutions[0].angles[1], beta), tolerance);
        EXPECT_LE(turnsApart(bodyFixed.solutions[0].angles[2], gamma), tolerance);
    }
}

TEST(Kdl, ZyzIsReadBackAlike)  // both keep beta in [0, pi]
{
    std::mt19937_64 generator(15103);
    for (int n = 0; n < kPoses; ++n) {
        const Quaterniond q_WB = randomPose(generator);
        double alpha = 0.0;
        double beta = 0.0;
        double gamma = 0.0;
        kdlOf(q_WB).GetEulerZYZ(alpha, beta, gamma);
        const EulerSolutions ours = solveEuler(q_WB, Order::zyz, About::body);
        const auto& [a, b, c] = ours.solutions[0].angles;
        const double tolerance = angleTolerance(ours.lockDistance);
        EXPECT_LE(turnsApart(a, alpha), tolerance);
        EXPECT_LE(turnsApart(b, beta), tolerance);
        EXPECT_LE(turnsApart(c, gamma), tolerance);
    }
}

TEST(Kdl, QuaternionsAndMatricesAgreeBothWays)
{
    std::mt19937_64 generator(15104);
    for (int n = 0; n < kPoses; ++n) {
        const Quaterniond q_WB = randomPose(generator);
        const KDL::Rotation rotation = kdlOf(q_WB);
        EXPECT_ELEMENTS_NEAR(read({.kind = Kind::quaternion, .scalar = ScalarPlace::last},
                                  {q_WB.x(), q_WB.y(), q_WB.z(), q_WB.w()})
                                 .toRotationMatrix(),
                             matrixOf(rotation), kRounding);
        double x = 0.0;
        double y = 0.0;
        double z = 0.0;
        double w = 0.0;
        rotation.GetQuaternion(x, y, z, w);
        EXPECT_QUATERNION_NEAR(read({.kind = Kind::matrix}, typed(matrixOf(rotation))),
                               Quaterniond(w, x, y, z), kRounding);
    }
}

TEST(Kdl, AxisAndAngleAgreeBothWays)
{
    std::mt19937_64 generator(15105);
    std::uniform_real_distribution<double> anyAngle(-7.0, 7.0);
    for (int n = 0; n < kPoses; ++n) {
        const Quaterniond q_WB = randomPose(generator);
        KDL::Vector axis;
        const double angle = kdlOf(q_WB).GetRotAngle(axis);
        const AxisAngle ours = axisAngleOf(q_WB);
        // KDL takes both from the antisymmetric part, 2 sin(angle) long, or the trace.
        const double tolerance = 4e-15 / std::sin(ours.angle);
        EXPECT_NEAR(ours.angle, angle, tolerance);
        EXPECT_ELEMENTS_NEAR(ours.axis, Vector3d(axis.x(), axis.y(), axis.z()), tolerance);

        const double turn = anyAngle(generator);
        const Vector3d along = 3.0 * ours.axis;
        const auto turned = poseOfAxisAngle(along, turn);
        ASSERT_TRUE(turned);
        EXPECT_ELEMENTS_NEAR(
            turned->toRotationMatrix(),
            matrixOf(KDL::Rotation::Rot(KDL::Vector(along.x(), along.y(), along.z()), turn)),
            kRounding);
    }
}

TEST(Kdl, ProductsAreChainsAboutBody)
{
    std::mt19937_64 generator(15106);
    for (int n = 0; n < 500; ++n) {
        const Quaterniond first = randomPose(generator);
        const Quaterniond second = randomPose(generator);
        const AxisAngle turn = axisAngleOf(second);
        const auto both = pose(Chain{{turn.axis, turn.angle}}, first);
        const auto spaceFixed = pose(Chain{{turn.axis, turn.angle, About::space}}, first);
        ASSERT_TRUE(both && spaceFixed);
        EXPECT_ELEMENTS_NEAR(both->toRotationMatrix(), matrixOf(kdlOf(first) * kdlOf(second)),
                             kRounding);
        EXPECT_ELEMENTS_NEAR(spaceFixed->toRotationMatrix(), matrixOf(kdlOf(second) * kdlOf(first)),
                             kRounding);
    }
}

TEST(Kdl, OurAnglesRebuildItsMatrixAtAndNearLock)
{
    std::mt19937_64 generator(15107);
    for (int n = 0; n < 20; ++n)
        for (const EulerAngles& angles :
             tests::anglesNearLock(Order::zyx, About::body, generator)) {
            const auto& [yaw, pitch, roll] = angles.angles;
            const KDL::Rotation rotation = KDL::Rotation::EulerZYX(yaw, pitch, roll);
            const EulerSolutions ours = solveEuler(pose(angles), Order::zyx, About::body);
            for (const EulerAngles& solution : ours.solutions)
                EXPECT_ELEMENTS_NEAR(pose(solution).toRotationMatrix(), matrixOf(rotation),
                                     kRounding);
        }
}

TEST(Kdl, LockOfRollPitchYawIsAMemberOfOurFamily)  // header: "the solution where roll == 0"
{
    const KDL::Rotation rotation = KDL::Rotation::EulerZYX(50_deg, 90_deg, 20_deg);
    double roll = 1.0;
    double pitch = 0.0;
    double yaw = 0.0;
    rotation.GetRPY(roll, pitch, yaw);
    EXPECT_NEAR(roll, 0.0, 0.0);
    const Quaterniond q_WB = aboutBody(Order::zyx, {50, 90, 20});
    const EulerSolutions ours = solveEuler(q_WB, Order::zyx, About::body, yaw);
    ASSERT_TRUE(ours.locked());
    // Near its pole KDL is left with elements of 1e-16 beside sines and cosines.
    EXPECT_ELEMENTS_NEAR(degreesOf(ours.solutions[0]), Vector3d(30.0, 90.0, 0.0), 1e-8);
    EXPECT_ELEMENTS_NEAR(inDegrees({yaw, pitch, roll}), Vector3d(30.0, 90.0, 0.0), 1e-8);
}

TEST(Kdl, LockOfZyzIsAMemberOfOurFamily)  // header: at beta 0 or pi, "gamma is chosen to be zero"
{
    for (const double beta : {0.0, kPi}) {
        const KDL::Rotation rotation = KDL::Rotation::EulerZYZ(50_deg, beta, 20_deg);
        double alpha = 0.0;
        double middle = 0.0;
        double gamma = 1.0;
        rotation.GetEulerZYZ(alpha, middle, gamma);
        EXPECT_NEAR(gamma, 0.0, 0.0);
        const Quaterniond q_WB = pose({Order::zyz, About::body, {50_deg, beta, 20_deg}});
        const EulerSolutions ours = solveEuler(q_WB, Order::zyz, About::body, alpha);
        ASSERT_TRUE(ours.locked());
        EXPECT_ELEMENTS_NEAR(degreesOf(ours.solutions[0]),
                             inDegrees(Vector3d(alpha, middle, gamma)), 1e-8);
    }
}

}  // namespace
