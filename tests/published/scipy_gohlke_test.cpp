// SPDX-License-Identifier: GPL-3.0-or-later
// Against printed values of SciPy 1.10.1 (docstrings and tests of spatial.transform.Rotation, seen
// and run again) and of C. Gohlke's transformations 2026.1.18 (doctests, seen; transforms3d 0.4 has
// the same). SciPy is active, quaternions x, y, z, w; capitals are about body, small letters about
// space. Gohlke's are w, x, y, z and radians; 's' is about space, 'r' about body.
//
// Left for when the product averages and interpolates: SciPy's chordal mean and slerp examples.
#include <cmath>

#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/quaternion.h"
#include "rotcore/rotation/rodrigues.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

const Reading kXyzw{.kind = Kind::quaternion, .scalar = ScalarPlace::last};

// Half the last of eight printed decimals.
constexpr double kEight = 5.001e-9;

TEST(ScipyPrinted, IntrinsicZxy)  // from_euler('ZXY', [30, 60, 45]); seven decimals
{
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zxy, {30, 60, 45}),
                         rows({0.3061862, -0.25, 0.9185587, 0.8838835, 0.4330127, -0.1767767,
                               -0.3535534, 0.8660254, 0.3535534}),
                         5.001e-8);
}

TEST(ScipyPrinted, IntrinsicZxz)  // 'ZXZ'
{
    EXPECT_ELEMENTS_NEAR(matrixAboutBody(Order::zxz, {30, 60, 45}),
                         rows({0.43559574, -0.78914913, 0.4330127, 0.65973961, -0.04736717, -0.75,
                               0.61237244, 0.61237244, 0.5}),
                         kEight);
}

TEST(ScipyPrinted, ExtrinsicZxy)  // 'zxy'
{
    EXPECT_ELEMENTS_NEAR(aboutSpace(Order::zxy, {30, 60, 45}).toRotationMatrix(),
                         rows({0.91855865, 0.1767767, 0.35355339, 0.25, 0.4330127, -0.8660254,
                               -0.30618622, 0.88388348, 0.35355339}),
                         kEight);
}

TEST(ScipyPrinted, ExtrinsicZxz)  // 'zxz'
{
    EXPECT_ELEMENTS_NEAR(aboutSpace(Order::zxz, {30, 60, 45}).toRotationMatrix(),
                         rows({0.43559574, -0.65973961, 0.61237244, 0.78914913, -0.04736717,
                               -0.61237244, 0.4330127, 0.75, 0.5}),
                         kEight);
}

TEST(ScipyPrinted, ExtrinsicZyxQuaternionAndWhatItDoesToAVector)
{
    const Quaterniond q_WB = aboutSpace(Order::zyx, {45, 60, 30});
    EXPECT_QUATERNION_NEAR(q_WB, fromXyzw({0.39190384, 0.36042341, 0.43967974, 0.72331741}),
                           kEight);
    EXPECT_ELEMENTS_NEAR(q_WB * Vector3d(1, 2, 3), Vector3d(2.24452282, 0.78093109, 2.89002836),
                         kEight);
}

TEST(ScipyPrinted, TwoAxisYxIsAThirdOfATurnAboutADiagonal)  // 'YX', [-90, -90]
{
    const Quaterniond q_WB = aboutBody(Order::yxz, {-90, -90, 0});
    EXPECT_ELEMENTS_NEAR(inDegrees(rotationVectorOf(q_WB)), Vector3d::Constant(-69.2820323),
                         5.001e-8);
    EXPECT_NEAR(toDegrees(axisAngleOf(q_WB).angle), 120.0, 1e-12);  // by hand
}

TEST(ScipyPrinted, QuaternionsNeedNotBeOfUnitLength)  // from_quat([1, 2, 3, 4]); derived, exact
{
    EXPECT_ELEMENTS_NEAR(read(kXyzw, {1, 2, 3, 4}).toRotationMatrix(),
                         rows({0.4, -2, 2.2, 2.8, 1, 0.4, -1, 2, 2}) / 3.0, 1e-15);
}

TEST(ScipyPrinted, RotationVectorAndModifiedRodriguesParameters)  // from_quat([1, 2, -3, 2])
{
    const Quaterniond q_WB = read(kXyzw, {1, 2, -3, 2});
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(q_WB), Vector3d(0.5772381, 1.1544763, -1.7317144),
                         5.001e-8);
    EXPECT_ELEMENTS_NEAR(modifiedRodriguesOf(q_WB).principal,
                         Vector3d(0.16018862, 0.32037724, -0.48056586), kEight);
}

