// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/cli/read_answer.h"

#include <cctype>

#include "rotcore/case/findings_json.h"
#include "rotcore/number_text.h"

namespace trunnion_cli {
namespace {

using namespace rotcore;

bool isSpace(char c)
{
    return std::isspace(static_cast<unsigned char>(c)) != 0;
}
bool isLetter(char c)
{
    return std::isalpha(static_cast<unsigned char>(c)) != 0;
}

// "#YPR=1,2,3" is a serial line; any other line that starts with # is a comment.
bool holdsNoSet(std::string_view line)
{
    std::size_t at = 0;
    while (at < line.size() && isSpace(line[at]))
        ++at;
    if (at == line.size()) return true;
    if (line[at] != '#') return false;
    ++at;
    const std::size_t word = at;
    while (at < line.size() && isLetter(line[at]))
        ++at;
    return at == word || at == line.size() || line[at] != '=';
}

// How far the pose may be off, radians, because its numbers were printed with few digits. A
// component of a quaternion counts for twice its share of the angle; all are bounds, rounded up.
double poseUncertainty(const TextInput& input)
{
    if (!input.resolution) return 0.0;
    const Reading& reading = input.numbers.reading;
    switch (reading.kind) {
        case Kind::quaternion:
            return 4.0 * *input.resolution;
        case Kind::matrix:
            return 2.0 * *input.resolution;
        case Kind::euler:
        case Kind::rotationVector:
        case Kind::axisAngle:
            return 2.0 * toRadians(*input.resolution, reading.unit);
    }
    return 0.0;
}

void appendInputJson(std::string& out, const ReadAnswer& answer)
{
    out += R"("input":{"kind":")";
    out += nameOf(answer.input.numbers.reading.kind);
    out += answer.input.kindGuessed ? R"(","guessed":true,"warnings":[)"
                                    : R"(","guessed":false,"warnings":[)";
    bool first = true;
    for (const std::string& warning : warningsOf(answer)) {
        if (!first) out += ',';
        out += jsonString(warning);
        first = false;
    }
    out += ']';
    if (const auto& matrix = answer.found.start->matrix) {
        out += R"(,"matrix_check":{"orthonormality_error":)" +
               numberText(matrix->orthonormalityError) + R"(,"determinant":)" +
               numberText(matrix->determinant) + R"(,"distance":)" + numberText(matrix->distance) +
               '}';
    }
    out += '}';
}

void appendAnswer(Output& output, const Result<ReadAnswer>& answer, bool json)
{
    if (answer) {
        if (json)
            appendJsonLine(output.out, *answer);
        else
            appendTable(output.out, *answer);
        return;
    }
    output.anyBad = true;
    if (json) appendErrorJsonLine(output.out, answer.error());
    output.err += errorText(answer.error()) + '\n';
}

}  // namespace

Result<ReadAnswer> readAndExamine(std::string_view text, const ReadOptions& options,
                                  UnitGuess unitGuess)
{
    auto input = readText(text, options.stated, unitGuess);
    if (!input) return input.error();
    const Case subject{.start = input->numbers, .chain = {}, .shown = options.shown};
    auto found = examine(subject);
    if (!found) return found.error();
    return ReadAnswer{std::move(input.value()), std::move(found.value())};
}

std::vector<std::string> warningsOf(const ReadAnswer& answer)
{
    std::vector<std::string> warnings = answer.input.warnings;
    const auto& more = answer.found.start->warnings;
    warnings.insert(warnings.end(), more.begin(), more.end());
    if (!answer.found.axisAngle.axisIsUnique)
        warnings.emplace_back("the angle is zero: any axis would do, x stands for it");
    if (answer.found.axisAngle.oppositeIsSame)
        warnings.emplace_back(
            "a half turn: the opposite axis would do as well, and there is no Gibbs vector");
    if (answer.found.euler.locked())
        warnings.emplace_back(
            "at lock: only a combination of the first and third angle is determined; the outer "
            "angle was kept");
    else if (answer.found.lock.distance <= poseUncertainty(answer.input))
        warnings.emplace_back(
            "as close to lock as the printed digits can tell: the first and third angle mean "
            "little");
    return warnings;
}

void appendJsonLine(std::string& out, const ReadAnswer& answer)
{
    out += '{';
    appendFindingsJson(out, answer.found);
    out += ',';
    appendInputJson(out, answer);
    out += "}\n";
}

void appendErrorJsonLine(std::string& out, const Fault& fault)
{
    out += R"({"error":)" + jsonString(fault.message);
    if (fault.place)
        out += R"(,"line":)" + std::to_string(fault.place->line) + R"(,"column":)" +
               std::to_string(fault.place->column);
    out += "}\n";
}

std::string errorText(const Fault& fault)
{
    if (!fault.place) return fault.message;
    return "line " + std::to_string(fault.place->line) + ", column " +
           std::to_string(fault.place->column) + ": " + fault.message;
}

void answerLines(Output& output, std::string_view lines, std::size_t firstLine,
                 const ReadOptions& options, UnitGuess unitGuess)
{
    std::size_t number = firstLine;
    for (std::size_t at = 0; at < lines.size(); ++number) {
        const std::size_t end = std::min(lines.find('\n', at), lines.size());
        const std::string_view line = lines.substr(at, end - at);
        at = end + 1;
        if (holdsNoSet(line)) continue;
        auto answer = readAndExamine(line, options, unitGuess);
        if (!answer) {
            Fault fault = answer.error();
            const TextPlace within = fault.place.value_or(TextPlace{});
            fault.place = TextPlace{number, within.column};
            answer = fault;
        }
        if (!options.json && answer && !output.out.empty()) output.out += '\n';
        appendAnswer(output, answer, options.json);
    }
}

void answerPaste(Output& output, std::string_view text, const ReadOptions& options)
{
    auto answer = readAndExamine(text, options, UnitGuess::fromValues);
    if (!answer && !answer.error().place) {
        Fault fault = answer.error();
        fault.place = TextPlace{};
        answer = fault;
    }
    appendAnswer(output, answer, options.json);
}

}  // namespace trunnion_cli
