// SPDX-License-Identifier: GPL-3.0-or-later
// All twelve orders, and the vectors of three numbers, against the numbers printed in the test
// program of H. Schaub's routines that go with Schaub & Junkins (second-hand). Its matrices are
// [BN], world to body; its quaternions of angles are ours.
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

/// Sixteen printed digits and the rounding of both sides.
constexpr double kSixteen = 2e-15;

const Reading kFrameMatrix{.kind = Kind::matrix, .direction = Direction::worldToBody};

struct PrintedQuaternion {
    Order order;
    Quaterniond q_NB;
};

TEST(HandbookNumbers, QuaternionsOfOneTripleInAllTwelveOrders)
{
    const std::array<double, 3> angles{0.5746957711326909, -0.7662610281769212, 0.2873478855663454};
    const double w = 0.8426692196316502;
    const double a = 0.3875084824890354;
    const double b = -0.3699741829975614;
    const double c = -0.05352444488005169;
    const std::array<PrintedQuaternion, 12> printed{{
        {Order::xyx, {w, a, b, c}},
        {Order::xyz,
         {0.8954752451958283, 0.2088240806958052, -0.3924414987701519, 0.02250019124496444}},
        {Order::xzx, {w, a, -c, b}},
        {Order::xzy,
         {0.8651365354042408, 0.3114838463640192, 0.2322088466732818, -0.3171681574333834}},
        {Order::yxy, {w, b, a, -c}},
        {Order::yxz,
         {0.8651365354042408, -0.3171681574333834, 0.3114838463640192, 0.2322088466732818}},
        {Order::yzx,
         {0.8954752451958283, 0.02250019124496444, 0.2088240806958052, -0.3924414987701519}},
        {Order::yzy, {w, c, a, b}},
        {Order::zxy,
         {0.8954752451958283, -0.3924414987701519, 0.02250019124496444, 0.2088240806958052}},
        {Order::zxz, {w, b, c, a}},
        {Order::zyx,
         {0.8651365354042408, 0.2322088466732818, -0.3171681574333834, 0.3114838463640192}},
        {Order::zyz, {w, -c, b, a}},
    }};
    for (const auto& [order, q_NB] : printed)
        EXPECT_QUATERNION_NEAR(pose({order, About::body, angles}), q_NB, kSixteen) << nameOf(order);
}

struct PrintedAngles {
    Order order;
    Vector3d radians;
};

// One attitude, as matrix, quaternion and in all orders.
const Matrix3d kBN = rows({-0.506611258027956, -0.05213449187759728, 0.860596902153381,
                           -0.7789950887797505, -0.4000755572346052, -0.4828107291273137,
                           0.3694748772194938, -0.9149981110691346, 0.1620702682281828});
const Quaterniond kNB(0.2526773896521122, 0.4276078901804977, -0.4859180570232927,
                      0.7191587243944733);

TEST(HandbookNumbers, AnglesOfOneAttitudeInAllTwelveOrders)
{
    const std::array<PrintedAngles, 12> printed{{
        {Order::xyx, {-3.081087141428621, 2.102046098550739, -1.127921895439695}},
        {Order::xyz, {1.395488250243478, 0.3784438476398376, 2.147410157986089}},
        {Order::xzx, {1.631301838956069, 2.102046098550739, 0.4428744313552013}},
        {Order::xzy, {-2.262757475208626, 0.8930615653924096, 2.511467464302149}},
        {Order::yxy, {-2.125637903992466, 1.982395614047245, -0.05691616561213509}},
        {Order::yxz, {1.157420789791818, 1.155503238813826, -3.012011225795042}},
        {Order::yzx, {-2.102846464319881, -0.05215813778076988, 1.982990154077466}},
        {Order::yzy, {-0.5548415771975691, 1.982395614047245, -1.627712492407032}},
        {Order::zxy, {2.045248068737305, -0.5038614866151004, -1.384653359078797}},
        {Order::zxz, {0.3837766626244829, 1.408008028147626, 2.082059614484753}},
        {Order::zyx, {-3.039045355374235, -1.036440549977791, -1.246934586231547}},
        {Order::zyz, {-1.187019664170414, 1.408008028147626, -2.630329365899936}},
    }};
    const Quaterniond q_NB = read(kFrameMatrix, typed(kBN));
    EXPECT_QUATERNION_NEAR(q_NB, kNB, kSixteen);
    for (const auto& [order, radians] : printed) {
        const EulerSolutions angles = solveEuler(q_NB, order, About::body);
        // yxz is the nearest to lock, at 24 deg, where an angle moves by 3.4 times the pose.
        EXPECT_ELEMENTS_NEAR(radiansOf(angles.solutions[0]), radians, 1e-14) << nameOf(order);
    }
}

