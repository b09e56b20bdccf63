// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/general_text.h"

#include <algorithm>
#include <array>
#include <utility>

#include "rotcore/number_text.h"
#include "rotcore/reading/text/fields.h"
#include "rotcore/reading/text/selection.h"
#include "rotcore/reading/text/settle.h"
#include "rotcore/rotation/quaternion.h"

namespace rotcore {
namespace {

constexpr std::size_t kLongestText = 4U << 20U;
constexpr std::size_t kMostNamesInWarning = 6;

/// Whether the numbers are as many as their kind takes.
bool isUsable(const Field& field)
{
    return !field.said.kind || selected(field.values, field.said.kind, std::nullopt).has_value();
}

/// Quaternions and matrices leave the least open, so they come first.
int rankOf(Kind kind)
{
    switch (kind) {
        case Kind::quaternion:
            return 0;
        case Kind::matrix:
            return 1;
        case Kind::axisAngle:
            return 2;
        case Kind::rotationVector:
            return 3;
        case Kind::euler:
            return 4;
    }
    return 5;
}

/// How far two readings of one pose may differ because of their printed digits, radians.
double slackOf(const TextInput& input)
{
    constexpr double kArithmetic = 1e-6;  // shortest prints of single precision
    constexpr double kPerDigit = 5.0;     // three angles or nine elements, each off by half a digit
    const Reading& reading = input.numbers.reading;
    const bool isLength = reading.kind == Kind::quaternion || reading.kind == Kind::matrix;
    const double half = input.resolution.value_or(0.0);
    return kArithmetic + kPerDigit * (isLength ? half : toRadians(half, reading.unit));
}

class Chooser {
public:
    Chooser(std::string_view text, const StatedReading& stated, UnitGuess guess)
        : m_text(text), m_stated(stated), m_guess(guess)
    {
    }

    Result<TextInput> run(DecimalMark mark)
    {
        const Parts parts = partsOf(m_text, itemsOf(m_text, tokensOf(m_text, mark)));
        m_fields = fieldsOf(parts);
        const auto field = choose();
        if (!field) return nothing(parts);
        auto input = settled(m_text, *field, m_stated, m_guess);
        if (!input) return explained(input.error(), parts);
        checkAgainstOthers(input.value());
        tellAside(parts, input.value());
        return input;
    }

private:
    Fault nothing(const Parts& parts) const
    {
        std::string message = "there are no numbers of an orientation in the text";
        if (!parts.garbled.empty())
            message += "; \"" + std::string(parts.garbled[0].substr(0, 40)) + "\" is not a number";
        else if (!m_fields.aside.empty())
            message += "; left aside: " + m_fields.aside[0];
        return Fault{Fault::Kind::badText, message + "; paste 3, 4, 9, 12 or 16 numbers",
                     TextPlace{}};
    }

    /// A wrong count is often due to something that only looks like a number.
    Fault explained(Fault fault, const Parts& parts) const
    {
        if (fault.kind != Fault::Kind::wrongCount || parts.garbled.empty()) return fault;
        const std::string_view word = parts.garbled.front();
        fault.message = "\"" + std::string(word.substr(0, 40)) +
                        "\" is not a number; write plain decimals (without it: " + fault.message +
                        ")";
        fault.kind = Fault::Kind::badText;
        fault.place = placeOf(m_text, static_cast<std::size_t>(word.data() - m_text.data()));
        return fault;
    }

    std::optional<Field> choose()
    {
        if (m_stated.kind) {
            if (auto field =
                    takeRotation([&](const Field& f) { return f.said.kind == m_stated.kind; }))
                return field;
            if (auto field = takeBare(*m_stated.kind)) return field;
        }
        std::stable_sort(m_fields.rotations.begin(), m_fields.rotations.end(),
                         [](const Field& a, const Field& b) {
                             return rankOf(*a.said.kind) < rankOf(*b.said.kind);
                         });
        if (auto field = takeRotation([](const Field&) { return true; })) return field;
        return joined();
    }

    template <class Predicate>
    std::optional<Field> takeRotation(Predicate wanted)
    {
        const auto found =
            std::find_if(m_fields.rotations.begin(), m_fields.rotations.end(),
                         [&](const Field& field) { return wanted(field) && isUsable(field); });
        if (found == m_fields.rotations.end()) return std::nullopt;
        Field field = std::move(*found);
        m_fields.rotations.erase(found);
        return field;
    }

    /// Numbers of which the text says nothing but that fit the stated kind.
    std::optional<Field> takeBare(Kind kind)
    {
        if (m_fields.rotations.empty()) return std::nullopt;
        const auto found =
            std::find_if(m_fields.bare.begin(), m_fields.bare.end(),
                         [&](const Field& field) { return fitsKind(field.values.size(), kind); });
        if (found == m_fields.bare.end()) return std::nullopt;
        Field field = std::move(*found);
        m_fields.bare.erase(found);
        return field;
    }

