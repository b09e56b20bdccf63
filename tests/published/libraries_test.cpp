// SPDX-License-Identifier: GPL-3.0-or-later
// Against the public reference pages of MathWorks, the tests of Hipparchus (Apache-2.0), of
// gl-matrix 3 and three.js (MIT), the AHRS library's documentation (10 Aug 2025, MIT), and Eigen
// 3.4.0 and tf2 as they are. All seen.
//
// Left for when the product interpolates: the slerp examples of gl-matrix and AHRS. Not used: AHRS'
// TRIAD example, whose data contradict each other.
#include <algorithm>
#include <cmath>

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

// Half the last of four and of eight printed decimals.
constexpr double kFour = 5.001e-5;
constexpr double kEight = 5.001e-9;

// MathWorks: eul2rotm, eul2quat and rotm2eul are active and about body; angle2dcm and quatrotate
// (Aerospace) are passive, the transpose. Quaternions w, x, y, z.
TEST(MathWorks, Eul2rotmAndEul2quat)
{
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyx, {0, 90, 0}),
                         rows({0, 0, 1, 0, 1, 0, -1, 0, 0}), kFour);
    EXPECT_QUATERNION_NEAR(aboutBody(Order::zyx, {0, 90, 0}), Quaterniond(0.7071, 0, 0.7071, 0),
                           kFour);
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyz, {0, 90, 90}),
                         rows({0, 0, 1, 1, 0, 0, 0, 1, 0}), 1e-15);
    EXPECT_ELEMENTS_NEAR(
        matrixAboutBody(Order::zyx, {45, 60, 22.5}),  // se3, so3
        rows({0.3536, -0.4189, 0.8364, 0.3536, 0.8876, 0.2952, -0.8660, 0.1913, 0.4619}), kFour);
}

TEST(MathWorks, Angle2dcmIsTheTranspose)  // yaw 0.7854, pitch 0.1, roll 0
{
    const Matrix3d printed =
        rows({0.7036, 0.7036, -0.0998, -0.7071, 0.7071, 0, 0.0706, 0.0706, 0.9950});
    const Quaterniond q_WB = pose({Order::zyx, About::body, {0.7854, 0.1, 0}});
    EXPECT_ELEMENTS_NEAR(q_WB.toRotationMatrix().transpose(), printed, kFour);
    // And back: the nearest rotation to the printed digits is half of the last of them away.
    const Reading dcm{.kind = Kind::matrix, .direction = Direction::worldToBody};
    EXPECT_POSE_NEAR(read(dcm, typed(printed)), q_WB, 1e-4);
}

TEST(MathWorks, QuatmultiplyIsHamilton)
{
    const auto number = [](double w, double x, double y, double z) {
        return hamiltonOf({ScalarPlace::first, Algebra::hamilton, {w, x, y, z}});
    };
    const Quaterniond q = number(1, 0, 1, 0);
    const Quaterniond r = number(1, 0.5, 0.5, 0.75);
    EXPECT_TRUE((q * r).coeffs() == Quaterniond(0.5, 1.25, 1.5, 0.25).coeffs());
    EXPECT_TRUE((r * q).coeffs() == Quaterniond(0.5, -0.25, 1.5, 1.25).coeffs());
    EXPECT_ELEMENTS_NEAR((q * number(2, 1, 0.1, 0.1)).coeffs(),
                         Quaterniond(1.9, 1.1, 2.1, -0.9).coeffs(), 1e-15);
}

TEST(MathWorks, QuatrotateTurnsTheAxesOfAQuaternionOfAnyLength)  // q (1; 0, 1, 0)
{
    const Quaterniond q_BW =
        read({.kind = Kind::quaternion, .direction = Direction::worldToBody}, {1, 0, 1, 0});
    EXPECT_ELEMENTS_NEAR(q_BW * Vector3d(1, 1, 1), Vector3d(-1, 1, 1), 1e-15);
    EXPECT_ELEMENTS_NEAR(q_BW * Vector3d(2, 3, 4), Vector3d(-4, 3, 2), 2e-15);
    EXPECT_ELEMENTS_NEAR(read({.kind = Kind::quaternion}, {1, 0, 1, 0}) * Vector3d(1, 1, 1),
                         Vector3d(1, 1, -1), 1e-15);  // derived: the active result
}

