// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/figure_text.h"

#include <QRegularExpression>
#include <algorithm>
#include <array>
#include <cmath>

#include "rotcore/number_text.h"
#include "rotcore/reading/text/expression.h"

namespace ui {
namespace {

using rotcore::AngleUnit;
using rotcore::Fault;

constexpr QChar kMinus(0x2212);

// Superscript digits 0 to 9.
constexpr std::array<char16_t, 10> kRaised{0x2070, 0xB9,   0xB2,   0xB3,   0x2074,
                                           0x2075, 0x2076, 0x2077, 0x2078, 0x2079};

bool isAngle(Quantity quantity)
{
    return quantity == Quantity::degrees || quantity == Quantity::radians;
}

Fault notANumber(const QString& text)
{
    return {
        Fault::Kind::badText,
        "\"" + text.toStdString() + "\" is not one number; write one such as 12.5, -0.25 or pi/2"};
}

// What the core's arithmetic understands: a point for a lone decimal comma, a plain minus.
std::string plainText(QString text)
{
    text.replace(kMinus, '-');
    if (text.count(',') == 1 && !text.contains('.')) text.replace(',', '.');
    return text.trimmed().toStdString();
}

}  // namespace

Quantity quantityOf(AngleUnit unit)
{
    return unit == AngleUnit::degrees ? Quantity::degrees : Quantity::radians;
}

int decimalsOf(Quantity quantity)
{
    switch (quantity) {
        case Quantity::degrees:
            return 3;
        case Quantity::radians:
            return 5;
        case Quantity::quaternion:
            return 6;
        case Quantity::matrix:
        case Quantity::length:
            return 4;
    }
    return 6;
}

QString fixedText(double value, int decimals)
{
    QString text = QString::number(value, 'f', decimals);
    if (!text.startsWith('-')) return text;
    const bool isZero =
        std::all_of(text.cbegin() + 1, text.cend(), [](QChar c) { return c == '0' || c == '.'; });
    if (isZero) return text.mid(1);
    text[0] = kMinus;
    return text;
}

QString figureText(double value, Quantity quantity)
{
    const QString unit = quantity == Quantity::degrees   ? QStringLiteral("°")
                         : quantity == Quantity::radians ? QStringLiteral(" rad")
                                                         : QString();
    return fixedText(value, decimalsOf(quantity)) + unit;
}

double shownAngle(double radians, AngleUnit unit)
{
    if (unit == AngleUnit::radians) return radians;
    const double degrees = rotcore::toDegrees(radians);
    for (int digits = 1; digits <= 17; ++digits) {
        const double rounder = QString::number(degrees, 'g', digits).toDouble();
        if (rotcore::fromDegrees(rounder) == radians) return rounder;
    }
    return degrees;
}

rotcore::Result<double> parseFigure(const QString& text, Quantity quantity)
{
    const std::string plain = plainText(text);
    const auto read =
        rotcore::itemsOf(plain, rotcore::tokensOf(plain, rotcore::DecimalMark::point));
    if (read.values.size() != 1) return notANumber(text);
    const rotcore::Value& value = read.values.front();
    std::optional<AngleUnit> unit = value.unit;
    for (const rotcore::Item& item : read.items) {
        if (item.kind == rotcore::Item::Kind::value) continue;
        const auto word = std::string_view(plain).substr(item.begin, item.end - item.begin);
        const auto named = rotcore::unitOfWord(word);
        if (!named) return notANumber(text);
        unit = named;
    }
    if (value.imaginary != '\0') return notANumber(text);
    if (!std::isfinite(value.number))
        return Fault{Fault::Kind::notFinite, "that is not a finite number"};
    if (!isAngle(quantity) || !unit) return value.number;
    const AngleUnit shown = quantity == Quantity::degrees ? AngleUnit::degrees : AngleUnit::radians;
    if (*unit == shown) return value.number;
    return shownAngle(rotcore::toRadians(value.number, *unit), shown);
}

QString orderWords(rotcore::Order order)
{
    const auto axes = rotcore::axesOf(order);
    QString words;
    for (const rotcore::Axis axis : axes) {
        if (!words.isEmpty()) words += QStringLiteral(", ");
        words += QString::fromUtf8(rotcore::nameOf(axis));
    }
    return words;
}

QString layoutWords(rotcore::ScalarPlace scalar)
{
    return scalar == rotcore::ScalarPlace::first ? QStringLiteral("w x y z")
                                                 : QStringLiteral("x y z w");
}

QString algebraWords(rotcore::Algebra algebra)
{
    return algebra == rotcore::Algebra::hamilton ? QStringLiteral("Hamilton")
                                                 : QStringLiteral("JPL");
}

QString turnWords(const rotcore::EulerAngles& angles, int listed)
{
    const auto axis = rotcore::axesOf(angles.order)[static_cast<std::size_t>(listed)];
    const QString letter = QString::fromUtf8(rotcore::nameOf(axis));
    const QString owner = angles.about == rotcore::About::body ? QStringLiteral("the body's ")
                                                               : QStringLiteral("the space's ");
    return QString::fromStdString(rotcore::ordinalText(listed)) + QStringLiteral(" turn, about ") +
           owner + letter + QStringLiteral(" axis");
}

std::vector<Factor> factorsOf(const rotcore::EulerAngles& angles, AngleUnit unit)
{
    const auto axes = rotcore::axesOf(angles.order);
    std::vector<Factor> factors;
    for (int place = 0; place < 3; ++place) {
        const int listed = angles.about == rotcore::About::body ? place : 2 - place;
        const auto index = static_cast<std::size_t>(listed);
        const double shown = rotcore::inUnit(angles.angles[index], unit);
        const QString figure = unit == AngleUnit::degrees
                                   ? fixedText(shown, 1) + QStringLiteral("°")
                                   : fixedText(shown, 3);
        factors.push_back(
            {listed, axes[index],
             "R" + QString::fromUtf8(rotcore::nameOf(axes[index])) + "(" + figure + ")"});
    }
    return factors;
}

QString lockText(const rotcore::Findings& found)
{
    if (!found.euler.family) return {};
    const rotcore::LockFamily& family = *found.euler.family;
    const auto axes = rotcore::axesOf(found.angles.order);
    const auto outer = static_cast<std::size_t>(rotcore::outerIndex(found.angles.about));
    const std::size_t inner = 2 - outer;
    const AngleUnit unit = found.shown.unit;
    const auto letter = [&](std::size_t n) { return QString::fromUtf8(rotcore::nameOf(axes[n])); };
    // A repeated axis would read "z + z".
    const bool repeats = axes[outer] == axes[inner];
    const QString first = repeats ? QStringLiteral("the outer ") + letter(outer) : letter(outer);
    const QString second = repeats ? QStringLiteral("the inner ") + letter(inner) : letter(inner);
    const QString sign = family.sign > 0 ? QStringLiteral(" + ") : QStringLiteral(" − ");
    return QStringLiteral("At lock: only ") + first + sign + second + QStringLiteral(" = ") +
           figureText(rotcore::inUnit(family.fixed, unit), quantityOf(unit)) +
           QStringLiteral(" is fixed. Shown: ") + first + QStringLiteral(" kept at ") +
           figureText(shownAngle(found.angles.angles[outer], unit), quantityOf(unit)) +
           QStringLiteral(", the outer ring's angle.");
}

QString roughText(double value)
{
    if (value == 0.0) return QStringLiteral("0");
    if (value >= 1e-3) return QString::fromStdString(rotcore::roundedText(value, 1));
    auto power = static_cast<int>(std::floor(std::log10(value)));
    auto digit = static_cast<int>(std::lround(value / std::pow(10.0, power)));
    if (digit == 10) {
        digit = 1;
        ++power;
    }
    QString raised(QChar(0x207B));  // power is negative here
    for (const QChar figure : QString::number(-power))
        raised += QChar(kRaised[static_cast<std::size_t>(figure.digitValue())]);
    return QString::number(digit) + QStringLiteral(" × 10") + raised;
}

QString rotationText(const rotcore::MatrixCheck& check)
{
    return QStringLiteral("✓ a rotation, to ") + roughText(check.orthonormalityError);
}

QString sentenceOf(const std::string& message)
{
    QString sentence = QString::fromStdString(message).trimmed();
    if (sentence.isEmpty()) return sentence;
    sentence[0] = sentence[0].toUpper();
    // A minus before a number becomes a true one; a hyphen in a word stays.
    static const QRegularExpression kSign(QStringLiteral("(?<=^|[\\s(])-(?=[0-9.])"));
    sentence.replace(kSign, kMinus);
    if (!sentence.endsWith('.')) sentence += '.';
    return sentence;
}

}  // namespace ui
