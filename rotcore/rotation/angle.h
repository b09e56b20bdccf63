// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <numbers>

#include "rotcore/names.h"

namespace rotcore {

enum class AngleUnit { degrees, radians };

template <>
struct Names<AngleUnit> {
    static constexpr std::string_view kWhat = "an angle unit";
    static constexpr NameTable<AngleUnit, 2> kTable{
        {{AngleUnit::degrees, "deg"}, {AngleUnit::radians, "rad"}}};
};

inline constexpr double kPi = std::numbers::pi;
inline constexpr double kRadiansPerDegree = kPi / 180.0;
inline constexpr double kDegreesPerRadian = 180.0 / kPi;

constexpr double fromDegrees(double degrees)
{
    return degrees * kRadiansPerDegree;
}
constexpr double toDegrees(double radians)
{
    return radians * kDegreesPerRadian;
}

/// `angle`, given in `unit`, as radians.
constexpr double toRadians(double angle, AngleUnit unit)
{
    return unit == AngleUnit::degrees ? fromDegrees(angle) : angle;
}
/// `radians` in `unit`.
constexpr double inUnit(double radians, AngleUnit unit)
{
    return unit == AngleUnit::degrees ? toDegrees(radians) : radians;
}

/// The same angle in (-pi, pi]. Radians, finite. Exact for angles already within two turns of it.
double wrapped(double angle);

}  // namespace rotcore
