// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/case/case_json.h"

#include <charconv>

#include "rotcore/case/field_reader.h"
#include "rotcore/case/findings_json.h"
#include "rotcore/number_text.h"

namespace rotcore {
namespace {

// --- writing

// Degrees that convert back to the very same radians, the roundest there are; nothing if none do.
std::optional<std::string> exactDegrees(double radians)
{
    const double degrees = toDegrees(radians);
    for (const int digits : {6, 12, 14, 15, 16, 17}) {
        const std::string text = roundedText(degrees, digits);
        double readBack = 0.0;
        std::from_chars(text.data(), text.data() + text.size(), readBack);
        if (fromDegrees(readBack) == radians) return text;
    }
    return std::nullopt;
}

std::string angleField(std::string_view name, double radians)
{
    const auto degrees = exactDegrees(radians);
    return '"' + std::string(name) +
           (degrees ? "_deg\": " + *degrees : "_rad\": " + numberText(radians));
}

template <class E>
std::string wordField(std::string_view name, E value)
{
    return '"' + std::string(name) + "\": \"" + std::string(nameOf(value)) + '"';
}

std::string listText(std::span<const double> values)
{
    std::string text;
    for (const double value : values)
        text += (text.empty() ? "" : ", ") + numberText(value);
    return '[' + text + ']';
}

std::string startText(const SentNumbers& sent)
{
    const Reading& reading = sent.reading;
    const std::string separator = ", ";
    return "{ " + wordField("kind", reading.kind) + separator + wordField("order", reading.order) +
           separator + wordField("about", reading.about) + separator +
           wordField("unit", reading.unit) + ",\n    " + wordField("layout", reading.scalar) +
           separator + wordField("algebra", reading.algebra) + separator +
           wordField("direction", reading.direction) + separator +
           wordField("storage", reading.storage) + ",\n    \"values\": " + listText(sent.values) +
           " }";
}

std::string axisText(const Eigen::Vector3d& axis)
{
    for (const Axis letter : {Axis::x, Axis::y, Axis::z})
        if (axis == unitVector(letter)) return '"' + std::string(nameOf(letter)) + '"';
    return listText({axis.data(), 3});
}

std::string turnText(const Turn& turn)
{
    return "{ \"axis\": " + axisText(turn.axis) + ", " + angleField("angle", turn.angle) + ", " +
           wordField("about", turn.about) + (turn.muted ? ", \"muted\": true" : "") +
           (turn.name.empty() ? "" : ", \"name\": " + jsonString(turn.name)) + " }";
}

// --- reading

// An angle given as name_deg or name_rad; nothing if neither is there.
std::optional<double> readAngle(FieldReader& fields, const std::string& name)
{
    const auto degrees = fields.number(name + "_deg");
    const auto radians = fields.number(name + "_rad");
    if (degrees && radians) fields.complain(name + "_rad", "the angle is given twice");
    if (degrees) return fromDegrees(*degrees);
    return radians;
}

Eigen::Vector3d readAxis(FieldReader& fields)
{
    if (fields.isText("axis")) {
        Axis letter = Axis::z;
        fields.word("axis", letter);
        return unitVector(letter);
    }
    const auto numbers = fields.numbers("axis");
    if (!numbers) {
        fields.complain("", "has no axis; write \"axis\": \"z\" or \"axis\": [0, 0, 1]");
        return Eigen::Vector3d::UnitZ();
    }
    if (numbers->size() != 3) {
        fields.complain("axis",
                        "has " + std::to_string(numbers->size()) + " numbers instead of three");
        return Eigen::Vector3d::UnitZ();
    }
    Eigen::Vector3d axis((*numbers)[0], (*numbers)[1], (*numbers)[2]);
    if (axis.isZero(0.0)) fields.complain("axis", "has no length, so it names no direction");
    return axis;
}

Turn readTurn(FieldReader& fields)
{
    Turn turn;
    turn.axis = readAxis(fields);
    const auto angle = readAngle(fields, "angle");
    if (!angle) fields.complain("", "has no angle; write \"angle_deg\": 90 or \"angle_rad\": 1.5");
    turn.angle = angle.value_or(0.0);
    fields.word("about", turn.about);
    turn.muted = fields.boolean("muted").value_or(false);
    turn.name = fields.text("name").value_or("");
    fields.refuseOthers();
    return turn;
}

SentNumbers readStart(FieldReader& fields)
{
    SentNumbers sent;
    Reading& reading = sent.reading;
    if (!fields.has("kind"))
        fields.complain("", "has no kind; write \"kind\": \"euler\" or another");
    fields.word("kind", reading.kind);
    fields.word("order", reading.order);
    fields.word("about", reading.about);
    fields.word("unit", reading.unit);
    fields.word("layout", reading.scalar);
    fields.word("algebra", reading.algebra);
    fields.word("direction", reading.direction);
    fields.word("storage", reading.storage);
    sent.values = fields.numbers("values").value_or(std::vector<double>());
    if (sent.values.size() != countOf(reading.kind))
        fields.complain("values", "holds " + std::to_string(sent.values.size()) + " numbers; " +
                                      std::string(nameOf(reading.kind)) + " takes " +
                                      std::to_string(countOf(reading.kind)));
    fields.refuseOthers();
    return sent;
}

void readConvention(FieldReader& fields, Convention& shown)
{
    fields.word("order", shown.order);
    fields.word("about", shown.about);
    fields.word("unit", shown.unit);
    shown.outerAtLock = readAngle(fields, "outer_at_lock").value_or(0.0);
    fields.refuseOthers();
}

void readVersion(FieldReader& fields)
{
    const auto version = fields.number("trunnion_case");
    if (!version)
        fields.complain("", "has no \"trunnion_case\" with the version, so it is not a case file");
    else if (*version > kCaseVersion)
        fields.complain("trunnion_case",
                        "version " + numberText(*version) +
                            " was written by a later Trunnion; this one reads up to " +
                            std::to_string(kCaseVersion));
    else if (*version != kCaseVersion)
        fields.complain("trunnion_case", "version " + numberText(*version) + " does not exist");
}

}  // namespace

std::string writeCase(const Case& subject)
{
    std::string json = "{\n  \"trunnion_case\": " + std::to_string(kCaseVersion);
    if (subject.start) json += ",\n  \"start\": " + startText(*subject.start);
    std::string turns;
    for (const Turn& turn : subject.chain)
        turns += (turns.empty() ? "\n    " : ",\n    ") + turnText(turn);
    json += ",\n  \"chain\": [" + turns + (turns.empty() ? "]" : "\n  ]");
    const Convention& shown = subject.shown;
    json += ",\n  \"shown\": { " + wordField("order", shown.order) + ", " +
            wordField("about", shown.about) + ", " + wordField("unit", shown.unit);
    if (shown.outerAtLock != 0.0) json += ", " + angleField("outer_at_lock", shown.outerAtLock);
    return json + " }\n}\n";
}

Result<Case> readCase(std::string_view json)
{
    const auto document = parseLocatedJson(json);
    if (!document) return document.error();
    std::optional<Fault> fault;
    FieldReader fields(*document, "", fault);
    readVersion(fields);
    Case subject;
    if (auto start = fields.object("start")) subject.start = readStart(*start);
    for (FieldReader& turn : fields.objects("chain"))
        subject.chain.push_back(readTurn(turn));
    if (auto shown = fields.object("shown")) readConvention(*shown, subject.shown);
    fields.refuseOthers();
    if (fault) return *fault;
    return subject;
}

}  // namespace rotcore