TEST(MathWorks,
     PointAndFrameDifferInOrderForTheSameLetters)  // quaternion([0 45 30], "eulerd", "ZYX")
{
    const Quaterniond point = aboutSpace(Order::zyx, {0, 45, 30});
    EXPECT_ELEMENTS_NEAR(point.toRotationMatrix(),
                         rows({0.7071, 0, 0.7071, 0.3536, 0.8660, -0.3536, -0.6124, 0.5, 0.6124}),
                         kFour);
    EXPECT_QUATERNION_NEAR(point, Quaterniond(0.8924, 0.23912, 0.36964, 0.099046), kFour);
    const Quaterniond frame = aboutBody(Order::zyx, {0, 45, 30});
    EXPECT_QUATERNION_NEAR(frame, Quaterniond(0.8924, 0.23912, 0.36964, -0.099046), kFour);
}

TEST(MathWorks, TwoReleasesPrintTheTwoSolutionsOfOnePose)  // quat2eul of (.7071; .7071, 0, 0), ZYZ
{
    const EulerSolutions angles = solveEuler(
        read({.kind = Kind::quaternion}, {0.7071, 0.7071, 0, 0}), Order::zyz, About::body);
    EXPECT_ELEMENTS_NEAR(radiansOf(angles.solutions[0]),  // current page
                         Vector3d(-1.5708, 1.5708, 1.5708), kFour);
    EXPECT_ELEMENTS_NEAR(radiansOf(angles.solutions[1]),  // page of R2021a
                         Vector3d(1.5708, -1.5708, -1.5708), kFour);
}

TEST(MathWorks, ExampleOfRotm2eulMirrorsAndIsRefused)  // page of R2021a: determinant -1
{
    const Matrix3d M = rows({0, 0, 1, 0, -1, 0, -1, 0, 0});
    EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(M)), Fault::Kind::leftHanded);
    const Quaterniond printed = pose({Order::zyz, About::body, {-3.1416, -1.5708, -3.1416}});
    EXPECT_NEAR((printed.toRotationMatrix() - M).cwiseAbs().maxCoeff(), 2.0, 1e-4);
}

// Hipparchus: (q0; q1, q2, q3), and the matrix of a rotation is R(q)^T.
TEST(Hipparchus, MatrixToQuaternionInTwoBranches)
{
    const Reading frame{.kind = Kind::matrix, .direction = Direction::worldToBody};
    EXPECT_QUATERNION_NEAR(read(frame, {0.445888, 0.797184, -0.407040, -0.354816, 0.574912,
                                        0.737280, 0.821760, -0.184320, 0.539200}),
                           Quaterniond(0.8, 0.288, 0.384, 0.36), 1e-12);
    EXPECT_QUATERNION_NEAR(read(frame, {-0.445888, 0.797184, -0.407040, 0.354816, 0.574912,
                                        0.737280, 0.821760, 0.184320, -0.539200}),
                           Quaterniond(0.384, 0.36, 0.8, 0.288), 1e-12);
}

TEST(Hipparchus, SwappedRowsAreRefusedAndNamed)
{
    const Matrix3d M = rows({0.445888, 0.797184, -0.407040, 0.821760, -0.184320, 0.539200,
                             -0.354816, 0.574912, 0.737280});
    EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(M)), Fault::Kind::leftHanded);
    const auto check = checkMatrix(M);
    ASSERT_TRUE(check);
    EXPECT_EQ(check->state, MatrixCheck::State::mirrored);
    EXPECT_TRUE(std::any_of(check->causes.begin(), check->causes.end(), [](const auto& cause) {
        return cause.kind == MatrixCause::Kind::rowsSwapped && cause.first == 1 &&
               cause.second == 2;
    }));
}

TEST(Hipparchus, ThirdOfATurnAboutTheDiagonalCyclesTheAxes)  // axis (10, 10, 10), 120 deg
{
    const auto q = poseOfAxisAngle({10, 10, 10}, 120_deg);
    ASSERT_TRUE(q);
    EXPECT_ELEMENTS_NEAR(*q * Vector3d::UnitX(), Vector3d::UnitY(), 1e-12);
    EXPECT_ELEMENTS_NEAR(*q * Vector3d::UnitY(), Vector3d::UnitZ(), 1e-12);
    EXPECT_ELEMENTS_NEAR(*q * Vector3d::UnitZ(), Vector3d::UnitX(), 1e-12);
    const Reading frame{.kind = Kind::axisAngle, .direction = Direction::worldToBody};
    const Quaterniond inverse = read(frame, {10, 10, 10, 120});
    EXPECT_ELEMENTS_NEAR(inverse * Vector3d::UnitX(), Vector3d::UnitZ(), 1e-12);
    EXPECT_ELEMENTS_NEAR(inverse * Vector3d::UnitY(), Vector3d::UnitX(), 1e-12);
    EXPECT_ELEMENTS_NEAR(inverse * Vector3d::UnitZ(), Vector3d::UnitY(), 1e-12);
}

