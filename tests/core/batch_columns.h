// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
// What the tests of the batch share: columns that own their numbers, poses to try, comparisons.
#include <algorithm>
#include <array>
#include <bit>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <limits>
#include <random>
#include <string>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/rotation/batch.h"
#include "rotcore/rotation/euler_angles.h"

namespace rotcore::batch_test {

using Eigen::Quaterniond;

// An outer or inner angle is a sum of two arctangents of up to pi, each within a unit of the last
// place (4.4e-16 rad), rounded once more at up to 2 pi (4.4e-16 rad): 13e-16 rad on either side.
// The worst of ten million was 18e-16 rad.
inline constexpr double kAngleTolerance = 2.7e-15;  // rad

inline constexpr double kNan = std::numeric_limits<double>::quiet_NaN();

struct Convention {
    Order order;
    About about;
};

inline std::vector<Convention> allConventions()
{
    std::vector<Convention> all;
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space})
            all.push_back({order, about});
    return all;
}

inline std::vector<VectorUnit> unitsHere()
{
    std::vector<VectorUnit> units;
    for (const VectorUnit unit : kAllVectorUnits)
        if (hasVectorUnit(unit)) units.push_back(unit);
    return units;
}

inline std::string wordsOf(const Convention& convention, VectorUnit unit)
{
    return std::string(nameOf(convention.order)) + " about " +
           std::string(nameOf(convention.about)) + " on " + std::string(nameOf(unit));
}

using Triple = std::array<double, 3>;

// Columns that own their numbers.
struct Angles {
    std::vector<double> a, b, c;

    explicit Angles(std::size_t rows) : a(rows), b(rows), c(rows) {}
    explicit Angles(const std::vector<Triple>& triples)
    {
        for (const Triple& triple : triples) {
            a.push_back(triple[0]);
            b.push_back(triple[1]);
            c.push_back(triple[2]);
        }
    }
    EulerColumns columns() { return {a, b, c}; }
    Triple row(std::size_t at) const { return {a[at], b[at], c[at]}; }
};

struct Poses {
    std::vector<double> w, x, y, z;

    explicit Poses(std::size_t rows) : w(rows), x(rows), y(rows), z(rows) {}
    explicit Poses(const std::vector<Quaterniond>& poses)
    {
        for (const Quaterniond& q : poses) {
            w.push_back(q.w());
            x.push_back(q.x());
            y.push_back(q.y());
            z.push_back(q.z());
        }
    }
    QuaternionColumns columns() { return {w, x, y, z}; }
    Quaterniond row(std::size_t at) const { return {w[at], x[at], y[at], z[at]}; }
};

inline std::vector<Quaterniond> posesFor(const std::vector<Triple>& triples,
                                         const Convention& convention, VectorUnit vectorUnit,
                                         AngleUnit unit = AngleUnit::radians)
{
    Angles in(triples);
    Poses out(triples.size());
    posesOf(convention.order, convention.about, in.columns(), out.columns(), unit, vectorUnit);
    std::vector<Quaterniond> poses;
    for (std::size_t row = 0; row < triples.size(); ++row)
        poses.push_back(out.row(row));
    return poses;
}

inline std::vector<Triple> anglesFor(const std::vector<Quaterniond>& poses,
                                     const Convention& convention, VectorUnit vectorUnit,
                                     AngleUnit unit = AngleUnit::radians)
{
    Poses in(poses);
    Angles out(poses.size());
    anglesOf(convention.order, convention.about, in.columns(), out.columns(), unit, vectorUnit);
    std::vector<Triple> triples;
    for (std::size_t row = 0; row < poses.size(); ++row)
        triples.push_back(out.row(row));
    return triples;
}

inline bool sameBits(const Triple& first, const Triple& second)
{
    using Bits = std::array<std::uint64_t, 3>;
    return std::bit_cast<Bits>(first) == std::bit_cast<Bits>(second);
}

inline bool sameBits(const Quaterniond& first, const Quaterniond& second)
{
    for (int at = 0; at < 4; ++at)
        if (std::bit_cast<std::uint64_t>(first.coeffs()[at]) !=
            std::bit_cast<std::uint64_t>(second.coeffs()[at]))
            return false;
    return true;
}

// The largest difference of two angles, the shorter way round; NaN if there is one.
inline double farthest(const Triple& first, const Triple& second)
{
    Triple apart{};
    for (std::size_t at = 0; at < 3; ++at)
        apart[at] = std::abs(std::remainder(first[at] - second[at], 2 * kPi));
    return apart[0] + apart[1] + apart[2] >= 0.0 ? std::max({apart[0], apart[1], apart[2]}) : kNan;
}

inline double farthest(const Quaterniond& first, const Quaterniond& second)
{
    return (first.coeffs() - second.coeffs()).lpNorm<Eigen::Infinity>();
}

inline constexpr std::size_t kRandomRows = 42'000;  // in each of 24 conventions: a million in all

inline std::vector<Triple> randomTriples()
{
    std::mt19937_64 random(1);
    std::uniform_real_distribution<double> angle(-2 * kPi, 2 * kPi);
    std::vector<Triple> triples(kRandomRows);
    for (Triple& triple : triples)
        triple = {angle(random), angle(random), angle(random)};
    return triples;
}

inline Quaterniond randomQuaternion(std::mt19937_64& random)
{
    std::normal_distribution<double> normal;
    return Quaterniond(normal(random), normal(random), normal(random), normal(random)).normalized();
}

// Where angles jump or cease to be defined: both locks, written with outer and inner angles at
// quarter turns and between, and (among them) the half turns and the 24 upright poses.
inline std::vector<Quaterniond> singularPoses(const Convention& convention)
{
    const double firstLock = isRepeating(convention.order) ? 0.0 : -kPi / 2;
    std::vector<Quaterniond> poses;
    for (const double middle : {firstLock, firstLock + kPi / 2, firstLock + kPi})
        for (int outer = -4; outer <= 4; ++outer)
            for (const double inner : {-kPi, -kPi / 2, -0.3, 0.0, 0.7, kPi / 2, kPi})
                poses.push_back(
                    pose({convention.order, convention.about, {outer * kPi / 4, middle, inner}}));
    for (int at = 0; at < 4; ++at) {  // exact: identity and half turns about the axes
        poses.emplace_back(Eigen::Vector4d::Unit(at));
        poses.emplace_back(-Eigen::Vector4d::Unit(at));
    }
    return poses;
}

// Random poses, the singular ones, and those 1e-16 to 1e-3 away from them in random directions.
inline std::vector<Quaterniond> poseSweep(const Convention& convention)
{
    std::mt19937_64 random(2);
    std::vector<Quaterniond> poses;
    while (poses.size() < kRandomRows)
        poses.push_back(randomQuaternion(random));
    for (const Quaterniond& singular : singularPoses(convention)) {
        poses.push_back(singular);
        for (int power = -16; power <= -3; ++power)
            for (int direction = 0; direction < 3; ++direction)
                poses.emplace_back(
                    (singular.coeffs() + std::pow(10.0, power) * randomQuaternion(random).coeffs())
                        .normalized());
    }
    return poses;
}

}  // namespace rotcore::batch_test
