// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/fields.h"

#include <algorithm>
#include <span>
#include <utility>

#include "rotcore/reading/text/named_numbers.h"
#include "rotcore/reading/text/turn_product.h"

namespace rotcore {
namespace {

using Run = std::span<const Value>;

/// Reads the parts of a text from left to right. Words say what the next numbers are; a run of
/// numbers uses up what was said.
class Assembler {
public:
    explicit Assembler(const Parts& parts) : m_parts(parts) {}

    Fields run()
    {
        for (const Part& part : m_parts.parts) {
            if (part.isRun) {
                numbers({m_parts.values.data() + part.first, part.last - part.first});
                forget();
                m_lastWasRun = true;
            } else {
                word(part);
            }
        }
        sayAtEnd();
        m_named.close();
        m_turns.finish(m_fields);
        return std::move(m_fields);
    }

private:
    /// `"degrees": true` and the like may stand at the very end.
    void sayAtEnd()
    {
        if (!m_said.scalar) m_said.scalar = m_named.layoutInNames();  // `[...]  # x y z w`
        if (m_named.sayAfterwards(m_said)) return;
        auto& fields = m_fields.rotations.empty() ? m_fields.bare : m_fields.rotations;
        if (fields.size() == 1) complete(fields.front().said, m_said);
    }

    // ---- words

    void word(const Part& part)
    {
        if (part.constructor) {
            constructor(*part.constructor);
        } else if (shortOrderOf(part)) {
            return;
        } else if (part.label.topic == Topic::order || part.label.topic == Topic::unit) {
            orderOrUnit(part);
            return;  // may stand after the numbers as well as before
        } else if (part.label.topic == Topic::component) {
            m_named.addName(part.label);
            if (part.label.unit) m_said.unit = part.label.unit;
        } else if (part.label.topic == Topic::unitAxis) {
            if (m_turns.awaitsAxis()) m_turns.addAxis(part.label.axis);
        } else if (part.label.topic == Topic::unknown) {
            unknown(part);
            return;
        } else {
            heading(part);
        }
        m_lastWasRun = false;
    }

    void constructor(const Constructor& known)
    {
        if (known.arguments != Arguments::angleThenAxis) m_turns.finish(m_fields);
        openSection(Topic::orientation, known.name);
        m_constructor = &known;
        m_said = {};
        m_said.kind = known.kind;
        m_said.scalar = known.scalar;
        m_said.order = known.order;
        m_said.about = known.about;
        m_said.unit = known.unit;
        m_said.storage = known.storage;
    }

    void heading(const Part& part)
    {
        const Label& label = part.label;
        const bool vectorOfRotation =
            label.topic == Topic::vector && m_section == Topic::orientation;
        if (label.topic == Topic::vector && !vectorOfRotation) return;
        if (label.topic == Topic::matrix && m_section == Topic::other) return;  // of a covariance
        const bool opens = label.topic == Topic::orientation || label.topic == Topic::position ||
                           label.topic == Topic::other;
        openSection(opens ? label.topic : Topic::orientation, part.word);
        if (m_section == Topic::position || m_section == Topic::other) aside(label);
        if (!opens) m_constructor = nullptr;
        if (isSameWord(part.word, "image_id")) {
            m_said.direction = Direction::worldToBody;
            m_named.addNote("the head of an image list: its quaternions map world to camera");
        }
        if (label.unit) m_said.unit = label.unit;
        if (label.order) m_said.order = label.order;
        sayKind(vectorOfRotation ? Topic::rotationVector : label.topic);
        scalarPlace(part);
        attribute(part);
    }

    /// A word above numbers that are no orientation ends what was said before, but for the
    /// direction.
    void aside(const Label& label)
    {
        const auto direction = m_said.direction;
        m_said = {};
        m_said.direction = direction;
        m_named.addName(label);
    }

