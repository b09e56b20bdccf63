// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/published/checks.h"

#include <cmath>
#include <sstream>

namespace published {

Eigen::Matrix3d rows(const std::array<double, 9>& elements)
{
    return Eigen::Map<const Eigen::Matrix<double, 3, 3, Eigen::RowMajor>>(elements.data());
}

Eigen::Quaterniond fromXyzw(const std::array<double, 4>& numbers)
{
    return {numbers[3], numbers[0], numbers[1], numbers[2]};
}

Eigen::Quaterniond aboutBody(rotcore::Order order, const std::array<double, 3>& degrees)
{
    using rotcore::fromDegrees;
    return rotcore::pose(
        {order,
         rotcore::About::body,
         {fromDegrees(degrees[0]), fromDegrees(degrees[1]), fromDegrees(degrees[2])}});
}

Eigen::Quaterniond aboutSpace(rotcore::Order order, const std::array<double, 3>& degrees)
{
    using rotcore::fromDegrees;
    return rotcore::pose(
        {order,
         rotcore::About::space,
         {fromDegrees(degrees[0]), fromDegrees(degrees[1]), fromDegrees(degrees[2])}});
}

Eigen::Matrix3d matrixAboutBody(rotcore::Order order, const std::array<double, 3>& degrees)
{
    return aboutBody(order, degrees).toRotationMatrix();
}

Eigen::Matrix3d frameX(double angle)
{
    const double c = std::cos(angle);
    const double s = std::sin(angle);
    return rows({1, 0, 0, 0, c, s, 0, -s, c});
}

Eigen::Matrix3d frameY(double angle)
{
    const double c = std::cos(angle);
    const double s = std::sin(angle);
    return rows({c, 0, -s, 0, 1, 0, s, 0, c});
}

Eigen::Matrix3d frameZ(double angle)
{
    const double c = std::cos(angle);
    const double s = std::sin(angle);
    return rows({c, s, 0, -s, c, 0, 0, 0, 1});
}

Eigen::Quaterniond read(const rotcore::Reading& reading, const std::vector<double>& values)
{
    const auto meaning = rotcore::interpret({reading, values});
    if (meaning) return meaning->q_WB;
    ADD_FAILURE() << "refused: " << meaning.error().message;
    return Eigen::Quaterniond::Identity();
}

std::optional<rotcore::Fault::Kind> refusal(const rotcore::Reading& reading,
                                            const std::vector<double>& values)
{
    const auto meaning = rotcore::interpret({reading, values});
    if (meaning) return std::nullopt;
    return meaning.error().kind;
}

std::vector<double> typed(const Eigen::Matrix3d& M)
{
    std::vector<double> values;
    for (int row = 0; row < 3; ++row)
        for (int column = 0; column < 3; ++column)
            values.push_back(M(row, column));
    return values;
}

Eigen::Vector3d radiansOf(const rotcore::EulerAngles& euler)
{
    return {euler.angles[0], euler.angles[1], euler.angles[2]};
}

Eigen::Vector3d degreesOf(const rotcore::EulerAngles& euler)
{
    return inDegrees(radiansOf(euler));
}

Eigen::Vector3d inDegrees(const Eigen::Vector3d& radians)
{
    return radians * rotcore::kDegreesPerRadian;
}

testing::AssertionResult elementsNear(const char* actualText, const char* expectedText,
                                      const char* toleranceText, const Eigen::MatrixXd& actual,
                                      const Eigen::MatrixXd& expected, double tolerance)
{
    const Eigen::MatrixXd difference = (actual - expected).cwiseAbs();
    // Asked of every element, for a maximum may pass over NaN.
    if ((difference.array() <= tolerance).all()) return testing::AssertionSuccess();
    std::ostringstream text;
    text.precision(17);
    text << "elements differ by up to " << difference.maxCoeff() << ", more than " << toleranceText
         << " = " << tolerance << "\n  " << actualText << " =\n"
         << actual << "\n  " << expectedText << " =\n"
         << expected;
    return testing::AssertionFailure() << text.str();
}

testing::AssertionResult quaternionsNear(const char* actualText, const char* expectedText,
                                         const char* toleranceText,
                                         const Eigen::Quaterniond& actual,
                                         const Eigen::Quaterniond& expected, double tolerance)
{
    const double sign = actual.dot(expected) < 0.0 ? -1.0 : 1.0;
    return elementsNear(actualText, expectedText, toleranceText, actual.coeffs() * sign,
                        expected.coeffs(), tolerance)
           << " (x, y, z, w)";
}

}  // namespace published
