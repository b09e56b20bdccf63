// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

#include "rotcore/case/case.h"
#include "rotcore/reading/text_input.h"

namespace trunnion_cli {

/// What `trunnion-cli read` was asked to do.
struct ReadOptions {
    std::vector<std::string> operands;  ///< numbers, one file name, or "-"
    bool paste = false;                 ///< the whole input is one text, not a set a line
    bool json = false;
    rotcore::StatedReading stated;
    rotcore::Convention shown;
};

}  // namespace trunnion_cli
