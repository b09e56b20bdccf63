// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/published/handbook_tables.h"

#include <cmath>

#include "tests/published/checks.h"

namespace published {

using Eigen::Matrix3d;
using rotcore::Order;

TrigOfThree::TrigOfThree(const std::array<double, 3>& radians)
    : s1(std::sin(radians[0])),
      c1(std::cos(radians[0])),
      s2(std::sin(radians[1])),
      c2(std::cos(radians[1])),
      s3(std::sin(radians[2])),
      c3(std::cos(radians[2]))
{
}

namespace {

// clang-format off
Matrix3d attitude121(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c2,     s1*s2,             -c1*s2,
                 s2*s3,  c1*c3 - c2*s1*s3,  c3*s1 + c1*c2*s3,
                 c3*s2, -c2*c3*s1 - c1*s3,  c1*c2*c3 - s1*s3});
}
Matrix3d attitude123(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c2*c3,  c3*s1*s2 + c1*s3,  s1*s3 - c1*c3*s2,
                -c2*s3,  c1*c3 - s1*s2*s3,  c3*s1 + c1*s2*s3,
                 s2,    -c2*s1,             c1*c2});
}
Matrix3d attitude131(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c2,     c1*s2,             s1*s2,
                -c3*s2,  c1*c2*c3 - s1*s3,  c2*c3*s1 + c1*s3,
                 s2*s3, -c3*s1 - c1*c2*s3,  c1*c3 - c2*s1*s3});
}
Matrix3d attitude132(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c2*c3,  c1*c3*s2 + s1*s3,  c3*s1*s2 - c1*s3,
                -s2,     c1*c2,             c2*s1,
                 c2*s3, -c3*s1 + c1*s2*s3,  c1*c3 + s1*s2*s3});
}
Matrix3d attitude212(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c3 - c2*s1*s3,  s2*s3, -c3*s1 - c1*c2*s3,
                 s1*s2,             c2,     c1*s2,
                 c2*c3*s1 + c1*s3, -c3*s2,  c1*c2*c3 - s1*s3});
}
Matrix3d attitude213(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c3 + s1*s2*s3,  c2*s3, -c3*s1 + c1*s2*s3,
                 c3*s1*s2 - c1*s3,  c2*c3,  c1*c3*s2 + s1*s3,
                 c2*s1,            -s2,     c1*c2});
}
Matrix3d attitude231(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c2,             s2,    -c2*s1,
                -c1*c3*s2 + s1*s3,  c2*c3,  c3*s1*s2 + c1*s3,
                 c3*s1 + c1*s2*s3, -c2*s3,  c1*c3 - s1*s2*s3});
}
Matrix3d attitude232(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c2*c3 - s1*s3,  c3*s2, -c2*c3*s1 - c1*s3,
                -c1*s2,             c2,     s1*s2,
                 c3*s1 + c1*c2*s3,  s2*s3,  c1*c3 - c2*s1*s3});
}
Matrix3d attitude312(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c3 - s1*s2*s3,  c3*s1 + c1*s2*s3, -c2*s3,
                -c2*s1,             c1*c2,             s2,
                 c3*s1*s2 + c1*s3,  s1*s3 - c1*c3*s2,  c2*c3});
}
Matrix3d attitude313(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c3*c1 - s3*c2*s1,  c3*s1 + s3*c2*c1,  s3*s2,
                -s3*c1 - c3*c2*s1, -s3*s1 + c3*c2*c1,  c3*s2,
                 s2*s1,            -s2*c1,             c2});
}
Matrix3d attitude321(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c2*c1,             c2*s1,            -s2,
                 s3*s2*c1 - c3*s1,  s3*s2*s1 + c3*c1,  s3*c2,
                 c3*s2*c1 + s3*s1,  c3*s2*s1 - s3*c1,  c3*c2});
}
Matrix3d attitude323(const TrigOfThree& t)
{
    const auto& [s1, c1, s2, c2, s3, c3] = t;
    return rows({c1*c2*c3 - s1*s3,  c2*c3*s1 + c1*s3, -c3*s2,
                -c3*s1 - c1*c2*s3,  c1*c3 - c2*s1*s3,  s2*s3,
                 c1*s2,             s1*s2,             c2});
}

Matrix3d rates121(const TrigOfThree& t)
{
    return rows({t.c2,       0,    1,
                 t.s2*t.s3,  t.c3, 0,
                 t.s2*t.c3, -t.s3, 0});
}
Matrix3d rates123(const TrigOfThree& t)
{
    return rows({t.c2*t.c3,  t.s3, 0,
                -t.c2*t.s3,  t.c3, 0,
                 t.s2,       0,    1});
}
Matrix3d rates131(const TrigOfThree& t)
{
    return rows({t.c2,       0,    1,
                -t.s2*t.c3,  t.s3, 0,
                 t.s2*t.s3,  t.c3, 0});
}
Matrix3d rates132(const TrigOfThree& t)
{
    return rows({t.c2*t.c3, -t.s3, 0,
                -t.s2,       0,    1,
                 t.c2*t.s3,  t.c3, 0});
}
Matrix3d rates212(const TrigOfThree& t)
{
    return rows({t.s2*t.s3,  t.c3, 0,
                 t.c2,       0,    1,
                -t.s2*t.c3,  t.s3, 0});
}
Matrix3d rates213(const TrigOfThree& t)
{
    return rows({t.c2*t.s3,  t.c3, 0,
                 t.c2*t.c3, -t.s3, 0,
                -t.s2,       0,    1});
}
Matrix3d rates231(const TrigOfThree& t)
{
    return rows({t.s2,       0,    1,
                 t.c2*t.c3,  t.s3, 0,
                -t.c2*t.s3,  t.c3, 0});
}
Matrix3d rates232(const TrigOfThree& t)
{
    return rows({t.s2*t.c3, -t.s3, 0,
                 t.c2,       0,    1,
                 t.s2*t.s3,  t.c3, 0});
}
Matrix3d rates312(const TrigOfThree& t)
{
    return rows({-t.c2*t.s3, t.c3, 0,
                  t.s2,      0,    1,
                  t.c2*t.c3, t.s3, 0});
}
Matrix3d rates313(const TrigOfThree& t)
{
    return rows({t.s2*t.s3,  t.c3, 0,
                 t.s2*t.c3, -t.s3, 0,
                 t.c2,       0,    1});
}
Matrix3d rates321(const TrigOfThree& t)
{
    return rows({-t.s2,       0,    1,
                  t.c2*t.s3,  t.c3, 0,
                  t.c2*t.c3, -t.s3, 0});
}
Matrix3d rates323(const TrigOfThree& t)
{
    return rows({-t.s2*t.c3, t.s3, 0,
                  t.s2*t.s3, t.c3, 0,
                  t.c2,      0,    1});
}
// clang-format on

}  // namespace

const std::array<HandbookRow, 12> kHandbook{{
    {Order::xyx, attitude121, rates121},
    {Order::xyz, attitude123, rates123},
    {Order::xzx, attitude131, rates131},
    {Order::xzy, attitude132, rates132},
    {Order::yxy, attitude212, rates212},
    {Order::yxz, attitude213, rates213},
    {Order::yzx, attitude231, rates231},
    {Order::yzy, attitude232, rates232},
    {Order::zxy, attitude312, rates312},
    {Order::zxz, attitude313, rates313},
    {Order::zyx, attitude321, rates321},
    {Order::zyz, attitude323, rates323},
}};

}  // namespace published
