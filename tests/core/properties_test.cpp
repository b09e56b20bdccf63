// SPDX-License-Identifier: GPL-3.0-or-later
// Laws that must hold for every pose, tried on generated ones: RapidCheck shrinks what breaks them.
#include <cmath>

#include <Eigen/SVD>
#include <rapidcheck.h>

#include "rotcore/chain/chain.h"
#include "rotcore/lock/gauge.h"
#include "rotcore/lock/rates.h"
#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/quaternion.h"
#include "rotcore/rotation/rodrigues.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;
using tests::poseDistance;

constexpr double kRoundTrip = 4e-15;  // rad; the core's stated limit

rc::Gen<double> angles()
{
    return rc::gen::map(rc::gen::inRange<std::int64_t>(-3141592653589793, 3141592653589794),
                        [](std::int64_t n) { return static_cast<double>(n) * 1e-15; });
}

// A middle angle anywhere, or at a lock of either family of orders, or 1e-16 ... 1e-3 from one.
rc::Gen<double> middleAngles()
{
    const auto nearLock =
        rc::gen::apply([](double lock, int exponent,
                          double factor) { return lock + factor * std::pow(10.0, exponent); },
                       rc::gen::element(0.0, kPi / 2, -kPi / 2, kPi, -kPi),
                       rc::gen::inRange(-16, -2), rc::gen::element(-1.0, 0.0, 1.0, 0.3));
    return rc::gen::oneOf(angles(), nearLock);
}

EulerAngles anyEuler()
{
    return {*rc::gen::elementOf(std::vector<Order>(kAllOrders.begin(), kAllOrders.end())),
            *rc::gen::element(About::body, About::space),
            {*angles(), *middleAngles(), *angles()}};
}

// At half turns and at zero rotation vectors and their kin are singular: poses there and close to
// there.
Quaterniond anyPose()
{
    const double angle = *middleAngles();
    const Eigen::Vector3d axis(*angles(), *angles(), *angles());
    RC_PRE(axis.norm() > 1e-6);
    const Quaterniond turn = *poseOfAxisAngle(axis, angle);
    return *rc::gen::arbitrary<bool>() ? turn : (turn * pose(anyEuler())).normalized();
}

void holds(const char* law, void (*property)())
{
    EXPECT_TRUE(rc::check(law, property));
}

TEST(Properties, AnglesOfAPoseGiveThePose)
{
    holds("both solutions rebuild the pose, at lock too", [] {
        const EulerAngles euler = anyEuler();
        const Quaterniond q = pose(euler).normalized();
        for (const EulerAngles& solution :
             solveEuler(q, euler.order, euler.about, *angles()).solutions)
            RC_ASSERT(poseDistance(pose(solution), q) <= kRoundTrip);
    });
}

TEST(Properties, EveryRepresentationRoundTrips)
{
    holds("quaternion, matrix, rotation vector and modified Rodrigues come back", [] {
        const Quaterniond q = anyPose();
        RC_ASSERT(poseDistance(*quaternionFrom(q.toRotationMatrix()), q) <= kRoundTrip);
        RC_ASSERT(poseDistance(*poseOfRotationVector(rotationVectorOf(q)), q) <= kRoundTrip);
        RC_ASSERT(poseDistance(*poseOfModifiedRodrigues(modifiedRodriguesOf(q).principal), q) <=
                  kRoundTrip);
        if (const auto gibbs = gibbsVectorOf(q))
            RC_ASSERT(poseDistance(*poseOfGibbsVector(*gibbs), q) <= kRoundTrip);
    });
}

TEST(Properties, QuaternionsComposeAsMatricesDo)
{
    holds("R(p q) = R(p) R(q) and R(q*) = R(q)^T", [] {
        const Quaterniond p = anyPose();
        const Quaterniond q = anyPose();
        const Eigen::Matrix3d product = p.toRotationMatrix() * q.toRotationMatrix();
        RC_ASSERT(tests::largestDifference((p * q).toRotationMatrix(), product) <= 3e-15);
        RC_ASSERT(tests::largestDifference(q.conjugate().toRotationMatrix(),
                                           q.toRotationMatrix().transpose()) <= 1e-15);
    });
}

TEST(Properties, GaugeIsTheSingularValueDecompositionOfTheRates)
{
    holds("closed form against JacobiSVD", [] {
        const EulerAngles euler = anyEuler();
        const LockGauge gauge = gaugeLock(pose(euler).normalized(), euler);
        const Eigen::JacobiSVD<Eigen::Matrix3d> svd(rateMatrixBody(euler));
        RC_ASSERT((svd.singularValues() - gauge.singularValues).norm() <= 4e-15);
        RC_ASSERT(std::abs(gauge.lostDirectionBody.norm() - 1.0) <= 1e-15);
        // The worst direction costs what the gauge says: |J^T lost| is the smallest singular value.
        const double cost = (rateMatrixBody(euler).transpose() * gauge.lostDirectionBody).norm();
        RC_ASSERT(std::abs(cost - gauge.singularValues[2]) <= 3e-15);
    });
}

TEST(Properties, ChainThenItsInverseIsNoTurn)
{
    holds("pose(inverse(chain)) is the inverse pose", [] {
        Chain chain;
        const int turns = *rc::gen::inRange(0, 12);
        for (int n = 0; n < turns; ++n) {
            Turn turn{.axis = {*angles(), *angles(), *angles()},
                      .angle = *middleAngles(),
                      .about = *rc::gen::element(About::body, About::space),
                      .muted = *rc::gen::inRange(0, 5) == 0};
            RC_PRE(turn.axis.norm() > 1e-6);
            chain.push_back(turn);
        }
        // Up to 24 products of about 4e-16 each.
        RC_ASSERT(poseDistance(*pose(inverse(chain)), pose(chain)->conjugate()) <= 1e-14);
    });
}

TEST(Properties, SignContinuityNeverJumps)
{
    holds("of q and -q the nearer is chosen, and both are one pose", [] {
        const Quaterniond previous = anyPose();
        const Quaterniond q = anyPose();
        const Quaterniond chosen = continued(q, previous);
        RC_ASSERT(chosen.dot(previous) >= 0.0);
        RC_ASSERT(poseDistance(chosen, q) == 0.0);
    });
}

}  // namespace
