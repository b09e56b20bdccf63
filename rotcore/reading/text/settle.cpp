// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/settle.h"

#include <algorithm>
#include <cmath>
#include <utility>

#include "rotcore/reading/text/selection.h"
#include "rotcore/reading/text/unit_guess.h"

namespace rotcore {
namespace {

std::string kindWords(Kind kind)
{
    switch (kind) {
        case Kind::euler:
            return "Euler angles";
        case Kind::quaternion:
            return "a quaternion";
        case Kind::matrix:
            return "a matrix";
        case Kind::rotationVector:
            return "a rotation vector";
        case Kind::axisAngle:
            return "axis and angle";
    }
    return {};
}

AngleUnit otherUnit(AngleUnit unit)
{
    return unit == AngleUnit::degrees ? AngleUnit::radians : AngleUnit::degrees;
}

class Settler {
public:
    Settler(std::string_view text, const Field& field, const StatedReading& stated, UnitGuess guess)
        : m_text(text), m_field(field), m_stated(stated), m_guess(guess)
    {
    }

    Result<TextInput> run()
    {
        mergeStated();
        m_input.kindGuessed = !m_known.kind.has_value();
        const auto selection = selected(m_field.values, m_known.kind, m_known.storage);
        if (!selection) return wrongCount();
        take(*selection);
        if (const auto fault = notFinite()) return *fault;
        decide(*selection);
        finish();
        return std::move(m_input);
    }

private:
    // ---- what is known

    template <class E>
    void merge(std::optional<E> StatedReading::*member, bool mayDiffer)
    {
        const auto& stated = m_stated.*member;
        const auto& said = m_field.said.*member;
        m_known.*member = stated ? stated : said;
        if (stated && said && stated != said && !mayDiffer)
            warn("the text says " + std::string(nameOf(*said)) + ", but " +
                 std::string(nameOf(*stated)) + " was stated and is used");
    }

    void mergeStated()
    {
        merge(&StatedReading::kind, false);
        merge(&StatedReading::order, m_field.axes.has_value());
        merge(&StatedReading::about, m_field.axes.has_value());
        merge(&StatedReading::unit, false);
        merge(&StatedReading::scalar, m_field.named);
        merge(&StatedReading::algebra, false);
        merge(&StatedReading::direction, false);
        merge(&StatedReading::storage, false);
    }

    Fault wrongCount() const
    {
        const std::size_t count = m_field.values.size();
        std::string message = std::to_string(count) + (count == 1 ? " number" : " numbers");
        std::size_t wanted = 0;
        if (m_known.kind) {
            wanted = countOf(*m_known.kind);
            message += ", but " + kindWords(*m_known.kind) +
                       (m_known.kind == Kind::euler ? " take " : " takes ") +
                       std::to_string(wanted);
            if (m_known.kind == Kind::matrix) message += " (or 12, or 16)";
        } else {
            message +=
                "; an orientation is 3 (angles or a rotation vector), 4 (a quaternion, or an axis "
                "and an angle), or 9, 12 or 16 (a matrix); paste the numbers of one orientation";
            wanted = count < 3 ? 3 : count < 9 ? 4 : count < 16 ? 9 : 16;
        }
        Fault fault{Fault::Kind::wrongCount, message};
        if (count > 0)
            fault.place = placeOf(m_text, m_field.values[std::min(wanted, count - 1)].begin);
        return fault;
    }

    // ---- the numbers

    void take(const Selection& selection)
    {
        m_reading.kind = selection.kind;
        m_count = countOf(selection.kind);
        for (std::size_t n = 0; n < m_count; ++n)
            m_values[n] = m_field.values[selection.places[n]];
        if (selection.scalar && !m_known.scalar) m_known.scalar = selection.scalar;
        if (selection.storage && !m_known.storage) m_known.storage = selection.storage;
        if (selection.direction && !m_known.direction) m_known.direction = selection.direction;
        for (const char* warning : selection.warnings)
            if (warning) warn(warning);
        m_reading.direction = m_known.direction.value_or(m_reading.direction);
    }

    std::optional<Fault> notFinite() const
    {
        for (std::size_t n = 0; n < m_count; ++n)
            if (!std::isfinite(m_values[n].number))
                return Fault{Fault::Kind::notFinite,
                             "number " + std::to_string(n + 1) +
                                 " is infinite or not a number; every number must be finite",
                             placeOf(m_text, m_values[n].begin)};
        return std::nullopt;
    }

