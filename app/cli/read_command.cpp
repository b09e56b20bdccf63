// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/cli/read_command.h"

#include <algorithm>
#include <cerrno>
#include <cstdio>
#include <cstring>
#include <filesystem>
#include <future>
#include <thread>

#include <fcntl.h>
#include <unistd.h>

#include "app/cli/read_answer.h"

namespace trunnion_cli {
namespace {

// Large enough that workers are busy for milliseconds, small enough that memory stays small.
constexpr std::size_t kChunkBytes = std::size_t{1} << 22;
constexpr std::size_t kSliceBytes = std::size_t{1} << 16;

void write(const Output& output)
{
    std::fwrite(output.out.data(), 1, output.out.size(), stdout);
    if (output.err.empty()) return;
    std::fflush(stdout);  // faults then stand after the answers before them
    std::fwrite(output.err.data(), 1, output.err.size(), stderr);
}

int exitCodeOf(bool anyBad)
{
    return anyBad ? kExitBadInput : kExitFine;
}

int badInput(const std::string& message)
{
    std::fprintf(stderr, "trunnion-cli: %s\n", message.c_str());
    return kExitBadInput;
}

// Cuts complete lines into slices for the workers.
std::vector<std::string_view> slicesOf(std::string_view lines)
{
    const std::size_t workers = std::max(1U, std::thread::hardware_concurrency());
    const std::size_t size = std::max(kSliceBytes, lines.size() / (2 * workers) + 1);
    std::vector<std::string_view> slices;
    while (!lines.empty()) {
        const std::size_t cut = lines.size() <= size ? lines.size() : lines.find('\n', size);
        const std::size_t end = cut >= lines.size() ? lines.size() : cut + 1;
        slices.push_back(lines.substr(0, end));
        lines.remove_prefix(end);
    }
    return slices;
}

// Answers lines in the order of the input, slices of them at the same time. Returns whether any was
// bad.
class LineAnswerer {
public:
    explicit LineAnswerer(const ReadOptions& options) : m_options(options) {}

    void answer(std::string_view lines)
    {
        std::vector<std::future<Output>> outputs;
        const auto slices = slicesOf(lines);
        const auto policy = slices.size() > 1 ? std::launch::async : std::launch::deferred;
        for (const std::string_view slice : slices) {
            outputs.push_back(std::async(policy, [this, slice, line = m_nextLine] {
                return answerLines(slice, line, m_options, rotcore::UnitGuess::never);
            }));
            m_nextLine += static_cast<std::size_t>(std::count(slice.begin(), slice.end(), '\n'));
        }
        for (auto& future : outputs) {
            Output output = future.get();
            if (m_answered && !m_options.json && !output.out.empty()) std::fputc('\n', stdout);
            m_answered = m_answered || !output.out.empty();
            write(output);
            m_anyBad = m_anyBad || output.anyBad;
        }
        std::fflush(stdout);
    }

    bool anyBad() const { return m_anyBad; }

private:
    const ReadOptions& m_options;
    std::size_t m_nextLine = 1;
    bool m_answered = false;
    bool m_anyBad = false;
};

// Reads the descriptor as it comes, so that a live pipe is answered line by line.
int readLinesFrom(int descriptor, const ReadOptions& options)
{
    LineAnswerer answerer(options);
    std::string pending;
    for (;;) {
        const std::size_t kept = pending.size();
        pending.resize(kept + kChunkBytes);
        const ssize_t got = ::read(descriptor, pending.data() + kept, kChunkBytes);
        if (got < 0 && errno == EINTR) {
            pending.resize(kept);
            continue;
        }
        if (got < 0) return badInput(std::string("reading failed: ") + std::strerror(errno));
        pending.resize(kept + static_cast<std::size_t>(got));
        if (got == 0) break;
        const std::size_t end = pending.rfind('\n');
        if (end == std::string::npos) continue;
        answerer.answer(std::string_view(pending).substr(0, end + 1));
        pending.erase(0, end + 1);
    }
    answerer.answer(pending);
    return exitCodeOf(answerer.anyBad());
}

int readPasteFrom(int descriptor, const ReadOptions& options)
{
    std::string text;
    std::string chunk(kChunkBytes, '\0');
    for (;;) {
        const ssize_t got = ::read(descriptor, chunk.data(), chunk.size());
        if (got < 0 && errno == EINTR) continue;
        if (got < 0) return badInput(std::string("reading failed: ") + std::strerror(errno));
        if (got == 0) break;
        text.append(chunk, 0, static_cast<std::size_t>(got));
    }
    const Output output = answerPaste(text, options);
    write(output);
    return exitCodeOf(output.anyBad);
}

int readFrom(int descriptor, const ReadOptions& options)
{
    return options.paste ? readPasteFrom(descriptor, options) : readLinesFrom(descriptor, options);
}

int readFile(const std::string& path, const ReadOptions& options)
{
    const int descriptor = ::open(path.c_str(), O_RDONLY | O_CLOEXEC);
    if (descriptor < 0) return badInput("cannot open " + path + ": " + std::strerror(errno));
    const int code = readFrom(descriptor, options);
    ::close(descriptor);
    return code;
}

int readArguments(const ReadOptions& options)
{
    std::string text;
    for (const std::string& operand : options.operands)
        text += (text.empty() ? "" : " ") + operand;
    const Output output = options.paste
                              ? answerPaste(text, options)
                              : answerLines(text, 1, options, rotcore::UnitGuess::fromValues);
    if (output.out.empty() && output.err.empty()) return badInput("the argument holds no numbers");
    write(output);
    return exitCodeOf(output.anyBad);
}

// Whether a single operand that is not a file was surely meant as one.
bool looksLikeFileName(const std::string& operand)
{
    if (operand.find_first_of(" \n\t,;=[({") != std::string::npos) return false;
    const std::string extension = std::filesystem::path(operand).extension().string();
    const bool named =
        extension.size() > 1 && std::all_of(extension.begin() + 1, extension.end(), [](char c) {
            return std::isalnum(static_cast<unsigned char>(c)) != 0;
        });
    const auto isLetter = [](char c) { return std::isalpha(static_cast<unsigned char>(c)) != 0; };
    return (named && std::any_of(extension.begin(), extension.end(), isLetter)) ||
           std::none_of(operand.begin(), operand.end(),
                        [](char c) { return std::isdigit(static_cast<unsigned char>(c)) != 0; });
}

}  // namespace

int runRead(const ReadOptions& options)
{
    if (options.operands.empty()) {
        if (::isatty(STDIN_FILENO) != 0) {
            std::fputs("trunnion-cli: no numbers were given; see trunnion-cli read --help\n",
                       stderr);
            return kExitBadUsage;
        }
        return readFrom(STDIN_FILENO, options);
    }
    if (options.operands.size() == 1) {
        const std::string& operand = options.operands.front();
        if (operand == "-") return readFrom(STDIN_FILENO, options);
        std::error_code ignored;
        if (std::filesystem::exists(operand, ignored)) return readFile(operand, options);
        if (looksLikeFileName(operand)) return badInput("there is no file " + operand);
    }
    return readArguments(options);
}

}  // namespace trunnion_cli
