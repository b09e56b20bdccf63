// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/lock/gauge.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <numbers>

#include "rotcore/lock/rates.h"
#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/euler_solutions.h"

namespace rotcore {
namespace {

// 1/sqrt(1 - cos d), with 1 - cos d = 2 sin^2(d/2) so that nothing cancels near lock.
double amplificationAt(double distance)
{
    if (distance < kLockTolerance) return std::numeric_limits<double>::infinity();
    return 1.0 / (std::numbers::sqrt2 * std::sin(0.5 * distance));
}

// J J^T = u u^T + v v^T + w w^T for the ring axes u, v, w, with v at right angles to both others.
// Its smallest eigenvector is along u - sign(u.w) w, which vanishes at lock; v x (u + sign(u.w) w)
// is the same direction and does not.
Eigen::Vector3d lostDirection(const Eigen::Matrix3d& ringAxes)
{
    const Eigen::Vector3d u = ringAxes.col(0);
    const Eigen::Vector3d v = ringAxes.col(1);
    const Eigen::Vector3d w = ringAxes.col(2);
    const double sign = u.dot(w) < 0.0 ? -1.0 : 1.0;
    return v.cross(u + sign * w).normalized();
}

}  // namespace

LockGauge gaugeLock(const Eigen::Quaterniond& q_WB, const EulerAngles& angles)
{
    LockGauge gauge;
    gauge.order = angles.order;
    gauge.about = angles.about;
    gauge.distance = lockDistance(q_WB, angles.order, angles.about);
    gauge.amplification = amplificationAt(gauge.distance);
    const double half = 0.5 * gauge.distance;
    gauge.singularValues = Eigen::Vector3d(std::numbers::sqrt2 * std::cos(half), 1.0,
                                           std::numbers::sqrt2 * std::sin(half));
    gauge.lostDirectionBody = lostDirection(rateMatrixBody(angles));
    gauge.lostDirectionSpace = q_WB * gauge.lostDirectionBody;
    gauge.crowding = std::sin(gauge.distance);
    return gauge;
}

std::array<OrderStanding, 12> rankOrders(const Eigen::Quaterniond& q_WB, About about)
{
    std::array<OrderStanding, 12> standings;
    for (std::size_t n = 0; n < standings.size(); ++n) {
        const double distance = lockDistance(q_WB, kAllOrders[n], about);
        standings[n] = {kAllOrders[n], distance, amplificationAt(distance)};
    }
    std::sort(standings.begin(), standings.end(),
              [](const OrderStanding& a, const OrderStanding& b) {
                  return a.distance != b.distance ? a.distance > b.distance : a.order < b.order;
              });
    return standings;
}

double crowding(Order order, double middle)
{
    return isRepeating(order) ? std::abs(std::sin(middle)) : std::abs(std::cos(middle));
}

std::vector<double> crowdingProfile(Order order, int rows)
{
    const double lowest = isRepeating(order) ? 0.0 : -kPi / 2;
    std::vector<double> profile;
    profile.reserve(static_cast<std::size_t>(std::max(rows, 0)));
    for (int row = 0; row < rows; ++row)
        profile.push_back(crowding(order, lowest + kPi * (row + 0.5) / rows));
    return profile;
}

}  // namespace rotcore
