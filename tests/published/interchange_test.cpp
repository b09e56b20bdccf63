// SPDX-License-Identifier: GPL-3.0-or-later
// Against what standards of interchange print and prescribe: Khronos glTF 2.0 and OpenXR, ROS REP
// 103 and URDF, CCSDS Attitude Data Messages, MAVLink, W3C Orientation Sensor, DIS (by Koks), EPSG.
//
// Left for when the product reads attitude files, recordings and positions: the layout of a CCSDS
// AEM (504.0-B-1 section 4, and B-2), the channels of BVH motion files, interpolation rules (glTF
// appendix C), positions in DIS (Koks 2008 with WGS 84). The public DIS test suite with two Nevada
// positions is not used: its angles are off by up to 1.05 deg from the method of Koks.
#include <cmath>

#include "rotcore/rotation/axis_map.h"
#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/quaternion.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

const Reading kXyzw{.kind = Kind::quaternion, .scalar = ScalarPlace::last};
const Reading kColumns{.kind = Kind::matrix, .storage = Storage::columns};

TEST(Gltf, CameraNodeMatrixIsListedByColumns)  // glTF 2.0, the specification's example node, seen
{
    const Quaterniond q_WB = read(kColumns, {-0.99975, -0.00679829, 0.0213218, 0.00167596, 0.927325,
                                             0.374254, -0.0223165, 0.374196, -0.927081});
    // Derived: the matrix is orthonormal to 9e-7, as printed to six digits.
    EXPECT_QUATERNION_NEAR(q_WB, fromXyzw({-0.0013046, 0.9816001, 0.1906198, -0.0111141}), 1e-6);
    EXPECT_NEAR(toDegrees(axisAngleOf(q_WB).angle), 178.726, 5e-4);  // near the half turn
}

TEST(Gltf, RotationIsScalarLast)  // glTF 2.0: XYZW; a quarter turn about +Y takes +Z to +X
{
    const double s = std::sqrt(0.5);
    EXPECT_ELEMENTS_NEAR(read(kXyzw, {0, s, 0, s}) * Vector3d::UnitZ(), Vector3d::UnitX(), 1e-15);
}

TEST(Rep103, FixedAxisRpyIsYawPitchRollBackwards)  // REP 103, "fixed axis roll, pitch, yaw", seen
{
    // URDF origin rpy, second-hand: Rz(yaw) Ry(pitch) Rx(roll), radians.
    const Reading rpy{.order = Order::xyz, .about = About::space, .unit = AngleUnit::radians};
    const Quaterniond q_WB = read(rpy, {0.3, -0.7, 1.9});
    EXPECT_ELEMENTS_NEAR(q_WB.toRotationMatrix(),
                         (frameX(0.3) * frameY(-0.7) * frameZ(1.9)).transpose(), kRounding);
    EXPECT_POSE_NEAR(q_WB, pose({Order::zyx, About::body, {1.9, -0.7, 0.3}}), kPoseRounding);
}

TEST(Rep103, YawZeroIsEastAndGrowsAnticlockwise)  // REP 103, seen: x east, y north, z up
{
    EXPECT_ELEMENTS_NEAR(aboutBody(Order::zyx, {0, 0, 0}) * Vector3d::UnitX(), Vector3d::UnitX(),
                         1e-15);
    EXPECT_ELEMENTS_NEAR(aboutBody(Order::zyx, {90, 0, 0}) * Vector3d::UnitX(), Vector3d::UnitY(),
                         1e-15);
}

