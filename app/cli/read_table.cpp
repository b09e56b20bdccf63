// SPDX-License-Identifier: GPL-3.0-or-later
// The table that `trunnion-cli read` prints for people.
#include <array>
#include <cmath>
#include <iterator>
#include <span>

#include <fmt/format.h>

#include "app/cli/read_answer.h"
#include "rotcore/number_text.h"
#include "rotcore/rotation/angle.h"

namespace trunnion_cli {
namespace {

using namespace rotcore;

class Table {
public:
    explicit Table(std::string& out) : m_out(out) {}

    void row(std::string_view label, std::string_view text)
    {
        fmt::format_to(std::back_inserter(m_out), "{:<17}{}\n", label, text);
    }

    // Numbers in columns, aligned on the decimal point, each with its letter before it.
    void row(std::string_view label, std::string_view letters, std::span<const double> numbers,
             std::string_view note = {})
    {
        std::string cells;
        for (std::size_t n = 0; n < numbers.size(); ++n)
            fmt::format_to(std::back_inserter(cells), "{} {:>15.9f}  ",
                           n < letters.size() ? letters[n] : ' ', numbers[n] + 0.0);
        cells += note;
        cells.erase(cells.find_last_not_of(' ') + 1);
        row(label, cells);
    }

private:
    std::string& m_out;
};

std::string unitWord(AngleUnit unit)
{
    return unit == AngleUnit::degrees ? "degrees" : "radians";
}

void addInput(Table& table, const ReadAnswer& answer)
{
    table.row("read as", wordsOf(answer.input.numbers.reading));
    std::string others;
    for (const OtherReading& other : answer.input.others)
        others += (others.empty() ? "" : "; or ") + other.words;
    if (!others.empty()) table.row("  could be too", others);
    for (const std::string& warning : warningsOf(answer))
        table.row("", "note: " + warning);
    if (const auto& matrix = answer.found.start->matrix)
        table.row("matrix check", wordsOf(*matrix));
}

void addAngles(Table& table, const Findings& found)
{
    const Convention& shown = found.shown;
    const std::string convention = std::string(nameOf(shown.order)) + " about " +
                                   std::string(nameOf(shown.about)) + ", " + unitWord(shown.unit);
    constexpr std::array<std::string_view, 2> kLabels{"angles", "  or as well"};
    for (std::size_t n = 0; n < found.euler.solutions.size(); ++n) {
        std::array<double, 3> angles = found.euler.solutions.at(n).angles;
        for (double& angle : angles)
            angle = inUnit(angle, shown.unit);
        table.row(kLabels.at(n), nameOf(shown.order), angles, n == 0 ? convention : std::string());
    }
    if (const auto& family = found.euler.family)
        table.row("  at lock", std::string("any angles with the same ") +
                                   (family->sign > 0 ? "sum" : "difference") +
                                   " of first and third do; the outer one was kept");
}

void addLock(Table& table, const Findings& found)
{
    const LockGauge& lock = found.lock;
    table.row("lock", found.euler.locked()
                          ? "at lock: the outer and inner ring turn about one line"
                          : degreesText(lock.distance) +
                                " from lock; 1 deg of the body costs up to " +
                                roundedText(lock.amplification, 4) + " deg of the rings");
    table.row("  lost direction", "xyz", {lock.lostDirectionBody.data(), 3}, "in the body");
    table.row("", "XYZ", {lock.lostDirectionSpace.data(), 3}, "in the world");
    std::string ranking;
    for (const OrderStanding& standing : found.orders)
        fmt::format_to(std::back_inserter(ranking), "{}{} {:.1f}", ranking.empty() ? "" : "  ",
                       nameOf(standing.order), toDegrees(standing.distance));
    constexpr std::size_t kHalf = 6;
    std::size_t cut = 0;
    for (std::size_t n = 0; n < kHalf; ++n)
        cut = ranking.find("  ", cut + 1);
    table.row("orders", ranking.substr(0, cut) + "   degrees from lock");
    table.row("", ranking.substr(cut + 2));
}

}  // namespace

void appendTable(std::string& out, const ReadAnswer& answer)
{
    const Findings& found = answer.found;
    Table table(out);
    addInput(table, answer);
    const Eigen::Quaterniond& q = found.q_WB;
    table.row("quaternion", "wxyz", std::array{q.w(), q.x(), q.y(), q.z()});
    table.row("", "Hamilton, body to world");
    for (int row = 0; row < 3; ++row) {
        const Eigen::Vector3d numbers = found.R_WB.row(row);
        table.row(row == 0 ? "matrix" : "", "", {numbers.data(), 3},
                  row == 0 ? "body to world" : "");
    }
    addAngles(table, found);
    const Eigen::Vector3d rotationVector = found.axisAngle.angle * found.axisAngle.axis;
    table.row("rotation vector", "xyz", {rotationVector.data(), 3}, "radians");
    table.row("axis", "xyz", {found.axisAngle.axis.data(), 3},
              "angle " + degreesText(found.axisAngle.angle));
    if (found.gibbs)
        table.row("Gibbs vector", "xyz", {found.gibbs->data(), 3}, "axis tan(angle/2)");
    else
        table.row("Gibbs vector", "does not exist at a half turn");
    table.row("mod. Rodrigues", "xyz", {found.modifiedRodrigues.principal.data(), 3},
              "axis tan(angle/4)");
    if (const auto& shadow = found.modifiedRodrigues.shadow)
        table.row("  shadow set", "xyz", {shadow->data(), 3});
    else
        table.row("  shadow set", "does not exist at angle zero");
    addLock(table, found);
}

}  // namespace trunnion_cli