TEST(ScipyPrinted, ParametersOfTheLongWayRound)  // from_mrp([1, 2, 2]) -> [.2, .4, .4, -.8]
{
    const auto q_WB = poseOfModifiedRodrigues({1, 2, 2});
    ASSERT_TRUE(q_WB);
    EXPECT_QUATERNION_NEAR(*q_WB, fromXyzw({0.2, 0.4, 0.4, -0.8}), 1e-15);
    const ModifiedRodrigues both = modifiedRodriguesOf(*q_WB);
    ASSERT_TRUE(both.shadow);
    EXPECT_ELEMENTS_NEAR(*both.shadow, Vector3d(1, 2, 2), 1e-14);
}

TEST(ScipyPrinted, ProductAppliesTheRightFactorFirst)  // p = 90 about z, q = 45 about x; p * q
{
    EXPECT_QUATERNION_NEAR(turnAbout(Axis::z, 90_deg) * turnAbout(Axis::x, 45_deg),
                           fromXyzw({0.27059805, 0.27059805, 0.65328148, 0.65328148}), kEight);
    EXPECT_QUATERNION_NEAR(aboutSpace(Order::xyz, {45, 0, 90}),
                           fromXyzw({0.27059805, 0.27059805, 0.65328148, 0.65328148}), kEight);
}

TEST(ScipyPrinted, HalvedQuarterTurnIsRefusedAndItsNearestRotationIsTheQuarterTurn)
{
    // from_matrix of 0.5 Rz(90), docstring: SciPy 1.10.1 answers 112.62 deg, for its formula takes
    // the matrix for nearly orthogonal. The nearest rotation, by hand, is Rz(90).
    const Matrix3d quarter = rows({0, -1, 0, 1, 0, 0, 0, 0, 1});
    const Matrix3d scipy = rows({-0.38461538, -0.92307692, 0, 0.92307692, -0.38461538, 0, 0, 0, 1});
    EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(0.5 * quarter)), Fault::Kind::notOrthonormal);
    EXPECT_ELEMENTS_NEAR(nearestRotation(0.5 * quarter), quarter, 1e-15);
    EXPECT_GT((nearestRotation(0.5 * quarter) - scipy).norm(), 0.5);
    const auto check = checkMatrix(0.5 * quarter);
    ASSERT_TRUE(check);
    ASSERT_FALSE(check->causes.empty());
    EXPECT_EQ(check->causes.front().kind, MatrixCause::Kind::scaled);
    EXPECT_ELEMENTS_NEAR(check->causes.front().factors, Vector3d::Constant(0.5), 1e-15);
}

TEST(ScipyPrinted, RangesOfAnglesAreThoseOfOurFirstSolution)  // as_euler's docstring
{
    std::mt19937_64 generator(1101);
    for (int n = 0; n < 2000; ++n) {
        const Quaterniond q_WB = tests::randomPose(generator);
        for (const Order order : kAllOrders) {
            const Vector3d degrees = degreesOf(solveEuler(q_WB, order, About::space).solutions[0]);
            EXPECT_LE(std::abs(degrees[0]), 180.0);
            EXPECT_LE(std::abs(degrees[2]), 180.0);
            EXPECT_LE(std::abs(degrees[1] - (isRepeating(order) ? 90.0 : 0.0)), 90.0);
        }
    }
}

TEST(ScipyPrinted, AtLockTheThirdAngleIsZero)  // as_euler's docstring, and a warning
{
    // About body the third is the inner one: the member of the family whose outer angle is all.
    const EulerSolutions body =
        solveEuler(aboutBody(Order::zyx, {50, 90, 20}), Order::zyx, About::body, 30_deg);
    EXPECT_ELEMENTS_NEAR(degreesOf(body.solutions[0]), Vector3d(30, 90, 0), 1e-8);
    // About space it is the outer one, kept at zero.
    const EulerSolutions space =
        solveEuler(aboutBody(Order::zyx, {50, 90, 20}), Order::xyz, About::space);
    EXPECT_ELEMENTS_NEAR(degreesOf(space.solutions[0]), Vector3d(-30, 90, 0), 1e-8);
}

