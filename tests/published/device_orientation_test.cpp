// SPDX-License-Identifier: GPL-3.0-or-later
// Against W3C "Device Orientation and Motion" (editor's draft of 12 Feb 2025, seen): the model
// section, the examples of the introduction, and annexes A.1 and A.2.
//
// W is the earth (x east, y north, z up), B the device (x right, y to its top, z out of its
// screen). R_WB = Rz(alpha) Rx(beta) Ry(gamma), which is our zxy about body; v_W = R_WB v_B.
// alpha grows anticlockwise, a compass heading clockwise.
#include <cmath>

#include "rotcore/rotation/euler_solutions.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

Quaterniond deviceDeg(double alpha, double beta, double gamma)
{
    return aboutBody(Order::zxy, {alpha, beta, gamma});
}

/// The compass heading of a direction of the earth frame, degrees in [0, 360).
double headingDeg(const Vector3d& v_W)
{
    const double heading = toDegrees(std::atan2(v_W.x(), v_W.y()));
    return heading < 0.0 ? heading + 360.0 : heading;
}

/// Annex A.2, the matrix, element by element.
Matrix3d annexMatrix(double alpha, double beta, double gamma)
{
    const double cX = std::cos(beta);
    const double cY = std::cos(gamma);
    const double cZ = std::cos(alpha);
    const double sX = std::sin(beta);
    const double sY = std::sin(gamma);
    const double sZ = std::sin(alpha);
    return rows({cZ * cY - sZ * sX * sY, -cX * sZ, cY * sZ * sX + cZ * sY,  //
                 cY * sZ + cZ * sX * sY, cZ * cX, sZ * sY - cZ * cY * sX,   //
                 -cX * sY, sX, cX * cY});
}

/// Annex A.2, the quaternion, of half angles.
Quaterniond annexQuaternion(double alpha, double beta, double gamma)
{
    const double cX = std::cos(beta / 2);
    const double cY = std::cos(gamma / 2);
    const double cZ = std::cos(alpha / 2);
    const double sX = std::sin(beta / 2);
    const double sY = std::sin(gamma / 2);
    const double sZ = std::sin(alpha / 2);
    return {cX * cY * cZ - sX * sY * sZ, sX * cY * cZ - cX * sY * sZ, cX * sY * cZ + sX * cY * sZ,
            cX * cY * sZ + sX * sY * cZ};
}

/// Annex A.1, the heading of the direction out of the device's back, degrees in [0, 360).
double annexHeadingDeg(double alpha, double beta, double gamma)
{
    const double vX =
        -std::cos(alpha) * std::sin(gamma) - std::sin(alpha) * std::sin(beta) * std::cos(gamma);
    const double vY =
        -std::sin(alpha) * std::sin(gamma) + std::cos(alpha) * std::sin(beta) * std::cos(gamma);
    double heading = std::atan(vX / vY);
    if (vY < 0.0)
        heading += kPi;
    else if (vX < 0.0)
        heading += 2.0 * kPi;
    return toDegrees(heading);
}

TEST(DeviceOrientation, MatrixAndQuaternionOfTheAnnexAreOurZxyAboutBody)
{
    std::mt19937_64 generator(20121);
    std::uniform_real_distribution<double> angle(-180.0, 360.0);
    for (int n = 0; n < 500; ++n) {
        const double alpha = angle(generator);
        const double beta = angle(generator);
        const double gamma = angle(generator);
        const Quaterniond q_WB = deviceDeg(alpha, beta, gamma);
        const double a = fromDegrees(alpha);
        const double b = fromDegrees(beta);
        const double c = fromDegrees(gamma);
        EXPECT_ELEMENTS_NEAR(q_WB.toRotationMatrix(), annexMatrix(a, b, c), kRounding);
        EXPECT_QUATERNION_NEAR(q_WB, annexQuaternion(a, b, c), kRounding);
    }
}

TEST(DeviceOrientation, FlatWithTheTopToTheWestIsAlphaNinety)  // an example of the introduction
{
    const Vector3d top_W = deviceDeg(90, 0, 0) * Vector3d::UnitY();
    EXPECT_ELEMENTS_NEAR(top_W, Vector3d(-1, 0, 0), 1e-15);
    EXPECT_NEAR(headingDeg(top_W), 360.0 - 90.0, 1e-12);
}

