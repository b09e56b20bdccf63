// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/cli/read_command.h"

#include <algorithm>
#include <cerrno>
#include <cstdio>
#include <filesystem>
#include <system_error>

#include <fcntl.h>
#include <poll.h>
#include <unistd.h>

#include "app/cli/line_pipeline.h"
#include "app/cli/read_answer.h"

namespace trunnion_cli {
namespace {

constexpr std::size_t kChunkBytes = std::size_t{1} << 20;

int exitCodeOf(bool anyBad)
{
    return anyBad ? kExitBadInput : kExitFine;
}

int badInput(const std::string& message)
{
    std::fprintf(stderr, "trunnion-cli: %s\n", message.c_str());
    return kExitBadInput;
}

// What the last system call said, in words.
std::string lastError()
{
    return std::generic_category().message(errno);
}

bool hasMoreAlready(int descriptor)
{
    pollfd wanted{descriptor, POLLIN, 0};
    return ::poll(&wanted, 1, 0) > 0;
}

// read(), repeated when a signal interrupts it.
ssize_t readSome(int descriptor, char* into, std::size_t size)
{
    for (;;) {
        const ssize_t got = ::read(descriptor, into, size);
        if (got >= 0 || errno != EINTR) return got;
    }
}

// Answers lines as they come: whenever the input pauses, all that came is answered.
int readLinesFrom(int descriptor, const ReadOptions& options)
{
    LinePipeline pipeline(options);
    std::string pending;
    std::string chunk(kChunkBytes, '\0');
    for (;;) {
        if (!hasMoreAlready(descriptor)) pipeline.drain();
        const ssize_t got = readSome(descriptor, chunk.data(), chunk.size());
        if (got < 0) return badInput("reading failed: " + lastError());
        if (got == 0) break;
        const std::string_view fresh(chunk.data(), static_cast<std::size_t>(got));
        const std::size_t lastBreak = fresh.rfind('\n');
        if (lastBreak == std::string_view::npos) {
            pending += fresh;
            continue;
        }
        pending += fresh.substr(0, lastBreak + 1);
        pipeline.push(pending);
        pending = fresh.substr(lastBreak + 1);
    }
    pipeline.push(pending);
    pipeline.drain();
    return exitCodeOf(pipeline.anyBad());
}

int readPasteFrom(int descriptor, const ReadOptions& options)
{
    std::string text;
    std::string chunk(kChunkBytes, '\0');
    for (;;) {
        const ssize_t got = readSome(descriptor, chunk.data(), chunk.size());
        if (got < 0) return badInput("reading failed: " + lastError());
        if (got == 0) break;
        text.append(chunk, 0, static_cast<std::size_t>(got));
    }
    Output output;
    answerPaste(output, text, options);
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
    if (descriptor < 0) return badInput("cannot open " + path + ": " + lastError());
    const int code = readFrom(descriptor, options);
    ::close(descriptor);
    return code;
}

int readArguments(const ReadOptions& options)
{
    std::string text;
    for (const std::string& operand : options.operands)
        text += (text.empty() ? "" : " ") + operand;
    Output output;
    if (options.paste)
        answerPaste(output, text, options);
    else
        answerLines(output, text, 1, options, rotcore::UnitGuess::fromValues);
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
