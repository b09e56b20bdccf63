// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/chain/chain.h"

#include <cmath>

#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;
using Eigen::Vector3d;

Quaterniond turn(const Vector3d& axis, double angle)
{
    return Quaterniond(Eigen::AngleAxisd(angle, axis.normalized()));
}

const Vector3d kX = Vector3d::UnitX();
const Vector3d kZ = Vector3d::UnitZ();

TEST(Chain, BodyTurnsMultiplyFromTheRightAndSpaceTurnsFromTheLeft)  // by hand
{
    const Chain body{{.axis = kZ, .angle = 90_deg}, {.axis = kX, .angle = 90_deg}};
    EXPECT_POSE_NEAR(*pose(body), turn(kZ, 90_deg) * turn(kX, 90_deg), 1e-15);
    Chain space = body;
    for (Turn& t : space)
        t.about = About::space;
    EXPECT_POSE_NEAR(*pose(space), turn(kX, 90_deg) * turn(kZ, 90_deg), 1e-15);
    Chain mixed = body;
    mixed.push_back({.axis = Vector3d(1, 2, 3), .angle = 0.7, .about = About::space});
    EXPECT_POSE_NEAR(*pose(mixed),
                     turn(Vector3d(1, 2, 3), 0.7) * turn(kZ, 90_deg) * turn(kX, 90_deg), 1e-15);
}

TEST(Chain, OfEulerAnglesMakesTheirPoseInAll24Conventions)
{
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space}) {
            const EulerAngles euler{order, about, {0.4, -1.3, 2.2}};
            EXPECT_POSE_NEAR(*pose(chainOf(euler)), pose(euler), 2e-15);
        }
}

TEST(Chain, PartialPosesFollowEachTurnAndMutedTurnsDoNothing)
{
    const Chain chain{{.axis = kZ, .angle = 90_deg},
                      {.axis = kX, .angle = 40_deg, .muted = true},
                      {.axis = kX, .angle = 90_deg}};
    const auto partials = partialPoses(chain);
    ASSERT_TRUE(partials);
    ASSERT_EQ(partials->size(), 3U);
    EXPECT_POSE_NEAR((*partials)[0], turn(kZ, 90_deg), 1e-15);
    EXPECT_POSE_NEAR((*partials)[1], turn(kZ, 90_deg), 1e-15);
    EXPECT_POSE_NEAR((*partials)[2], turn(kZ, 90_deg) * turn(kX, 90_deg), 1e-15);
}

TEST(Chain, StartsFromThePoseItIsGiven)
{
    const Quaterniond start = turn(Vector3d(3, -1, 2), 1.0);
    EXPECT_POSE_NEAR(*pose({{.axis = kX, .angle = 0.3}}, start), start * turn(kX, 0.3), 1e-15);
    EXPECT_POSE_NEAR(*pose({}, start), start, 0.0);
}

TEST(Chain, InverseUndoesItWhetherPureOrMixed)
{
    std::mt19937_64 generator(61);
    std::uniform_real_distribution<double> number(-3, 3);
    for (const int kind : {0, 1, 2})
        for (int repeat = 0; repeat < 100; ++repeat) {
            Chain chain;
            for (int n = 0; n < 6; ++n)
                chain.push_back(
                    {.axis = Vector3d(number(generator), number(generator), number(generator)),
                     .angle = number(generator),
                     .about = kind == 0 || (kind == 2 && n % 2 == 0) ? About::body : About::space,
                     .muted = n == 4});
            EXPECT_POSE_NEAR((*pose(chain) * *pose(inverse(chain))).normalized(),
                             Quaterniond::Identity(),
                             5e-15);  // twelve products of about 4e-16 each
        }
    // The everyday form for turns of one kind: backwards and negated.
    const Chain inverted =
        inverse({{.axis = kZ, .angle = 1.0, .name = "slew"}, {.axis = kX, .angle = 2.0}});
    EXPECT_EQ(inverted[0], (Turn{.axis = kX, .angle = -2.0}));
    EXPECT_EQ(inverted[1], (Turn{.axis = kZ, .angle = -1.0, .name = "slew"}));
}

TEST(Chain, StaysOfUnitLengthOverThousandsOfTurns)
{
    const Chain chain(10000, {.axis = Vector3d(1, 1, 1), .angle = 120_deg});
    const auto end = pose(chain);
    ASSERT_TRUE(end);
    // 120 deg as a double is off by up to 2.2e-16 rad, 10000 times, and each product rounds.
    EXPECT_POSE_NEAR(*end, turn(Vector3d(1, 1, 1), 120_deg), 1e-11);
    EXPECT_NEAR(end->norm(), 1.0, 3e-16);
}

TEST(Chain, NamesTheTurnThatIsWrong)
{
    const auto noAxis =
        pose({{.axis = kZ, .angle = 1.0}, {.axis = Vector3d::Zero(), .angle = 1.0}});
    ASSERT_FALSE(noAxis);
    EXPECT_EQ(noAxis.error().kind, Fault::Kind::zeroLength);
    EXPECT_EQ(noAxis.error().message.rfind("turn 2: ", 0), 0U);
    EXPECT_EQ(pose({{.axis = kZ, .angle = NAN}}).error().kind, Fault::Kind::notFinite);
}

}  // namespace
