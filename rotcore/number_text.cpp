// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/number_text.h"

#include <array>
#include <cmath>
#include <cstddef>

#include <fmt/format.h>

#include "rotcore/rotation/angle.h"

namespace rotcore {

std::string numberText(double value)
{
    return fmt::format("{}", value + 0.0);  // adding zero makes +0 of -0
}

std::string roundedText(double value, int significantDigits)
{
    return fmt::format("{:.{}g}", value + 0.0, significantDigits);
}

std::string degreesText(double radians)
{
    const double degrees = toDegrees(radians);
    if (degrees != 0.0 && std::abs(degrees) < 1e-3) return fmt::format("{:.2g} deg", degrees);
    std::string text = fmt::format("{:.4f}", degrees + 0.0);
    text.erase(text.find_last_not_of('0') + 1);
    if (text.back() == '.') text.pop_back();
    return text + " deg";
}

std::string ordinalText(int index)
{
    constexpr std::array<const char*, 4> kWords{"first", "second", "third", "fourth"};
    return kWords.at(static_cast<std::size_t>(index));
}

}  // namespace rotcore
