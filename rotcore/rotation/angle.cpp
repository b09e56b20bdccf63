// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/angle.h"

#include <cmath>

namespace rotcore {

double wrapped(double angle)
{
    // remainder() is exact for the double nearest to 2 pi and ends in [-pi, pi].
    const double inside = std::remainder(angle, 2.0 * kPi);
    return inside <= -kPi ? kPi : inside;
}

}  // namespace rotcore
