// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "ui/stage/scene.h"

namespace ui {

/// "30.0°", "−5.0°": radians in degrees to one decimal, with a true minus and no minus before zero.
QString degreesText(double radians);

/// "z 30.0°".
QString ringText(const RingShape& ring);

/// "nearing lock", "near lock" or "at lock" with the angle between the pins; empty far from it.
QString lockText(const Scene& scene);

/// What a press at the place pointed at would do, or what the drag under way is doing.
QString hintText(const Scene& scene, const Pointing& pointing);

}  // namespace ui