TEST(Rep103, OpticalFrameStandsOnTheBodyAtMinusNinetyZeroMinusNinety)
{
    // REP 103, seen: optical z forward, x right, y down; body x forward, y left, z up. So body
    // coordinates of an optical vector are (z, -x, -y). OpenCV's camera, from memory, is the same.
    const auto map = parseAxisMap("z, -x, -y");
    ASSERT_TRUE(map);
    EXPECT_ELEMENTS_NEAR(matrixOf(*map), rows({0, 0, 1, -1, 0, 0, 0, -1, 0}), 0.0);
    EXPECT_EQ(handednessOf(*map), Handedness::right);
    const Quaterniond q_BO = read({.kind = Kind::matrix}, typed(matrixOf(*map)));
    EXPECT_QUATERNION_NEAR(q_BO, fromXyzw({0.5, -0.5, 0.5, -0.5}), 1e-15);  // common practice
    EXPECT_POSE_NEAR(q_BO, aboutSpace(Order::xyz, {-90, 0, -90}), kPoseRounding);
}

TEST(Rep103, EastNorthUpToNorthEastDownIsAHalfTurnAboutXPlusY)
{
    const auto map = parseAxisMap("y, x, -z");
    ASSERT_TRUE(map);
    EXPECT_ELEMENTS_NEAR(matrixOf(*map), rows({0, 1, 0, 1, 0, 0, 0, 0, -1}), 0.0);
    EXPECT_EQ(handednessOf(*map), Handedness::right);
    const AxisAngle turn = axisAngleOf(read({.kind = Kind::matrix}, typed(matrixOf(*map))));
    EXPECT_NEAR(toDegrees(turn.angle), 180.0, 1e-13);
    EXPECT_ELEMENTS_NEAR(turn.axis, Vector3d(1, 1, 0).normalized(), 1e-15);
}

TEST(VehicleAxes, IsoToSaeZDownIsAHalfTurnAboutForward)
{
    // ISO 8855 x forward, y left, z up; SAE J670 z-down x forward, y right, z down (both
    // second-hand; MAVLink's body frame, seen, is the latter).
    const auto map = parseAxisMap("x, -y, -z");
    ASSERT_TRUE(map);
    const AxisAngle turn = axisAngleOf(read({.kind = Kind::matrix}, typed(matrixOf(*map))));
    EXPECT_NEAR(toDegrees(turn.angle), 180.0, 1e-13);
    EXPECT_ELEMENTS_NEAR(turn.axis, Vector3d::UnitX(), 1e-15);
}

TEST(MavLink, NullRotationIsScalarFirst)  // ATTITUDE_QUATERNION, seen: w, x, y, z, null (1 0 0 0)
{
    EXPECT_POSE_NEAR(read({.kind = Kind::quaternion}, {1, 0, 0, 0}), Quaterniond::Identity(), 0.0);
    // Read scalar last the same numbers are a half turn about x: the usual slip.
    EXPECT_NEAR(toDegrees(axisAngleOf(read(kXyzw, {1, 0, 0, 0})).angle), 180.0, 1e-13);
}

TEST(OrientationSensor, MatrixIsListedByColumns)  // W3C Orientation Sensor, 2026, seen; xyzw
{
    const double s = std::sqrt(0.5);
    const Quaterniond q = read(kXyzw, {0, 0, s, s});  // a quarter turn from east to north
    EXPECT_ELEMENTS_NEAR(q * Vector3d::UnitX(), Vector3d::UnitY(), 1e-15);
    EXPECT_POSE_NEAR(read(kColumns, {0, 1, 0, -1, 0, 0, 0, 0, 1}), q, kPoseRounding);
}

TEST(Android, GetOrientationTurnsAboutMinusZMinusXAndY)
{
    // Documentation, second-hand: azimuth about -z, pitch about -x, roll about y. Formulas from
    // memory: azimuth = atan2(R[1], R[4]), pitch = asin(-R[7]), roll = atan2(-R[6], R[8]).
    const Matrix3d R_WB = matrixAboutBody(Order::zxy, {-40, -25, 70});
    EXPECT_NEAR(toDegrees(std::atan2(R_WB(0, 1), R_WB(1, 1))), 40.0, 1e-12);
    EXPECT_NEAR(toDegrees(std::asin(-R_WB(2, 1))), 25.0, 1e-12);
    EXPECT_NEAR(toDegrees(std::atan2(-R_WB(2, 0), R_WB(2, 2))), 70.0, 1e-12);
}

