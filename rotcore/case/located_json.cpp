// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/case/located_json.h"

#include <algorithm>
#include <cstddef>
#include <iterator>
#include <set>
#include <vector>

namespace rotcore {
namespace {

constexpr std::size_t kDeepest = 64;

// Walks over the text and tells how far the parser has read.
class CountingIterator {
public:
    using iterator_category = std::input_iterator_tag;
    using value_type = char;
    using difference_type = std::ptrdiff_t;
    using pointer = const char*;
    using reference = const char&;

    CountingIterator(const char* at, std::size_t* consumed) : m_at(at), m_consumed(consumed) {}
    const char& operator*() const { return *m_at; }
    CountingIterator& operator++()
    {
        ++m_at;
        ++*m_consumed;
        return *this;
    }
    CountingIterator operator++(int)
    {
        CountingIterator before = *this;
        ++*this;
        return before;
    }
    friend bool operator==(const CountingIterator& a, const CountingIterator& b)
    {
        return a.m_at == b.m_at;
    }

private:
    const char* m_at;
    std::size_t* m_consumed;
};

TextPlace placeAt(std::string_view text, std::size_t offset)
{
    const std::string_view before = text.substr(0, std::min(offset, text.size()));
    const std::size_t lastBreak = before.rfind('\n');
    TextPlace place;
    place.line = 1 + static_cast<std::size_t>(std::count(before.begin(), before.end(), '\n'));
    place.column =
        lastBreak == std::string_view::npos ? before.size() + 1 : before.size() - lastBreak;
    return place;
}

std::string escaped(std::string key)
{
    // RFC 6901: ~ and / inside a name.
    for (std::size_t at = 0; (at = key.find_first_of("~/", at)) != std::string::npos; at += 2)
        key.replace(at, 1, key[at] == '~' ? "~0" : "~1");
    return key;
}

// Builds the document from the parser's events, noting places.
class Builder : public nlohmann::json_sax<nlohmann::ordered_json> {
public:
    using Json = nlohmann::ordered_json;

    Builder(std::string_view text, const std::size_t* consumed) : m_text(text), m_consumed(consumed)
    {
    }

    bool null() override { return value(nullptr, 4); }
    bool boolean(bool b) override { return value(b, b ? 4 : 5); }
    bool number_integer(number_integer_t n) override { return value(n, 2); }
    bool number_unsigned(number_unsigned_t n) override { return value(n, 2); }
    bool number_float(number_float_t n, const string_t& written) override
    {
        return value(n, written.size() + 1);
    }
    bool string(string_t& s) override { return value(s, s.size() + 2); }
    bool binary(binary_t& /*unused*/) override { return false; }
    bool start_object(std::size_t /*size*/) override { return open(Json::object()); }
    bool end_object() override { return close(); }
    bool start_array(std::size_t /*size*/) override { return open(Json::array()); }
    bool end_array() override { return close(); }

    bool key(string_t& name) override
    {
        Level& level = m_levels.back();
        const TextPlace place = placeBefore(name.size() + 2);
        if (level.json->contains(name)) {
            m_fault = Fault{Fault::Kind::badText, "the name \"" + name + "\" appears twice", place};
            return false;
        }
        level.key = name;
        m_result.places.emplace(level.pointer + '/' + escaped(name), place);
        return true;
    }

    bool parse_error(std::size_t position, const std::string& /*token*/,
                     const nlohmann::detail::exception& error) override
    {
        // "[json.exception.…] parse error at line 1, column 2: what was read and what was
        // expected".
        std::string why = error.what();
        if (const auto end = why.find("] "); end != std::string::npos) why.erase(0, end + 2);
        if (why.starts_with("parse error at "))
            if (const auto end = why.find(": "); end != std::string::npos) why.erase(0, end + 2);
        m_fault = Fault{Fault::Kind::badText, "this is not JSON: " + why,
                        placeAt(m_text, position == 0 ? 0 : position - 1)};
        return false;
    }

    Result<LocatedJson> result(bool parsed)
    {
        if (parsed && !m_fault) return std::move(m_result);
        return m_fault.value_or(Fault{Fault::Kind::badText, "this is not JSON"});
    }

private:
    struct Level {
        Json* json;
        std::string pointer;
        std::string key = {};
    };

    TextPlace placeBefore(std::size_t length) const
    {
        return placeAt(m_text, *m_consumed > length ? *m_consumed - length : 0);
    }

    std::string pointerOfNext() const
    {
        if (m_levels.empty()) return {};
        const Level& level = m_levels.back();
        return level.pointer + '/' +
               (level.json->is_object() ? escaped(level.key) : std::to_string(level.json->size()));
    }

    Json* place(Json json)
    {
        if (m_levels.empty()) {
            m_result.root = std::move(json);
            return &m_result.root;
        }
        Level& level = m_levels.back();
        if (level.json->is_object()) return &((*level.json)[level.key] = std::move(json));
        level.json->push_back(std::move(json));
        return &level.json->back();
    }

    bool value(Json json, std::size_t length)
    {
        m_result.places.emplace(pointerOfNext(), placeBefore(length));
        place(std::move(json));
        return true;
    }

    bool open(Json json)
    {
        if (m_levels.size() == kDeepest) {
            m_fault = Fault{Fault::Kind::badText, "more than 64 levels deep", placeBefore(1)};
            return false;
        }
        std::string pointer = pointerOfNext();
        m_result.places.emplace(pointer, placeBefore(1));
        m_levels.push_back({place(std::move(json)), std::move(pointer)});
        return true;
    }

    bool close()
    {
        m_levels.pop_back();
        return true;
    }

    std::string_view m_text;
    const std::size_t* m_consumed;
    LocatedJson m_result;
    std::vector<Level> m_levels;
    std::optional<Fault> m_fault;
};

}  // namespace

TextPlace LocatedJson::placeOf(std::string pointer) const
{
    for (;;) {
        if (const auto found = places.find(pointer); found != places.end()) return found->second;
        if (pointer.empty()) return {};
        pointer.erase(pointer.rfind('/'));
    }
}

Result<LocatedJson> parseLocatedJson(std::string_view text)
{
    std::size_t consumed = 0;
    Builder builder(text, &consumed);
    const char* end = text.data() + text.size();
    const bool parsed = nlohmann::ordered_json::sax_parse(
        CountingIterator(text.data(), &consumed), CountingIterator(end, &consumed), &builder);
    return builder.result(parsed);
}

}  // namespace rotcore
