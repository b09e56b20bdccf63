// SPDX-License-Identifier: GPL-3.0-or-later
// All twelve orders against the tables of the handbooks (handbook_tables.h says whose), and single
// pages of others: Henderson, NASA TM-74839 / JSC-12960 (1977); Diebel, Representing Attitude (20
// Oct 2006); Bunge's matrix as texture analysis has it.
//
// A 321 of the handbooks lists the angle applied first in front and gives world-to-body matrices:
// the transpose of our zyx about body with the same list.
#include "tests/published/handbook_tables.h"

#include <algorithm>
#include <cmath>

#include "rotcore/lock/rates.h"
#include "rotcore/rotation/quaternion.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

/// General triples, radians: each quadrant, and several turns; no two angles alike.
const std::vector<std::array<double, 3>> kTriples{
    {0.5, -0.7, 0.3},  {2.4, 0.4, -2.9}, {-1.9, 1.3, 0.8},   {3.7, -2.6, 1.1},
    {-0.2, 2.1, -1.4}, {6.9, -4.4, 9.2}, {1e-3, 2e-3, -3e-3}};

TEST(HandbookTables, EveryOrderHasARow)
{
    for (const Order order : kAllOrders)
        EXPECT_EQ(std::count_if(kHandbook.begin(), kHandbook.end(),
                                [&](const HandbookRow& row) { return row.order == order; }),
                  1)
            << nameOf(order);
}

TEST(HandbookTables, AttitudeMatricesAreTheTransposesOfOurs)
{
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& angles : kTriples)
            EXPECT_ELEMENTS_NEAR(pose({order, About::body, angles}).toRotationMatrix().transpose(),
                                 attitude(TrigOfThree(angles)), kRounding)
                << nameOf(order);
}

TEST(HandbookTables,
     AboutSpaceIsTheReversedRow)  // common practice: zyx about body is xyz about space
{
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& [a, b, c] : kTriples)
            EXPECT_ELEMENTS_NEAR(
                pose({reversed(order), About::space, {c, b, a}}).toRotationMatrix().transpose(),
                attitude(TrigOfThree({a, b, c})), kRounding)
                << nameOf(order);
}

TEST(HandbookTables, RatesInBodyAxes)
{
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& angles : kTriples)
            EXPECT_ELEMENTS_NEAR(rateMatrixBody({order, About::body, angles}),
                                 rates(TrigOfThree(angles)), kRounding)
                << nameOf(order);
}

TEST(HandbookTables, RatesInWorldAxesAreThoseTurnedByTheAttitude)
{
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& angles : kTriples) {
            const TrigOfThree t(angles);
            EXPECT_ELEMENTS_NEAR(rateMatrixSpace({order, About::body, angles}),
                                 attitude(t).transpose() * rates(t), kRounding)
                << nameOf(order);
        }
}

TEST(HandbookTables, RatesAboutSpaceAreTheReversedColumns)
{
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& [a, b, c] : kTriples)
            EXPECT_ELEMENTS_NEAR(rateMatrixBody({reversed(order), About::space, {c, b, a}}),
                                 Matrix3d(rates(TrigOfThree({a, b, c})).rowwise().reverse()),
                                 kRounding)
                << nameOf(order);
}

TEST(HandbookTables, AngleRatesSolveTheTable)
{
    const Vector3d w_WB_B(0.2, 0.1, -0.5);
    for (const auto& [order, attitude, rates] : kHandbook)
        for (const auto& angles : kTriples) {
            const auto found = angleRates({order, About::body, angles}, w_WB_B);
            ASSERT_TRUE(found) << nameOf(order);
            const Matrix3d table = rates(TrigOfThree(angles));
            // Rounding of the rates, which near lock are as large as they please.
            EXPECT_ELEMENTS_NEAR(table * *found, w_WB_B, kRounding * (1.0 + found->norm()))
                << nameOf(order);
        }
}

/// The twelve tables once more as numbers, at 30, -40, 15 deg: first row [B]^-1, last the rates for
/// w = (0.2, 0.1, -0.5) rad/s, from the test program of Schaub's routines (second-hand).
struct PrintedRates {
    Order order;
    Matrix3d matrix;
    Vector3d rates;  ///< rad/s
};

