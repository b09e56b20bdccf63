// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include <Eigen/LU>
#include <Eigen/SVD>

#include "rotcore/lock/gauge.h"
#include "rotcore/lock/rates.h"
#include "rotcore/rotation/euler_solutions.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;

constexpr std::array<About, 2> kBothAbouts{About::body, About::space};

LockGauge gaugeOf(const EulerAngles& euler)
{
    return gaugeLock(pose(euler), euler);
}

TEST(Rates, ColumnsAreTheVelocitiesThatSmallStepsOfEachAngleGive)
{
    // A second formula: central differences of the pose. Step 1e-5: error 1e-10 / 6 of the third
    // derivative, and rounding 2e-16 / 1e-5.
    constexpr double kStep = 1e-5;
    std::mt19937_64 generator(51);
    std::uniform_real_distribution<double> angle(-3, 3);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts) {
            const EulerAngles euler{
                order, about, {angle(generator), angle(generator), angle(generator)}};
            for (std::size_t n = 0; n < 3; ++n) {
                EulerAngles before = euler;
                EulerAngles after = euler;
                before.angles[n] -= kStep;
                after.angles[n] += kStep;
                const Quaterniond world = pose(after) * pose(before).conjugate();
                const Quaterniond body = pose(before).conjugate() * pose(after);
                const auto rate = [](const Quaterniond& step) {
                    return Vector3d(2.0 * std::atan2(step.vec().norm(), step.w()) *
                                    step.vec().normalized() / (2 * kStep));
                };
                const auto column = static_cast<int>(n);
                EXPECT_NEAR((rateMatrixBody(euler).col(column) - rate(body)).norm(), 0.0, 1e-9);
                EXPECT_NEAR((rateMatrixSpace(euler).col(column) - rate(world)).norm(), 0.0, 1e-9);
            }
        }
}

TEST(Rates, InverseTakesVelocityBackToAngleRates)
{
    std::mt19937_64 generator(52);
    std::uniform_real_distribution<double> angle(-3, 3);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int n = 0; n < 50; ++n) {
                const EulerAngles euler{
                    order, about, {angle(generator), angle(generator), angle(generator)}};
                const Vector3d rates(angle(generator), angle(generator), angle(generator));
                const auto back = angleRates(euler, rateMatrixBody(euler) * rates);
                ASSERT_TRUE(back);
                // Amplified by at most 1/|det J|.
                const double scale = std::abs(rateMatrixBody(euler).determinant());
                EXPECT_NEAR((*back - rates).norm() * scale, 0.0, 2e-14);
            }
    EXPECT_EQ(
        angleRates({Order::zyx, About::body, {1, kPi / 2, 2}}, Vector3d::UnitX()).error().kind,
        Fault::Kind::singular);
}

TEST(LockGauge, AgreesWithANumericSingularValueDecomposition)
{
    std::mt19937_64 generator(53);
    std::uniform_real_distribution<double> angle(-3, 3);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts)
            for (int n = 0; n < 300; ++n) {
                const EulerAngles euler{
                    order, about, {angle(generator), angle(generator), angle(generator)}};
                const LockGauge gauge = gaugeOf(euler);
                const Eigen::JacobiSVD<Matrix3d> svd(rateMatrixBody(euler), Eigen::ComputeFullU);
                EXPECT_NEAR((svd.singularValues() - gauge.singularValues).norm(), 0.0, 4e-15);
                EXPECT_NEAR(std::abs(rateMatrixBody(euler).determinant()), gauge.crowding, 2e-15);
                EXPECT_NEAR(crowding(order, euler.angles[1]), gauge.crowding, 2e-15);
                // The smallest left singular vector, up to sign, is known to 1e-15 over the gap of
                // the values.
                const double gap = gauge.singularValues[1] - gauge.singularValues[2];
                if (gap < 1e-3) continue;
                const double alignment =
                    std::abs(svd.matrixU().col(2).dot(gauge.lostDirectionBody));
                EXPECT_NEAR(alignment, 1.0, 1e-14 / gap);
            }
}

