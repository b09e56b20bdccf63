// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "rotcore/names.h"
#include "rotcore/rotation/quaternion.h"

namespace ui {

/// What the world's three axes are called, and which of them is up.
enum class WorldNames { plain, eastNorthUp, northEastDown, forwardLeftUp, rightDownForward, yUp };

/// How things are shown; no part of what they are.
struct View {
    WorldNames worldNames = WorldNames::plain;
    rotcore::ScalarPlace quaternionLayout = rotcore::ScalarPlace::first;
    rotcore::Algebra quaternionAlgebra = rotcore::Algebra::hamilton;
    friend bool operator==(const View&, const View&) = default;
};

}  // namespace ui

template <>
struct rotcore::Names<ui::WorldNames> {
    static constexpr std::string_view kWhat = "names of the world's directions";
    static constexpr NameTable<ui::WorldNames, 6> kTable{
        {{ui::WorldNames::plain, "plain x, y, z"},
         {ui::WorldNames::eastNorthUp, "east, north, up"},
         {ui::WorldNames::northEastDown, "north, east, down"},
         {ui::WorldNames::forwardLeftUp, "forward, left, up"},
         {ui::WorldNames::rightDownForward, "right, down, forward (camera)"},
         {ui::WorldNames::yUp, "x, y up, z"}}};
};
