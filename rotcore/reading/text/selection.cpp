// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/selection.h"

#include <algorithm>
#include <cmath>
#include <numeric>

namespace rotcore {
namespace {

using Values = std::span<const Value>;
using Rival = Selection::Rival;

// Two decimals move the length of a unit quaternion by up to 0.01; twice that is still near one.
constexpr double kLengthTolerance = 0.02;

bool isUnit(Values values)
{
    double squares = 0.0;
    for (const Value& value : values)
        squares += value.number * value.number;
    return std::abs(std::sqrt(squares) - 1.0) <= kLengthTolerance;
}

bool isWhole(const Value& value)
{
    return value.halfDigit == 0.0 && value.number >= 0.0 &&
           std::floor(value.number) == value.number;
}

/// Largest element of |R R^T - I| of nine places.
double rotationError(Values values, const std::array<std::size_t, 9>& places)
{
    double worst = 0.0;
    for (std::size_t i = 0; i < 3; ++i)
        for (std::size_t j = i; j < 3; ++j) {
            double dot = i == j ? -1.0 : 0.0;
            for (std::size_t k = 0; k < 3; ++k)
                dot += values[places[3 * i + k]].number * values[places[3 * j + k]].number;
            worst = std::max(worst, std::abs(dot));
        }
    return worst;
}

void fill(Selection& selection, std::size_t first)
{
    std::iota(selection.places.begin(), selection.places.end(), first);
}

void selectFour(Values values, Selection& selection)
{
    const bool whole = isUnit(values);
    const bool firstThree = isUnit(values.first(3));
    const bool lastThree = isUnit(values.last(3));
    double largest = 0.0;
    for (const Value& value : values.first(3))
        largest = std::max(largest, std::abs(value.number));
    const bool wide = largest <= 1.0 && std::abs(values[3].number) > 1.0;
    fill(selection, 0);
    selection.kind = Kind::quaternion;
    if (whole) {
        selection.warn("four numbers of length 1: taken for a quaternion");
        selection.rival = firstThree ? Rival::axisAngle : Rival::scalarLast;
    } else if (firstThree || (wide && !lastThree)) {
        selection.kind = Kind::axisAngle;
        selection.rival = lastThree ? Rival::angleAxis : Rival::scalarLast;
        selection.warn(
            firstThree ? "the first three of four numbers have length 1: taken for an axis, then "
                         "its angle"
                       : "the last of four numbers is too large for a quaternion: taken for an "
                         "axis, then its angle");
    } else if (lastThree) {
        selection.kind = Kind::axisAngle;
        selection.places = {1, 2, 3, 0};
        selection.rival = Rival::scalarLast;
        selection.warn(
            "the last three of four numbers have length 1: taken for an angle, then its axis");
    } else {
        selection.warn(
            "four numbers, neither of length 1 nor with an axis of length 1: taken for a "
            "quaternion that is not normalised");
        selection.rival = Rival::axisAngle;
    }
}

/// Position and quaternion, perhaps after a time. Without a word that they are, seven or eight
/// numbers need four of length 1 among them.
bool selectPoseRow(Values values, Selection& selection, bool guessed)
{
    const std::size_t start = values.size() - 7;
    const Values row = values.subspan(start);
    const bool last = isUnit(row.last(4));
    const bool first = isUnit(row.first(4));
    if (guessed && !first && !last) return false;
    selection.kind = Kind::quaternion;
    if (first && !last) {
        fill(selection, start);
        selection.scalar = ScalarPlace::first;
        selection.warn("a quaternion, wxyz assumed, then a position, which is left aside");
        return true;
    }
    fill(selection, start + 3);
    selection.scalar = ScalarPlace::last;
    selection.warn(
        start == 0
            ? "a position, which is left aside, then a quaternion, xyzw assumed"
            : "a time and a position, which are left aside, then a quaternion, xyzw assumed");
    if (first) {
        selection.rival = Rival::quaternionFirst;
        selection.warn("the first four numbers have length 1 too: the quaternion may stand first");
    }
    return true;
}

/// Number, qw qx qy qz, tx ty tz, camera: a row of an image list, which maps world to camera
/// (documentation of the format).
bool selectImageRow(Values values, Selection& selection)
{
    if (values.size() != 9 || !isWhole(values[0]) || !isWhole(values[8])) return false;
    if (!isUnit(values.subspan(1, 4))) return false;
    std::array<std::size_t, 9> all{};
    std::iota(all.begin(), all.end(), 0U);
    if (rotationError(values, all) <= 2.0 * kLengthTolerance) return false;
    selection.kind = Kind::quaternion;
    fill(selection, 1);
    selection.scalar = ScalarPlace::first;
    selection.direction = Direction::worldToBody;
    selection.warn(
        "a row of an image list: qw qx qy qz, from world to camera; number, position and camera "
        "are left aside");
    return true;
}

void selectNine(Values values, Selection& selection, bool guessed)
{
    fill(selection, 0);
    if (guessed && rotationError(values, selection.places) > 0.5)
        selection.warn(
            "these nine numbers are far from a rotation matrix; paste one orientation at a time");
}

void selectTwelve(Values values, Selection& selection)
{
    fill(selection, 0);
    std::array<std::size_t, 9> wide{0, 1, 2, 4, 5, 6, 8, 9, 10};
    if (rotationError(values, wide) > 2.0 * kLengthTolerance &&
        rotationError(values, selection.places) <= 2.0 * kLengthTolerance) {
        selection.rival = Rival::columns;
        selection.warn(
            "twelve numbers of which the first nine are a rotation; the last three are left "
            "aside as the translation");
        return;
    }
    selection.places = wide;
    selection.warn("a 3x4 matrix; its last column is left aside as the translation");
}

void selectSixteen(Values values, Selection& selection)
{
    selection.places = {0, 1, 2, 4, 5, 6, 8, 9, 10};
    const auto zero = [&](std::initializer_list<std::size_t> places) {
        return std::all_of(places.begin(), places.end(),
                           [&](std::size_t place) { return values[place].number == 0.0; });
    };
    const bool one = values[15].number == 1.0;
    const bool rowEmpty = zero({12, 13, 14});
    const bool columnEmpty = zero({3, 7, 11});
    if (one && columnEmpty && !rowEmpty) {
        if (!selection.storage)
            selection.warn(
                "this 4x4 matrix looks transposed, its translation stands in "
                "the last row: read by columns");
        if (!selection.storage) selection.storage = Storage::columns;
        selection.warn("the translation of a 4x4 matrix is left aside");
        return;
    }
    if (!columnEmpty) selection.warn("the translation of a 4x4 matrix is left aside");
    if (!one || !rowEmpty) selection.warn("the last row of the 4x4 matrix is not 0 0 0 1");
}

bool selectMatrix(Values values, Selection& selection, bool guessed)
{
    selection.kind = Kind::matrix;
    switch (values.size()) {
        case 9:
            selectNine(values, selection, guessed);
            return true;
        case 12:
            selectTwelve(values, selection);
            return true;
        case 16:
            selectSixteen(values, selection);
            return true;
        default:
            return false;
    }
}

}  // namespace

bool fitsKind(std::size_t count, Kind kind)
{
    if (count == countOf(kind)) return true;
    if (kind == Kind::quaternion) return count == 7 || count == 8;
    return kind == Kind::matrix && (count == 12 || count == 16);
}

bool fitsAnyKind(std::size_t count)
{
    return count == 3 || count == 4 || (count >= 7 && count <= 9) || count == 12 || count == 16;
}

std::optional<Selection> selected(std::span<const Value> values, std::optional<Kind> kind,
                                  std::optional<Storage> storage)
{
    Selection selection;
    selection.storage = storage;
    if (kind && !fitsKind(values.size(), *kind)) {
        if (*kind == Kind::quaternion && selectImageRow(values, selection)) return selection;
        return std::nullopt;
    }
    if (kind && values.size() == countOf(*kind)) {
        selection.kind = *kind;
        fill(selection, 0);
        return selection;
    }
    switch (values.size()) {
        case 3:
            fill(selection, 0);
            selection.warn("three numbers: taken for Euler angles");
            return selection;
        case 4:
            selectFour(values, selection);
            return selection;
        case 7:
        case 8:
            if (!selectPoseRow(values, selection, !kind)) return std::nullopt;
            return selection;
        case 9:
            if (!kind && selectImageRow(values, selection)) return selection;
            break;
        default:
            break;
    }
    if (!selectMatrix(values, selection, !kind)) return std::nullopt;
    if (!kind && values.size() == 9) selection.warn("nine numbers: taken for a matrix");
    return selection;
}

}  // namespace rotcore
