// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <cstddef>
#include <optional>
#include <span>

#include "rotcore/reading/reading.h"
#include "rotcore/reading/text/expression.h"

namespace rotcore {

/// Whether so many numbers can be of this kind, possibly with a position: 9, 12 or 16 for a matrix,
/// 4, 7 or 8 for a quaternion.
bool fitsKind(std::size_t count, Kind kind);

/// Whether so many numbers can be an orientation of any kind.
bool fitsAnyKind(std::size_t count);

/// Which of several numbers are the rotation, found by their count and lengths.
struct Selection {
    Kind kind = Kind::euler;
    std::array<std::size_t, 9> places{};  ///< countOf(kind) of them
    std::optional<ScalarPlace> scalar;
    std::optional<Storage> storage;
    std::optional<Direction> direction;
    /// Another selection from the same numbers that was not clearly worse.
    enum class Rival {
        none,
        scalarLast,
        axisAngle,
        angleAxis,
        quaternionFirst,
        columns
    } rival = Rival::none;
    std::array<const char*, 3> warnings{};  ///< static texts, null where there is none
    void warn(const char* text)
    {
        for (const char*& place : warnings)
            if (!place) {
                place = text;
                return;
            }
    }
};

/// `kind`: what they are known to be. Nothing if the count fits nothing.
std::optional<Selection> selected(std::span<const Value> values, std::optional<Kind> kind,
                                  std::optional<Storage> storage);

}  // namespace rotcore
