// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/euler_solutions.h"

#include <algorithm>
#include <cmath>

#include "rotcore/rotation/angle.h"

namespace rotcore {
namespace {

// Two points of the plane that carry all of a pose. Their lengths are cos(b'/2) and sin(b'/2) up to
// a common factor, their bearings (a + c)/2 and (a - c)/2; b' is the middle angle counted from a
// lock.
struct HalfAnglePairs {
    double sumCosine, sumSine;
    double differenceCosine, differenceSine;

    // Squares may underflow: a length below 1e-154 counts as none, and is at lock either way.
    double sumLength() const { return std::sqrt(sumCosine * sumCosine + sumSine * sumSine); }
    double differenceLength() const
    {
        return std::sqrt(differenceCosine * differenceCosine + differenceSine * differenceSine);
    }
};

HalfAnglePairs pairsAboutBody(const Eigen::Quaterniond& q, Order order)
{
    const auto [i, j, k] = axesOf(order);
    const double e = cyclicSign(i, j);
    const double qi = q.vec()[indexOf(i)];
    const double qj = q.vec()[indexOf(j)];
    const double qm = q.vec()[indexOf(otherThan(i, j))];
    if (i == k) return {q.w(), qi, qj, e * qm};
    // q R_j(pi/2) = R_i(a) R_j(b + pi/2) R_i(-e c): the same form, with c' = -e c. The common
    // 1/sqrt(2) cancels.
    return {q.w() - qj, qi - e * qm, qj + q.w(), e * qm + qi};
}

double lockDistanceOf(const HalfAnglePairs& pairs)
{
    const double sum = pairs.sumLength();
    const double difference = pairs.differenceLength();
    return 2.0 * std::atan2(std::min(sum, difference), std::max(sum, difference));
}

// The middle angle of the lock from which b' counts.
double lowerLock(Order order)
{
    return isRepeating(order) ? 0.0 : -kPi / 2;
}

// c = innerSign * c', see pairsAboutBody.
int innerSign(Order order)
{
    const auto [i, j, k] = axesOf(order);
    return i == k ? 1 : -cyclicSign(i, j);
}

LockFamily familyOf(const HalfAnglePairs& pairs, Order order)
{
    const bool atUpper = pairs.sumLength() < pairs.differenceLength();
    LockFamily family;
    family.middle = (atUpper ? kPi : 0.0) + lowerLock(order);
    family.sign = (atUpper ? -1 : 1) * innerSign(order);
    family.fixed = wrapped(2.0 * (atUpper ? std::atan2(pairs.differenceSine, pairs.differenceCosine)
                                          : std::atan2(pairs.sumSine, pairs.sumCosine)));
    return family;
}

EulerSolutions solveAboutBody(const Eigen::Quaterniond& q, Order order, double outerAtLock)
{
    const HalfAnglePairs pairs = pairsAboutBody(q, order);
    EulerSolutions solved;
    solved.lockDistance = lockDistanceOf(pairs);
    if (solved.lockDistance < kLockTolerance) {
        solved.family = familyOf(pairs, order);
        solved.solutions[0] = memberOf(*solved.family, order, About::body, outerAtLock);
    } else {
        const double half = std::atan2(pairs.sumSine, pairs.sumCosine);
        const double other = std::atan2(pairs.differenceSine, pairs.differenceCosine);
        const double fromLock = 2.0 * std::atan2(pairs.differenceLength(), pairs.sumLength());
        solved.solutions[0] = {order,
                               About::body,
                               {wrapped(half + other), wrapped(fromLock + lowerLock(order)),
                                wrapped(innerSign(order) * (half - other))}};
    }
    solved.solutions[1] = twinOf(solved.solutions[0]);
    return solved;
}

}  // namespace

EulerAngles twinOf(const EulerAngles& euler)
{
    const auto [a, b, c] = euler.angles;
    const double middle = isRepeating(euler.order) ? -b : kPi - b;
    return {euler.order, euler.about, {wrapped(a + kPi), wrapped(middle), wrapped(c + kPi)}};
}

EulerAngles memberOf(const LockFamily& family, Order order, About about, double outer)
{
    EulerAngles member{order, about, {0.0, family.middle, 0.0}};
    const auto outerAt = static_cast<std::size_t>(outerIndex(about));
    member.angles[outerAt] = wrapped(outer);
    member.angles[2 - outerAt] = wrapped(family.sign * (family.fixed - outer));
    return member;
}

EulerSolutions solveEuler(const Eigen::Quaterniond& q_WB, Order order, About about,
                          double outerAtLock)
{
    if (about == About::body) return solveAboutBody(q_WB, order, outerAtLock);
    EulerSolutions solved = solveAboutBody(q_WB, reversed(order), outerAtLock);
    for (EulerAngles& solution : solved.solutions)
        solution = aboutTheOther(solution);
    return solved;
}

EulerAngles nearerTo(const EulerAngles& previous, const EulerSolutions& solved)
{
    const auto squaredDistance = [&](const EulerAngles& euler) {
        double sum = 0.0;
        for (std::size_t n = 0; n < 3; ++n) {
            const double difference = wrapped(euler.angles[n] - previous.angles[n]);
            sum += difference * difference;
        }
        return sum;
    };
    const auto& [first, second] = solved.solutions;
    return squaredDistance(second) < squaredDistance(first) ? second : first;
}

double lockDistance(const Eigen::Quaterniond& q_WB, Order order, About about)
{
    return lockDistanceOf(pairsAboutBody(q_WB, about == About::body ? order : reversed(order)));
}

}  // namespace rotcore
