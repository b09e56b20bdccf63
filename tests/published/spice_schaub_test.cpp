// SPDX-License-Identifier: GPL-3.0-or-later
// Against NAIF SPICE (routine headers of Toolkit N0066, CSPICE of 2021, seen) and the examples of
// Schaub & Junkins, Analytical Mechanics of Space Systems, ch. 3 (second-hand: two independent test
// suites quote the printed digits).
//
// SPICE's [t]_i and Schaub's [BN] give coordinates in turned axes: the transpose of our R_WB.
// m = [a3]_i [a2]_j [a1]_k applies a1 first, so it is the transpose of our kji about body (a1, a2,
// a3); Schaub's 3-2-1 lists the angle applied first in front.
//
// Left for when the product takes observed directions: TRIAD and Davenport's q-method.
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

const Reading kFrameMatrix{.kind = Kind::matrix, .direction = Direction::worldToBody};
const double kS = std::sqrt(0.5);

TEST(Spice, M2eulExampleReadsAlphaDeltaKappa)  // m2eul, example 1
{
    const Matrix3d ticam = rows({0.49127379678135830, 0.50872620321864170, 0.70699908539882417,
                                 -0.50872620321864193, -0.49127379678135802, 0.70699908539882428,
                                 0.70699908539882406, -0.70699908539882439, 0.01745240643728360});
    // ticam = [kappa]_3 [pi/2 - delta]_1 [pi/2 + alpha]_3 with alpha 315, delta 1, kappa 45 deg.
    const EulerSolutions angles =
        solveEuler(read(kFrameMatrix, typed(ticam)), Order::zxz, About::body);
    // 90 + 315 = 405 = 45 deg. The elements are printed to 1e-17; near 89 deg nothing amplifies.
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]), Vector3d(45, 89, 45), 1e-13);
}

TEST(Spice, M2qExampleIsTheTransposeOfOurMatrix)  // m2q, example 1: [90]_3
{
    const Matrix3d M = rows({0, 1, 0, -1, 0, 0, 0, 0, 1});
    const Quaterniond spice(kS, 0, 0, -kS);  // of the same matrix taken for an active one
    EXPECT_QUATERNION_NEAR(read({.kind = Kind::matrix}, typed(M)), spice, 1e-15);
    EXPECT_QUATERNION_NEAR(read(kFrameMatrix, typed(M)), spice.conjugate(), 1e-15);
    EXPECT_GE(read({.kind = Kind::matrix}, typed(M)).w(), 0.0);  // SPICE: scalar part >= 0
}

TEST(Spice, Eul2mExampleTurnsAxesByNinetyAboutThree)  // eul2m, example 2; rotate by pi/4
{
    // Angles 0, 0, pi/2 about axes 1, 1, 3, which is no order of ours: its first two turns are nil.
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyx, {90, 0, 0}).transpose(),
                         rows({0, 1, 0, -1, 0, 0, 0, 0, 1}), 1e-15);
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zyx, {45, 0, 0}).transpose(),
                         rows({kS, kS, 0, -kS, kS, 0, 0, 0, 1}), 1e-15);
}

TEST(Spice, AxisarIsActiveThoughRotateIsNot)  // axisar, example 1
{
    const auto q = poseOfAxisAngle(Vector3d::UnitZ(), kPi / 2);
    ASSERT_TRUE(q);
    EXPECT_ELEMENTS_NEAR(q->toRotationMatrix(), rows({0, -1, 0, 1, 0, 0, 0, 0, 1}), 1e-15);
}

TEST(Spice, RotvecTurnsTheAxesUnderAVector)  // rotvec: (1.414, 0, 0) in axes turned by pi/4 about z
{
    const Quaterniond q_WB = aboutBody(Order::zyx, {45, 0, 0});
    const Vector3d v = q_WB.conjugate() * Vector3d(1.414, 0, 0);
    EXPECT_ELEMENTS_NEAR(v, Vector3d(1, -1, 0), 2e-4);  // printed so; 1.414 is rounded
    EXPECT_ELEMENTS_NEAR(v, Vector3d(0.999848989, -0.999848989, 0), 5e-10);  // derived
}

TEST(Spice, QuaternionUnitsMultiplyAsHamiltonHasThem)  // qxq: i j = k, j k = i, k i = j
{
    const auto unit = [](double x, double y, double z) {
        return hamiltonOf({ScalarPlace::first, Algebra::hamilton, {0, x, y, z}});
    };
    const Quaterniond i = unit(1, 0, 0);
    const Quaterniond j = unit(0, 1, 0);
    const Quaterniond k = unit(0, 0, 1);
    const auto same = [](const Quaterniond& a, const Quaterniond& b) {
        return a.coeffs() == b.coeffs();
    };
    EXPECT_TRUE(same(i * j, k));
    EXPECT_TRUE(same(j * k, i));
    EXPECT_TRUE(same(k * i, j));
    for (const Quaterniond& unitOf : {i, j, k})
        EXPECT_TRUE(same(unitOf * unitOf, Quaterniond(-1, 0, 0, 0)));
}