TEST(Unity, EulerTurnsAboutFixedZThenXThenY)  // Quaternion.Euler(x, y, z), degrees, seen
{
    // In left-handed axes, where the same formulas hold for turns that are left-handed.
    const Quaterniond q = aboutSpace(Order::zxy, {30, 10, 20});
    EXPECT_ELEMENTS_NEAR(q.toRotationMatrix(),
                         (frameZ(30_deg) * frameX(10_deg) * frameY(20_deg)).transpose(), kRounding);
}

TEST(OpenXr, PoseOnePercentOffUnitLengthIsReadAndTold)
{
    // XrPosef, seen: a runtime refuses a norm off by more than 1 %. We read it, and say so.
    const auto meaning = interpret({kXyzw, {0.0, 0.0, 0.0, 1.02}});
    ASSERT_TRUE(meaning);
    EXPECT_NEAR(meaning->length, 1.02, 1e-15);
    EXPECT_EQ(meaning->warnings.size(), 1U);
}

TEST(TumTrajectory, SampleLineIsNearlyAThirdOfATurnAboutADiagonal)
{
    // TUM RGB-D "tx ty tz qx qy qz qw"; the sample is second-hand, and printed to five decimals.
    const AxisAngle turn = axisAngleOf(read(kXyzw, {-0.49915, 0.50408, -0.49682, 0.49992}));
    EXPECT_NEAR(toDegrees(turn.angle), 2.0 * toDegrees(std::acos(0.49992)), 2e-3);  // by hand
    EXPECT_ELEMENTS_NEAR(turn.axis, Vector3d(-1, 1, -1).normalized(), 5e-3);
}

// CCSDS 504.0-B-1 (May 2008): the sample AEM with the Mars Global Surveyor's attitude, scalar last,
// second-hand.
const std::vector<std::vector<double>> kAemRows{{0.56748, 0.03146, 0.45689, 0.68427},
                                                {0.42319, -0.45697, 0.23784, 0.74533},
                                                {-0.84532, 0.26974, -0.06532, 0.45652},
                                                {0.74563, -0.45375, 0.36875, 0.31964}};

TEST(Ccsds, SampleAttitudeHasTheseAnglesAndSteps)  // derived from the printed rows
{
    const std::array<double, 4> anglesDeg{93.6434, 83.6248, 125.6745, 142.7177};
    const std::array<double, 3> stepsDeg{64.7734, 162.0189, 101.7736};
    for (std::size_t n = 0; n < 4; ++n) {
        const auto meaning = interpret({kXyzw, kAemRows[n]});
        ASSERT_TRUE(meaning);
        EXPECT_NEAR(meaning->length, 1.0, 1e-5);  // five decimals
        EXPECT_NEAR(toDegrees(axisAngleOf(meaning->q_WB).angle), anglesDeg[n], 1e-3);
        if (n == 0) continue;
        EXPECT_NEAR(toDegrees(angleBetween(read(kXyzw, kAemRows[n - 1]), meaning->q_WB)),
                    stepsDeg[n - 1], 1e-3);
    }
}

TEST(Ccsds, ScalarReadFirstIsSilentlyWrong)  // derived: the length is still 1
{
    const Quaterniond right = read(kXyzw, kAemRows[0]);
    const auto wrong = interpret({{.kind = Kind::quaternion}, kAemRows[0]});
    ASSERT_TRUE(wrong);
    EXPECT_NEAR(wrong->length, 1.0, 1e-5);
    EXPECT_NEAR(toDegrees(angleBetween(right, wrong->q_WB)), 85.6936, 1e-3);
}