    void sayKind(Topic topic)
    {
        if (topic == Topic::quaternion) m_said.kind = Kind::quaternion;
        if (topic == Topic::euler) m_said.kind = Kind::euler;
        if (topic == Topic::matrix) m_said.kind = Kind::matrix;
        if (topic == Topic::rotationVector) m_said.kind = Kind::rotationVector;
        if (topic == Topic::axisAngle) m_said.kind = Kind::axisAngle;
        if (topic == Topic::rollPitchYaw) angles(Order::xyz, About::space);
        if (topic == Topic::yawPitchRoll) angles(Order::zyx, About::body);
    }

    void scalarPlace(const Part& part)
    {
        if (part.label.scalar) {
            m_said.scalar = part.label.scalar;
            m_notes.clear();
        } else if (part.label.topic == Topic::quaternion && part.afterIn && !m_said.scalar) {
            m_said.scalar = ScalarPlace::last;
            m_notes.emplace_back(
                "\"in Quaternion\" is taken as xyzw, as transform printouts have it");
        }
    }

    void angles(Order order, About about)
    {
        m_said.kind = Kind::euler;
        m_said.order = order;
        m_said.about = about;
    }

    /// What the attributes of robot and simulation files mean; common practice of such files.
    void attribute(const Part& part)
    {
        if (!part.attribute) return;
        if (part.label.topic == Topic::rollPitchYaw && !m_said.unit) {
            m_said.unit = AngleUnit::radians;
            m_notes.emplace_back("an rpy attribute is taken in radians, as robot files have it");
        }
        if (part.label.topic == Topic::euler && isSameWord(part.word, "euler") && !m_said.order) {
            angles(Order::xyz, About::body);
            m_notes.emplace_back(
                "an euler attribute is taken as xyz about body, as simulation files have it");
        }
    }

    void orderOrUnit(const Part& part)
    {
        const Label& label = part.label;
        if (label.order == Order::xyz && part.assigned) {  // xyz="0 0 1" is a place, not an order
            openSection(Topic::position, part.word);
            m_lastWasRun = false;
            return;
        }
        bool after = m_lastWasRun && !part.assigned && m_lastField != kNone;
        if (after && label.order && lastField().said.order && !m_lastConstructor) after = false;
        StatedReading& said = after ? lastField().said : m_said;
        if (label.unit) said.unit = label.unit;
        if (!label.order) return;
        said.order = label.order;
        const bool byCase = (m_constructor && m_constructor->caseSaysAbout) ||
                            (after && m_lastConstructor && m_lastConstructor->caseSaysAbout);
        if (byCase) said.about = part.word[0] < 'a' ? About::body : About::space;
        if (label.about) said.about = label.about;
        if (!after) m_said.kind = m_said.kind.value_or(Kind::euler);
        if (after && !said.kind) promoteLast();
    }

    /// Bare numbers that turn out to be angles.
    void promoteLast()
    {
        if (m_fields.bare.empty() || m_lastIsRotation) return;
        Field field = std::move(m_fields.bare.back());
        m_fields.bare.pop_back();
        field.said.kind = Kind::euler;
        m_fields.rotations.push_back(std::move(field));
        m_lastField = m_fields.rotations.size() - 1;
        m_lastIsRotation = true;
    }

    void unknown(const Part& part)
    {
        if (isSameWord(part.word, "intrinsic") || isSameWord(part.word, "extrinsic")) {
            const bool after = m_lastWasRun && m_lastField != kNone;
            (after ? lastField().said : m_said).about =
                isSameWord(part.word, "intrinsic") ? About::body : About::space;
            return;
        }
        m_named.addName({});
        m_lastWasRun = false;
    }

    /// from_euler('z', 90): an order of one or two axes.
    bool shortOrderOf(const Part& part)
    {
        if (!m_constructor || !m_constructor->caseSaysAbout) return false;
        const auto order = shortOrder(part.word);
        if (!order) return false;
        m_said.order = order;
        m_said.about = part.word[0] < 'a' ? About::body : About::space;
        m_axesGiven = part.word.size();
        return true;
    }

    void openSection(Topic topic, std::string_view name)
    {
        m_named.close();
        m_section = topic;
        m_sectionName = name;
    }

    // ---- numbers

