// SPDX-License-Identifier: GPL-3.0-or-later
// The batch against the scalar core and its vector units against each other: a million rotations
// and the singular poses, in all 24 conventions.
#include <cmath>
#include <vector>

#include <Eigen/Geometry>
#include <gtest/gtest.h>

#include "rotcore/rotation/batch.h"
#include "rotcore/rotation/euler_angles.h"
#include "rotcore/rotation/euler_solutions.h"
#include "rotcore/rotation/quaternion.h"
#include "tests/core/batch_columns.h"

namespace rotcore::batch_test {
namespace {

// Per component: products of three sines or cosines, each within a unit of the last place (1.1e-16
// below 1), and three roundings of half a unit are 5e-16 on either side. The worst of ten million
// was 4.4e-16.
constexpr double kComponentTolerance = 1e-15;

// Three angles in error by at most 13e-16 rad, if all add up. The worst of ten million was 18e-16.
constexpr double kRoundTripTolerance = 4e-15;  // rad

bool isFused(VectorUnit unit)
{
    return unit == VectorUnit::avx2 || unit == VectorUnit::avx512;
}

// Keeps the largest of what it is shown; a NaN stays.
struct Worst {
    double value = 0.0;
    std::size_t row = 0;
    void see(double measure, std::size_t at)
    {
        if (measure <= value || std::isnan(value)) return;
        value = measure;
        row = at;
    }
};

TEST(BatchPoses, AgreeWithTheScalarCoreInEveryConvention)
{
    const std::vector<Triple> triples = randomTriples();
    for (const Convention& convention : allConventions()) {
        std::vector<Quaterniond> expected;
        expected.reserve(triples.size());
        for (const Triple& triple : triples)
            expected.push_back(pose({convention.order, convention.about, triple}));
        for (const VectorUnit unit : unitsHere()) {
            const std::vector<Quaterniond> found = posesFor(triples, convention, unit);
            Worst worst;
            for (std::size_t row = 0; row < triples.size(); ++row)
                worst.see(farthest(found[row], expected[row]), row);
            EXPECT_LE(worst.value, kComponentTolerance)
                << wordsOf(convention, unit) << ", row " << worst.row;
        }
    }
}

TEST(BatchPoses, LargeAnglesAreThoseOfTheScalarCore)
{
    const std::vector<Triple> triples{
        {1.0, 2.0, 3.0},     {29.9, -29.9, 29.9}, {30.1, 0.5, -1.0},
        {0.5, -1e5, 2.0},    {0.1, 0.2, 1e15},    {1e300, -1e300, 1e3},
        {-30.0, 30.0, 30.0}, {0.0, 0.0, 0.0},     {1e22, 1e-300, 0.3}};
    for (const Convention& convention : allConventions())
        for (const VectorUnit unit : unitsHere()) {
            const std::vector<Quaterniond> found = posesFor(triples, convention, unit);
            for (std::size_t row = 0; row < triples.size(); ++row)
                EXPECT_LE(
                    farthest(found[row], pose({convention.order, convention.about, triples[row]})),
                    kComponentTolerance)
                    << wordsOf(convention, unit) << ", row " << row;
        }
}

TEST(BatchPoses, DegreesAreTheSameAnglesInAnotherUnit)
{
    std::vector<Triple> radians = randomTriples();
    std::vector<Triple> degrees = radians;
    for (std::size_t row = 0; row < radians.size(); ++row)
        for (std::size_t at = 0; at < 3; ++at) {
            degrees[row][at] = toDegrees(radians[row][at]);
            radians[row][at] = fromDegrees(degrees[row][at]);
        }
    const Convention convention{Order::yxy, About::space};
    for (const VectorUnit unit : unitsHere()) {
        const auto found = posesFor(degrees, convention, unit, AngleUnit::degrees);
        const auto expected = posesFor(radians, convention, unit);
        for (std::size_t row = 0; row < radians.size(); ++row)
            ASSERT_TRUE(sameBits(found[row], expected[row])) << nameOf(unit) << ", row " << row;
    }
}

TEST(BatchAngles, AgreeWithTheScalarCoreInEveryConvention)
{
    for (const Convention& convention : allConventions()) {
        const std::vector<Quaterniond> poses = poseSweep(convention);
        std::vector<Triple> expected;
        expected.reserve(poses.size());
        for (const Quaterniond& q : poses)
            expected.push_back(
                solveEuler(q, convention.order, convention.about).solutions[0].angles);
        for (const VectorUnit unit : unitsHere()) {
            const std::vector<Triple> found = anglesFor(poses, convention, unit);
            Worst worst;
            for (std::size_t row = 0; row < poses.size(); ++row)
                worst.see(farthest(found[row], expected[row]), row);
            EXPECT_LE(worst.value, kAngleTolerance)
                << wordsOf(convention, unit) << ", row " << worst.row;
        }
    }
}

TEST(BatchAngles, LeadBackToTheSameRotation)
{
    for (const Convention& convention : allConventions()) {
        const std::vector<Quaterniond> poses = poseSweep(convention);
        for (const VectorUnit unit : unitsHere()) {
            const auto back = posesFor(anglesFor(poses, convention, unit), convention, unit);
            Worst worst;
            for (std::size_t row = 0; row < poses.size(); ++row)
                worst.see(angleBetween(back[row], poses[row]), row);
            EXPECT_LE(worst.value, kRoundTripTolerance)
                << wordsOf(convention, unit) << ", row " << worst.row;
        }
    }
}

// In (-limit, limit], and the middle one in a closed half turn.
bool isInRange(const Triple& angles, Order order, double limit)
{
    const double lowest = isRepeating(order) ? 0.0 : -limit / 2;
    return -limit < angles[0] && angles[0] <= limit && -limit < angles[2] && angles[2] <= limit &&
           lowest <= angles[1] && angles[1] <= lowest + limit;
}

TEST(BatchAngles, StayInTheirRangesInEitherUnit)
{
    for (const Convention& convention : allConventions()) {
        const std::vector<Quaterniond> poses = poseSweep(convention);
        for (const VectorUnit unit : unitsHere()) {
            const auto radians = anglesFor(poses, convention, unit);
            const auto degrees = anglesFor(poses, convention, unit, AngleUnit::degrees);
            for (std::size_t row = 0; row < poses.size(); ++row) {
                ASSERT_TRUE(isInRange(radians[row], convention.order, kPi))
                    << wordsOf(convention, unit) << ", row " << row;
                ASSERT_TRUE(isInRange(degrees[row], convention.order, 180.0))
                    << wordsOf(convention, unit) << ", row " << row;
            }
        }
    }
}

TEST(Batch, EveryVectorUnitAgreesWithEveryOther)
{
    const std::vector<Triple> triples = randomTriples();
    for (const Convention& convention : allConventions()) {
        const std::vector<Quaterniond> poses = poseSweep(convention);
        for (const VectorUnit first : unitsHere())
            for (const VectorUnit second : unitsHere()) {
                if (second <= first) continue;
                const bool exactly = isFused(first) && isFused(second);
                const auto q1 = posesFor(triples, convention, first);
                const auto q2 = posesFor(triples, convention, second);
                Worst components;
                for (std::size_t row = 0; row < triples.size(); ++row)
                    components.see(farthest(q1[row], q2[row]), row);
                EXPECT_LE(components.value, exactly ? 0.0 : kComponentTolerance)
                    << wordsOf(convention, second) << " and " << nameOf(first);
                const auto e1 = anglesFor(poses, convention, first);
                const auto e2 = anglesFor(poses, convention, second);
                Worst angles;
                for (std::size_t row = 0; row < poses.size(); ++row)
                    angles.see(farthest(e1[row], e2[row]), row);
                EXPECT_LE(angles.value, exactly ? 0.0 : kAngleTolerance)
                    << wordsOf(convention, second) << " and " << nameOf(first);
            }
    }
}

}  // namespace
}  // namespace rotcore::batch_test
