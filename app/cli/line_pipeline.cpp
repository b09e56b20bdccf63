// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/cli/line_pipeline.h"

#include <algorithm>
#include <cstdio>
#include <thread>

namespace trunnion_cli {
namespace {

// About 10 ms of work: a thread costs 1/500 of that, and the answers still fit a second-level cache
// or so.
constexpr std::size_t kSliceBytes = std::size_t{1} << 15;

}  // namespace

void write(const Output& output)
{
    std::fwrite(output.out.data(), 1, output.out.size(), stdout);
    if (output.err.empty()) return;
    std::fflush(stdout);
    std::fwrite(output.err.data(), 1, output.err.size(), stderr);
}

LinePipeline::LinePipeline(const ReadOptions& options)
    : m_options(options), m_workers(std::max(1U, std::thread::hardware_concurrency()))
{
}

void LinePipeline::push(std::string_view lines)
{
    while (!lines.empty()) {
        const std::size_t cut =
            lines.size() <= kSliceBytes ? lines.size() : lines.find('\n', kSliceBytes);
        const std::size_t end = std::min(cut, lines.size() - 1) + 1;
        start(lines.substr(0, end));
        lines.remove_prefix(end);
    }
}

void LinePipeline::start(std::string_view lines)
{
    // One slice more than there are cores, so that none waits while answers are written.
    while (m_running.size() > m_workers)
        writeOldest();
    if (m_spare.empty()) m_spare.push_back(std::make_unique<Slice>());
    std::unique_ptr<Slice> slice = std::move(m_spare.back());
    m_spare.pop_back();
    slice->lines = lines;
    slice->firstLine = m_nextLine;
    m_nextLine += static_cast<std::size_t>(std::count(lines.begin(), lines.end(), '\n'));
    const auto policy = lines.size() < kSliceBytes / 4 ? std::launch::deferred : std::launch::async;
    slice->done = std::async(policy, [this, work = slice.get()] {
        answerLines(work->output, work->lines, work->firstLine, m_options,
                    rotcore::UnitGuess::never);
    });
    m_running.push_back(std::move(slice));
}

void LinePipeline::writeOldest()
{
    std::unique_ptr<Slice> slice = std::move(m_running.front());
    m_running.pop_front();
    slice->done.get();
    Output& output = slice->output;
    if (m_answered && !m_options.json && !output.out.empty()) std::fputc('\n', stdout);
    m_answered = m_answered || !output.out.empty();
    m_anyBad = m_anyBad || output.anyBad;
    write(output);
    output.out.clear();
    output.err.clear();
    output.anyBad = false;
    m_spare.push_back(std::move(slice));
}

void LinePipeline::drain()
{
    while (!m_running.empty())
        writeOldest();
    std::fflush(stdout);
}

}  // namespace trunnion_cli
