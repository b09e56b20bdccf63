// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string_view>
#include <vector>

#include "rotcore/reading/text/constructors.h"
#include "rotcore/reading/text/expression.h"
#include "rotcore/reading/text/labels.h"

namespace rotcore {

/// A word with its meaning, or a run of numbers that no word parts.
struct Part {
    bool isRun = false;
    std::string_view word;
    Label label;
    const Constructor* constructor = nullptr;
    bool assigned = false;   ///< a colon or an equals sign follows
    bool attribute = false;  ///< the value stands in quotes, as in XML
    bool afterIn = false;    ///< the word "in" stands before it
    std::size_t first = 0;   ///< of a run: its values are [first, last)
    std::size_t last = 0;
};

/// A text as words and runs of numbers. Left out are words that say nothing (`array`, `float`),
/// dimensions and indices (`R[9]`, `R[0][1] =`, `3x3`), numbers before a colon and times of day.
struct Parts {
    std::vector<Part> parts;
    std::vector<Value> values;
    std::vector<std::string_view> garbled;  ///< what looks like a number and is none
    bool hasClock = false;
};

Parts partsOf(std::string_view text, const Items& items);

}  // namespace rotcore
