// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "rotcore/chain/chain.h"
#include "rotcore/reading/reading.h"

namespace rotcore {

/// The convention in which angles are shown.
struct Convention {
    Order order = Order::zyx;
    About about = About::body;
    AngleUnit unit = AngleUnit::degrees;
    double outerAtLock = 0.0;  ///< radians: at lock, the outer angle that is kept
    friend bool operator==(const Convention&, const Convention&) = default;
};

/// Everything under inspection. A plain value: what is saved, undone, compared and examined.
struct Case {
    std::optional<SentNumbers> start;  ///< the pose before the first turn; the world's axes if none
    Chain chain;                       ///< the turns from there
    Convention shown;
    friend bool operator==(const Case&, const Case&) = default;
};

/// The angles of a case that is nothing but three turns, none muted, about the axes and in the
/// order of its convention; nothing for any other.
std::optional<EulerAngles> turnedAngles(const Case& subject);

}  // namespace rotcore
