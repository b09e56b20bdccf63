// SPDX-License-Identifier: GPL-3.0-or-later
// What all tests share: degrees as literals, comparing poses, random and awkward poses.
#pragma once
#include <random>
#include <string>
#include <vector>

#include <Eigen/Geometry>
#include <gtest/gtest.h>

#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/euler_angles.h"

namespace tests {

constexpr double operator""_deg(long double degrees)
{
    return rotcore::fromDegrees(static_cast<double>(degrees));
}
constexpr double operator""_deg(unsigned long long degrees)
{
    return rotcore::fromDegrees(static_cast<double>(degrees));
}

/// The angle between two poses, radians: 2 atan2(|v|, |w|) of q1* q2, computed here and not by the
/// core.
double poseDistance(const Eigen::Quaterniond& first, const Eigen::Quaterniond& second);

/// For EXPECT_POSE_NEAR: prints both poses and their angle in degrees.
testing::AssertionResult posesNear(const char* firstText, const char* secondText,
                                   const char* toleranceText, const Eigen::Quaterniond& first,
                                   const Eigen::Quaterniond& second, double tolerance);

#define EXPECT_POSE_NEAR(first, second, tolerance) \
    EXPECT_PRED_FORMAT3(::tests::posesNear, first, second, tolerance)

/// A pose uniform over all rotations (four normal components, normalised), from a seeded generator.
Eigen::Quaterniond randomPose(std::mt19937_64& generator);

/// Poses at, and within 1e-16 ... 1e-3 rad of, every lock of an order, on both sides, with random
/// outer angles.
std::vector<rotcore::EulerAngles> anglesNearLock(rotcore::Order order, rotcore::About about,
                                                 std::mt19937_64& generator);

/// The largest absolute difference of two matrices' elements; not a number if one of them is.
double largestDifference(const Eigen::MatrixXd& first, const Eigen::MatrixXd& second);

}  // namespace tests

using tests::operator""_deg;