std::vector<PrintedRates> printedRates()
{
    // clang-format off
    return {
        {Order::xyx, rows({0.76604444311898, 0, 1, -0.16636567534280, 0.96592582628907, 0,
                           -0.62088515301485, -0.25881904510252, 0}),
         {0.7110918159377425, 0.2260021051801672, -0.3447279341464908}},
        {Order::xyz, rows({0.73994211169385, 0.25881904510252, 0,
                           -0.19826689127415, 0.96592582628907, 0, -0.64278760968654, 0, 1}),
         {0.2183988961089258, 0.148356391649411, -0.3596158956119647}},
        {Order::xzx, rows({0.76604444311898, 0, 1, 0.62088515301485, 0.25881904510252, 0,
                           -0.16636567534280, 0.96592582628907, 0}),
         {0.3515968599493992, -0.4570810086342821, -0.06933882078231876}},
        {Order::xzy, rows({0.73994211169385, -0.25881904510252, 0, 0.64278760968654, 0, 1,
                           0.19826689127415, 0.96592582628907, 0}),
         {0.08325318887098565, -0.5347267221650382, 0.04648588172683711}},
        {Order::yxy, rows({-0.16636567534280, 0.96592582628907, 0, 0.76604444311898, 0, 1,
                           0.62088515301485, 0.25881904510252, 0}),
         {-0.8318871025311179, 0.06377564270655334, 0.7372624921963103}},
        {Order::yxz, rows({0.19826689127415, 0.96592582628907, 0,
                           0.73994211169385, -0.25881904510252, 0, 0.64278760968654, 0, 1}),
         {0.1936655150781755, 0.1673032607475616, -0.6244857935158128}},
        {Order::yzx, rows({-0.64278760968654, 0, 1, 0.73994211169385, 0.25881904510252, 0,
                           -0.19826689127415, 0.96592582628907, 0}),
         {0.2950247955066306, -0.4570810086342821, 0.3896382831019671}},
        {Order::yzy, rows({-0.62088515301485, -0.25881904510252, 0, 0.76604444311898, 0, 1,
                           -0.16636567534280, 0.96592582628907, 0}),
         {-0.09921728693192147, -0.5347267221650384, 0.1760048513155397}},
        {Order::zxy, rows({-0.19826689127415, 0.96592582628907, 0, -0.64278760968654, 0, 1,
                           0.73994211169385, 0.25881904510252, 0}),
         {-0.6980361609149971, 0.06377564270655331, -0.3486889953493196}},
        {Order::zxz, rows({-0.16636567534280, 0.96592582628907, 0,
                           -0.62088515301485, -0.25881904510252, 0, 0.76604444311898, 0, 1}),
         {-0.2308015733560238, 0.1673032607475616, -0.3231957372675008}},
        {Order::zyx, rows({0.64278760968654, 0, 1, 0.19826689127415, 0.96592582628907, 0,
                           0.73994211169385, -0.25881904510252, 0}),
         {-0.596676880486542, 0.2260021051801672, 0.5835365057631652}},
        {Order::zyz, rows({0.62088515301485, 0.25881904510252, 0,
                           -0.16636567534280, 0.96592582628907, 0, 0.76604444311898, 0, 1}),
         {0.260277669056422, 0.148356391649411, -0.6993842620486324}},
    };
    // clang-format on
}

TEST(HandbookTables, PrintedRatesOfAllTwelveOrders)
{
    const Vector3d w_WB_B(0.2, 0.1, -0.5);  // rad/s
    for (const auto& [order, matrix, rates] : printedRates()) {
        const EulerAngles euler{order, About::body, {30_deg, -40_deg, 15_deg}};
        EXPECT_ELEMENTS_NEAR(rateMatrixBody(euler), matrix, 5.1e-15) << nameOf(order);
        const auto found = angleRates(euler, w_WB_B);
        ASSERT_TRUE(found);
        EXPECT_ELEMENTS_NEAR(*found, rates, 2e-15) << nameOf(order);  // 16 digits, few roundings
    }
}

