// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/names.h"
#include "rotcore/result.h"
#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/matrix_check.h"
#include "rotcore/rotation/order.h"
#include "rotcore/rotation/quaternion.h"

namespace rotcore {

/// What a set of numbers is.
enum class Kind { euler, quaternion, matrix, rotationVector, axisAngle };

/// Which way the written rotation carries coordinates.
enum class Direction { bodyToWorld, worldToBody };

/// How nine numbers fill a matrix.
enum class Storage { rows, columns };

template <>
struct Names<Kind> {
    static constexpr std::string_view kWhat = "a kind of numbers";
    static constexpr NameTable<Kind, 5> kTable{{{Kind::euler, "euler"},
                                                {Kind::quaternion, "quaternion"},
                                                {Kind::matrix, "matrix"},
                                                {Kind::rotationVector, "rotvec"},
                                                {Kind::axisAngle, "axis-angle"}}};
};
template <>
struct Names<Direction> {
    static constexpr std::string_view kWhat = "a direction";
    static constexpr NameTable<Direction, 2> kTable{
        {{Direction::bodyToWorld, "body-to-world"}, {Direction::worldToBody, "world-to-body"}}};
};
template <>
struct Names<Storage> {
    static constexpr std::string_view kWhat = "a storage of matrices";
    static constexpr NameTable<Storage, 2> kTable{
        {{Storage::rows, "rows"}, {Storage::columns, "columns"}}};
};

/// A full rule that makes a rotation of raw numbers. Each switch counts only for the kinds it
/// concerns: order and about for euler; scalar and algebra for quaternion; storage for matrix; unit
/// for euler, rotvec and axis-angle.
struct Reading {
    Kind kind = Kind::euler;
    Order order = Order::zyx;
    About about = About::body;
    AngleUnit unit = AngleUnit::degrees;
    ScalarPlace scalar = ScalarPlace::first;
    Algebra algebra = Algebra::hamilton;
    Direction direction = Direction::bodyToWorld;
    Storage storage = Storage::rows;
    friend bool operator==(const Reading&, const Reading&) = default;
};

/// How many numbers a kind takes: 3, 4 or 9 (axis-angle: the axis, then the angle).
constexpr std::size_t countOf(Kind kind)
{
    switch (kind) {
        case Kind::euler:
        case Kind::rotationVector:
            return 3;
        case Kind::quaternion:
        case Kind::axisAngle:
            return 4;
        case Kind::matrix:
            return 9;
    }
    return 0;
}

/// Raw numbers with the rule they are read by.
struct SentNumbers {
    Reading reading;
    std::vector<double> values;  ///< countOf(reading.kind) of them, as they were sent
    friend bool operator==(const SentNumbers&, const SentNumbers&) = default;
};

/// What the numbers mean, with what had to be done to them.
struct Interpretation {
    Eigen::Quaterniond q_WB = Eigen::Quaterniond::Identity();
    std::optional<MatrixCheck> matrix;  ///< for a matrix only
    double length = 1.0;                ///< of the quaternion or axis before it was normalised
    std::vector<std::string> warnings;  ///< for people, one sentence each
};

/// The pose that `sent` stands for. A matrix within kRoundedMatrixTolerance of a rotation is
/// replaced by the nearest rotation, and a quaternion or axis brought to unit length; both are told
/// in the warnings. Faults: wrongCount; notFinite; zeroLength; notOrthonormal and leftHanded, with
/// the likely cause.
Result<Interpretation> interpret(const SentNumbers& sent);

/// The sentence of a reading, with only the switches that count for its kind:
/// "Euler angles, zyx about body, degrees, body to world".
std::string wordsOf(const Reading& reading);

}  // namespace rotcore
