// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/desktop/desktop_options.h"

#include <algorithm>
#include <map>

#include <CLI/CLI.hpp>

namespace trunnion {
namespace {

// "1600x1000" to two numbers.
void parseSize(const std::string& text, DesktopOptions& options)
{
    int width = 0;
    int height = 0;
    char rest = 0;
    if (std::sscanf(text.c_str(), "%dx%d%c", &width, &height, &rest) != 2 || width < 640 ||
        height < 480 || width > 8000 || height > 8000)
        throw CLI::ValidationError(
            "--size", "\"" + text + "\" is not a size from 640x480 to 8000x8000, as in 1600x1000");
    options.width = width;
    options.height = height;
}

void addOptions(CLI::App& app, DesktopOptions& options)
{
    app.add_option("case", options.caseFile, "A case file to open; the demo case when absent");
    app.add_option("--snapshot", options.snapshot,
                   "Write a picture of the window to this PNG file and exit");
    app.add_option_function<std::string>(
           "--size", [&options](const std::string& text) { parseSize(text, options); },
           "Size of the snapshot, as in 1600x1000")
        ->type_name("WxH");
    app.add_option("--task", "The task to show")->check(CLI::IsMember({"inspect"}));
    app.add_option_function<std::string>(
           "--scheme",
           [&options](const std::string& word) {
               options.scheme = word == "dark" ? ui::Scheme::dark : ui::Scheme::light;
           },
           "Light or dark; as the desktop when absent")
        ->check(CLI::IsMember({"light", "dark"}));
    app.add_option("--scale", options.scale, "Scale of everything, 1 to 2.5")
        ->check(CLI::Range(1.0, 2.5));
    const std::map<std::string, RendererChoice> renderers{{"auto", RendererChoice::automatic},
                                                          {"qt3d", RendererChoice::qt3d},
                                                          {"painter", RendererChoice::painter}};
    app.add_option("--renderer", options.renderer,
                   "How the stage is drawn: auto takes qt3d wherever OpenGL works")
        ->transform(CLI::CheckedTransformer(renderers, CLI::ignore_case));
    app.add_flag("--probe-gl", options.probeOpenGl)->group("");
}

}  // namespace

std::variant<DesktopOptions, int> parseDesktopOptions(std::vector<std::string> arguments)
{
    CLI::App app("Trunnion finds out why a body points the wrong way.", "trunnion");
    app.set_version_flag("--version", "trunnion " TRUNNION_VERSION);
    app.footer(
        "Trunnion explains numbers; it does not release motion. Try a fix at reduced speed and "
        "with\n"
        "people clear, and follow the equipment's manual, the site's rules, local codes and the\n"
        "judgement of whoever is licensed for the work.");
    DesktopOptions options;
    addOptions(app, options);
    std::reverse(arguments.begin(), arguments.end());
    try {
        app.parse(arguments);
    } catch (const CLI::ParseError& error) {
        const bool asked = error.get_exit_code() == static_cast<int>(CLI::ExitCodes::Success);
        app.exit(error);
        return asked ? 0 : 2;
    }
    return options;
}

}  // namespace trunnion
