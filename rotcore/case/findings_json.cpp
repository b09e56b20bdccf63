// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/case/findings_json.h"

#include <algorithm>
#include <cmath>
#include <initializer_list>
#include <iterator>

#include <fmt/compile.h>
#include <fmt/format.h>
#include <nlohmann/json.hpp>

#include "rotcore/rotation/angle.h"

namespace rotcore {
namespace {

using Buffer = fmt::memory_buffer;

void appendText(Buffer& out, std::string_view text)
{
    out.append(text.data(), text.data() + text.size());
}

void appendNumber(Buffer& out, double value)
{
    if (std::isfinite(value))
        fmt::format_to(std::back_inserter(out), FMT_COMPILE("{}"), value + 0.0);  // +0 for -0
    else
        appendText(out, "null");
}

template <class Numbers>
void appendList(Buffer& out, const Numbers& numbers)
{
    char separator = '[';
    for (const double number : numbers) {
        out.push_back(separator);
        appendNumber(out, number);
        separator = ',';
    }
    out.push_back(']');
}

void appendMatrix(Buffer& out, const Eigen::Matrix3d& R)
{
    char separator = '[';
    for (int row = 0; row < 3; ++row) {
        out.push_back(separator);
        appendList(out, Eigen::Vector3d(R.row(row)));
        separator = ',';
    }
    out.push_back(']');
}

void appendEuler(Buffer& out, const Findings& found)
{
    const Convention& shown = found.shown;
    appendText(out, R"({"order":")");
    appendText(out, nameOf(shown.order));
    appendText(out, R"(","about":")");
    appendText(out, nameOf(shown.about));
    appendText(out, R"(","unit":")");
    appendText(out, nameOf(shown.unit));
    appendText(out, R"(","solutions":)");
    char separator = '[';
    for (const EulerAngles& solution : found.euler.solutions) {
        out.push_back(separator);
        const auto& [a, b, c] = solution.angles;
        appendList(out, std::initializer_list<double>{inUnit(a, shown.unit), inUnit(b, shown.unit),
                                                      inUnit(c, shown.unit)});
        separator = ',';
    }
    appendText(out, found.euler.locked() ? R"(],"locked":true)" : R"(],"locked":false)");
    if (const auto& family = found.euler.family) {
        // outer + sign * inner, said for the listed angles.
        const bool firstIsOuter = outerIndex(shown.about) == 0;
        const double fixed = firstIsOuter ? family->fixed : family->sign * family->fixed;
        appendText(out, R"(,"fixed":{"combination":")");
        appendText(out, family->sign > 0 ? "first + third" : "first - third");
        appendText(out, R"(","value":)");
        appendNumber(out, inUnit(fixed, shown.unit));
        out.push_back('}');
    }
    out.push_back('}');
}

}  // namespace

std::string jsonString(std::string_view text)
{
    const bool plain = std::all_of(text.begin(), text.end(), [](char c) {
        return c >= ' ' && c <= '~' && c != '"' && c != '\\';
    });
    if (plain) return '"' + std::string(text) + '"';
    return nlohmann::json(text).dump(-1, ' ', false, nlohmann::json::error_handler_t::replace);
}

void appendFindingsJson(std::string& json, const Findings& found)
{
    Buffer out;
    const Eigen::Quaterniond& q = found.q_WB;
    appendText(out, R"("quaternion_wxyz":)");
    appendList(out, std::initializer_list<double>{q.w(), q.x(), q.y(), q.z()});
    appendText(out, R"(,"matrix":)");
    appendMatrix(out, found.R_WB);
    appendText(out, R"(,"rotvec_rad":)");
    appendList(out, Eigen::Vector3d(found.axisAngle.angle * found.axisAngle.axis));
    appendText(out, R"(,"axis":)");
    appendList(out, found.axisAngle.axis);
    appendText(out, R"(,"angle_deg":)");
    appendNumber(out, toDegrees(found.axisAngle.angle));
    appendText(out, R"(,"gibbs":)");
    if (found.gibbs)
        appendList(out, *found.gibbs);
    else
        appendText(out, "null");
    appendText(out, R"(,"mrp":)");
    appendList(out, found.modifiedRodrigues.principal);
    appendText(out, R"(,"euler":)");
    appendEuler(out, found);
    appendText(out, R"(,"lock":{"distance_deg":)");
    appendNumber(out, toDegrees(found.lock.distance));
    appendText(out, R"(,"amplification":)");
    appendNumber(out, found.lock.amplification);
    appendText(out, R"(,"lost_direction_body":)");
    appendList(out, found.lock.lostDirectionBody);
    out.push_back('}');
    json.append(out.data(), out.size());
}

}  // namespace rotcore