TEST(Spice, EngineeringStyleIsScalarLastWithTheVectorNegated)  // m2q and q2m headers
{
    const Quaterniond spice = hamiltonOf({ScalarPlace::last, Algebra::jpl, {0.1, 0.2, 0.3, 0.4}});
    EXPECT_TRUE(spice.coeffs() == Quaterniond(0.4, -0.1, -0.2, -0.3).coeffs());
    EXPECT_EQ(numbersOf(spice, ScalarPlace::last, Algebra::jpl).numbers,
              (std::array{0.1, 0.2, 0.3, 0.4}));
}

TEST(Spice, LockGivesTheAngleAppliedFirstEverything)  // m2eul: angle3 = 0 where it is not unique
{
    // [20]_1 [90]_2 [50]_3 for three axes, [20]_3 [0]_1 [50]_3 for a repeated one.
    const Quaterniond cardan =
        read(kFrameMatrix, typed(frameX(20_deg) * frameY(90_deg) * frameZ(50_deg)));
    EXPECT_ELEMENTS_NEAR(
        degreesOf(solveEuler(cardan, Order::zyx, About::body, 30_deg).solutions[0]),
        Vector3d(30, 90, 0), 1e-8);  // common tolerance at a lock: only the sum is well determined
    const Quaterniond euler = read(kFrameMatrix, typed(frameZ(20_deg) * frameZ(50_deg)));
    EXPECT_ELEMENTS_NEAR(degreesOf(solveEuler(euler, Order::zxz, About::body, 70_deg).solutions[0]),
                         Vector3d(70, 0, 0), 1e-8);
}

/// Schaub's [BN] of 3-2-1 angles in degrees.
Matrix3d schaub321(double yaw, double pitch, double roll)
{
    return matrixAboutBody(Order::zyx, {yaw, pitch, roll}).transpose();
}

// Half the last of six printed digits.
constexpr double kSixDigits = 5.1e-7;  // and the rounding of the printed half

TEST(Schaub, AttitudeMatricesOfThreeTwoOne)
{
    EXPECT_ELEMENTS_NEAR(schaub321(30, -45, 60),
                         rows({0.612372, 0.353553, 0.707107, -0.780330, 0.126826, 0.612372,
                               0.126826, -0.926777, 0.353553}),
                         kSixDigits);
    EXPECT_ELEMENTS_NEAR(schaub321(10, 25, -15),
                         rows({0.892539, 0.157379, -0.422618, -0.275451, 0.932257, -0.234570,
                               0.357073, 0.325773, 0.875426}),
                         kSixDigits);
}

TEST(Schaub, RelativeAttitudeIsOneMatrixTimesTheTransposeOfTheOther)
{
    // [BF] = [BN] [FN]^T; so q_FB = q_FN q_NB.
    const Quaterniond q_NB = aboutBody(Order::zyx, {30, -45, 60});
    const Quaterniond q_NF = aboutBody(Order::zyx, {10, 25, -15});
    const Quaterniond q_FB = q_NF.conjugate() * q_NB;
    EXPECT_ELEMENTS_NEAR(q_FB.toRotationMatrix().transpose(),
                         rows({0.303372, -0.0049418, 0.952859, -0.935315, 0.1895340, 0.298769,
                               -0.182075, -0.9818620, 0.052877}),
                         kSixDigits);
    const EulerSolutions angles = solveEuler(q_FB, Order::zyx, About::body);
    // The third is printed one unit high in its last digit: 79.963547 is what it comes to.
    EXPECT_ELEMENTS_NEAR(degreesOf(angles.solutions[0]), Vector3d(-0.933242, -72.3373, 79.9636),
                         1e-4);
}

TEST(Schaub, PrincipalRotationOfTheSecondMatrix)
{
    const AxisAngle turn = axisAngleOf(aboutBody(Order::zyx, {10, 25, -15}));
    EXPECT_NEAR(toDegrees(turn.angle), 31.7762, 5e-5);
    EXPECT_ELEMENTS_NEAR(turn.axis, Vector3d(-0.532035, 0.740302, 0.410964), kSixDigits);
}

TEST(Schaub, EulerParametersOfAFrameMatrixAreOurQuaternion)
{
    // The q-method's answer, taken as a given attitude: [BN] = R(q)^T, so q is our q_NB.
    const Quaterniond printed(0.9481, -0.1172, 0.1414, 0.2597);
    const Quaterniond q =
        read({.kind = Kind::quaternion}, {printed.w(), printed.x(), printed.y(), printed.z()});
    // Of the same data: inertial x and z as observed in body axes. They subtend 90 deg less their
    // scalar product, and equal weights share that misfit evenly (derived; four digits printed).
    const Vector3d x_B(0.8190, -0.5282, 0.2242);
    const Vector3d z_B(-0.3138, -0.1584, 0.9362);
    const double share = x_B.dot(z_B) / 2.0;  // rad
    EXPECT_NEAR((q.conjugate() * Vector3d::UnitX() - x_B).norm(), share, 2e-4);
    EXPECT_NEAR((q.conjugate() * Vector3d::UnitZ() - z_B).norm(), share, 2e-4);
}

}  // namespace
