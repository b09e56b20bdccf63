// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/reading.h"

#include <algorithm>
#include <cmath>

#include "rotcore/number_text.h"
#include "rotcore/rotation/euler_angles.h"
#include "rotcore/rotation/rotation_vector.h"

namespace rotcore {
namespace {

// Seven printed digits move the length of a quaternion by less than this; more is worth a word.
constexpr double kLengthWorthAWord = 1e-6;
// Three printed digits move it by up to this; more was not rounding.
constexpr double kLengthOfRounding = 1e-3;

using Values = std::span<const double>;

Eigen::Matrix3d matrixFrom(Values values, Storage storage)
{
    Eigen::Matrix3d M;
    for (int row = 0; row < 3; ++row)
        for (int column = 0; column < 3; ++column) {
            const int place = storage == Storage::rows ? 3 * row + column : 3 * column + row;
            M(row, column) = values[static_cast<std::size_t>(place)];
        }
    return M;
}

Result<Interpretation> interpretEuler(const Reading& reading, Values values)
{
    EulerAngles euler{reading.order, reading.about, {}};
    std::transform(values.begin(), values.end(), euler.angles.begin(),
                   [&](double value) { return toRadians(value, reading.unit); });
    Interpretation meaning;
    meaning.q_WB = pose(euler);
    return meaning;
}

Result<Interpretation> interpretQuaternion(const Reading& reading, Values values)
{
    const QuaternionNumbers numbers{
        reading.scalar, reading.algebra, {values[0], values[1], values[2], values[3]}};
    const auto unit = normalised(hamiltonOf(numbers));
    if (!unit) return unit.error();
    Interpretation meaning;
    meaning.q_WB = unit->quaternion;
    meaning.length = unit->length;
    const double off = std::abs(unit->length - 1.0);
    if (off > kLengthWorthAWord)
        meaning.warnings.push_back(
            "the quaternion's length is " + roundedText(unit->length, 7) +
            (off > kLengthOfRounding ? ", not 1" : ", as few digits make it") +
            "; it was normalised");
    return meaning;
}

Result<Interpretation> interpretMatrix(const Reading& reading, Values values)
{
    auto check = checkMatrix(matrixFrom(values, reading.storage));
    if (!check) return check.error();
    using State = MatrixCheck::State;
    if (check->state == State::mirrored) return Fault{Fault::Kind::leftHanded, wordsOf(*check)};
    if (check->state == State::notRotation)
        return Fault{Fault::Kind::notOrthonormal, wordsOf(*check)};
    const auto q = quaternionFrom(
        check->state == State::rotation ? matrixFrom(values, reading.storage) : check->nearest);
    if (!q) return q.error();
    Interpretation meaning;
    meaning.q_WB = *q;
    if (check->state == State::rounded)
        meaning.warnings.push_back("the matrix is " + wordsOf(*check));
    meaning.matrix = std::move(check.value());
    return meaning;
}

Result<Interpretation> interpretRotationVector(const Reading& reading, Values values)
{
    const auto q = poseOfRotationVector({toRadians(values[0], reading.unit),
                                         toRadians(values[1], reading.unit),
                                         toRadians(values[2], reading.unit)});
    if (!q) return q.error();
    Interpretation meaning;
    meaning.q_WB = *q;
    return meaning;
}

Result<Interpretation> interpretAxisAngle(const Reading& reading, Values values)
{
    const Eigen::Vector3d axis(values[0], values[1], values[2]);
    const auto q = poseOfAxisAngle(axis, toRadians(values[3], reading.unit));
    if (!q) return q.error();
    Interpretation meaning;
    meaning.q_WB = *q;
    meaning.length = axis.stableNorm();
    if (std::abs(meaning.length - 1.0) > kLengthWorthAWord)
        meaning.warnings.push_back("the axis' length is " + roundedText(meaning.length, 7) +
                                   ", not 1; only its direction counts");
    return meaning;
}

Result<Interpretation> interpretByKind(const Reading& reading, Values values)
{
    switch (reading.kind) {
        case Kind::euler:
            return interpretEuler(reading, values);
        case Kind::quaternion:
            return interpretQuaternion(reading, values);
        case Kind::matrix:
            return interpretMatrix(reading, values);
        case Kind::rotationVector:
            return interpretRotationVector(reading, values);
        case Kind::axisAngle:
            return interpretAxisAngle(reading, values);
    }
    return Fault{Fault::Kind::badField, "the kind of the numbers is unknown"};
}

std::string unitWord(AngleUnit unit)
{
    return unit == AngleUnit::degrees ? "degrees" : "radians";
}

}  // namespace

Result<Interpretation> interpret(const SentNumbers& sent)
{
    const std::size_t wanted = countOf(sent.reading.kind);
    if (sent.values.size() != wanted)
        return Fault{Fault::Kind::wrongCount, std::string(nameOf(sent.reading.kind)) + " takes " +
                                                  std::to_string(wanted) + " numbers, not " +
                                                  std::to_string(sent.values.size())};
    for (std::size_t n = 0; n < wanted; ++n)
        if (!std::isfinite(sent.values[n]))
            return Fault{Fault::Kind::notFinite,
                         "number " + std::to_string(n + 1) + " is not a finite number"};
    auto meaning = interpretByKind(sent.reading, sent.values);
    if (meaning && sent.reading.direction == Direction::worldToBody)
        meaning.value().q_WB = meaning->q_WB.conjugate();
    return meaning;
}

std::string wordsOf(const Reading& reading)
{
    std::string words;
    switch (reading.kind) {
        case Kind::euler:
            words = "Euler angles, " + std::string(nameOf(reading.order)) + " about " +
                    std::string(nameOf(reading.about)) + ", " + unitWord(reading.unit);
            break;
        case Kind::quaternion:
            words = "quaternion, " + std::string(nameOf(reading.scalar)) +
                    (reading.algebra == Algebra::hamilton ? ", Hamilton" : ", JPL");
            break;
        case Kind::matrix:
            words = "matrix, listed by " + std::string(nameOf(reading.storage));
            break;
        case Kind::rotationVector:
            words = "rotation vector, " + unitWord(reading.unit);
            break;
        case Kind::axisAngle:
            words = "axis and angle, " + unitWord(reading.unit);
            break;
    }
    return words +
           (reading.direction == Direction::bodyToWorld ? ", body to world" : ", world to body");
}

}  // namespace rotcore
