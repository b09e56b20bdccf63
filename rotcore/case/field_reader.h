// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <set>
#include <string>
#include <string_view>
#include <vector>

#include "rotcore/case/located_json.h"
#include "rotcore/names.h"

namespace rotcore {

/// Reads the fields of one JSON object strictly. The first thing that is wrong is kept as the fault
/// and everything after it gives nothing, so a reader asks for all fields and looks at the fault
/// once.
class FieldReader {
public:
    /// `fault` is shared by the readers of one document.
    FieldReader(const LocatedJson& document, std::string pointer, std::optional<Fault>& fault);

    bool has(std::string_view field) const;
    std::optional<double> number(std::string_view field);
    std::optional<bool> boolean(std::string_view field);
    std::optional<std::string> text(std::string_view field);
    std::optional<std::vector<double>> numbers(std::string_view field);

    /// One of the words of an enumeration; `value` stays as it is if the field is not there.
    template <class E>
    void word(std::string_view field, E& value)
    {
        const auto written = text(field);
        if (!written) return;
        const auto parsed = parseName<E>(*written);
        if (parsed)
            value = *parsed;
        else
            complain(field, parsed.error().message);
    }

    /// The reader of an object within this one, or of each object of an array.
    std::optional<FieldReader> object(std::string_view field);
    std::vector<FieldReader> objects(std::string_view field);

    /// Whether the field is text rather than something else.
    bool isText(std::string_view field) const;

    /// Notes a fault of `field` ("" for the object itself), unless there is one already.
    void complain(std::string_view field, const std::string& message);

    /// Complains of fields that were not asked for.
    void refuseOthers();

private:
    const nlohmann::ordered_json* find(std::string_view field);
    std::string pointerTo(std::string_view field) const;

    const LocatedJson* m_document;
    const nlohmann::ordered_json* m_object;
    std::string m_pointer;
    std::optional<Fault>* m_fault;
    std::set<std::string, std::less<>> m_asked;
};

}  // namespace rotcore
