// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <utility>

#include "rotcore/reading/text/named_numbers.h"

namespace rotcore {
namespace {

/// Takes the numbers of a group one rotation at a time.
class GroupSorter {
public:
    GroupSorter(const NamedGroup& group, Fields& fields)
        : m_group(group), m_used(group.numbers.size(), false), m_fields(fields)
    {
    }

    void run()
    {
        using enum Component;
        quaternion();
        fourNumbered();
        axisAndAngle();
        matrix();
        photogrammetric();
        rollPitchYaw();
        if (turns({turnX, turnY, turnZ},
                  "the angles are taken in the order they are listed, about body"))
            m_fields.rotations.back().maybeVector = !m_group.said.order;
        if (m_group.ofOrientation || m_group.said.kind == Kind::euler)
            turns({x, y, z},
                  "angles about x, y, z are taken in the order they are listed, about body");
        plainVector();
        leaveRest();
    }

private:
    const Named* find(Component component) const
    {
        for (std::size_t n = 0; n < m_group.numbers.size(); ++n)
            if (m_group.numbers[n].component == component && !m_used[n]) return &m_group.numbers[n];
        return nullptr;
    }
    std::size_t placeOf(const Named* named) const
    {
        return static_cast<std::size_t>(named - m_group.numbers.data());
    }
    std::vector<Value> take(const std::vector<const Named*>& numbers)
    {
        std::vector<Value> values;
        for (const Named* number : numbers) {
            values.push_back(number->value);
            m_used[placeOf(number)] = true;
        }
        return values;
    }
    bool has(std::initializer_list<Component> components) const
    {
        return std::all_of(components.begin(), components.end(),
                           [&](Component component) { return find(component) != nullptr; });
    }

    Field& add(Kind kind, std::vector<Value> values)
    {
        Field field;
        field.values = std::move(values);
        field.said = m_group.said;
        field.said.kind = kind;
        field.name = kindName(kind);
        field.notes = m_group.notes;
        m_fields.rotations.push_back(std::move(field));
        return m_fields.rotations.back();
    }

    void quaternion()
    {
        using enum Component;
        if (!has({w, x, y, z})) return;
        const bool scalarLast = placeOf(find(w)) > placeOf(find(z));
        Field& field = add(Kind::quaternion, take({find(w), find(x), find(y), find(z)}));
        field.named = true;
        field.said.scalar = scalarLast ? ScalarPlace::last : ScalarPlace::first;
    }

    void fourNumbered()
    {
        std::vector<const Named*> found;
        for (const Named& number : m_group.numbers)
            if (number.component == Component::numbered) found.push_back(&number);
        if (found.size() != 4) return;
        std::sort(found.begin(), found.end(),
                  [](const Named* a, const Named* b) { return a->number < b->number; });
        const int base = found[0]->number;
        if (base > 1 || found[3]->number != base + 3) return;
        Field& field = add(Kind::quaternion, take(found));
        field.said.scalar = base == 0 ? ScalarPlace::first : ScalarPlace::last;
        field.notes.emplace_back(base == 0 ? "q0 is taken for the scalar, the common practice"
                                           : "q4 is taken for the scalar, the common practice");
    }

    void axisAndAngle()
    {
        using enum Component;
        if (!has({angle})) return;
        for (const auto& axis : {std::array{axisX, axisY, axisZ}, std::array{x, y, z}})
            if (has({axis[0], axis[1], axis[2]})) {
                add(Kind::axisAngle,
                    take({find(axis[0]), find(axis[1]), find(axis[2]), find(angle)}));
                return;
            }
    }

    void matrix()
    {
        std::vector<const Named*> found;
        for (const Named& number : m_group.numbers)
            if (number.component == Component::element) found.push_back(&number);
        if (found.size() < 9) return;
        std::sort(found.begin(), found.end(),
                  [](const Named* a, const Named* b) { return a->number < b->number; });
        add(Kind::matrix, take(found)).said.storage = Storage::rows;
    }

