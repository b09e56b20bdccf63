// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string>
#include <string_view>

#include "app/cli/read_options.h"
#include "rotcore/case/findings.h"

namespace trunnion_cli {

/// One set of numbers, read and examined.
struct ReadAnswer {
    rotcore::TextInput input;
    rotcore::Findings found;
};

/// Reads one text and examines it. Places in faults count from the text's start.
rotcore::Result<ReadAnswer> readAndExamine(std::string_view text, const ReadOptions& options,
                                           rotcore::UnitGuess unitGuess);

/// All that was to be said of a text: notes on the input, then on what had to be done to it.
std::vector<std::string> warningsOf(const ReadAnswer& answer);

/// The answer as one JSON object on a line of its own.
void appendJsonLine(std::string& out, const ReadAnswer& answer);

/// The answer as an aligned table for people.
void appendTable(std::string& out, const ReadAnswer& answer);

/// In place of an answer: {"error":"...","line":3,"column":7}, or the sentence alone.
void appendErrorJsonLine(std::string& out, const rotcore::Fault& fault);

/// "line 3, column 7: what is wrong".
std::string errorText(const rotcore::Fault& fault);

/// What came of a stretch of input. Answers are appended.
struct Output {
    std::string out;
    std::string err;
    bool anyBad = false;
};

/// Answers every line of `lines`, the first of which is line `firstLine` of the input. Blank lines
/// and comments ("#" unless it is the mark of a serial line, as in "#YPR=") hold no set and give no
/// answer.
void answerLines(Output& output, std::string_view lines, std::size_t firstLine,
                 const ReadOptions& options, rotcore::UnitGuess unitGuess);

/// Answers the whole of `text` as one set.
void answerPaste(Output& output, std::string_view text, const ReadOptions& options);

}  // namespace trunnion_cli
