// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <variant>
#include <vector>

#include "ui/stage/stage_renderer.h"

namespace trunnion {

enum class RendererChoice { automatic, qt3d, painter };

/// What `trunnion` was asked to do.
struct DesktopOptions {
    std::string caseFile;  ///< the demo case if empty
    std::string snapshot;  ///< file to write the window's picture to; no window then
    int width = 1280;      ///< of the snapshot, logical pixels
    int height = 800;
    double scale = 1.0;  ///< of everything, as on a screen of finer pixels
    std::optional<ui::Scheme> scheme;
    RendererChoice renderer = RendererChoice::automatic;
    bool probeOpenGl =
        false;  ///< only try OpenGL and exit: what the program asks of a copy of itself
};

/// The options, or the exit code where the program is already done (help, version, bad usage).
std::variant<DesktopOptions, int> parseDesktopOptions(std::vector<std::string> arguments);

/// Runs the program: 0 fine, 2 bad usage, 3 bad input, 4 no display.
int runDesktop(const DesktopOptions& options, int argc, char** argv);

}  // namespace trunnion