    std::span<Value> values() { return {m_values.data(), m_count}; }

    // ---- the kinds

    void decide(const Selection& selection)
    {
        switch (m_reading.kind) {
            case Kind::euler:
                euler();
                break;
            case Kind::quaternion:
                quaternion();
                break;
            case Kind::matrix:
                m_reading.storage = m_known.storage.value_or(Storage::rows);
                break;
            case Kind::rotationVector:
                rotationVector();
                break;
            case Kind::axisAngle:
                unit(values().last(1), AngleUnit::degrees);
                break;
        }
        rivals(selection);
    }

    void euler()
    {
        m_reading.order = m_known.order.value_or(Order::zyx);
        m_reading.about = m_known.about.value_or(About::body);
        if (m_field.axes) placeByAxis();
        if (!m_known.order || !m_known.about) {
            std::string assumed = "assumed: ";
            if (!m_known.order) assumed += "zyx ";
            warn(assumed + (m_known.about == About::space ? "about space" : "about body"));
        }
        unit(values(), AngleUnit::degrees);
    }

    /// Puts angles that are known to be about x, y, z into the order of the reading.
    void placeByAxis()
    {
        if (isRepeating(m_reading.order)) {
            warn("the names of the angles do not go with " + std::string(nameOf(m_reading.order)) +
                 "; they are taken as listed");
            return;
        }
        const auto listed = m_values;
        const auto axes = axesOf(m_reading.order);
        for (std::size_t n = 0; n < 3; ++n)
            for (std::size_t m = 0; m < 3; ++m)
                if ((*m_field.axes)[m] == axes[n]) m_values[n] = listed[m];
    }

    void quaternion()
    {
        m_reading.scalar = m_known.scalar.value_or(ScalarPlace::first);
        m_reading.algebra = m_known.algebra.value_or(m_reading.algebra);
        if (!m_known.scalar) warn("assumed: the scalar stands first, wxyz");
        if (m_field.named && m_reading.scalar == ScalarPlace::last)
            std::rotate(m_values.begin(), m_values.begin() + 1, m_values.begin() + 4);
    }

    void rotationVector()
    {
        if (m_field.axes) {
            const auto listed = m_values;
            for (std::size_t m = 0; m < 3; ++m)
                m_values[static_cast<std::size_t>(indexOf((*m_field.axes)[m]))] = listed[m];
        }
        unit(values(), AngleUnit::radians);
    }

    void unit(std::span<Value> angles, AngleUnit usual)
    {
        UnitDecision decision =
            decideUnit(angles, m_field.said.unit, m_stated.unit, usual, m_guess);
        m_reading.unit = decision.unit;
        m_unitGuessed = decision.guessed;
        if (!decision.warning.empty()) warn(std::move(decision.warning));
    }

    // ---- what else it could be

    /// The reading of another kind that agrees with this one in all that concerns both.
    Reading as(Kind kind) const
    {
        Reading reading;
        reading.kind = kind;
        reading.direction = m_reading.direction;
        if (kind == Kind::quaternion)
            reading.algebra = m_known.algebra.value_or(reading.algebra);
        else
            reading.unit = m_reading.unit;
        return reading;
    }

    void addOther(const Reading& reading, std::span<const std::size_t> places, const char* words)
    {
        OtherReading other;
        other.numbers.reading = reading;
        other.numbers.values.reserve(places.size());
        for (const std::size_t place : places)
            other.numbers.values.push_back(m_values[place].number);
        other.words = words;
        m_input.others.push_back(std::move(other));
    }

