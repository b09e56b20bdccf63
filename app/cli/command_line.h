// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

namespace trunnion_cli {

/// Runs the program on its arguments (without its name). Returns the exit code: 0 fine, 2 bad
/// usage, 3 bad input.
int runCommandLine(std::vector<std::string> arguments);

}  // namespace trunnion_cli