TEST(HandbookNumbers, VectorsOfThatAttitude)
{
    const auto gibbs = gibbsVectorOf(kNB);
    ASSERT_TRUE(gibbs);
    // The Gibbs vector, v/w, has the scalar's rounding magnified by 1/w.
    EXPECT_ELEMENTS_NEAR(*gibbs, Vector3d(1.692307692307693, -1.923076923076923, 2.846153846153846),
                         1e-14);
    EXPECT_ELEMENTS_NEAR(modifiedRodriguesOf(kNB).principal,
                         Vector3d(0.3413551595269481, -0.3879035903715318, 0.5740973137498672),
                         kSixteen);
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(kNB),
                         Vector3d(1.162634795241009, -1.321175903682964, 1.955340337450788),
                         kSixteen);
}

TEST(HandbookNumbers, GibbsVectorToAttitude)
{
    const auto q_NB =
        poseOfGibbsVector({0.5746957711326909, -0.7662610281769212, 0.2873478855663454});
    ASSERT_TRUE(q_NB);
    EXPECT_QUATERNION_NEAR(*q_NB,
                           Quaterniond(0.7071067811865475, 0.4063712768871578, -0.5418283691828771,
                                       0.2031856384435789),
                           kSixteen);
    EXPECT_ELEMENTS_NEAR(q_NB->toRotationMatrix().transpose(),
                         rows({0.3302752293577981, -0.1530190869107189, 0.9313986428558203,
                               -0.7277148580434096, 0.5871559633027522, 0.3545122848941588,
                               -0.6011234134980221, -0.794879257371223, 0.08256880733944938}),
                         kSixteen);
}

TEST(HandbookNumbers, ModifiedRodriguesParametersToAttitudeAndShadow)
{
    const auto q_NB = poseOfModifiedRodrigues({0.2, -0.25, 0.3});
    ASSERT_TRUE(q_NB);
    EXPECT_QUATERNION_NEAR(
        *q_NB,
        Quaterniond(0.6771488469601677, 0.3354297693920336, -0.419287211740042, 0.5031446540880503),
        kSixteen);
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(*q_NB),
                         Vector3d(0.7538859486650076, -0.9423574358312593, 1.130828922997511),
                         kSixteen);
    const ModifiedRodrigues both = modifiedRodriguesOf(*q_NB);
    EXPECT_ELEMENTS_NEAR(both.principal, Vector3d(0.2, -0.25, 0.3), kSixteen);
    ASSERT_TRUE(both.shadow);
    EXPECT_ELEMENTS_NEAR(*both.shadow,
                         Vector3d(-1.038961038961039, 1.298701298701299, -1.558441558441558),
                         1e-14);  // divided by a square of 0.19
}

TEST(HandbookNumbers, RotationVectorToAttitude)
{
    const auto q_NB = poseOfRotationVector({0.2, -0.25, 0.3});
    ASSERT_TRUE(q_NB);
    EXPECT_QUATERNION_NEAR(*q_NB,
                           Quaterniond(0.9760338459808767, 0.09919984446969178, -0.1239998055871147,
                                       0.1487997667045377),
                           kSixteen);
    EXPECT_ELEMENTS_NEAR(q_NB->toRotationMatrix().transpose(),
                         rows({0.9249653552860658, 0.2658656942983466, 0.2715778417245783,
                               -0.3150687400124018, 0.9360360405717283, 0.1567425271513747,
                               -0.212534186867712, -0.2305470957224576, 0.9495668781430935}),
                         kSixteen);
}

TEST(HandbookNumbers, HalfTurnsHaveRotationVectorsOfLengthPi)
{
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(read(kFrameMatrix, {-1, 0, 0, 0, -1, 0, 0, 0, 1})),
                         Vector3d(0, 0, kPi), 0.0);
    const auto q = poseOfModifiedRodrigues({1, 0, 0});
    ASSERT_TRUE(q);
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(*q), Vector3d(kPi, 0, 0), 1e-15);
}

TEST(HandbookNumbers,
     RelativeEulerParameters)  // subEP: what is left of one attitude beyond another
{
    // [BN](d) = [BN](q) [BN](p)^T, so the quaternion of the difference is q_p^-1 q_q in our order.
    const Quaterniond q = read({.kind = Kind::quaternion}, {0.45226701686665, 0.75377836144441,
                                                            0.15075567228888, 0.45226701686665});
    const Quaterniond p = read({.kind = Kind::quaternion}, {-0.18663083698528, 0.46657709246321,
                                                            0.83983876643378, -0.20529392068381});
    EXPECT_QUATERNION_NEAR(p.conjugate() * q,
                           Quaterniond(0.3010515331052196, -0.762476312817895, -0.0422034859493331,
                                       0.5711538431809339),
                           1e-13);  // the operands are printed to 14 decimals
}

}  // namespace
