// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <QFont>
#include <QRectF>
#include <QString>
#include <vector>

#include "ui/stage/camera.h"
#include "ui/stage/palette.h"
#include "ui/stage/scene.h"

namespace ui {

/// A word on the picture, already placed.
struct StageLabel {
    enum class Kind { chip, worldName, bodyLetter, tipWord };
    Kind kind = Kind::chip;
    QString text;
    QRectF box;      ///< logical pixels
    QPointF anchor;  ///< what it names
    QColor colour;
    QFont font;
    bool behind = false;  ///< what it names is on the far side
    bool lit = false;     ///< its ring is under the hand
    int ring = -1;        ///< a chip's ring, 0 outer to 2 inner
};

/// All words of a scene, placed so that chips cover neither each other nor, where there is room,
/// other words.
std::vector<StageLabel> labelsOf(const Scene& scene, const Projection& projection,
                                 const Palette& palette, const QFont& font);

/// Where the hint line and the lock words are painted; labels keep clear of them.
QRectF hintBox(const QSizeF& size, const QFont& font);
QRectF lockWordsBox(const QSizeF& size, const QFont& font);

/// The same face at a share of the desktop's size.
QFont scaledFont(const QFont& font, double share);

}  // namespace ui
