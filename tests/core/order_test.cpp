// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/order.h"

#include <set>

#include <gtest/gtest.h>

namespace {

using namespace rotcore;

TEST(Order, ThereAreTwelveAndNoNeighboursAreEqual)  // 3 * 2 * 2, counted by hand
{
    std::set<std::array<Axis, 3>> seen;
    for (const Order order : kAllOrders) {
        const auto axes = axesOf(order);
        EXPECT_NE(axes[0], axes[1]);
        EXPECT_NE(axes[1], axes[2]);
        seen.insert(axes);
    }
    EXPECT_EQ(seen.size(), 12U);
}

TEST(Order, IsReadHoweverPeopleWriteIt)
{
    for (const char* text :
         {"zyx", "ZYX", "321", "z-y-x", "Z Y X", "z,y,x", "3-2-1", "zYx", "z-y'-x''"}) {
        const auto order = parseOrder(text);
        ASSERT_TRUE(order) << text;
        EXPECT_EQ(*order, Order::zyx) << text;
    }
    for (const Order order : kAllOrders)
        EXPECT_EQ(*parseOrder(nameOf(order)), order);
    EXPECT_EQ(*parseOrder("313"), Order::zxz);
}

TEST(Order, IsRefusedWithTheReason)
{
    const auto reason = [](const char* text) {
        const auto order = parseOrder(text);
        return order ? std::string("accepted") : order.error().message;
    };
    EXPECT_NE(reason("zzx").find("single turn"), std::string::npos);
    EXPECT_NE(reason("xyy").find("single turn"), std::string::npos);
    EXPECT_NE(reason("zy").find("2 axes instead of three"), std::string::npos);
    EXPECT_NE(reason("zyxz").find("more than three"), std::string::npos);
    EXPECT_NE(reason("zaz").find("'a'"), std::string::npos);
    EXPECT_NE(reason("").find("0 axes"), std::string::npos);
    EXPECT_NE(reason("021").find("'0'"), std::string::npos);
}

TEST(Order, ReversedTwiceIsItself)
{
    for (const Order order : kAllOrders) {
        EXPECT_EQ(reversed(reversed(order)), order);
        EXPECT_EQ(isRepeating(order), reversed(order) == order);
    }
    EXPECT_EQ(reversed(Order::zyx), Order::xyz);
    EXPECT_EQ(reversed(Order::yzx), Order::xzy);
}

TEST(Order, WordsOfAnEnumerationReadBack)
{
    EXPECT_EQ(*parseName<About>("space"), About::space);
    const auto wrong = parseName<About>("world");
    ASSERT_FALSE(wrong);
    EXPECT_NE(wrong.error().message.find("choose from body, space"), std::string::npos);
}

}  // namespace