TEST(LockGauge, AmplificationIsOneOverTheSmallestSingularValueDownToTheLastDigits)
{
    for (const double distance : {1e-14, 1e-10, 1e-6, 1e-3, 0.5}) {
        const LockGauge gauge = gaugeOf({Order::zxz, About::body, {0.0, distance, 0.0}});
        EXPECT_NEAR(gauge.distance / distance, 1.0, 1e-15);
        // sqrt(2)/d for small d; the next term is d^2/24 of it.
        EXPECT_NEAR(gauge.amplification * distance / std::sqrt(2.0), 1.0,
                    distance * distance / 20 + 1e-15);
        EXPECT_NEAR(gauge.amplification * gauge.singularValues[2], 1.0, 1e-15);
    }
}

TEST(LockGauge, AtLockItIsInfiniteAndTheLostDirectionIsTheMissingOne)
{
    // zyx, pitch 90 deg, roll 0: rings turn about body y (pitch) and body x (yaw and roll
    // together); by hand the missing direction is body z.
    const LockGauge gauge = gaugeOf({Order::zyx, About::body, {30_deg, 90_deg, 0.0}});
    EXPECT_TRUE(std::isinf(gauge.amplification));
    EXPECT_NEAR(std::abs(gauge.lostDirectionBody.z()), 1.0, 1e-15);
    EXPECT_NEAR(gauge.lostDirectionBody.norm(), 1.0, 1e-15);
    for (const Order order : kAllOrders)
        for (const About about : kBothAbouts) {
            const double lock = isRepeating(order) ? 0.0 : kPi / 2;
            const EulerAngles euler{order, about, {0.3, lock, 1.1}};
            const LockGauge atLock = gaugeOf(euler);
            EXPECT_TRUE(std::isinf(atLock.amplification));
            // No ring turns about it: it is at right angles to all three axes.
            EXPECT_NEAR((rateMatrixBody(euler).transpose() * atLock.lostDirectionBody).norm(), 0.0,
                        1e-15);
            EXPECT_NEAR((rateMatrixSpace(euler).transpose() * atLock.lostDirectionSpace).norm(),
                        0.0, 2e-15);
        }
}

TEST(LockGauge, FarthestFromLockCostsNothingMore)
{
    const LockGauge gauge = gaugeOf({Order::zyx, About::body, {0.3, 0.0, 1.1}});
    EXPECT_NEAR(gauge.amplification, 1.0, 1e-15);
    EXPECT_NEAR(gauge.distance, kPi / 2, 1e-15);
}

TEST(OrderRanking, PutsTheFarthestFromLockFirst)
{
    std::mt19937_64 generator(54);
    for (int n = 0; n < 200; ++n) {
        const Quaterniond q = tests::randomPose(generator);
        for (const About about : kBothAbouts) {
            const auto standings = rankOrders(q, about);
            ASSERT_EQ(standings.size(), 12U);
            for (std::size_t place = 0; place + 1 < 12; ++place)
                EXPECT_GE(standings[place].distance, standings[place + 1].distance);
            for (const OrderStanding& standing : standings) {
                // Against the middle angle, the other way to see the distance.
                const double middle = solveEuler(q, standing.order, about).solutions[0].angles[1];
                EXPECT_NEAR(standing.distance,
                            std::abs(middle - nearestLock(standing.order, middle)), 2e-15);
            }
        }
    }
    // By hand: upright, all different axes are a quarter turn from lock and repeated ones are at
    // it.
    const auto upright = rankOrders(Quaterniond::Identity(), About::body);
    for (std::size_t place = 0; place < 12; ++place)
        EXPECT_EQ(isRepeating(upright[place].order), place >= 6);
}

TEST(Crowding, IsTheVolumeOfRotationsPerVolumeOfAngles)
{
    // Common practice (Haar measure): over the whole range of the middle angle |det J| integrates
    // to 2. The midpoint rule over n steps is off by 2 (pi/n)^2 / 24.
    constexpr int kRows = 400;
    for (const Order order : kAllOrders) {
        double sum = 0.0;
        for (const double value : crowdingProfile(order, kRows))
            sum += value * kPi / kRows;
        EXPECT_NEAR(sum, 2.0, 2 * std::pow(kPi / kRows, 2) / 20);
    }
    EXPECT_TRUE(crowdingProfile(Order::zyx, 0).empty());
}

}  // namespace
