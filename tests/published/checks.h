// SPDX-License-Identifier: GPL-3.0-or-later
// What the checks against published values share: numbers as they are printed, and comparing them.
// The expected values of all these tests come from the source named beside them, never from
// rotcore. How a value was come by is said with it: "seen" in the source itself, "second-hand" in a
// public transcription of it, "from memory", or "derived" by hand from a published formula.
#pragma once
#include <array>
#include <optional>
#include <vector>

#include <Eigen/Geometry>
#include <gtest/gtest.h>

#include "rotcore/reading/reading.h"
#include "rotcore/rotation/euler_angles.h"
#include "tests/support/poses.h"

namespace published {

/// An element of a matrix or quaternion at full precision: each side takes a few dozen roundings of
/// 1.1e-16 of numbers no larger than 1.
inline constexpr double kRounding = 1e-14;

/// Poses at full precision, radians: rounding of the elements, and room for other compilers.
inline constexpr double kPoseRounding = 1e-13;

/// A matrix from its rows, as printed.
Eigen::Matrix3d rows(const std::array<double, 9>& elements);

/// A quaternion printed with the scalar last. (Scalar first is Eigen's own constructor.)
Eigen::Quaterniond fromXyzw(const std::array<double, 4>& numbers);

/// The core's pose of three angles in degrees, listed as the order is.
Eigen::Quaterniond aboutBody(rotcore::Order order, const std::array<double, 3>& degrees);
Eigen::Quaterniond aboutSpace(rotcore::Order order, const std::array<double, 3>& degrees);

/// Its matrix R_WB.
Eigen::Matrix3d matrixAboutBody(rotcore::Order order, const std::array<double, 3>& degrees);

/// Elementary frame matrices, written out: coordinates in axes turned by `angle` (radians), which
/// is the transpose of the right-handed turn of a body.
Eigen::Matrix3d frameX(double angle);
Eigen::Matrix3d frameY(double angle);
Eigen::Matrix3d frameZ(double angle);

/// The pose the core reads from numbers; a failure of the test, and the identity, if it refuses.
Eigen::Quaterniond read(const rotcore::Reading& reading, const std::vector<double>& values);

/// Why the core refuses numbers; nothing if it takes them.
std::optional<rotcore::Fault::Kind> refusal(const rotcore::Reading& reading,
                                            const std::vector<double>& values);

/// The nine elements by rows, as they would be typed.
std::vector<double> typed(const Eigen::Matrix3d& M);

/// All three angles of a triple.
Eigen::Vector3d radiansOf(const rotcore::EulerAngles& euler);
Eigen::Vector3d degreesOf(const rotcore::EulerAngles& euler);

/// A rotation vector in degrees.
Eigen::Vector3d inDegrees(const Eigen::Vector3d& radians);

testing::AssertionResult elementsNear(const char* actualText, const char* expectedText,
                                      const char* toleranceText, const Eigen::MatrixXd& actual,
                                      const Eigen::MatrixXd& expected, double tolerance);
testing::AssertionResult quaternionsNear(const char* actualText, const char* expectedText,
                                         const char* toleranceText,
                                         const Eigen::Quaterniond& actual,
                                         const Eigen::Quaterniond& expected, double tolerance);

/// Every element of a matrix or vector to a tolerance.
#define EXPECT_ELEMENTS_NEAR(actual, expected, tolerance) \
    EXPECT_PRED_FORMAT3(::published::elementsNear, actual, expected, tolerance)

/// Every component of a quaternion to a tolerance, up to the sign of all four: q and -q are one
/// pose.
#define EXPECT_QUATERNION_NEAR(actual, expected, tolerance) \
    EXPECT_PRED_FORMAT3(::published::quaternionsNear, actual, expected, tolerance)

}  // namespace published
