// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/case/field_reader.h"

namespace rotcore {

FieldReader::FieldReader(const LocatedJson& document, std::string pointer,
                         std::optional<Fault>& fault)
    : m_document(&document),
      m_object(&document.root.at(nlohmann::ordered_json::json_pointer(pointer))),
      m_pointer(std::move(pointer)),
      m_fault(&fault)
{
    if (!m_object->is_object()) complain("", "is not an object in { }");
}

bool FieldReader::has(std::string_view field) const
{
    return m_object->is_object() && m_object->contains(std::string(field));
}

bool FieldReader::isText(std::string_view field) const
{
    return has(field) && m_object->at(std::string(field)).is_string();
}

std::string FieldReader::pointerTo(std::string_view field) const
{
    return field.empty() ? m_pointer : m_pointer + '/' + std::string(field);
}

void FieldReader::complain(std::string_view field, const std::string& message)
{
    if (*m_fault) return;
    const std::string pointer = pointerTo(field);
    *m_fault =
        Fault{Fault::Kind::badField, (pointer.empty() ? "the document" : pointer) + ": " + message,
              m_document->placeOf(pointer)};
}

const nlohmann::ordered_json* FieldReader::find(std::string_view field)
{
    m_asked.emplace(field);
    return has(field) ? &m_object->at(std::string(field)) : nullptr;
}

std::optional<double> FieldReader::number(std::string_view field)
{
    const auto* json = find(field);
    if (json == nullptr) return std::nullopt;
    if (json->is_number()) return json->get<double>();
    complain(field, "is not a number");
    return std::nullopt;
}

std::optional<bool> FieldReader::boolean(std::string_view field)
{
    const auto* json = find(field);
    if (json == nullptr) return std::nullopt;
    if (json->is_boolean()) return json->get<bool>();
    complain(field, "is not true or false");
    return std::nullopt;
}

std::optional<std::string> FieldReader::text(std::string_view field)
{
    const auto* json = find(field);
    if (json == nullptr) return std::nullopt;
    if (json->is_string()) return json->get<std::string>();
    complain(field, "is not text in quotes");
    return std::nullopt;
}

std::optional<std::vector<double>> FieldReader::numbers(std::string_view field)
{
    const auto* json = find(field);
    if (json == nullptr) return std::nullopt;
    std::vector<double> values;
    bool allNumbers = json->is_array();
    if (allNumbers)
        for (const auto& element : *json) {
            allNumbers = allNumbers && element.is_number();
            if (allNumbers) values.push_back(element.get<double>());
        }
    if (allNumbers) return values;
    complain(field, "is not a list of numbers in [ ]");
    return std::nullopt;
}

std::optional<FieldReader> FieldReader::object(std::string_view field)
{
    if (find(field) == nullptr) return std::nullopt;
    return FieldReader(*m_document, pointerTo(field), *m_fault);
}

std::vector<FieldReader> FieldReader::objects(std::string_view field)
{
    std::vector<FieldReader> readers;
    const auto* json = find(field);
    if (json == nullptr) return readers;
    if (!json->is_array()) {
        complain(field, "is not a list in [ ]");
        return readers;
    }
    for (std::size_t n = 0; n < json->size(); ++n)
        readers.emplace_back(*m_document, pointerTo(field) + '/' + std::to_string(n), *m_fault);
    return readers;
}

void FieldReader::refuseOthers()
{
    if (!m_object->is_object()) return;
    for (const auto& [name, value] : m_object->items()) {
        if (m_asked.contains(name)) continue;
        std::string known;
        for (const std::string& field : m_asked)
            known += (known.empty() ? "" : ", ") + field;
        complain(name, "is not a field here; the fields are " + known);
    }
}

}  // namespace rotcore
