// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

namespace rotcore {

/// The shortest text that reads back as the same double; never in a locale's style, never "-0".
std::string numberText(double value);

/// For messages and tables: `value` to so many significant digits, trailing zeros dropped.
std::string roundedText(double value, int significantDigits = 6);

/// An angle as degrees for people, "30.5 deg" (4 decimals at most).
std::string degreesText(double radians);

/// "first", "second", "third" for 0, 1, 2.
std::string ordinalText(int index);

}  // namespace rotcore