TEST(Hipparchus, ThreeQuarterTurnIsAQuarterTurnTheOtherWay)
{
    const auto q = poseOfAxisAngle(Vector3d::UnitZ(), 1.5 * kPi);
    ASSERT_TRUE(q);
    const AxisAngle turn = axisAngleOf(*q);
    EXPECT_NEAR(turn.angle, 0.5 * kPi, 1e-12);
    EXPECT_ELEMENTS_NEAR(turn.axis, -Vector3d::UnitZ(), 1e-12);
}

TEST(Hipparchus, SingularAnglesAreReadBackAsTheyWereGiven)
{
    // All orders: (0, +-pi/2, 0.125) with three axes, (0.125, 0 or pi, 0) with a repeated one. Two
    // roundings of the middle or of a half angle are all that may come between.
    const auto expectKept = [](Order order, const std::array<double, 3>& angles) {
        const EulerSolutions solved =
            solveEuler(pose({order, About::body, angles}), order, About::body, angles[0]);
        EXPECT_TRUE(solved.locked());
        for (std::size_t n = 0; n < 3; ++n)
            EXPECT_NEAR(solved.solutions[0].angles[n], angles[n], 4.5e-16) << nameOf(order);
    };
    for (const Order order : kAllOrders) {
        if (isRepeating(order)) {
            expectKept(order, {0.125, 0.0, 0.0});
            expectKept(order, {0.125, kPi, 0.0});
        } else {
            expectKept(order, {0.0, kPi / 2, 0.125});
            expectKept(order, {0.0, -kPi / 2, 0.125});
        }
    }
}

// gl-matrix: fromEuler takes angles about x, y and z, whatever the order; orders are about body.
TEST(GlMatrix, FromEulerTakesAnglesByAxis)  // x -30, y 30, z 30; tolerance 1e-6 as in its specs
{
    EXPECT_QUATERNION_NEAR(aboutBody(Order::zyx, {30, 30, -30}),
                           fromXyzw({-0.3061862, 0.1767767, 0.3061862, 0.8838835}), 1e-6);
    EXPECT_QUATERNION_NEAR(aboutBody(Order::xyz, {-30, 30, 30}),
                           fromXyzw({-0.1767767, 0.3061862, 0.1767767, 0.9185587}), 1e-6);
    EXPECT_QUATERNION_NEAR(aboutBody(Order::yxz, {30, -30, 30}),
                           fromXyzw({-0.1767767, 0.3061862, 0.3061862, 0.8838835}), 1e-6);
    EXPECT_QUATERNION_NEAR(aboutBody(Order::xzy, {-30, 30, 30}),
                           fromXyzw({-0.3061862, 0.3061862, 0.1767767, 0.8838835}), 1e-6);
}

TEST(GlMatrix, FromMat3IsListedByColumns)
{
    const std::vector<double> listed{1, 0, 0, 0, 0, -1, 0, 1, 0};
    const Quaterniond byColumns = fromXyzw({-0.707106, 0, 0, 0.707106});
    EXPECT_QUATERNION_NEAR(read({.kind = Kind::matrix, .storage = Storage::columns}, listed),
                           byColumns, 1e-6);
    EXPECT_QUATERNION_NEAR(read({.kind = Kind::matrix}, listed), byColumns.conjugate(), 1e-6);
}

TEST(ThreeJs, PremultiplyIsHamilton)  // a (2, 3, 4, 5), b (4, -3, -8, 5), x y z w: b a
{
    const Quaterniond a = hamiltonOf({ScalarPlace::last, Algebra::hamilton, {2, 3, 4, 5}});
    const Quaterniond b = hamiltonOf({ScalarPlace::last, Algebra::hamilton, {4, -3, -8, 5}});
    EXPECT_TRUE((b * a).coeffs() == Eigen::Vector4d(42, -32, -2, 58));
    EXPECT_TRUE((a * b).coeffs() == Eigen::Vector4d(18, 32, -38, 58));
}

TEST(ThreeJs, EulerXyzIsAboutBody)  // class Euler: default order 'XYZ', "local axes"
{
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::xyz, {20, -35, 110}),
                         (frameZ(110_deg) * frameY(-35_deg) * frameX(20_deg)).transpose(),
                         kRounding);
}

TEST(Ahrs, MatricesOfThreeTurns)
{
    // The page calls the first rpy = [30, 20, 10]: its argument rpy is yaw, pitch, roll.
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyx, {30, 20, 10}),
                         rows({0.81379768, -0.44096961, 0.37852231, 0.46984631, 0.88256412,
                               0.01802831, -0.34202014, 0.16317591, 0.92541658}),
                         kEight);
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyz, {40, 50, 60}),
                         rows({-0.31046846, -0.74782807, 0.58682409, 0.8700019, 0.02520139,
                               0.49240388, -0.38302222, 0.66341395, 0.64278761}),
                         kEight);
}

