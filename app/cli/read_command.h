// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "app/cli/read_options.h"

namespace trunnion_cli {

/// The exit codes of every verb.
inline constexpr int kExitFine = 0;
inline constexpr int kExitBadUsage = 2;
inline constexpr int kExitBadInput = 3;

/// Runs `trunnion-cli read`: answers to standard output, faults to standard error. Returns the exit
/// code.
int runRead(const ReadOptions& options);

}  // namespace trunnion_cli
