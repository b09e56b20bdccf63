// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <optional>
#include <vector>

#include "rotcore/case/findings.h"

namespace ui {

/// What a shown number measures: this gives its decimals, its steps and the units it may be typed
/// in.
enum class Quantity { degrees, radians, quaternion, matrix, length };

Quantity quantityOf(rotcore::AngleUnit unit);
int decimalsOf(Quantity quantity);

/// Fixed decimals, true minus, never "minus zero", with the unit of an angle.
QString figureText(double value, Quantity quantity);

/// As figureText, but with so many decimals and no sign of the unit.
QString fixedText(double value, int decimals);

/// The roundest number of `unit` that is, to the last digit, this angle.
double shownAngle(double radians, rotcore::AngleUnit unit);

/// The number in what a person typed into a field that shows `quantity`: decimals with point or
/// comma, a true minus, arithmetic ("pi/2", "sqrt(2)/2"), for angles also "30 deg" or "0.5 rad",
/// whichever is shown. Faults: badText, notFinite, said for people.
rotcore::Result<double> parseFigure(const QString& text, Quantity quantity);

/// "z, y, x".
QString orderWords(rotcore::Order order);

/// The four letters of a layout, apart: "w x y z".
QString layoutWords(rotcore::ScalarPlace scalar);
QString algebraWords(rotcore::Algebra algebra);

/// "first turn, about the body's z axis", for tooltips and accessible names.
QString turnWords(const rotcore::EulerAngles& angles, int listed);

/// One factor of the product that makes the pose.
struct Factor {
    int listed = 0;  ///< which of the three turns
    rotcore::Axis axis = rotcore::Axis::z;
    QString text;  ///< "Rz(30.0°)"
    friend bool operator==(const Factor&, const Factor&) = default;
};

/// The factors from left to right, as matrices are multiplied: about space the last listed is
/// first.
std::vector<Factor> factorsOf(const rotcore::EulerAngles& angles, rotcore::AngleUnit unit);

/// At lock, what the pose still fixes and which member is shown; empty elsewhere.
QString lockText(const rotcore::Findings& found);

/// "a rotation, to 2 × 10⁻¹⁶".
QString rotationText(const rotcore::MatrixCheck& check);

/// A rough positive number as people write it: "2 × 10⁻¹⁶", "0.03".
QString roughText(double value);

/// A message of the core for the screen: it starts with a capital, ends with a full stop and has
/// true minus signs.
QString sentenceOf(const std::string& message);

}  // namespace ui
