// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/cli/command_line.h"

#include <algorithm>
#include <cctype>
#include <optional>

#include <CLI/CLI.hpp>

#include "app/cli/read_command.h"

namespace trunnion_cli {
namespace {

using namespace rotcore;

constexpr const char* kCaution =
    "Trunnion explains numbers; it does not release motion. Try a fix at reduced speed and with\n"
    "people clear, and follow the equipment's manual, the site's rules, local codes and the\n"
    "judgement of whoever is licensed for the work.";

constexpr const char* kReadExamples = R"(Examples:
  trunnion-cli read 30 20 10                    three angles, zyx about body, degrees
  trunnion-cli read --order xyz --about space --unit rad 0.1 -0.2 pi/2
  trunnion-cli read "q = {w: 0.5, x: 0.5, y: 0.5, z: 0.5}" --to-order zxz
  trunnion-cli read --as quaternion --layout xyzw --json poses.csv > poses.jsonl
  some-sensor | trunnion-cli read --json -      one set a line, answered as they come
  trunnion-cli read --paste < matrix.txt        one text, however many lines

Without --as and the like the kind is guessed from labels, count and length, and the guess is told.
Exit codes: 0 fine, 2 bad usage, 3 bad input (the message is on standard error with line and column).)";

/// An option whose value `parse` understands; a fault of it is bad usage.
template <class T, class Parse>
CLI::Option* addParsed(CLI::App& app, const std::string& name, std::optional<T>& target,
                       const std::string& help, Parse parse)
{
    return app.add_option_function<std::string>(
        name,
        [&target, parse](const std::string& text) {
            const auto parsed = parse(text);
            if (!parsed) throw CLI::ValidationError(parsed.error().message);
            target = *parsed;
        },
        help);
}

/// An option whose value is one of the words of an enumeration.
template <class E>
CLI::Option* addWord(CLI::App& app, const std::string& name, std::optional<E>& target,
                     const std::string& help)
{
    std::string words;
    for (const auto& [value, word] : Names<E>::kTable)
        words += (words.empty() ? "" : "|") + std::string(word);
    return addParsed(app, name, target, help, parseName<E>)->type_name(words);
}

CLI::Option* addOrder(CLI::App& app, const std::string& name, std::optional<Order>& target,
                      const std::string& help)
{
    return addParsed(app, name, target, help, parseOrder)->type_name("ORDER");
}

/// The convention of the output, as far as it was said.
struct StatedConvention {
    std::optional<Order> order;
    std::optional<About> about;
    std::optional<AngleUnit> unit;

    Convention convention() const
    {
        const Convention standard;
        return {order.value_or(standard.order), about.value_or(standard.about),
                unit.value_or(standard.unit), standard.outerAtLock};
    }
};

CLI::App* addRead(CLI::App& app, ReadOptions& options, StatedConvention& shown)
{
    CLI::App* read =
        app.add_subcommand("read", "Read numbers and show the pose in every representation");
    read->add_option(
        "numbers", options.operands,
        "Numbers, or one file with a set a line, or - for standard input (also when absent)");
    read->add_flag("--paste", options.paste,
                   "The whole input is one pasted text, however many lines");
    read->add_flag("--json", options.json, "One JSON object a set instead of a table");
    StatedReading& stated = options.stated;
    addWord(*read, "--as", stated.kind,
            "What the numbers are (axis-angle: the axis, then the angle)");
    addOrder(*read, "--order", stated.order,
             "The axes of three angles as listed: zyx, 321, z-y-x; default zyx");
    addWord(*read, "--about", stated.about,
            "Turns about the axes of the body or of space; default body");
    addWord(*read, "--unit", stated.unit, "Of angles; default deg, but rad for a rotation vector");
    addWord(*read, "--layout", stated.scalar, "Where a quaternion's scalar stands; default wxyz");
    addWord(*read, "--algebra", stated.algebra,
            "hamilton: ij = k; jpl: ij = -k, so that q v q* turns the other way");
    addWord(*read, "--direction", stated.direction,
            "Which way the rotation takes coordinates; default body-to-world");
    addWord(*read, "--storage", stated.storage,
            "Whether nine numbers list rows or columns; default rows");
    addOrder(*read, "--to-order", shown.order, "The order of the angles to show; default zyx");
    addWord(*read, "--to-about", shown.about,
            "About body or space in the angles to show; default body");
    addWord(*read, "--to-unit", shown.unit, "The unit of the angles to show; default deg");
    read->footer(kReadExamples);
    return read;
}

/// "-.5" and "-pi/2" are numbers, not options; a blank before them says so and is no part of a
/// number.
void shieldNumbers(std::vector<std::string>& arguments)
{
    for (std::string& argument : arguments) {
        if (argument.size() < 2 || argument[0] != '-') continue;
        const char second = argument[1];
        const bool number = std::isdigit(static_cast<unsigned char>(second)) != 0 ||
                            second == '.' || argument.compare(1, 2, "pi") == 0 || second == '(';
        if (number) argument.insert(0, " ");
    }
}

}  // namespace

int runCommandLine(std::vector<std::string> arguments)
{
    CLI::App app("Trunnion finds out why a body points the wrong way.", "trunnion-cli");
    app.set_version_flag("--version", "trunnion-cli " TRUNNION_VERSION);
    app.require_subcommand(1);
    app.footer(kCaution);

    ReadOptions readOptions;
    StatedConvention shown;
    const CLI::App* read = addRead(app, readOptions, shown);

    shieldNumbers(arguments);
    std::reverse(arguments.begin(), arguments.end());  // as CLI11 takes them
    try {
        app.parse(arguments);
    } catch (const CLI::ParseError& error) {
        const bool asked = error.get_exit_code() == static_cast<int>(CLI::ExitCodes::Success);
        app.exit(error);
        return asked ? kExitFine : kExitBadUsage;
    }
    readOptions.shown = shown.convention();
    return read->parsed() ? runRead(readOptions) : kExitBadUsage;
}

}  // namespace trunnion_cli