TEST(Ahrs, ProductsOfNormalisedQuaternions)  // p (1; 2, 3, 4), q (-5; 4, -3, 2)
{
    const Quaterniond p = read({.kind = Kind::quaternion}, {1, 2, 3, 4});
    const Quaterniond q = read({.kind = Kind::quaternion}, {-5, 4, -3, 2});
    EXPECT_QUATERNION_NEAR(p * q, Quaterniond(-0.2981424, 0.2981424, -0.1490712, -0.89442719),
                           5.001e-8);  // the coarsest printed digit
    EXPECT_QUATERNION_NEAR(q * p, Quaterniond(-0.298142397, -0.596284794, -0.745355992, 0),
                           5.001e-10);
}

TEST(Ahrs, DistancesOfTwoAttitudes)  // ZYX (10, -20, 30) and (-10, 20, -30)
{
    const Quaterniond first = aboutBody(Order::zyx, {10, -20, 30});
    const Quaterniond second = aboutBody(Order::zyx, {-10, 20, -30});
    EXPECT_NEAR(angleBetween(first, second), 1.282213683073497, 1e-14);
    EXPECT_NEAR((first.toRotationMatrix() - second.toRotationMatrix()).norm(), 1.6916338074634352,
                1e-14);
}

TEST(Ahrs, ExampleOfSixtyDegreesIsOfSixtyRadians)  // axis (1, 2, 3): a slip of unit
{
    const Reading radians{.kind = Kind::axisAngle, .unit = AngleUnit::radians};
    const Matrix3d R = read(radians, {1, 2, 3, 60}).toRotationMatrix();
    EXPECT_NEAR(R(0, 0), -0.81295491, kEight);
    EXPECT_NEAR(R(0, 1), 0.52330834, kEight);
    // Derived: 60 rad is 9 turns and 197.747 deg, so 162.253 deg about the opposite axis.
    const AxisAngle turn = axisAngleOf(read(radians, {1, 2, 3, 60}));
    EXPECT_NEAR(toDegrees(turn.angle), 360.0 - 197.747, 5e-4);
    EXPECT_ELEMENTS_NEAR(turn.axis, -Vector3d(1, 2, 3).normalized(), 1e-14);
    EXPECT_GT((read({.kind = Kind::axisAngle}, {1, 2, 3, 60}).toRotationMatrix() - R).norm(), 1.3);
}

TEST(Ahrs, PrintedLogarithmIsThatOfTheTranspose)  // of ZYX (10, -20, 30): the sign at (1, 2)
{
    // The element at (1, 2) of a skew matrix is -z. Derived: z of the rotation vector is .2602604,
    // so the logarithm has -.26026043 there where +.26026043 is printed.
    const Quaterniond q_WB = aboutBody(Order::zyx, {10, -20, 30});
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(q_WB), Vector3d(0.5473806, -0.2953180, 0.2602604), 1e-7);
    EXPECT_NEAR(-rotationVectorOf(q_WB.conjugate()).z(), 0.26026043, kEight);
}

TEST(Eigen34, ConstructorIsScalarFirstAndStorageIsNot)  // header of Eigen 3.4.0
{
    const Quaterniond q(1, 2, 3, 4);
    EXPECT_TRUE(q.coeffs() == Eigen::Vector4d(2, 3, 4, 1));
    EXPECT_EQ(numbersOf(q, ScalarPlace::last, Algebra::hamilton).numbers,
              (std::array<double, 4>{2, 3, 4, 1}));
    EXPECT_EQ(numbersOf(q, ScalarPlace::first, Algebra::hamilton).numbers,
              (std::array<double, 4>{1, 2, 3, 4}));
}

TEST(Tf2, SetEulerIsAboutYxzAndSetRpyAboutFixedXyz)  // geometry2 header of Feb 2024
{
    const Quaterniond setEuler = aboutBody(Order::yxz, {30, 20, 10});
    const Quaterniond setRpy = aboutSpace(Order::xyz, {10, 20, 30});
    EXPECT_QUATERNION_NEAR(setEuler, fromXyzw({0.189307857, 0.239298338, 0.038134576, 0.951548525}),
                           5.001e-10);
    EXPECT_QUATERNION_NEAR(setRpy, fromXyzw({0.038134576, 0.189307857, 0.239298338, 0.951548525}),
                           5.001e-10);
    EXPECT_NEAR(toDegrees(angleBetween(setEuler, setRpy)), 29.479998, 5.001e-7);
}

}  // namespace
