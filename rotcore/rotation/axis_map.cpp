// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/axis_map.h"

#include <algorithm>
#include <cctype>

namespace rotcore {
namespace {

std::array<AxisMap, 48> makeAllAxisMaps()
{
    std::array<AxisMap, 48> maps;
    std::size_t count = 0;
    std::array<int, 3> rows{0, 1, 2};
    do {
        for (int signs = 0; signs < 8; ++signs) {
            AxisMap& map = maps.at(count++);
            for (std::size_t n = 0; n < 3; ++n)
                map.images[n] = {axisAt(rows[n]), ((signs >> n) & 1) != 0 ? -1 : 1};
        }
    } while (std::next_permutation(rows.begin(), rows.end()));
    std::stable_partition(maps.begin(), maps.end(), [](const AxisMap& map) {
        return handednessOf(map) == Handedness::right;
    });
    return maps;
}

Fault badMap(std::string_view text, const std::string& why)
{
    return {Fault::Kind::badText,
            "\"" + std::string(text) + "\" is not an axis map: " + why +
                ". Write the new x, y and z in terms of the old, as in y, x, -z"};
}

}  // namespace

const std::array<AxisMap, 48>& allAxisMaps()
{
    static const std::array<AxisMap, 48> maps = makeAllAxisMaps();
    return maps;
}

Eigen::Matrix3d matrixOf(const AxisMap& map)
{
    Eigen::Matrix3d matrix = Eigen::Matrix3d::Zero();
    for (int row = 0; row < 3; ++row) {
        const SignedAxis image = map.images[static_cast<std::size_t>(row)];
        matrix(row, indexOf(image.axis)) = image.sign;
    }
    return matrix;
}

Handedness handednessOf(const AxisMap& map)
{
    const auto& [x, y, z] = map.images;
    const int sign = cyclicSign(x.axis, y.axis) * x.sign * y.sign * z.sign;
    return sign > 0 ? Handedness::right : Handedness::left;
}

AxisMap inverse(const AxisMap& map)
{
    AxisMap result;
    for (int row = 0; row < 3; ++row) {
        const SignedAxis image = map.images[static_cast<std::size_t>(row)];
        result.images[static_cast<std::size_t>(indexOf(image.axis))] = {axisAt(row), image.sign};
    }
    return result;
}

AxisMap composed(const AxisMap& outer, const AxisMap& inner)
{
    AxisMap result;
    for (std::size_t row = 0; row < 3; ++row) {
        const SignedAxis middle = outer.images[row];
        const SignedAxis image = inner.images[static_cast<std::size_t>(indexOf(middle.axis))];
        result.images[row] = {image.axis, middle.sign * image.sign};
    }
    return result;
}

std::string textOf(const AxisMap& map)
{
    std::string text;
    for (const SignedAxis& image : map.images) {
        if (!text.empty()) text += ", ";
        if (image.sign < 0) text += '-';
        text += nameOf(image.axis);
    }
    return text;
}

Result<AxisMap> parseAxisMap(std::string_view text)
{
    AxisMap map;
    std::size_t count = 0;
    std::array<bool, 3> used{};
    int sign = 1;
    bool signPending = false;
    for (const char raw : text) {
        const char c = static_cast<char>(std::tolower(static_cast<unsigned char>(raw)));
        if (c == '+' || c == '-') {
            if (signPending) return badMap(text, "two signs stand together");
            sign = c == '-' ? -1 : 1;
            signPending = true;
        } else if (c >= 'x' && c <= 'z') {
            if (count == 3) return badMap(text, "it names more than three axes");
            const Axis axis = axisAt(c - 'x');
            if (used[static_cast<std::size_t>(indexOf(axis))])
                return badMap(text, std::string("it names ") + c + " twice");
            used[static_cast<std::size_t>(indexOf(axis))] = true;
            map.images[count++] = {axis, sign};
            sign = 1;
            signPending = false;
        } else if (c != ' ' && c != ',') {
            return badMap(text, std::string("it has a '") + raw + "' in it");
        }
    }
    if (signPending) return badMap(text, "it ends with a sign");
    if (count != 3)
        return badMap(text, "it names " + std::to_string(count) + " axes instead of three");
    return map;
}

}  // namespace rotcore