    void numbers(Run run)
    {
        m_lastField = kNone;
        if (std::any_of(run.begin(), run.end(),
                        [](const Value& v) { return v.imaginary != '\0'; })) {
            m_named.takeImaginary(run);
        } else if (m_constructor && m_constructor->arguments == Arguments::angleThenAxis) {
            m_named.close();
            if (!m_turns.addAngle(run, m_said.unit)) list(run);
        } else if (m_turns.awaitsAxis() && run.size() == 3) {
            m_turns.addAxis(run);
        } else if (!m_named.take(run, m_said, m_section)) {
            m_named.close();
            list(run);
        }
    }

    /// A run without names of its own.
    void list(Run run)
    {
        if (m_section == Topic::other) {
            m_fields.aside.push_back("\"" + std::string(m_sectionName.substr(0, 40)) + "\"");
            m_section = Topic::unknown;
            return;
        }
        if (m_section == Topic::position) {
            m_fields.aside.emplace_back("the position");
            m_section = Topic::unknown;
            run = run.subspan(std::min<std::size_t>(run.size(), 3));
            if (run.empty()) return;
        }
        Field field;
        field.values.assign(run.begin(), run.end());
        field.said = m_said;
        field.notes = std::move(m_notes);
        field.name = m_said.kind ? kindName(*m_said.kind) : "numbers";
        if (m_axesGiven < 3 && run.size() == m_axesGiven)
            field.values.resize(3, run.front().zeroHere());
        turnOfVector(field);
        if (m_constructor && m_constructor->arguments == Arguments::byAxis)
            field.axes = {Axis::x, Axis::y, Axis::z};
        m_lastIsRotation = m_said.kind.has_value();
        auto& where = m_lastIsRotation ? m_fields.rotations : m_fields.bare;
        where.push_back(std::move(field));
        m_lastField = where.size() - 1;
        m_lastConstructor = m_constructor;
    }

    /// An angle times an axis, handed over as a rotation vector: `pi/2 * np.array([0, 0, 1])`.
    static void turnOfVector(Field& field)
    {
        if (field.said.kind != Kind::rotationVector || field.values.size() != 4) return;
        field.said.kind = Kind::axisAngle;
        field.name = kindName(Kind::axisAngle);
        const auto unitLength = [&](std::size_t first) {
            double squares = 0.0;
            for (std::size_t n = first; n < first + 3; ++n)
                squares += field.values[n].number * field.values[n].number;
            return squares > 0.96 && squares < 1.04;  // two decimals
        };
        if (unitLength(1))
            std::rotate(field.values.begin(), field.values.begin() + 1, field.values.end());
        else if (!unitLength(0))
            field.said.kind = Kind::rotationVector;
    }

    // ---- state

    Field& lastField()
    {
        return (m_lastIsRotation ? m_fields.rotations : m_fields.bare)[m_lastField];
    }

    void forget()
    {
        m_named.forgetNames();
        m_said = {};
        m_notes.clear();
        m_constructor = nullptr;
        m_axesGiven = 3;
    }

    static constexpr std::size_t kNone = static_cast<std::size_t>(-1);

    const Parts& m_parts;
    Fields m_fields;
    NamedNumbers m_named{m_fields};
    TurnProduct m_turns;
    Topic m_section = Topic::unknown;
    std::string_view m_sectionName;
    StatedReading m_said;  ///< said since the last run
    std::vector<std::string> m_notes;
    const Constructor* m_constructor = nullptr;
    const Constructor* m_lastConstructor = nullptr;
    std::size_t m_axesGiven = 3;  ///< letters of an order of one or two axes
    bool m_lastWasRun = false;
    bool m_lastIsRotation = false;
    std::size_t m_lastField = kNone;
};

}  // namespace

std::string_view kindName(Kind kind)
{
    switch (kind) {
        case Kind::euler:
            return "Euler angles";
        case Kind::quaternion:
            return "quaternion";
        case Kind::matrix:
            return "matrix";
        case Kind::rotationVector:
            return "rotation vector";
        case Kind::axisAngle:
            return "axis and angle";
    }
    return {};
}

Fields fieldsOf(const Parts& parts)
{
    return Assembler(parts).run();
}

}  // namespace rotcore
