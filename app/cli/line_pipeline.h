// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <deque>
#include <future>
#include <memory>
#include <string>
#include <string_view>
#include <vector>

#include "app/cli/read_answer.h"

namespace trunnion_cli {

/// Answers lines on all cores and writes the answers in the order of the lines.
class LinePipeline {
public:
    explicit LinePipeline(const ReadOptions& options);

    /// Takes complete lines; may write answers to earlier ones.
    void push(std::string_view lines);

    /// Waits for all answers and writes them.
    void drain();

    bool anyBad() const { return m_anyBad; }

private:
    struct Slice {
        std::string lines;
        std::size_t firstLine = 1;
        Output output;
        std::future<void> done = {};
    };

    void start(std::string_view lines);
    void writeOldest();

    const ReadOptions& m_options;
    std::size_t m_workers;
    std::size_t m_nextLine = 1;
    std::deque<std::unique_ptr<Slice>> m_running;
    std::vector<std::unique_ptr<Slice>> m_spare;  ///< their memory is used again
    bool m_answered = false;
    bool m_anyBad = false;
};

/// To standard output and standard error, faults after the answers before them.
void write(const Output& output);

}  // namespace trunnion_cli