TEST(Ccsds, RotationSequencesAreDigitsOfThreeAxes)  // 504.0-B-1, 3.2.5.4, seen
{
    // First digit first; 121 and the like are valid, fewer than three axes are not; 504.0-B-2 has
    // letters (second-hand).
    const auto orderOrFail = [](std::string_view text) {
        const auto order = parseOrder(text);
        EXPECT_TRUE(order) << text;
        return order ? *order : Order::xyz;
    };
    EXPECT_EQ(orderOrFail("321"), Order::zyx);
    EXPECT_EQ(orderOrFail("212"), Order::yxy);
    EXPECT_EQ(orderOrFail("213"), Order::yxz);
    EXPECT_EQ(orderOrFail("121"), Order::xyx);
    EXPECT_EQ(orderOrFail("131"), Order::xzx);
    EXPECT_EQ(orderOrFail("232"), Order::yzy);
    EXPECT_EQ(orderOrFail("313"), Order::zxz);
    EXPECT_EQ(orderOrFail("323"), Order::zyz);
    EXPECT_EQ(orderOrFail("ZYX"), Order::zyx);
    EXPECT_EQ(orderOrFail("YXY"), Order::yxy);
    EXPECT_FALSE(parseOrder("21"));
    EXPECT_FALSE(parseOrder("112"));
}

TEST(Ccsds, EulerAnglesOfAFrameTransformAreTheTransposeOfOurs)
{
    // A2B with 321 is F1(a3) F2(a2) F3(a1): world-to-body angles, first digit first (second-hand,
    // the practice of an implementation of AEM).
    const Matrix3d R_BA = frameX(70_deg) * frameY(-20_deg) * frameZ(35_deg);
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyx, {35, -20, 70}).transpose(), R_BA, kRounding);
}

TEST(Dis, HeadingPitchRollBecomeGeocentricAngles)
{
    // Koks, DSTO-TN-0640 (2008), section 4.3, eqs (4.26)-(4.29), p. 19, seen. Latitude -34.9,
    // longitude 138.5; heading 135, pitch 20, roll 30, zyx about body on north-east-down.
    // North-east-down stands on the earth-fixed frame as z by longitude, then y by -(90 +
    // latitude).
    const Quaterniond q_EN = aboutBody(Order::zyx, {138.5, -(90.0 - 34.9), 0});
    const Quaterniond q_EB = q_EN * aboutBody(Order::zyx, {135, 20, 30});
    EXPECT_ELEMENTS_NEAR(
        q_EB.toRotationMatrix().transpose(),  // its rows are the body's axes, to three decimals
        rows({-0.366, -0.564, -0.741, 0.928, -0.165, -0.333, 0.065, -0.809, 0.584}), 5e-4);
    const EulerSolutions angles = solveEuler(q_EB, Order::zyx, About::body);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]), Vector3d(-123.0, 47.8, -29.7), 0.05);
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]),  // derived, to four decimals
                         Vector3d(-122.9699, 47.7865, -29.6702), 5e-5);
}

// EPSG guidance note 7-2: X_T = t + M R X_S. Input seen; the printed target is from memory.
TEST(Epsg, PositionVectorAndCoordinateFrameDifferInTheSignOfTheAngleAlone)
{
    const Vector3d source(3657660.66, 255768.55, 5201382.11);  // m
    const Vector3d target(3657660.78, 255778.43, 5201387.75);  // m
    const double scale = 1.0 + 0.219e-6;
    const double arcseconds = kPi / 180.0 / 3600.0;  // rad
    const auto moved = [&](double rzArcseconds, Direction direction) -> Vector3d {
        const Quaterniond q =
            read({.kind = Kind::rotationVector, .unit = AngleUnit::radians, .direction = direction},
                 {0, 0, rzArcseconds * arcseconds});
        return Vector3d(0, 0, 4.5) + scale * (q * source);
    };
    // Method 9606 turns the position, 9607 the axes. Printed to 0.01 m, as computed in the note.
    EXPECT_ELEMENTS_NEAR(moved(0.554, Direction::bodyToWorld), target, 0.01);
    EXPECT_ELEMENTS_NEAR(moved(-0.554, Direction::worldToBody), target, 0.01);
    const Vector3d wrong = moved(-0.554, Direction::bodyToWorld) - target;
    EXPECT_NEAR(wrong.head<2>().norm(), 19.70, 0.01);  // derived: m on the ground
}

}  // namespace
