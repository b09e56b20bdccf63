// SPDX-License-Identifier: GPL-3.0-or-later
// Any bytes as a case file: refused with a place, or read into a case that writes and reads back
// equal.
#include <cstddef>
#include <cstdint>
#include <cstdlib>
#include <string_view>

#include "rotcore/case/case_json.h"
#include "rotcore/case/findings.h"

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size)
{
    const std::string_view text(reinterpret_cast<const char*>(data), size);
    const auto subject = rotcore::readCase(text);
    if (!subject) {
        if (subject.error().message.empty() || !subject.error().place) std::abort();
        return 0;
    }
    const std::string written = rotcore::writeCase(*subject);
    const auto back = rotcore::readCase(written);
    if (!back || *back != *subject || rotcore::writeCase(*back) != written) std::abort();
    const auto found = rotcore::examine(*subject);
    if (found && !found->R_WB.allFinite()) std::abort();
    return 0;
}
