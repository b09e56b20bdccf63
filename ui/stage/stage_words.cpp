// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/stage_words.h"

#include <QCoreApplication>
#include <cmath>

namespace ui {

namespace {

QString tr(const char* text)
{
    return QCoreApplication::translate("ui::Stage", text);
}

QString letterOf(rotcore::Axis axis)
{
    return QString(QChar(u"xyz"[rotcore::indexOf(axis)]));
}

QString placeOf(int ring)
{
    return ring == 0 ? tr("outer") : ring == 1 ? tr("middle") : tr("inner");
}

}  // namespace

QString degreesText(double radians)
{
    const double tenths = std::round(rotcore::toDegrees(radians) * 10);
    QString text = QString::number(std::abs(tenths) / 10, 'f', 1);
    if (tenths < 0) text.prepend(QChar(0x2212));
    return text + QChar(0x00B0);
}

QString ringText(const RingShape& ring)
{
    return letterOf(ring.axis) + QChar(u' ') + degreesText(ring.angle);
}

QString lockText(const Scene& scene)
{
    if (scene.lock && scene.lock->atLock) return tr("at lock · outer and inner pins are one line");
    const QString apart = degreesText(scene.lockDistance);
    if (scene.lockDistance < kNearLock) return tr("near lock · pins %1 apart").arg(apart);
    if (scene.lockDistance < kNearingLock) return tr("nearing lock · pins %1 apart").arg(apart);
    return {};
}

QString hintText(const Scene& scene, const Pointing& pointing)
{
    if (const auto ring = pointing.draggedRing ? pointing.draggedRing : pointing.hoveredRing) {
        const QString which = letterOf(scene.rings.at(static_cast<std::size_t>(*ring)).axis);
        if (pointing.draggedRing)
            return tr("turning the %1 ring · Shift: steps of 15° · Ctrl: fine · Esc: as it was")
                .arg(which);
        return tr("drag to turn the %1 ring (%2) about its pins · Shift: steps of 15° · Ctrl: fine")
            .arg(which, placeOf(*ring));
    }
    if (pointing.overBody) return tr("drag to turn the body freely · all three rings follow");
    return tr("drag a ring to turn it · the body to turn it freely · elsewhere to look around");
}

}  // namespace ui
