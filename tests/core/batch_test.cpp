// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/batch.h"

#include <cmath>
#include <limits>
#include <span>
#include <vector>

#include <Eigen/Geometry>
#include <gtest/gtest.h>

#include "tests/core/batch_columns.h"

namespace rotcore::batch_test {
namespace {

using Eigen::Vector3d;

constexpr double kInfinity = std::numeric_limits<double>::infinity();

TEST(Batch, BestVectorUnitIsTheWidestOfThoseThereAre)
{
    EXPECT_TRUE(hasVectorUnit(VectorUnit::scalar));
    EXPECT_EQ(bestVectorUnit(), unitsHere().back());
}

TEST(BatchPoses, QuarterTurnAboutZCarriesBodyXToWorldY)  // by hand
{
    for (const VectorUnit unit : unitsHere()) {
        const Quaterniond q_WB =
            posesFor({{kPi / 2, 0.0, 0.0}}, {Order::zyx, About::body}, unit)[0];
        EXPECT_NEAR((q_WB * Vector3d::UnitX() - Vector3d::UnitY()).norm(), 0.0, 1e-15)
            << nameOf(unit);  // a few roundings near 1
    }
}

TEST(BatchPoses, AboutSpaceTheLastListedTurnActsLast)  // by hand: x to y about z, then to z about x
{
    for (const VectorUnit unit : unitsHere()) {
        const std::vector<Triple> turns{{kPi / 2, 0.0, kPi / 2}};
        const Quaterniond q_WB = posesFor(turns, {Order::zyx, About::space}, unit)[0];
        EXPECT_NEAR((q_WB * Vector3d::UnitX() - Vector3d::UnitZ()).norm(), 0.0, 1e-15)
            << nameOf(unit);  // a few roundings near 1
    }
}

// W3C, Device Orientation and Motion: turns about the carried axes z, x, y.
TEST(BatchPoses, AgreeWithThePublishedDeviceOrientation)
{
    const Quaterniond published(0.723317411, 0.360423406, 0.439679740, 0.391903837);
    for (const VectorUnit unit : unitsHere()) {
        const Quaterniond q_WB =
            posesFor({{30.0, 60.0, 45.0}}, {Order::zxy, About::body}, unit, AngleUnit::degrees)[0];
        EXPECT_LE(farthest(q_WB, published), 1e-9) << nameOf(unit);  // nine decimals are given
    }
}

TEST(BatchPoses, LargeAngleChangesNoBitOfItsNeighbours)
{
    const Convention convention{Order::zyx, About::body};
    const std::vector<Triple> triples = randomTriples();
    for (const VectorUnit unit : unitsHere()) {
        const std::vector<Quaterniond> before = posesFor(triples, convention, unit);
        std::vector<Triple> mixed = triples;
        for (std::size_t row = 0; row < mixed.size(); row += 5)
            mixed[row][row % 3] = row % 2 == 0 ? 100.0 : 1e18;
        const std::vector<Quaterniond> found = posesFor(mixed, convention, unit);
        for (std::size_t row = 0; row < mixed.size(); ++row) {
            if (row % 5 == 0) continue;
            ASSERT_TRUE(sameBits(found[row], before[row])) << nameOf(unit) << ", row " << row;
        }
    }
}

TEST(BatchAngles, QuarterTurnAboutTheMiddleAxisKeepsTheOuterAngleAtZero)  // by hand: lock
{
    const double half = std::sqrt(0.5);
    // A turn of 30 deg about z, then 90 deg about the carried y.
    const Quaterniond q_WB = Quaterniond(std::cos(kPi / 12), 0.0, 0.0, std::sin(kPi / 12)) *
                             Quaterniond(half, 0.0, half, 0.0);
    for (const VectorUnit unit : unitsHere()) {
        const Triple body = anglesFor({q_WB}, {Order::zyx, About::body}, unit)[0];
        EXPECT_EQ(body[0], 0.0) << nameOf(unit);
        EXPECT_EQ(body[1], kPi / 2) << nameOf(unit);
        EXPECT_NEAR(body[2], -kPi / 6, kAngleTolerance) << nameOf(unit);
        const Triple space = anglesFor({q_WB}, {Order::xyz, About::space}, unit)[0];
        EXPECT_EQ(space[2], 0.0) << nameOf(unit);
        EXPECT_EQ(space[1], kPi / 2) << nameOf(unit);
        EXPECT_NEAR(space[0], -kPi / 6, kAngleTolerance) << nameOf(unit);
    }
}

TEST(BatchAngles, HalfTurnIsExactlyPlus180Degrees)  // by hand, of either sign
{
    for (const VectorUnit unit : unitsHere())
        for (const Quaterniond& q_WB : {Quaterniond(0, 0, 0, 1), Quaterniond(0, 0, 0, -1),
                                        Quaterniond(-0.0, 0, 0, 1), Quaterniond(-0.0, 0, 0, -1)}) {
            const Convention convention{Order::zyx, About::body};
            const Triple angles = anglesFor({q_WB}, convention, unit, AngleUnit::degrees)[0];
            EXPECT_EQ(angles, (Triple{180.0, 0.0, 0.0})) << nameOf(unit);
        }
}

TEST(BatchAngles, PairTooSmallToBeSquaredIsAtLock)  // 1e-160 squared is zero in a double
{
    for (const VectorUnit unit : unitsHere()) {
        const Convention convention{Order::zxz, About::body};
        const auto found = anglesFor({{1.0, 1e-160, 1e-160, 0.0},  // next to none
                                      {1e-160, 1.0, 0.0, 1e-160},  // next to a half turn about x
                                      {0.0, 0.6, 0.8, -1e-200}},   // about an axis tilted from x
                                     convention, unit);
        EXPECT_EQ(found[0], (Triple{0.0, 0.0, 0.0})) << nameOf(unit);
        EXPECT_EQ(found[1], (Triple{0.0, kPi, 0.0})) << nameOf(unit);
        EXPECT_EQ(found[2][0], 0.0) << nameOf(unit);
        EXPECT_EQ(found[2][1], kPi) << nameOf(unit);
        EXPECT_NEAR(found[2][2], -2.0 * std::atan2(0.8, 0.6), kAngleTolerance) << nameOf(unit);
    }
}

TEST(BatchAngles, CommonFactorDoesNoHarm)  // a power of two changes no digit
{
    for (const Convention& convention : allConventions()) {
        const std::vector<Quaterniond> poses = singularPoses(convention);
        for (const double factor : {std::ldexp(1.0, 332), std::ldexp(1.0, -332)}) {  // 1e100
            std::vector<Quaterniond> scaled;
            scaled.reserve(poses.size());
            for (const Quaterniond& q : poses)
                scaled.emplace_back(factor * q.coeffs());
            for (const VectorUnit unit : unitsHere()) {
                const auto expected = anglesFor(poses, convention, unit);
                const auto found = anglesFor(scaled, convention, unit);
                for (std::size_t row = 0; row < poses.size(); ++row)
                    ASSERT_TRUE(sameBits(found[row], expected[row]))
                        << wordsOf(convention, unit) << ", row " << row;
            }
        }
    }
}

// Columns of every length from 0 up, each a part of a longer one whose other rows are watched.
TEST(Batch, RowHasTheSameBitsInAColumnOfAnyLengthAndNothingElseIsWritten)
{
    constexpr std::size_t kMost = 19;  // two of the widest blocks and a rest
    constexpr double kUntouched = 77.0;
    const Convention convention{Order::xzy, About::space};
    const std::vector<Quaterniond> sweep = poseSweep(convention);
    for (const VectorUnit unit : unitsHere())
        for (std::size_t rows = 0; rows <= kMost; ++rows) {
            Poses in({sweep.begin(), sweep.begin() + kMost});
            Angles out({kMost, Triple{kUntouched, kUntouched, kUntouched}});
            Poses back({kMost, Quaterniond(kUntouched, kUntouched, kUntouched, kUntouched)});
            const auto part = [rows](std::vector<double>& all) {
                return std::span(all).first(rows);
            };
            anglesOf(convention.order, convention.about,
                     QuaternionColumns{part(in.w), part(in.x), part(in.y), part(in.z)},
                     {part(out.a), part(out.b), part(out.c)}, AngleUnit::radians, unit);
            posesOf(convention.order, convention.about,
                    EulerColumns{part(out.a), part(out.b), part(out.c)},
                    {part(back.w), part(back.x), part(back.y), part(back.z)}, AngleUnit::radians,
                    unit);
            for (std::size_t row = 0; row < kMost; ++row) {
                Triple angles{kUntouched, kUntouched, kUntouched};
                Quaterniond q(kUntouched, kUntouched, kUntouched, kUntouched);
                if (row < rows) {
                    angles = anglesFor({sweep[row]}, convention, unit)[0];
                    q = posesFor({angles}, convention, unit)[0];
                }
                EXPECT_TRUE(sameBits(out.row(row), angles)) << rows << " rows, row " << row;
                EXPECT_TRUE(sameBits(back.row(row), q)) << rows << " rows, row " << row;
            }
        }
}

TEST(BatchPoses, AngleThatIsNotFiniteSpoilsItsOwnRowOnly)
{
    const std::vector<Triple> whole(8, Triple{0.1, 0.7, -2.0});  // one block of the widest unit
    for (const Convention& convention : allConventions())
        for (const VectorUnit unit : unitsHere()) {
            const Quaterniond unspoilt = posesFor(whole, convention, unit)[0];
            for (const double bad : {kNan, kInfinity, -kInfinity})
                for (std::size_t at = 0; at < 3 * whole.size(); ++at) {
                    std::vector<Triple> triples = whole;
                    triples[at / 3][at % 3] = bad;
                    const std::vector<Quaterniond> found = posesFor(triples, convention, unit);
                    for (std::size_t row = 0; row < whole.size(); ++row)
                        EXPECT_TRUE(row == at / 3 ? found[row].coeffs().array().isNaN().all()
                                                  : sameBits(found[row], unspoilt))
                            << wordsOf(convention, unit) << ", row " << row;
                }
        }
}

TEST(BatchAngles, ComponentThatIsNotFiniteSpoilsItsOwnRowOnly)
{
    const std::vector<Quaterniond> whole(8, Quaterniond(0.1, -0.5, 0.7, 0.5));
    for (const Convention& convention : allConventions())
        for (const VectorUnit unit : unitsHere()) {
            const Triple unspoilt = anglesFor(whole, convention, unit)[0];
            for (const double bad : {kNan, kInfinity, -kInfinity})
                for (std::size_t at = 0; at < 4 * whole.size(); ++at) {
                    std::vector<Quaterniond> poses = whole;
                    poses[at / 4].coeffs()[static_cast<Eigen::Index>(at % 4)] = bad;
                    const std::vector<Triple> found = anglesFor(poses, convention, unit);
                    for (std::size_t row = 0; row < whole.size(); ++row) {
                        const Triple& angles = found[row];
                        EXPECT_TRUE(row == at / 4
                                        ? std::isnan(angles[0]) && std::isnan(angles[1]) &&
                                              std::isnan(angles[2])
                                        : sameBits(angles, unspoilt))
                            << wordsOf(convention, unit) << ", row " << row;
                    }
                }
        }
}

}  // namespace
}  // namespace rotcore::batch_test