TEST(DeviceOrientation, UprightScreenFixesOnlyTheSumOfAlphaAndGamma)  // beta = 90 is the lock
{
    const Quaterniond q_WB = deviceDeg(10, 90, 20);
    EXPECT_POSE_NEAR(q_WB, deviceDeg(25, 90, 5), kPoseRounding);
    EXPECT_NEAR(headingDeg(q_WB * -Vector3d::UnitZ()), 330.0, 1e-12);  // -(alpha + gamma)
    const EulerSolutions angles = solveEuler(q_WB, Order::zxy, About::body, 25_deg);
    ASSERT_TRUE(angles.locked());
    EXPECT_EQ(angles.family->sign, 1);
    EXPECT_NEAR(toDegrees(angles.family->fixed), 30.0, 1e-12);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]), Vector3d(25, 90, 5), 1e-12);
}

TEST(DeviceOrientation, UserFacingAHeadingHoldsTheScreenAtGammaNinety)
{
    // Screen upright, top to the right: (270 - heading, 0, 90). The last angle is outside of the
    // specification's own range [-90, 90), in its own example.
    for (const double heading : {10.0, 200.0}) {
        const Quaterniond q_WB = deviceDeg(270.0 - heading, 0, 90);
        EXPECT_NEAR(headingDeg(q_WB * Vector3d::UnitY()), heading + 90.0, 1e-12);
        EXPECT_NEAR(headingDeg(q_WB * -Vector3d::UnitZ()), heading, 1e-12);
    }
}

TEST(DeviceOrientation, HeadingOfTheAnnexIsThatOfTheBackOfTheDevice)
{
    std::mt19937_64 generator(20122);
    std::uniform_real_distribution<double> angle(-85.0, 85.0);
    for (int n = 0; n < 500; ++n) {
        const double alpha = 180.0 + 2.0 * angle(generator);
        const double beta = angle(generator);
        const double gamma = angle(generator);
        const Vector3d back_W = deviceDeg(alpha, beta, gamma) * -Vector3d::UnitZ();
        // The horizontal part of the direction divides the rounding of 1e-16 rad.
        const double tolerance = 1e-13 / back_W.head<2>().norm();  // deg
        const double apart =
            headingDeg(back_W) -
            annexHeadingDeg(fromDegrees(alpha), fromDegrees(beta), fromDegrees(gamma));
        EXPECT_LE(std::abs(std::remainder(apart, 360.0)), tolerance);
    }
}

TEST(DeviceOrientation, HeadingIsMinusAlphaForAScreenHeldUpWithoutRoll)
{
    for (const double alpha : {0.0, 12.0, 100.0, 200.0, 300.0}) {
        const double heading = headingDeg(deviceDeg(alpha, 80, 0) * -Vector3d::UnitZ());
        EXPECT_LE(std::abs(std::remainder(heading + alpha, 360.0)), 1e-12);
    }
}

TEST(DeviceOrientation, ThirtySixtyFortyFive)  // derived from the annexes, to nine decimals
{
    const Quaterniond q_WB = deviceDeg(30, 60, 45);
    EXPECT_ELEMENTS_NEAR(q_WB.toRotationMatrix(),
                         rows({0.306186218, -0.25, 0.918558654, 0.883883476, 0.433012702,
                               -0.176776695, -0.353553391, 0.866025404, 0.353553391}),
                         5e-10);
    EXPECT_QUATERNION_NEAR(q_WB, Quaterniond(0.723317411, 0.360423406, 0.439679740, 0.391903837),
                           5e-10);
    EXPECT_NEAR(headingDeg(q_WB * -Vector3d::UnitZ()), 280.893394649, 5e-10);
}

TEST(DeviceOrientation, OneHundredTwentyTwentyFiveMinusFifty)  // derived likewise
{
    const Quaterniond q_WB = deviceDeg(120, 25, -50);
    EXPECT_QUATERNION_NEAR(q_WB, Quaterniond(0.521628835, 0.455402987, -0.036419932, 0.720544979),
                           5e-10);
    EXPECT_NEAR(headingDeg(q_WB * -Vector3d::UnitZ()), 310.474535286, 5e-10);
}

TEST(DeviceOrientation, DomMatrixRotateIsAnotherOrder)  // a trap the specification warns of
{
    // DOMMatrix.rotate(x, y, z) makes z, y, x about body; with x 60, y 45, z 30 it is far off.
    const Quaterniond q_dom = aboutBody(Order::zyx, {30, 45, 60});
    EXPECT_ELEMENTS_NEAR(q_dom.toRotationMatrix(),
                         (frameX(60_deg) * frameY(45_deg) * frameZ(30_deg)).transpose(), kRounding);
    EXPECT_GT(toDegrees(tests::poseDistance(q_dom, deviceDeg(30, 60, 45))), 10.0);
}

}  // namespace