    /// Angles about the axes given, as far as they are there, in the order the text lists them.
    bool turns(const std::array<Component, 3>& components, const char* note)
    {
        std::vector<std::pair<std::size_t, Axis>> listed;
        for (int axis = 0; axis < 3; ++axis)
            if (const Named* number = find(components[static_cast<std::size_t>(axis)]))
                listed.emplace_back(placeOf(number), axisAt(axis));
        if (listed.empty()) return false;
        std::sort(listed.begin(), listed.end());
        addAngles(listed, note);
        return true;
    }

    void addAngles(const std::vector<std::pair<std::size_t, Axis>>& listed, const char* note)
    {
        std::array<Axis, 3> axes{};
        std::vector<const Named*> numbers;
        for (std::size_t n = 0; n < listed.size(); ++n) {
            axes[n] = listed[n].second;
            numbers.push_back(&m_group.numbers[listed[n].first]);
        }
        if (listed.size() == 1) axes[1] = axisAt(indexOf(axes[0]) + 2);
        if (listed.size() < 3) axes[2] = otherThan(axes[0], axes[1]);
        Field& field = add(Kind::euler, take(numbers));
        const std::size_t given = field.values.size();
        if (given < 3) {
            field.notes.emplace_back(given == 1 ? "one angle only: the other two are taken as zero"
                                                : "two angles only: the third is taken as zero");
            field.values.resize(3, field.values.back().zeroHere());
        }
        field.axes = axes;
        if (field.said.order) return;
        const auto order = orderOf(axes);
        if (order) field.said.order = *order;
        if (!field.said.about) field.said.about = About::body;
        if (given > 1) field.notes.emplace_back(note);
    }

    void photogrammetric()
    {
        using enum Component;
        if (!has({omega, phi, kappa})) return;
        turns({omega, phi, kappa},
              "omega, phi, kappa are taken about x, y, z in this order, about body, the common "
              "practice");
        setOrder(Order::xyz);
    }

    void rollPitchYaw()
    {
        using enum Component;
        const Component about = has({roll}) ? roll : phi;
        if (!turns({about, pitch, yaw},
                   "yaw, pitch, roll are taken as turns about z, y, x of the body"))
            return;
        setOrder(Order::zyx);
    }

    /// The order that the names imply, unless the text has one.
    void setOrder(Order order)
    {
        StatedReading& said = m_fields.rotations.back().said;
        said.order = m_group.said.order.value_or(order);
        if (!said.about) said.about = About::body;
    }

    void plainVector()
    {
        using enum Component;
        if (!has({x, y, z})) return;
        auto values = take({find(x), find(y), find(z)});
        if (m_group.said.kind == Kind::rotationVector) {
            add(Kind::rotationVector, std::move(values));
            return;
        }
        Field field;
        field.values = std::move(values);
        field.said = m_group.said;
        field.name = "x, y, z";
        if (!field.said.kind || field.said.kind == Kind::euler) {
            field.axes = {Axis::x, Axis::y, Axis::z};
            if (!field.said.order) field.said.order = Order::xyz;
        }
        m_fields.bare.push_back(std::move(field));
    }

    void leaveRest()
    {
        using enum Component;
        bool places = false;
        bool others = false;
        std::vector<Value> loose;
        for (std::size_t n = 0; n < m_used.size(); ++n) {
            if (m_used[n]) continue;
            const Component component = m_group.numbers[n].component;
            if (component == position)
                places = true;
            else if (component == other)
                others = true;
            else
                loose.push_back(m_group.numbers[n].value);
        }
        if (places) m_fields.aside.emplace_back("the position");
        if (others) m_fields.aside.emplace_back("numbers that are no orientation");
        if (loose.empty()) return;
        Field field;
        field.values = std::move(loose);
        field.said = m_group.said;
        field.name = "numbers with incomplete names";
        m_fields.bare.push_back(std::move(field));
    }

    const NamedGroup& m_group;
    std::vector<bool> m_used;
    Fields& m_fields;
};

}  // namespace

void addGroup(const NamedGroup& group, Fields& fields)
{
    GroupSorter(group, fields).run();
}

}  // namespace rotcore
