// SPDX-License-Identifier: GPL-3.0-or-later
// What people paste: prints, code, configuration files, logs. Each is invented in the style of its
// source.
#include <cmath>
#include <numbers>

#include "rotcore/reading/text_input.h"
#include "tests/core/text_input_support.h"

namespace {

using namespace text_input_test;

constexpr double kHalfPi = std::numbers::pi / 2.0;

SentNumbers rollPitchYaw(AngleUnit unit, std::vector<double> values)
{
    return angles(Order::xyz, About::space, unit, std::move(values));
}

// ---- prints of arrays

TEST(TextInputSources, AnArrayPrint)
{
    const auto input = read("array([ 0.12345678, -0.        , 1.57079633])");
    EXPECT_EQ(input.numbers, radiansZyx({0.12345678, -0.0, 1.57079633}));
    EXPECT_DOUBLE_EQ(input.resolution.value_or(0), 0.5e-8);
    EXPECT_EQ(read("array([0.6, 0. , 0. , 0.8], dtype=float32)").numbers, wxyz({0.6, 0, 0, 0.8}));
    EXPECT_EQ(read("[np.float64(30.0), np.float64(20.0), np.float64(10.0)]").numbers,
              degreesZyx({30, 20, 10}));
}

TEST(TextInputSources, ATensorPrintWrappedOverLines)
{
    const auto input = read(
        "tensor([[ 1.0000,  0.0000,  0.0000],\n"
        "        [ 0.0000,  0.0000, -1.0000],\n"
        "        [ 0.0000,  1.0000,  0.0000]], device='cuda:0', dtype=torch.float32,\n"
        "       grad_fn=<MulBackward0>)");
    EXPECT_EQ(input.numbers, rows({1, 0, 0, 0, 0, -1, 0, 1, 0}));
    EXPECT_FALSE(says(input, "left aside")) << warningsOf(input);
}

TEST(TextInputSources, AWrappedFourByFourPrint)
{
    EXPECT_EQ(
        read("T =\n[[ 0.000e+00 -1.000e+00  0.000e+00\n   2.500e-01]\n [ 1.000e+00  0.000e+00 "
             " 0.000e+00\n   1.000e+00]\n [ 0. 0. 1. 0.]\n [ 0. 0. 0. 1.]]")
            .numbers,
        rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
}

TEST(TextInputSources, AColumnAndAMatrixOfEigen)
{
    EXPECT_EQ(read("  30\n20.5\n -10\n").numbers, degreesZyx({30, 20.5, -10}));
    EXPECT_EQ(read("q.coeffs():\n  0\n  0\n0.6\n0.8").numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_EQ(read("R:\n         0         -1 0\n 1 6.12e-17 0\n0 0 1").numbers,
              rows({0, -1, 0, 1, 6.12e-17, 0, 0, 0, 1}));
}

TEST(TextInputSources, ACInitialiser)
{
    const auto input = read("double R[9] = {0.f, -1.0f, 1.5e-3, 1.f, .0f, 0.f, 0.f, 0.f, 1.f};");
    EXPECT_EQ(input.numbers, rows({0, -1, 1.5e-3, 1, 0, 0, 0, 0, 1}));
    EXPECT_EQ(read("static const float ypr_deg[3]{30.5f, 20.0f, 10.0f};").numbers,
              degreesZyx({30.5, 20, 10}));
}

// ---- files with names

TEST(TextInputSources, JsonFlatAndNested)
{
    EXPECT_EQ(read("[0.6, 0.0, 0.0, 0.8]").numbers, wxyz({0.6, 0, 0, 0.8}));
    EXPECT_EQ(read(R"({"qx": 0.1, "qy": 0.2, "qz": 0.3, "qw": 0.9})").numbers,
              xyzw({0.1, 0.2, 0.3, 0.9}));
    EXPECT_EQ(
        read(R"({"head": {"orientation": {"w": 0.8, "x": 0.6, "y": 0, "z": 0}, "id": 7}})").numbers,
        wxyz({0.8, 0.6, 0, 0}));
    EXPECT_EQ(read(R"({"euler": {"yaw": 30, "pitch": 20, "roll": 10}, "degrees": true})").numbers,
              degreesZyx({30, 20, 10}));
    EXPECT_EQ(read(R"({"yawDeg": 30, "pitchDeg": 20, "rollDeg": 10})").numbers,
              degreesZyx({30, 20, 10}));
    const auto input =
        read(R"({"position": [1, 2, 3], "rotation": [0.6, 0, 0, 0.8], "scale": [1, 1, 1]})");
    EXPECT_EQ(input.numbers, wxyz({0.6, 0, 0, 0.8}));
    EXPECT_TRUE(says(input, "left aside: the position, \"scale\"")) << warningsOf(input);
}

TEST(TextInputSources, YamlOnSeveralLines)
{
    const auto input = read(
        "header:\n  seq: 12\n  stamp: 1700000000.25\npose:\n  position:\n    x: 1.0\n    y: 2.0\n  "
        "  z: "
        "3.0\n"
        "  orientation:\n    x: 0.0\n    y: 0.0\n    z: 0.6\n    w: 0.8\n");
    EXPECT_EQ(input.numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_FALSE(input.kindGuessed);
    EXPECT_TRUE(says(input, "the position")) << warningsOf(input);
    EXPECT_TRUE(input.others.empty());
}

TEST(TextInputSources, YamlOnOneLine)
{
    EXPECT_EQ(read("x: 0.0 y: 0.0 z: 0.6 w: 0.8").numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_EQ(
        read("position: {x: 1, y: 2, z: 3}, orientation: {x: 0.0, y: 0.6, z: 0.0, w: 0.8}").numbers,
        xyzw({0, 0.6, 0, 0.8}));
}

TEST(TextInputSources, TheVelocitiesOfALogAreLeftAside)
{
    const auto input = read(
        "orientation: {x: 0, y: 0, z: 0.6, w: 0.8}\nangular_velocity: {x: 1, y: 2, z: 3}\n"
        "linear_acceleration: {x: 4, y: 5, z: 9.81}\norientation_covariance: [1, 0, 0, 0, 1, 0, 0, "
        "0, 1]");
    EXPECT_EQ(input.numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_TRUE(says(input, "left aside")) << warningsOf(input);
}

TEST(TextInputSources, AttributesOfRobotAndSimulationFiles)
{
    const auto origin = read(R"(<origin xyz="0 0 1" rpy="0.1 -0.2 1.5707963"/>)");
    EXPECT_EQ(origin.numbers, rollPitchYaw(kRadians, {0.1, -0.2, 1.5707963}));
    EXPECT_TRUE(says(origin, "the position"));
    EXPECT_TRUE(says(origin, "rpy attribute is taken in radians"));
    // the order of the two attributes does not matter, nor do expressions in them
    EXPECT_EQ(read(R"(<origin rpy="${-pi/2} 0 ${pi/4}" xyz="0 0 1"/>)").numbers,
              rollPitchYaw(kRadians, {-kHalfPi, 0, std::numbers::pi / 4}));
    const auto quaternion = read(R"(<body pos="1 2 3" quat="0.96 0.1 0.2 0.17"/>)");
    EXPECT_EQ(quaternion.numbers, wxyz({0.96, 0.1, 0.2, 0.17}));
    EXPECT_TRUE(says(quaternion, "wxyz"));
    const auto euler = read(R"(<geom euler="0 0 1.57"/>)");
    EXPECT_EQ(euler.numbers, angles(Order::xyz, About::body, kRadians, {0, 0, 1.57}));
    EXPECT_TRUE(says(euler, "xyz about body"));
    EXPECT_EQ(refused(R"(<origin xyz="0 0 1"/>)").kind, Fault::Kind::badText);
}

// ---- named numbers

TEST(TextInputSources, QuaternionsWithNamesInAnyOrder)
{
    EXPECT_EQ(read("w, x, y, z = (0.9, 0.1, 0.2, 0.3)").numbers, wxyz({0.9, 0.1, 0.2, 0.3}));
    EXPECT_EQ(read("x, y, z, w = 0.1, 0.2, 0.3, 0.9").numbers, xyzw({0.1, 0.2, 0.3, 0.9}));
    EXPECT_EQ(read("<Quaternion (w=0.0000, x=-0.0000, y=1.0000, z=0.0000)>").numbers,
              wxyz({0, -0.0, 1, 0}));
    EXPECT_EQ(read("{ 'w_val': 0.9, 'x_val': 0.1, 'y_val': 0.2, 'z_val': 0.3 }").numbers,
              wxyz({0.9, 0.1, 0.2, 0.3}));
    EXPECT_EQ(read("qw=0.9 qx=0.1 qy=0.2 qz=0.3").numbers, wxyz({0.9, 0.1, 0.2, 0.3}));
    EXPECT_EQ(read("q.w() = 0.9; q.x() = 0.1; q.y() = 0.2; q.z() = 0.3;").numbers,
              wxyz({0.9, 0.1, 0.2, 0.3}));
    EXPECT_EQ(read("z: 0.3, w: 0.9, y: 0.2, x: 0.1").numbers.reading.kind, Kind::quaternion);
    EXPECT_EQ(read("msg.pose.orientation.x = 0.1\nmsg.pose.orientation.y = 0.2\n"
                   "msg.pose.orientation.z = 0.3\nmsg.pose.orientation.w = 0.9")
                  .numbers,
              xyzw({0.1, 0.2, 0.3, 0.9}));
    EXPECT_EQ(read("q = [0.1, 0.2, 0.3, 0.9]  # x y z w").numbers, xyzw({0.1, 0.2, 0.3, 0.9}));
    EXPECT_EQ(read("quaternion xyzw: 0.1 0.2 0.3 0.9").numbers, xyzw({0.1, 0.2, 0.3, 0.9}));
}

TEST(TextInputSources, NumberedQuaternionComponents)
{
    const auto fromZero = read("q0: 0.9 q1: 0.1 q2: 0.2 q3: 0.3");
    EXPECT_EQ(fromZero.numbers, wxyz({0.9, 0.1, 0.2, 0.3}));
    EXPECT_TRUE(says(fromZero, "q0 is taken for the scalar"));
    const auto fromOne = read("q1 = 0.1, q2 = 0.2, q3 = 0.3, q4 = 0.9");
    EXPECT_EQ(fromOne.numbers, xyzw({0.1, 0.2, 0.3, 0.9}));
    EXPECT_TRUE(says(fromOne, "q4 is taken for the scalar"));
}

TEST(TextInputSources, ImaginaryUnits)
{
    EXPECT_EQ(read("+ 0.7 + 0.0.i + 0.0.j + 0.7.k").numbers, wxyz({0.7, 0, 0, 0.7}));
    EXPECT_EQ(read("0.7 + 0i + 0j + 0.7k").numbers, wxyz({0.7, 0, 0, 0.7}));
    EXPECT_EQ(read("(0.7 - 0.1*i + 0.2*j - 0.7*k)").numbers, wxyz({0.7, -0.1, 0.2, -0.7}));
    EXPECT_EQ(read("0.1i 0.2j 0.3k 0.9").numbers.values, (std::vector<double>{0.1, 0.2, 0.3, 0.9}));
}

TEST(TextInputSources, RollPitchYawGoByTheirNames)
{
    const auto input = read("roll: 1 pitch: 2 yaw: 3");
    EXPECT_EQ(input.numbers, degreesZyx({3, 2, 1}));
    EXPECT_TRUE(says(input, "turns about z, y, x of the body"));
    for (const char* text :
         {"yaw=3, pitch=2, roll=1", "Roll: 1\nPitch: 2\nHeading: 3\n",
          "roll, pitch, yaw = (1, 2, 3)", "pitch_deg: 2; yaw_deg: 3; roll_deg: 1",
          "roll[deg],pitch[deg],yaw[deg]\n1,2,3", "phi: 1 theta: 2 psi: 3",
          "\u03C6 = 1\u00B0, \u03B8 = 2\u00B0, \u03C8 = 3\u00B0",
          "attitude.roll = 1 attitude.pitch = 2 attitude.yaw = 3"})
        EXPECT_EQ(read(text).numbers, degreesZyx({3, 2, 1})) << text;
    EXPECT_EQ(read("yaw 0.5rad, pitch 0.25rad, roll 0").numbers, radiansZyx({0.5, 0.25, 0}));
}

TEST(TextInputSources, AnglesWithNamesForSomeAxesOnly)
{
    const auto yaw = read("yaw: 30");
    EXPECT_EQ(yaw.numbers, degreesZyx({30, 0, 0}));
    EXPECT_TRUE(says(yaw, "one angle only"));
    EXPECT_EQ(read("heading 30deg").numbers, degreesZyx({30, 0, 0}));
    EXPECT_EQ(read("pitch 20deg").numbers.reading.order, Order::zyx);
    EXPECT_EQ(read("pitch 20deg").numbers.values, (std::vector<double>{0, 20, 0}));
    const auto two = read("yaw: 30, roll: 10");
    EXPECT_EQ(two.numbers, degreesZyx({30, 0, 10}));
    EXPECT_TRUE(says(two, "two angles only"));
}

TEST(TextInputSources, YprLines)
{
    EXPECT_EQ(read("ypr\t1.0\t2.0\t3.0").numbers, degreesZyx({1, 2, 3}));
    EXPECT_EQ(read("#YPR=1,2,3").numbers, degreesZyx({1, 2, 3}));
    EXPECT_EQ(read("RPY (degree) [1.0, 2.0, 3.0]").numbers, rollPitchYaw(kDegrees, {1, 2, 3}));
}

TEST(TextInputSources, TurnsAboutNamedAxes)
{
    const auto input = read("Rx: 12.34 degree Ry: 1.2 degree Rz: -3 degree");
    EXPECT_EQ(input.numbers, angles(Order::xyz, About::body, kDegrees, {12.34, 1.2, -3}));
    EXPECT_TRUE(says(input, "order they are listed"));
    EXPECT_EQ(other(input, "rotation vector"), vector(kDegrees, {12.34, 1.2, -3}));
    const auto vectorFirst = read("rz = 0.3, ry = 0.2, rx = 0.1");
    EXPECT_EQ(vectorFirst.numbers.reading.order, Order::zyx);
    EXPECT_EQ(other(vectorFirst, "rotation vector"), vector(kRadians, {0.1, 0.2, 0.3}));
    EXPECT_EQ(read("rotation: {x: 10, y: 20, z: 30}").numbers,
              angles(Order::xyz, About::body, kDegrees, {10, 20, 30}));
    EXPECT_EQ(read("x: 10, y: 20, z: 30").numbers,
              angles(Order::xyz, About::body, kDegrees, {10, 20, 30}));
}

TEST(TextInputSources, OmegaPhiKappa)
{
    const auto input = read("omega: 1 phi: 2 kappa: 3");
    EXPECT_EQ(input.numbers, angles(Order::xyz, About::body, kDegrees, {1, 2, 3}));
    EXPECT_TRUE(says(input, "omega, phi, kappa"));
}

TEST(TextInputSources, OrdersInWords)
{
    EXPECT_EQ(read("euler angles zxz: 30 20 10").numbers.reading.order, Order::zxz);
    EXPECT_EQ(read("30 20 10 XYZ").numbers.reading.order, Order::xyz);
    EXPECT_EQ(read("extrinsic xyz (deg): 30 20 10").numbers, rollPitchYaw(kDegrees, {30, 20, 10}));
    EXPECT_EQ(read(R"({"order": "yxz", "angles": [30, 20, 10]})").numbers.reading.order,
              Order::yxz);
}

TEST(TextInputSources, RotationVectorsByName)
{
    const auto expected = vector(kRadians, {0.1, 0.2, 0.3});
    for (const char* text :
         {"rotation vector: 0.1 0.2 0.3", "rvec = [[0.1], [0.2], [0.3]]",
          "rotvec (rad) 0.1, 0.2, 0.3", "rotation_vector: {x: 0.1, y: 0.2, z: 0.3}",
          "rotationVector=[0.1,0.2,0.3]", "tvec: 1 2 3 rvec: 0.1 0.2 0.3"})
        EXPECT_EQ(read(text).numbers, expected) << text;
}

TEST(TextInputSources, AxisAndAngleByName)
{
    for (const char* text :
         {"axis: [0,0,1] angle: 90deg", "angle = 90\u00B0, axis = (0, 0, 1)",
          "axis: z, angle: 90 deg", "axis-angle (deg): 0 0 1 90", "angle-axis (deg): 90 0 0 1",
          "axis: {x: 0, y: 0, z: 1}\nangle: 90 deg",
          "<axis x=\"0\" y=\"0\" z=\"1\" angle=\"90deg\"/>", "ax=0 ay=0 az=1 angle=90deg"})
        EXPECT_EQ(read(text).numbers, axisAngle(kDegrees, {0, 0, 1, 90})) << text;
}

TEST(TextInputSources, MatrixElementsByName)
{
    EXPECT_EQ(read("r11=0 r12=-1 r13=0 r21=1 r22=0 r23=0 r31=0 r32=0 r33=1").numbers,
              rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_EQ(
        read("m00: 0, m10: 1, m20: 0, m01: -1, m11: 0, m21: 0, m02: 0, m12: 0, m22: 1").numbers,
        rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
}

// ---- tables and series

TEST(TextInputSources, ARowWithTimePositionAndQuaternion)
{
    const auto input = read("1700000000.2500 1.3405 0.6266 1.6575 0.6574 0.6126 -0.2949 -0.3248");
    EXPECT_EQ(input.numbers, xyzw({0.6574, 0.6126, -0.2949, -0.3248}));
    EXPECT_TRUE(says(input, "a time and a position, which are left aside"));
}

TEST(TextInputSources, SevenNumbersAreDecidedByTheirLengths)
{
    EXPECT_EQ(read("1 2 3 0 0 0.6 0.8").numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_EQ(read("0.6 0 0 0.8 1 2 3").numbers, wxyz({0.6, 0, 0, 0.8}));
    const auto both = read("0.6 0 0 0.8 0 0.6 0");
    EXPECT_EQ(both.numbers, xyzw({0.8, 0, 0.6, 0}));
    EXPECT_TRUE(says(both, "may stand first"));
    EXPECT_EQ(other(both, "before the position"), wxyz({0.6, 0, 0, 0.8}));
}

TEST(TextInputSources, ARowOfAnImageListMapsWorldToCamera)
{
    const SentNumbers expected{{.kind = Kind::quaternion, .direction = Direction::worldToBody},
                               {0.8, 0.0, 0.6, 0.0}};
    const auto bare = read("1 0.8 0.0 0.6 0.0 -0.7374 1.0297 3.7435 1 head_01.jpg");
    EXPECT_EQ(bare.numbers, expected);
    EXPECT_TRUE(says(bare, "from world to camera"));
    const auto headed = read(
        "#   IMAGE_ID, QW, QX, QY, QZ, TX, TY, TZ, CAMERA_ID, NAME\n"
        "1 0.8 0.0 0.6 0.0 -0.7374 1.0297 3.7435 1 head_01.jpg");
    EXPECT_EQ(headed.numbers, expected);
    EXPECT_TRUE(says(headed, "world to camera"));
}

TEST(TextInputSources, TheHeadOfATableNamesItsColumns)
{
    EXPECT_EQ(read("timestamp,tx,ty,tz,qx,qy,qz,qw\n12.5,1,2,3,0,0,0.6,0.8").numbers,
              xyzw({0, 0, 0.6, 0.8}));
    EXPECT_EQ(read("time roll pitch yaw\n0.5 1 2 3").numbers, degreesZyx({3, 2, 1}));
    EXPECT_EQ(read("frame;qw;qx;qy;qz\n12;0.8;0.6;0;0").numbers, wxyz({0.8, 0.6, 0, 0}));
    EXPECT_EQ(read("x y z qx qy qz qw\n1 2 3 0 0 0.6 0.8").numbers, xyzw({0, 0, 0.6, 0.8}));
    const auto several = read("yaw,pitch,roll\n30,20,10\n31,21,11\n32,22,12");
    EXPECT_EQ(several.numbers, degreesZyx({30, 20, 10}));
    EXPECT_TRUE(says(several, "rows of the table after the first"));
}

TEST(TextInputSources, TimesOfDayAreLeftAside)
{
    const auto input = read("2024-01-05T12:30:05.123Z 30 20 10");
    EXPECT_EQ(input.numbers, degreesZyx({30, 20, 10}));
    EXPECT_TRUE(says(input, "left aside: the time"));
    EXPECT_EQ(read("[12:30:05.123] yaw 30 pitch 20 roll 10").numbers, degreesZyx({30, 20, 10}));
}

TEST(TextInputSources, ATransformPrintout)
{
    // cos(36.87 deg) = 0.8: a turn of 73.7398 deg about z, printed as 73.740
    const std::string head =
        "At time 1700000000.25\n- Translation: [1.000, 2.000, 3.000]\n"
        "- Rotation: in Quaternion [0.000, 0.000, 0.600, 0.800]\n"
        "            in RPY (radian) [0.000, -0.000, 1.287]\n";
    const std::string tail =
        "- Matrix:\n  0.280 -0.960  0.000  1.000\n  0.960  0.280  0.000  2.000\n"
        "  0.000  0.000  1.000  3.000\n  0.000  0.000  0.000  1.000\n";
    const auto input = read(head + "            in RPY (degree) [0.000, -0.000, 73.740]\n" + tail);
    EXPECT_EQ(input.numbers, xyzw({0, 0, 0.6, 0.8}));
    EXPECT_TRUE(says(input, "the position, the matrix, the Euler angles")) << warningsOf(input);
    EXPECT_FALSE(says(input, "another pose")) << warningsOf(input);
    const auto wrong = read(head + "            in RPY (degree) [0.000, -0.000, 63.740]\n" + tail);
    EXPECT_TRUE(says(wrong, "Euler angles in the same text: another pose, 9.9998 deg"))
        << warningsOf(wrong);
}

// ---- code; the facts stand beside each constructor in constructors.cpp

TEST(TextInputSources, QuaternionConstructorsScalarFirst)
{
    for (const char* text :
         {"Eigen::Quaterniond q(0.8, 0.1, 0.2, 0.3);", "Quaternionf{0.8f, 0.1f, 0.2f, 0.3f}",
          "Eigen::Quaternion<double> q_WB(0.8, 0.1, 0.2, 0.3);",
          "Quaterniond q = {0.8, 0.1, 0.2, 0.3};",
          "auto q = Eigen::Quaterniond(0.8, 0.1, 0.2, 0.3).normalized();",
          "glm::quat q = glm::quat(0.8f, 0.1f, 0.2f, 0.3f);", "QQuaternion(0.8, 0.1, 0.2, 0.3)",
          "mathutils.Quaternion((0.8, 0.1, 0.2, 0.3))", "np.quaternion(0.8, 0.1, 0.2, 0.3)",
          "gtsam.Rot3.Quaternion(0.8, 0.1, 0.2, 0.3)", "quat2rotm([0.8 0.1 0.2 0.3])"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers, wxyz({0.8, 0.1, 0.2, 0.3})) << text;
        EXPECT_FALSE(input.kindGuessed) << text;
        EXPECT_TRUE(input.warnings.empty()) << text << warningsOf(input);
    }
}

TEST(TextInputSources, QuaternionConstructorsScalarLast)
{
    for (const char* text :
         {"R.from_quat([0.1, 0.2, 0.3, 0.8])", "Rotation.from_quat(np.array([0.1, 0.2, 0.3, 0.8]))",
          "new Quaternion(0.1, 0.2, 0.3, 0.8)", "new THREE.Quaternion( 0.1, 0.2, 0.3, 0.8 );",
          "tf2::Quaternion q(0.1, 0.2, 0.3, 0.8);", "btQuaternion(0.1, 0.2, 0.3, 0.8)",
          "KDL::Rotation::Quaternion(0.1, 0.2, 0.3, 0.8)",
          "geometry_msgs.msg.Quaternion(x=0.1, y=0.2, z=0.3, w=0.8)"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers, xyzw({0.1, 0.2, 0.3, 0.8})) << text;
        EXPECT_TRUE(input.others.empty()) << text;
    }
}

TEST(TextInputSources, APlainQuaternionCallLeavesTheScalarOpen)
{
    const auto input = read("Quaternion(0.8, 0.1, 0.2, 0.3)");
    EXPECT_EQ(input.numbers, wxyz({0.8, 0.1, 0.2, 0.3}));
    EXPECT_EQ(other(input, "scalar last"), xyzw({0.8, 0.1, 0.2, 0.3}));
}

TEST(TextInputSources, AngleAxisTakesTheAngleFirst)
{
    for (const char* text :
         {"Eigen::AngleAxisd(0.5, Eigen::Vector3d(0, 0, 1))",
          "AngleAxisd aa(0.5, Vector3d::UnitZ());", "AngleAxisf{0.5f, {0.f, 0.f, 1.f}}",
          "Eigen::AngleAxis<double>(0.5, Eigen::Vector3d::UnitZ())",
          "glm::angleAxis(0.5f, glm::vec3(0.0f, 0.0f, 1.0f))"})
        EXPECT_EQ(read(text).numbers, axisAngle(kRadians, {0, 0, 1, 0.5})) << text;
}

TEST(TextInputSources, AxisThenAngle)
{
    EXPECT_EQ(
        read("new THREE.Quaternion().setFromAxisAngle(new THREE.Vector3(0, 0, 1), Math.PI / 2)")
            .numbers,
        axisAngle(kRadians, {0, 0, 1, kHalfPi}));
    EXPECT_EQ(read("QQuaternion::fromAxisAndAngle(QVector3D(0, 0, 1), 90)").numbers,
              axisAngle(kDegrees, {0, 0, 1, 90}));
    EXPECT_EQ(read("axang2quat([0 0 1 pi/2])").numbers, axisAngle(kRadians, {0, 0, 1, kHalfPi}));
}

TEST(TextInputSources, AProductOfTurnsIsASetOfEulerAnglesAboutBody)
{
    EXPECT_EQ(read("Eigen::AngleAxisd(0.3, Eigen::Vector3d::UnitZ())\n"
                   "  * Eigen::AngleAxisd(0.2, Eigen::Vector3d::UnitY())\n"
                   "  * Eigen::AngleAxisd(0.1, Eigen::Vector3d::UnitX())")
                  .numbers,
              radiansZyx({0.3, 0.2, 0.1}));
    EXPECT_EQ(
        read("AngleAxisd(0.3, Vector3d(1, 0, 0)) * AngleAxisd(M_PI/2, Vector3d(0, 0, 1))").numbers,
        angles(Order::xzy, About::body, kRadians, {0.3, kHalfPi, 0}));
    EXPECT_EQ(
        refused("AngleAxisd(0.3, Vector3d(1, 1, 0)) * AngleAxisd(0.5, Vector3d(0, 0, 1))").kind,
        Fault::Kind::badText);
}

TEST(TextInputSources, TheCaseOfFromEulerSaysAboutWhat)
{
    EXPECT_EQ(read("R.from_euler('zyx', [30, 20, 10], degrees=True)").numbers,
              angles(Order::zyx, About::space, kDegrees, {30, 20, 10}));
    EXPECT_EQ(read("Rotation.from_euler(\"ZYX\", [0.3, 0.2, 0.1])").numbers,
              radiansZyx({0.3, 0.2, 0.1}));
    EXPECT_EQ(read("R.from_euler('XZX', (3, 2, 1), degrees=False)").numbers,
              angles(Order::xzx, About::body, kRadians, {3, 2, 1}));
    EXPECT_EQ(read("R.from_euler('z', 90, degrees=True)").numbers,
              angles(Order::zyx, About::space, kDegrees, {90, 0, 0}));
    EXPECT_EQ(read("R.from_euler('YX', [20, 10], degrees=True)").numbers,
              angles(Order::yxz, About::body, kDegrees, {20, 10, 0}));
}

TEST(TextInputSources, RotationVectorAndMatrixCalls)
{
    EXPECT_EQ(read("R.from_rotvec([0, 0, 10])").numbers, vector(kRadians, {0, 0, 10}));
    EXPECT_EQ(read("R.from_rotvec(np.pi/2 * np.array([0, 0, 1]))").numbers,
              axisAngle(kRadians, {0, 0, 1, kHalfPi}));
    EXPECT_EQ(read("cv2.Rodrigues(np.array([0.1, 0.2, 0.3]))").numbers,
              vector(kRadians, {0.1, 0.2, 0.3}));
    const auto matrix = read("R.from_matrix([[0, -1, 0], [1, 0, 0], [0, 0, 1]])");
    EXPECT_EQ(matrix.numbers, rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(matrix.others.empty());
}

TEST(TextInputSources, AnglesHandedOverByAxis)
{
    EXPECT_EQ(read("new THREE.Euler(0.1, 0.2, 0.3)").numbers,
              angles(Order::xyz, About::body, kRadians, {0.1, 0.2, 0.3}));
    EXPECT_EQ(read("new THREE.Euler(0.1, 0.2, 0.3, 'ZYX')").numbers, radiansZyx({0.3, 0.2, 0.1}));
    EXPECT_EQ(read("transform.rotation = Quaternion.Euler(30, 45, 60);").numbers,
              angles(Order::zxy, About::space, kDegrees, {60, 30, 45}));
    EXPECT_EQ(read("quaternion.Euler(30, 45, 60)").numbers.reading.order,
              Order::zyx);  // another one
    EXPECT_EQ(read("mathutils.Euler((0.1, 0.2, 0.3), 'XYZ')").numbers,
              rollPitchYaw(kRadians, {0.1, 0.2, 0.3}));
}

TEST(TextInputSources, RollPitchYawCallsTurnAboutSpace)
{
    const auto expected = rollPitchYaw(kRadians, {0.1, 0.2, kHalfPi});
    for (const char* text :
         {"q.setRPY(0.1, 0.2, M_PI/2);", "KDL::Rotation::RPY(0.1, 0.2, M_PI_2)",
          "tf.transformations.quaternion_from_euler(0.1, 0.2, math.pi/2)",
          "euler_matrix(0.1, 0.2, np.pi/2, 'sxyz')", "euler2quat(0.1, 0.2, np.pi/2)"})
        EXPECT_EQ(read(text).numbers, expected) << text;
    EXPECT_EQ(read("euler_matrix(0.3, 0.2, 0.1, 'rzyx')").numbers, radiansZyx({0.3, 0.2, 0.1}));
    EXPECT_EQ(read("KDL::Rotation::EulerZYZ(0.3, 0.2, 0.1)").numbers,
              angles(Order::zyz, About::body, kRadians, {0.3, 0.2, 0.1}));
    EXPECT_EQ(read("eul2quat([0.3 0.2 0.1])").numbers, radiansZyx({0.3, 0.2, 0.1}));
}

}  // namespace