    /// The numbers that words have parted, all together; or those of them that alone are enough.
    std::optional<Field> joined()
    {
        std::vector<Field> loose = std::move(m_fields.rotations);
        std::move(m_fields.bare.begin(), m_fields.bare.end(), std::back_inserter(loose));
        m_fields.rotations.clear();
        m_fields.bare.clear();
        if (loose.empty()) return std::nullopt;
        std::stable_sort(loose.begin(), loose.end(), [](const Field& a, const Field& b) {
            return a.values.front().begin < b.values.front().begin;
        });
        const auto fits = [&](const Field& field) {
            return m_stated.kind ? fitsKind(field.values.size(), *m_stated.kind)
                                 : fitsAnyKind(field.values.size());
        };
        if (std::count_if(loose.begin(), loose.end(), fits) == 1 && loose.size() > 1) {
            const auto found = std::find_if(loose.begin(), loose.end(), fits);
            Field field = std::move(*found);
            loose.erase(found);
            m_fields.bare = std::move(loose);
            return field;
        }
        Field all = std::move(loose.front());
        for (auto field = loose.begin() + 1; field != loose.end(); ++field)
            append(all, *field);
        return all;
    }

    static void append(Field& all, const Field& more)
    {
        all.values.insert(all.values.end(), more.values.begin(), more.values.end());
        if (!all.said.kind) all.said.kind = more.said.kind;
        if (!all.said.unit) all.said.unit = more.said.unit;
        if (!all.said.order) all.said.order = more.said.order;
        if (!all.said.about) all.said.about = more.said.about;
        all.axes.reset();
        all.named = false;
    }

    /// The other rotations of a printout say the same pose again, or something is wrong.
    void checkAgainstOthers(TextInput& input)
    {
        constexpr std::size_t kMostChecked = 4;
        if (m_fields.rotations.empty()) return;
        const auto chosen = interpret(input.numbers);
        if (!chosen) return;
        for (std::size_t n = 0; n < std::min(kMostChecked, m_fields.rotations.size()); ++n) {
            const Field& field = m_fields.rotations[n];
            if (field.said.kind == Kind::euler && !field.said.order) continue;
            const auto other = settled(m_text, field, {}, m_guess);
            if (!other) continue;
            const auto meaning = interpret(other->numbers);
            if (!meaning) continue;
            const double apart = angleBetween(chosen->q_WB, meaning->q_WB);
            if (apart > slackOf(input) + slackOf(*other))
                input.warnings.push_back(field.name + " in the same text: another pose, " +
                                         degreesText(apart) + " away");
        }
    }

    void tellAside(const Parts& parts, TextInput& input)
    {
        std::vector<std::string> names = std::move(m_fields.aside);
        const auto& rotations = m_fields.rotations;
        for (std::size_t n = 0; n < std::min(rotations.size(), kMostNamesInWarning + 1); ++n)
            names.push_back("the " + rotations[n].name);
        std::size_t loose = 0;
        for (const Field& field : m_fields.bare)
            loose += field.values.size();
        if (loose > 0)
            names.push_back(std::to_string(loose) + (loose == 1 ? " number" : " numbers"));
        if (parts.hasClock) names.emplace_back("the time");
        for (const std::string_view word : parts.garbled)
            if (names.size() <= kMostNamesInWarning)
                names.push_back("\"" + std::string(word.substr(0, 40)) +
                                "\", which is not a number");
        names.erase(std::unique(names.begin(), names.end()), names.end());
        if (names.empty()) return;
        std::string sentence = "left aside: ";
        for (std::size_t n = 0; n < std::min(names.size(), kMostNamesInWarning); ++n)
            sentence += (n > 0 ? ", " : "") + names[n];
        if (names.size() > kMostNamesInWarning) sentence += " and more";
        input.warnings.push_back(sentence);
    }

    std::string_view m_text;
    const StatedReading& m_stated;
    UnitGuess m_guess;
    Fields m_fields;
};

}  // namespace

Result<TextInput> readGeneralText(std::string_view text, const StatedReading& stated,
                                  UnitGuess unitGuess)
{
    if (text.size() > kLongestText)
        return Fault{
            Fault::Kind::badText,
            "the text has more than 4 MB; paste the numbers of one orientation, or open it as a "
            "recording",
            TextPlace{}};
    Chooser chooser(text, stated, unitGuess);
    auto withPoints = chooser.run(DecimalMark::point);
    if (!mayHaveDecimalCommas(text)) return withPoints;
    auto withCommas = chooser.run(DecimalMark::comma);
    if (!withCommas) return withPoints;
    if (withPoints) {
        withCommas.value().others.push_back(
            {withPoints->numbers, "commas separate the numbers, " +
                                      std::to_string(withPoints->numbers.values.size()) +
                                      " of them"});
        withCommas.value().warnings.emplace_back(
            "commas are taken for decimal marks, but could separate the numbers");
    } else {
        withCommas.value().warnings.emplace_back("commas are taken for decimal marks");
    }
    return withCommas;
}

}  // namespace rotcore