TEST(ScipyPrinted, VectorsGoThereAndBack)  // 'zxy', [45, 30, 60] applied to (1, 0, -1), and inverse
{
    const Quaterniond q_WB = aboutSpace(Order::zxy, {45, 30, 60});
    EXPECT_ELEMENTS_NEAR(q_WB * Vector3d(1, 0, -1), Vector3d(-0.09026039, 1.11237244, -0.86860844),
                         kEight);
    EXPECT_ELEMENTS_NEAR(q_WB.conjugate() * Vector3d(1, 0, -1),
                         Vector3d(1.09533535, -0.8365163, 0.3169873), kEight);
}

TEST(ScipyPrinted, RotationVectorOfFourNumbersWithOneZero)  // from_quat([1, 1, 0, 1])
{
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(read(kXyzw, {1, 1, 0, 1})),
                         Vector3d(1.35102172, 1.35102172, 0), kEight);
}

TEST(Gohlke, ExtrinsicYxzMatrix)  // euler_matrix(1, 2, 3, 'syxz'): the sum of its first row
{
    const Matrix3d R_WB = pose({Order::yxz, About::space, {1, 2, 3}}).toRotationMatrix();
    EXPECT_NEAR(R_WB.row(0).sum(), -1.34786452, 1e-8);
}

TEST(Gohlke, IntrinsicYxzQuaternion)  // quaternion_from_euler(1, 2, 3, 'ryxz'); six decimals
{
    EXPECT_QUATERNION_NEAR(pose({Order::yxz, About::body, {1, 2, 3}}),
                           Quaterniond(0.435953, 0.310622, -0.718287, 0.444435), 5.001e-7);
}

TEST(Gohlke, FlippedProductIsTheHamiltonProductOfSwappedOperands)
{
    // quaternion_multiply of (4; 1, -2, 3) and (8; -5, 6, 7). The flipped product, of the algebra
    // with ij = -k, is the same with its operands exchanged (Sommer et al. 2018, Aerospace 5(3):72,
    // abstract seen).
    const std::array<double, 4> p{4, 1, -2, 3};
    const std::array<double, 4> q{8, -5, 6, 7};
    const auto product = [&](Algebra algebra) {
        const Quaterniond both = hamiltonOf({ScalarPlace::first, algebra, p}) *
                                 hamiltonOf({ScalarPlace::first, algebra, q});
        return numbersOf(both, ScalarPlace::first, algebra).numbers;
    };
    EXPECT_EQ(product(Algebra::hamilton), (std::array<double, 4>{28, -44, -14, 48}));
    EXPECT_EQ(product(Algebra::jpl), (std::array<double, 4>{28, 20, 30, 56}));
}

TEST(Gohlke, JplNumbersTurnTheOtherWay)
{
    // Sola 2017, table of conventions, second-hand: JPL is scalar last, ij = -k, and takes global
    // coordinates to local ones. The numbers of a quarter turn about z, x to y in Hamilton's sense:
    const double s = std::sqrt(0.5);
    const Reading jpl{
        .kind = Kind::quaternion, .scalar = ScalarPlace::last, .algebra = Algebra::jpl};
    EXPECT_ELEMENTS_NEAR(read(jpl, {0, 0, s, s}) * Vector3d::UnitX(), -Vector3d::UnitY(), 1e-15);
    Reading globalToLocal = jpl;
    globalToLocal.direction = Direction::worldToBody;
    EXPECT_POSE_NEAR(read(globalToLocal, {0, 0, s, s}), read(kXyzw, {0, 0, s, s}), kPoseRounding);
}

TEST(Gohlke, RotationOfThreeDecimalsIsBroughtToTheNearest)
{
    // quaternion_from_matrix with isprecise=False; determinant .99918. Printed to five decimals.
    EXPECT_QUATERNION_NEAR(read({.kind = Kind::matrix}, {-0.545, 0.797, 0.260, 0.733, 0.603, -0.313,
                                                         -0.407, 0.021, -0.913}),
                           Quaterniond(0.19069, 0.43736, 0.87485, -0.083611), 5e-6);
}

TEST(Gohlke, MatrixThreePercentOffIsRefusedAndItsNearestRotationIsThis)
{
    // Another doctest of the same; determinant 1.0060. Three decimals do not explain R R^T - I.
    const Matrix3d M = rows({0.395, 0.362, 0.843, -0.626, 0.796, -0.056, -0.677, -0.498, 0.529});
    EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(M)), Fault::Kind::notOrthonormal);
    const auto q_WB = quaternionFrom(nearestRotation(M));
    ASSERT_TRUE(q_WB);
    EXPECT_QUATERNION_NEAR(*q_WB, Quaterniond(0.82336615, -0.13610694, 0.46344705, -0.29792603),
                           kEight);
}

}  // namespace
