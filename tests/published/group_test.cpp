// SPDX-License-Identifier: GPL-3.0-or-later
// Facts about the group of rotations: how many conventions and axis maps there are, how far random
// attitudes are apart, and what two turns leave when they are undone in the wrong order.
#include <cmath>
#include <set>

#include "rotcore/chain/chain.h"
#include "rotcore/rotation/axis_map.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Quaterniond;
using Eigen::Vector3d;

TEST(Counts, TwentyFourConventionsOfEulerAnglesDiffer)  // REP 103; transforms3d: 12 and 12, seen
{
    std::vector<Quaterniond> poses;
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space})
            poses.push_back(pose({order, about, {0.5, -0.7, 1.9}}));
    ASSERT_EQ(poses.size(), 24U);
    for (std::size_t n = 0; n < poses.size(); ++n)
        for (std::size_t m = 0; m < n; ++m)
            EXPECT_GT(tests::poseDistance(poses[n], poses[m]), 1e-3);
}

TEST(Counts, TwentyFourOfFortyEightAxisMapsAreRotations)  // SciPy's create_group('O') has 24
{
    std::set<std::vector<double>> all;
    int rotations = 0;
    for (const AxisMap& map : allAxisMaps()) {
        const Eigen::Matrix3d M = matrixOf(map);
        all.insert(typed(M));
        const bool isRotation = M.determinant() > 0.0;
        rotations += isRotation ? 1 : 0;
        EXPECT_EQ(handednessOf(map) == Handedness::right, isRotation);
        EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(M)).has_value(), !isRotation);
    }
    EXPECT_EQ(all.size(), 48U);
    EXPECT_EQ(rotations, 24);
}

TEST(Counts, RotationsAmongAxisMapsAreTheGroupOfTheCube)
{
    // Derived: of 24, one is none, 6 + 3 turn about faces by 90 and 180, 8 about corners by 120 and
    // 6 about edges by 180 deg.
    std::multiset<long> degrees;
    for (const AxisMap& map : allAxisMaps())
        if (handednessOf(map) == Handedness::right)
            degrees.insert(std::lround(
                toDegrees(axisAngleOf(read({.kind = Kind::matrix}, typed(matrixOf(map)))).angle)));
    EXPECT_EQ(degrees.count(0), 1U);
    EXPECT_EQ(degrees.count(90), 6U);
    EXPECT_EQ(degrees.count(120), 8U);
    EXPECT_EQ(degrees.count(180), 9U);
}

TEST(RandomAttitudes, AnglesHaveTheDensityOfTheGroup)
{
    // OEIS A361605 (2023) after Rummler, Math. Intelligencer 24(4) 2002, seen: density (1 - cos t)
    // / pi on [0, pi], mean pi/2 + 2/pi (also M. B. Reynolds 2017: about 126.476 deg). Derived:
    // P(angle < t) = (t - sin t)/pi, which is .007511724 at 30 and .181690114 at 90 deg.
    constexpr int kCount = 200000;
    std::mt19937_64 generator(1701);
    double sum = 0.0;
    int below30 = 0;
    int below90 = 0;
    for (int n = 0; n < kCount; ++n) {
        const double angle = axisAngleOf(tests::randomPose(generator)).angle;
        sum += angle;
        below30 += angle < 30_deg ? 1 : 0;
        below90 += angle < 90_deg ? 1 : 0;
    }
    // Four standard deviations: 0.65 rad of one angle, sqrt(p (1 - p)) of a share, over sqrt(n).
    const double root = std::sqrt(kCount);
    EXPECT_NEAR(sum / kCount, 2.207416099, 4.0 * 0.65 / root);
    EXPECT_NEAR(static_cast<double>(below30) / kCount, 0.007511724, 4.0 * 0.0863 / root);
    EXPECT_NEAR(static_cast<double>(below90) / kCount, 0.181690114, 4.0 * 0.3856 / root);
}

/// What x by a, y by b, then x back and y back leave.
AxisAngle leftOver(double aDeg, double bDeg)
{
    const auto q = pose(Chain{{Vector3d::UnitX(), fromDegrees(aDeg)},
                              {Vector3d::UnitY(), fromDegrees(bDeg)},
                              {Vector3d::UnitX(), fromDegrees(-aDeg)},
                              {Vector3d::UnitY(), fromDegrees(-bDeg)}});
    EXPECT_TRUE(q);
    return axisAngleOf(*q);
}

TEST(Commutator, OfTwoTurnsIsFourArcsinesOfTheProductOfSines)  // derived: an identity of the group
{
    EXPECT_NEAR(toDegrees(leftOver(10, 10).angle), 1.740920010, 5.001e-10);
    EXPECT_NEAR(toDegrees(leftOver(90, 90).angle), 120.0, 1e-12);
    EXPECT_ELEMENTS_NEAR(leftOver(90, 90).axis, Vector3d(1, -1, 1).normalized(), 1e-14);
    for (const double a : {1.0, 25.0, 70.0, 110.0})
        for (const double b : {2.0, 40.0, 85.0}) {
            const double product = std::sin(fromDegrees(a) / 2) * std::sin(fromDegrees(b) / 2);
            EXPECT_NEAR(leftOver(a, b).angle, 4.0 * std::asin(product), kRounding);
        }
}

}  // namespace