TEST(Henderson, QuaternionsOfXyzAndZyx)  // pp., second-hand; half angles
{
    // Active, axes in the order of the matrices: X(t1) Y(t2) Z(t3). The numbers are derived.
    for (const auto& angles : kTriples) {
        const TrigOfThree t({angles[0] / 2, angles[1] / 2, angles[2] / 2});
        const auto& [s1, c1, s2, c2, s3, c3] = t;
        EXPECT_QUATERNION_NEAR(
            pose({Order::xyz, About::body, angles}),
            Quaterniond(-s1 * s2 * s3 + c1 * c2 * c3, s1 * c2 * c3 + s2 * s3 * c1,
                        -s1 * s3 * c2 + s2 * c1 * c3, s1 * s2 * c3 + s3 * c1 * c2),
            kRounding);
        EXPECT_QUATERNION_NEAR(
            pose({Order::zyx, About::body, angles}),
            Quaterniond(s1 * s2 * s3 + c1 * c2 * c3, -s1 * s2 * c3 + s3 * c1 * c2,
                        s1 * s3 * c2 + s2 * c1 * c3, s1 * c2 * c3 - s2 * s3 * c1),
            kRounding);
    }
    EXPECT_QUATERNION_NEAR(aboutBody(Order::xyz, {20, -35, 110}),
                           Quaterniond(0.581492635, -0.147590871, -0.305518198, 0.739419962),
                           5.001e-10);
    EXPECT_QUATERNION_NEAR(aboutBody(Order::zyx, {20, -35, 110}),
                           Quaterniond(0.495945288, 0.799320860, -0.034196674, 0.337572247),
                           5.001e-10);
}

TEST(Diebel, SequencesListTheAngleAppliedLastInFront)  // eqs (449), (459), second-hand
{
    // R321(phi, theta, psi) = F3(phi) F2(theta) F1(psi), world to body: our xyz about body of (psi,
    // theta, phi). His aeroplane's yaw, pitch, roll is therefore (1,2,3).
    for (const auto& [phi, theta, psi] : kTriples) {
        const Matrix3d R321 = frameZ(phi) * frameY(theta) * frameX(psi);
        EXPECT_ELEMENTS_NEAR(
            pose({Order::xyz, About::body, {psi, theta, phi}}).toRotationMatrix().transpose(), R321,
            kRounding);
        const Matrix3d R123 = frameX(phi) * frameY(theta) * frameZ(psi);
        EXPECT_ELEMENTS_NEAR(
            pose({Order::zyx, About::body, {psi, theta, phi}}).toRotationMatrix().transpose(), R123,
            kRounding);
    }
}

TEST(Diebel, RateMatrix453IsOfWorldAxes)  // second-hand; there labelled as body-fixed
{
    for (const auto& [phi, theta, psi] : kTriples) {
        const double ct = std::cos(theta);
        const Matrix3d E = rows({std::sin(theta), 0, 1,                  //
                                 -std::sin(psi) * ct, std::cos(psi), 0,  //
                                 std::cos(psi) * ct, std::sin(psi), 0});
        const EulerAngles euler{Order::xyz, About::body, {psi, theta, phi}};
        EXPECT_ELEMENTS_NEAR(Matrix3d(rateMatrixSpace(euler).rowwise().reverse()), E, kRounding);
        EXPECT_GT((rateMatrixBody(euler).rowwise().reverse() - E).norm(), 1e-3);
        EXPECT_NEAR(E.determinant(), -ct, kRounding);
    }
}

TEST(Bunge, MatrixOfZxz)  // active, about body; as public codes of texture analysis print it, seen
{
    for (const auto& angles : kTriples) {
        const TrigOfThree t(angles);
        const auto& [s1, c1, s2, c2, s3, c3] = t;
        EXPECT_ELEMENTS_NEAR(pose({Order::zxz, About::body, angles}).toRotationMatrix(),
                             rows({c1 * c3 - c2 * s1 * s3, -c1 * s3 - c2 * c3 * s1, s1 * s2,  //
                                   c3 * s1 + c1 * c2 * s3, c1 * c2 * c3 - s1 * s3, -c1 * s2,  //
                                   s2 * s3, c3 * s2, c2}),
                             kRounding);
    }
}

}  // namespace