    void rivals(const Selection& selection)
    {
        static constexpr std::array<std::size_t, 9> kAsListed{0, 1, 2, 3, 4, 5, 6, 7, 8};
        const std::span<const std::size_t> all(kAsListed.data(), m_count);
        Reading other = m_reading;
        if (m_reading.kind == Kind::quaternion && !m_known.scalar) {
            other.scalar = ScalarPlace::last;
            addOther(other, all, "scalar last, xyzw");
        }
        if (m_reading.kind == Kind::matrix && !m_known.storage) {
            other.storage = Storage::columns;
            addOther(other, all, "listed by columns");
        }
        if (m_unitGuessed) {
            other.unit = otherUnit(m_reading.unit);
            addOther(other, all,
                     other.unit == AngleUnit::radians ? "radians instead of degrees"
                                                      : "degrees instead of radians");
        }
        if (m_reading.kind == Kind::euler && (m_input.kindGuessed || m_field.maybeVector))
            otherVector();
        if (m_input.kindGuessed) otherKinds(selection, all);
        if (selection.rival == Selection::Rival::quaternionFirst) quaternionFirst();
        if (selection.rival == Selection::Rival::columns && m_reading.storage == Storage::rows &&
            m_input.others.empty()) {
            other.storage = Storage::columns;
            addOther(other, all, "listed by columns");
        }
    }

    /// Three numbers as a rotation vector: x, y, z if they have names, as listed if not.
    void otherVector()
    {
        std::array<std::size_t, 3> places{0, 1, 2};
        if (m_field.axes && !isRepeating(m_reading.order)) {
            const auto axes = axesOf(m_reading.order);
            for (std::size_t n = 0; n < 3; ++n)
                places[static_cast<std::size_t>(indexOf(axes[n]))] = n;
        }
        Reading other = as(Kind::rotationVector);
        if (m_unitGuessed) other.unit = AngleUnit::radians;
        addOther(other, places, "a rotation vector");
    }

    void otherKinds(const Selection& selection, std::span<const std::size_t> all)
    {
        using Rival = Selection::Rival;
        if (m_reading.kind == Kind::quaternion && selection.rival == Rival::axisAngle) {
            addOther(as(Kind::axisAngle), all, "an axis, then its angle");
        } else if (m_reading.kind == Kind::axisAngle) {
            if (selection.rival == Rival::angleAxis) {
                static constexpr std::array<std::size_t, 4> kAngleFirst{1, 2, 3, 0};
                addOther(m_reading, kAngleFirst, "an angle, then its axis");
            }
            addOther(as(Kind::quaternion), all, "a quaternion, wxyz, not normalised");
            for (std::size_t n = 0; n < 4; ++n)  // an angle that stood first is first again
                m_input.others.back().numbers.values[n] = m_field.values[n].number;
        }
    }

    /// Of seven or eight numbers with two quaternions in them, the other one.
    void quaternionFirst()
    {
        OtherReading other;
        other.numbers.reading = m_reading;
        other.numbers.reading.scalar = m_stated.scalar.value_or(ScalarPlace::first);
        const auto first = m_field.values.end() - 7;
        for (auto value = first; value != first + 4; ++value) {
            if (!std::isfinite(value->number)) return;
            other.numbers.values.push_back(value->number);
        }
        other.words = "the quaternion stands before the position";
        m_input.others.push_back(std::move(other));
    }

    // ---- the result

    void finish()
    {
        m_input.numbers.reading = m_reading;
        m_input.numbers.values.reserve(m_count);
        for (const Value& value : values())
            m_input.numbers.values.push_back(value.number);
        const bool angleOnly = m_reading.kind == Kind::axisAngle;
        const double resolution = resolutionOf(angleOnly ? values().last(1) : values());
        if (resolution > 0.0) m_input.resolution = resolution;
        for (const std::string& note : m_field.notes)
            warn(note);
    }

    void warn(std::string sentence) { m_input.warnings.push_back(std::move(sentence)); }

    std::string_view m_text;
    const Field& m_field;
    const StatedReading& m_stated;
    UnitGuess m_guess;
    StatedReading m_known;
    Reading m_reading;
    TextInput m_input;
    std::array<Value, 9> m_values{};
    std::size_t m_count = 0;
    bool m_unitGuessed = false;
};

}  // namespace

Result<TextInput> settled(std::string_view text, const Field& field, const StatedReading& stated,
                          UnitGuess unitGuess)
{
    return Settler(text, field, stated, unitGuess).run();
}

TextPlace placeOf(std::string_view text, std::size_t byte)
{
    TextPlace place;
    const std::string_view before = text.substr(0, byte);
    place.line += static_cast<std::size_t>(std::count(before.begin(), before.end(), '\n'));
    const auto lineStart = before.rfind('\n');
    place.column = lineStart == std::string_view::npos ? byte + 1 : byte - lineStart;
    return place;
}

}  // namespace rotcore
