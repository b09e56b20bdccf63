// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/euler_angles.h"

#include <cassert>
#include <cmath>

namespace rotcore {
namespace {

struct HalfAngle {
    double sine;
    double cosine;
    explicit HalfAngle(double angle) : sine(std::sin(0.5 * angle)), cosine(std::cos(0.5 * angle)) {}
};

// The product R_i(a) R_j(b) R_k(c), multiplied out. In both cases e is the sign of the cycle i, j.
Eigen::Quaterniond productAboutBody(const std::array<Axis, 3>& axes,
                                    const std::array<double, 3>& angles)
{
    const auto [i, j, k] = axes;
    const double e = cyclicSign(i, j);
    const HalfAngle a(angles[0]);
    const HalfAngle b(angles[1]);
    const HalfAngle c(angles[2]);
    Eigen::Quaterniond q;
    if (i == k) {
        q.w() = b.cosine * (a.cosine * c.cosine - a.sine * c.sine);
        q.vec()[indexOf(i)] = b.cosine * (a.sine * c.cosine + a.cosine * c.sine);
        q.vec()[indexOf(j)] = b.sine * (a.cosine * c.cosine + a.sine * c.sine);
        q.vec()[indexOf(otherThan(i, j))] = e * b.sine * (a.sine * c.cosine - a.cosine * c.sine);
    } else {
        q.w() = a.cosine * b.cosine * c.cosine - e * a.sine * b.sine * c.sine;
        q.vec()[indexOf(i)] = a.sine * b.cosine * c.cosine + e * a.cosine * b.sine * c.sine;
        q.vec()[indexOf(j)] = a.cosine * b.sine * c.cosine - e * a.sine * b.cosine * c.sine;
        q.vec()[indexOf(k)] = a.cosine * b.cosine * c.sine + e * a.sine * b.sine * c.cosine;
    }
    return q;
}

}  // namespace

Eigen::Quaterniond pose(const EulerAngles& euler)
{
    assert(std::isfinite(euler.angles[0]) && std::isfinite(euler.angles[1]) &&
           std::isfinite(euler.angles[2]));
    const EulerAngles body = euler.about == About::body ? euler : aboutTheOther(euler);
    return productAboutBody(axesOf(body.order), body.angles);
}

Eigen::Quaterniond turnAbout(Axis axis, double angle)
{
    const HalfAngle half(angle);
    Eigen::Quaterniond q(half.cosine, 0.0, 0.0, 0.0);
    q.vec()[indexOf(axis)] = half.sine;
    return q;
}

EulerAngles aboutTheOther(const EulerAngles& euler)
{
    return {reversed(euler.order),
            euler.about == About::body ? About::space : About::body,
            {euler.angles[2], euler.angles[1], euler.angles[0]}};
}

}  // namespace rotcore
