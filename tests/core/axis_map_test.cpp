// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/axis_map.h"

#include <algorithm>
#include <set>

#include <Eigen/LU>
#include <gtest/gtest.h>

namespace {

using namespace rotcore;

TEST(AxisMap,
     ThereAre48OfWhich24KeepHandedness)  // common practice: the octahedral group has 48 elements
{
    std::set<std::string> seen;
    for (const AxisMap& map : allAxisMaps())
        seen.insert(textOf(map));
    EXPECT_EQ(seen.size(), 48U);
    const auto rightHanded =
        std::count_if(allAxisMaps().begin(), allAxisMaps().end(),
                      [](const AxisMap& map) { return handednessOf(map) == Handedness::right; });
    EXPECT_EQ(rightHanded, 24);
    EXPECT_EQ(allAxisMaps().front(), AxisMap{});
    EXPECT_EQ(handednessOf(allAxisMaps()[23]), Handedness::right);
    EXPECT_EQ(handednessOf(allAxisMaps()[24]), Handedness::left);
}

TEST(AxisMap, HandednessIsTheSignOfTheDeterminant)
{
    for (const AxisMap& map : allAxisMaps())
        EXPECT_EQ(matrixOf(map).determinant(), handednessOf(map) == Handedness::right ? 1.0 : -1.0)
            << textOf(map);
}

TEST(AxisMap, EastNorthUpToNorthEastDownExchangesAndNegates)  // ROS REP 103, geographic frames
{
    const AxisMap map = *parseAxisMap("y, x, -z");
    const Eigen::Vector3d northEastDown = matrixOf(map) * Eigen::Vector3d(1.0, 2.0, 3.0);
    EXPECT_EQ(northEastDown, Eigen::Vector3d(2.0, 1.0, -3.0));
    EXPECT_EQ(handednessOf(map), Handedness::right);
    EXPECT_EQ(inverse(map), map);
}

TEST(AxisMap, ComposesAndInvertsAsItsMatrixDoes)
{
    for (const AxisMap& outer : allAxisMaps()) {
        EXPECT_EQ(matrixOf(inverse(outer)), matrixOf(outer).transpose());
        for (const AxisMap& inner : allAxisMaps())
            EXPECT_EQ(matrixOf(composed(outer, inner)), matrixOf(outer) * matrixOf(inner));
    }
}

TEST(AxisMap, TextReadsBack)
{
    for (const AxisMap& map : allAxisMaps())
        EXPECT_EQ(*parseAxisMap(textOf(map)), map);
    EXPECT_EQ(*parseAxisMap("yx-z"), *parseAxisMap("Y,+X,-Z"));
}

TEST(AxisMap, IsRefusedWithTheReason)
{
    const auto reason = [](const char* text) {
        const auto map = parseAxisMap(text);
        return map ? std::string("accepted") : map.error().message;
    };
    EXPECT_NE(reason("x, x, z").find("x twice"), std::string::npos);
    EXPECT_NE(reason("x, y").find("2 axes"), std::string::npos);
    EXPECT_NE(reason("x, y, z, x").find("more than three"), std::string::npos);
    EXPECT_NE(reason("x, y, --z").find("two signs"), std::string::npos);
    EXPECT_NE(reason("x, y, z-").find("ends with a sign"), std::string::npos);
    EXPECT_NE(reason("x, y, w").find("'w'"), std::string::npos);
}

}  // namespace
