// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string>
#include <utility>
#include <vector>

#include "rotcore/reading/text/fields.h"

namespace rotcore {

/// One number with its name.
struct Named {
    Component component = Component::none;
    int number = 0;  ///< see Label::number
    Value value;
};

/// Named numbers that may make one rotation, and what stood above them.
struct NamedGroup {
    std::vector<Named> numbers;
    StatedReading said;
    std::vector<std::string> notes;
    bool ofOrientation = false;  ///< x, y, z alone stand under "orientation" or the like
};

/// Sorts named numbers into the rotation they make; the others go to `fields.aside`.
void addGroup(const NamedGroup& group, Fields& fields);

/// Collects named numbers one after another. A name that comes again begins a new group.
class NamedNumbers {
public:
    explicit NamedNumbers(Fields& fields) : m_fields(fields) {}

    /// A word that may name one of the next numbers; `label` is empty if its meaning is unknown.
    void addName(const Label& label) { m_names.push_back(label); }
    void addNote(std::string sentence) { m_notes.push_back(std::move(sentence)); }
    void forgetNames() { m_names.clear(); }

    /// Gives the names to the numbers of a run. False if there are none or they do not fit.
    /// `section`: what the numbers stand under; changed when the names open or close one.
    bool take(std::span<const Value> run, const StatedReading& said, Topic& section);
    /// Numbers with i, j, k behind them and one without.
    void takeImaginary(std::span<const Value> run);
    /// Ends the group.
    void close();
    /// The layout, if the names since the last run are just w, x, y, z or x, y, z, w.
    std::optional<ScalarPlace> layoutInNames() const;
    /// Something said after the numbers: it holds for the open group if that does not have it.
    bool sayAfterwards(const StatedReading& said);

private:
    void axisByLetter(const std::vector<Label>& components, Topic& section);
    void axisNumbers(std::span<const Value> run, bool angleFirst);
    bool tuple(std::span<const Value> run, const std::vector<Label>& components, Topic& section);
    std::vector<Label> columns(std::size_t count, const std::vector<Label>& components) const;
    void add(const Label& label, const Value& value, Topic section);
    void addNamed(Component component, int number, const Value& value);

    Fields& m_fields;
    NamedGroup m_group;
    StatedReading m_said;
    std::vector<Label> m_names;
    std::vector<std::string> m_notes;  ///< for the next group
};

/// Fills `into` with what only `from` says.
void complete(StatedReading& into, const StatedReading& from);

}  // namespace rotcore
