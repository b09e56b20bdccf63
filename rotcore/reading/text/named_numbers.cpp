// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/named_numbers.h"

#include <algorithm>
#include <array>
#include <utility>

namespace rotcore {
namespace {

using Run = std::span<const Value>;

constexpr std::size_t kMostNamed = 64;  // more in one group are no orientation

Component shifted(Component first, int by)
{
    return static_cast<Component>(static_cast<int>(first) + by);
}

/// 0, 1, 2 for x, y, z; -1 for others.
int letterOf(Component component)
{
    const int letter = static_cast<int>(component) - static_cast<int>(Component::x);
    return letter >= 0 && letter <= 2 ? letter : -1;
}

template <class T>
void fillIn(std::optional<T>& into, const std::optional<T>& from)
{
    if (!into) into = from;
}

}  // namespace

void complete(StatedReading& into, const StatedReading& from)
{
    fillIn(into.kind, from.kind);
    fillIn(into.order, from.order);
    fillIn(into.about, from.about);
    fillIn(into.unit, from.unit);
    fillIn(into.scalar, from.scalar);
    fillIn(into.algebra, from.algebra);
    fillIn(into.direction, from.direction);
    fillIn(into.storage, from.storage);
}

bool NamedNumbers::take(Run run, const StatedReading& said, Topic& section)
{
    m_said = said;
    std::vector<Label> components;
    for (const Label& name : m_names)
        if (name.topic == Topic::component) components.push_back(name);
    if (components.empty()) return false;
    const Component last = components.back().component;
    if (run.size() == 1) {
        axisByLetter(components, section);
        add(components.back(), run[0], section);
        return true;
    }
    if (last == Component::axis && (run.size() == 3 || run.size() == 4)) {
        axisNumbers(run, components.size() > 1);
        return true;
    }
    if (last == Component::angle && components.size() == 2 && run.size() == 4 &&
        components[0].component == Component::axis) {
        axisNumbers(run, false);
        return true;
    }
    return tuple(run, components, section);
}

void NamedNumbers::takeImaginary(Run run)
{
    close();
    m_said = {};
    m_said.kind = Kind::quaternion;
    for (const Value& value : run) {
        const char letter = value.imaginary;
        addNamed(letter == '\0' ? Component::w : shifted(Component::x, letter - 'i'), 0, value);
    }
    close();
}

void NamedNumbers::close()
{
    if (!m_group.numbers.empty()) addGroup(m_group, m_fields);
    m_group = {};
}

bool NamedNumbers::sayAfterwards(const StatedReading& said)
{
    if (m_group.numbers.empty()) return false;
    complete(m_group.said, said);
    return true;
}

std::optional<ScalarPlace> NamedNumbers::layoutInNames() const
{
    using enum Component;
    if (m_names.size() != 4) return std::nullopt;
    const auto are = [&](std::array<Component, 4> components) {
        return std::equal(
            m_names.begin(), m_names.end(), components.begin(),
            [](const Label& name, Component component) { return name.component == component; });
    };
    if (are({w, x, y, z})) return ScalarPlace::first;
    if (are({x, y, z, w})) return ScalarPlace::last;
    return std::nullopt;
}

/// `axis: z  angle: 90`, and x, y, z below `axis`.
void NamedNumbers::axisByLetter(const std::vector<Label>& components, Topic& section)
{
    using enum Component;
    const std::size_t count = components.size();
    if (count >= 2 && components[count - 2].component == axis) section = Topic::axisAngle;
    if (count < 3 || components[count - 3].component != axis ||
        components[count - 1].component != angle)
        return;
    const int letter = letterOf(components[count - 2].component);
    if (letter < 0) return;
    for (int n = 0; n < 3; ++n) {
        Value part;
        part.number = n == letter ? 1.0 : 0.0;
        addNamed(shifted(axisX, n), 0, part);
    }
}

void NamedNumbers::axisNumbers(Run run, bool angleFirst)
{
    using enum Component;
    const bool withAngle = run.size() == 4;
    const std::size_t skip = withAngle && angleFirst ? 1 : 0;
    for (int n = 0; n < 3; ++n)
        addNamed(shifted(axisX, n), 0, run[skip + static_cast<std::size_t>(n)]);
    if (withAngle) addNamed(angle, 0, run[angleFirst ? 0 : 3]);
}

/// The names of `count` numbers; words without a known meaning count as names if the counts then
/// agree.
std::vector<Label> NamedNumbers::columns(std::size_t count,
                                         const std::vector<Label>& components) const
{
    if (m_names.size() == count) return m_names;
    if (m_names.size() > components.size() && count % m_names.size() == 0) return m_names;
    // the last columns of a table may hold words
    if (m_names.size() > count && components.size() < count)
        return {m_names.begin(), m_names.begin() + static_cast<std::ptrdiff_t>(count)};
    if (components.size() > count && count >= 3)
        return {components.end() - static_cast<std::ptrdiff_t>(count), components.end()};
    return components;
}

/// Names in a row, then numbers in a row: `w, x, y, z = (...)`, or the head of a table.
bool NamedNumbers::tuple(Run run, const std::vector<Label>& components, Topic& section)
{
    const std::vector<Label> names = columns(run.size(), components);
    if (names.size() < 2 || run.size() % names.size() != 0) return false;
    if (names.size() == 2 && run.size() > 2) return false;
    close();
    if (names.size() != components.size()) section = Topic::unknown;  // its word names a column
    for (std::size_t n = 0; n < names.size(); ++n)
        add(names[n], run[n], section);
    if (run.size() > names.size())
        m_fields.aside.emplace_back("the rows of the table after the first");
    return true;
}

void NamedNumbers::add(const Label& label, const Value& value, Topic section)
{
    using enum Component;
    Component component = label.component;
    const int letter = letterOf(component);
    const Topic within = label.within != Topic::unknown ? label.within : section;
    if (within == Topic::position && letter >= 0) component = position;
    if (within == Topic::other || label.topic != Topic::component) component = other;
    if (within == Topic::axisAngle && letter >= 0) component = shifted(axisX, letter);
    addNamed(component, label.number, value);
    if (letter >= 0 && within == Topic::orientation) m_group.ofOrientation = !m_group.said.kind;
}

void NamedNumbers::addNamed(Component component, int number, const Value& value)
{
    const bool repeats =
        std::any_of(m_group.numbers.begin(), m_group.numbers.end(), [&](const Named& earlier) {
            return earlier.component == component && earlier.number == number &&
                   component != Component::other && component != Component::position;
        });
    if (repeats) close();
    if (m_group.numbers.size() < kMostNamed) m_group.numbers.push_back({component, number, value});
    for (std::string& note : std::exchange(m_notes, {}))
        m_group.notes.push_back(std::move(note));
    complete(m_group.said, m_said);  // what was said before any number of a group holds for all
}

}  // namespace rotcore
