// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/poses.h"

#include <cmath>
#include <sstream>

namespace tests {

double poseDistance(const Eigen::Quaterniond& first, const Eigen::Quaterniond& second)
{
    const Eigen::Quaterniond difference = first.conjugate() * second;
    return 2.0 * std::atan2(difference.vec().norm(), std::abs(difference.w()));
}

testing::AssertionResult posesNear(const char* firstText, const char* secondText,
                                   const char* toleranceText, const Eigen::Quaterniond& first,
                                   const Eigen::Quaterniond& second, double tolerance)
{
    const double distance = poseDistance(first, second);
    const double lengthError =
        std::max(std::abs(first.norm() - 1.0), std::abs(second.norm() - 1.0));
    if (distance <= tolerance && lengthError <= tolerance + 1e-15)
        return testing::AssertionSuccess();
    std::ostringstream text;
    text.precision(17);
    const auto print = [&](const char* name, const Eigen::Quaterniond& q) {
        text << "  " << name << " = (" << q.w() << "; " << q.x() << ", " << q.y() << ", " << q.z()
             << ")\n";
    };
    text << "poses are " << distance << " rad = " << rotcore::toDegrees(distance)
         << " deg apart, more than " << toleranceText << " = " << tolerance << " rad\n";
    print(firstText, first);
    print(secondText, second);
    return testing::AssertionFailure() << text.str();
}

Eigen::Quaterniond randomPose(std::mt19937_64& generator)
{
    std::normal_distribution<double> normal;
    Eigen::Quaterniond q(normal(generator), normal(generator), normal(generator),
                         normal(generator));
    q.normalize();
    return q;
}

std::vector<rotcore::EulerAngles> anglesNearLock(rotcore::Order order, rotcore::About about,
                                                 std::mt19937_64& generator)
{
    using rotcore::kPi;
    std::uniform_real_distribution<double> angle(-kPi, kPi);
    const std::vector<double> locks =
        rotcore::isRepeating(order) ? std::vector{0.0, kPi, -kPi} : std::vector{kPi / 2, -kPi / 2};
    std::vector<rotcore::EulerAngles> points;
    for (const double lock : locks) {
        points.push_back({order, about, {angle(generator), lock, angle(generator)}});
        for (int exponent = -16; exponent <= -3; ++exponent)
            for (const double side : {-1.0, 1.0}) {
                const double offset = side * std::pow(10.0, exponent);
                points.push_back(
                    {order, about, {angle(generator), lock + offset, angle(generator)}});
            }
    }
    return points;
}

double largestDifference(const Eigen::MatrixXd& first, const Eigen::MatrixXd& second)
{
    return (first - second).cwiseAbs().maxCoeff<Eigen::PropagateNaN>();
}

}  // namespace tests
