// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/overlay.h"

#include <QCoreApplication>
#include <QFontMetricsF>
#include <QPainterPath>
#include <cmath>

#include "ui/stage/palette.h"
#include "ui/stage/ring_drag.h"
#include "ui/stage/stage_labels.h"
#include "ui/stage/stage_words.h"

namespace ui {

using Eigen::Vector3d;

namespace {

struct OverlayContext {
    QPainter& painter;
    const Scene& scene;
    const Projection& projection;
    const Palette& palette;
    QFont font;
};

/// Text with a rim of the paper's colour, readable on whatever is under it.
void rimmedText(QPainter& painter, const QRectF& box, const QFont& font, const QString& text,
                const QColor& colour, const QColor& rim)
{
    const QFontMetricsF metrics(font);
    QPainterPath letters;
    letters.addText(box.center().x() - metrics.horizontalAdvance(text) / 2,
                    box.center().y() + (metrics.ascent() - metrics.descent()) / 2, font, text);
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(rim, 3.5, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
    painter.drawPath(letters);
    painter.setFont(font);
    painter.setPen(colour);
    painter.drawText(box.adjusted(-20, 0, 20, 0), Qt::AlignCenter, text);
}

void paintChip(const OverlayContext& to, const StageLabel& chip)
{
    to.painter.setPen(QPen(chip.colour, 1.2));
    to.painter.drawLine(chip.anchor, chip.box.center());
    to.painter.setBrush(chip.colour);
    to.painter.setPen(QPen(to.palette.sheet, 1.2));
    to.painter.drawEllipse(chip.anchor, 3.2, 3.2);
    to.painter.setBrush(chip.lit ? chip.colour : to.palette.sheet);
    to.painter.setPen(QPen(chip.colour, 1.4));
    to.painter.drawRoundedRect(chip.box, 6, 6);
    to.painter.setFont(chip.font);
    to.painter.setPen(chip.lit ? to.palette.sheet : chip.colour);
    to.painter.drawText(chip.box, Qt::AlignCenter, chip.text);
}

void paintLabel(const OverlayContext& to, const StageLabel& label)
{
    QColor rim = to.palette.sheet;
    rim.setAlphaF(0.85F);
    switch (label.kind) {
        case StageLabel::Kind::chip:
            paintChip(to, label);
            return;
        case StageLabel::Kind::bodyLetter:
            to.painter.setOpacity(label.behind ? 0.6 : 1.0);
            to.painter.setPen(Qt::NoPen);
            to.painter.setBrush(rim);
            to.painter.drawEllipse(label.box.center(), 9.0, 9.0);
            to.painter.setFont(label.font);
            to.painter.setPen(label.colour);
            to.painter.drawText(label.box.adjusted(-4, -4, 4, 2), Qt::AlignCenter, label.text);
            to.painter.setOpacity(1.0);
            return;
        case StageLabel::Kind::worldName:
            rim.setAlphaF(0.5F);
            rimmedText(to.painter, label.box, label.font, label.text, label.colour, rim);
            return;
        case StageLabel::Kind::tipWord:
            rimmedText(to.painter, label.box, label.font, label.text,
                       label.behind ? to.palette.quietInk : label.colour, rim);
            return;
    }
}

void lineBetween(const OverlayContext& to, const Vector3d& from_W, const Vector3d& until_W)
{
    const auto from = to.projection.project(from_W);
    const auto until = to.projection.project(until_W);
    if (from && until) to.painter.drawLine(from->at, until->at);
}

/// A pin axis as a heavy line, thin where it runs through the body.
void pinLine(const OverlayContext& to, const Vector3d& pin_W, const QColor& colour, double width)
{
    constexpr double kBody = 0.8;  // stage units
    const double reach = kRingRadii[0] + 0.12;
    QColor rim = to.palette.sheet;
    rim.setAlphaF(0.6F);
    for (const auto& [pen, extra] : {std::pair{rim, 3.0}, std::pair{colour, 0.0}}) {
        to.painter.setPen(QPen(pen, width + extra, Qt::SolidLine, Qt::RoundCap));
        lineBetween(to, -reach * pin_W, -kBody * pin_W);
        lineBetween(to, kBody * pin_W, reach * pin_W);
    }
    to.painter.setPen(QPen(colour, 1.6, Qt::DotLine));
    lineBetween(to, -kBody * pin_W, kBody * pin_W);
}

/// A short double bar along the direction no ring turns about, with its words at the upper end.
void paintLostDirection(const OverlayContext& to, const LockShape& lock)
{
    constexpr double kReach = 0.98;  // stage units, just out of the body
    const auto a = to.projection.project(-kReach * lock.lost_W);
    const auto b = to.projection.project(kReach * lock.lost_W);
    if (!a || !b) return;
    const QPointF along = b->at - a->at;
    const double length = std::max(1.0, std::hypot(along.x(), along.y()));
    const QPointF aside = QPointF(-along.y(), along.x()) / length * 3.5;
    QColor rim = to.palette.sheet;
    rim.setAlphaF(0.7F);
    for (const auto& [colour, width] : {std::pair{rim, 6.0}, std::pair{to.palette.atLock, 3.0}})
        for (const double side : {-1.0, 1.0}) {
            to.painter.setPen(QPen(colour, width, Qt::SolidLine, Qt::RoundCap));
            to.painter.drawLine(a->at + side * aside, b->at + side * aside);
        }
    if (!lock.atLock) return;
    QFont font = to.font;
    font.setBold(true);
    const QString words = QCoreApplication::translate("ui::Stage", "no ring turns this way");
    const QPointF end = a->at.y() < b->at.y() ? a->at : b->at;
    const QFontMetricsF metrics(font);
    QRectF box(0, 0, metrics.horizontalAdvance(words) + 8, metrics.height());
    const double sideways = end.x() < (a->at.x() + b->at.x()) / 2 ? -1.0 : 1.0;
    box.moveCenter(end + QPointF(sideways * (box.width() / 2 + 6), -box.height() * 0.9));
    const double width = to.projection.size().width();
    box.moveLeft(std::clamp(box.left(), 8.0, std::max(8.0, width - box.width() - 8)));
    rimmedText(to.painter, box, font, words, to.palette.atLock, to.palette.sheet);
}

void paintLock(const OverlayContext& to)
{
    if (to.scene.lock) {
        const auto& outer = to.scene.rings[0];
        const auto& inner = to.scene.rings[2];
        if (to.scene.lock->atLock) {
            pinLine(to, to.scene.lock->pins_W, to.palette.atLock, 5.0);
        } else {
            pinLine(to, outer.pin_W, to.palette.axis(outer.axis), 3.0);
            pinLine(to, inner.pin_W, to.palette.axis(inner.axis), 3.0);
        }
        paintLostDirection(to, *to.scene.lock);
    }
}

void paintWords(const OverlayContext& to, const QString& hint)
{
    const QSizeF size = to.projection.size();
    to.painter.setFont(to.font);
    to.painter.setPen(to.palette.quietInk);
    const QRectF line = hintBox(size, to.font);
    to.painter.drawText(line, Qt::AlignLeft | Qt::AlignVCenter,
                        QFontMetricsF(to.font).elidedText(hint, Qt::ElideRight, line.width()));
    const QString words = lockText(to.scene);
    if (words.isEmpty()) return;
    QFont bold = to.font;
    bold.setBold(true);
    to.painter.setFont(bold);
    to.painter.setPen(to.scene.lockDistance < kNearLock ? to.palette.atLock
                                                        : to.palette.nearingLock);
    to.painter.drawText(lockWordsBox(size, to.font), Qt::AlignLeft | Qt::AlignVCenter, words);
}

QPolygonF arcOf(const OverlayContext& to, const SweepMark& sweep, double turn)
{
    const int count = std::max(2, static_cast<int>(std::abs(turn) / 0.05));
    QPolygonF arc;
    for (int n = 0; n <= count; ++n)
        if (const auto p =
                to.projection.project(turnedAbout(sweep.pin_W, turn * n / count, sweep.from_W)))
            arc << p->at;
    return arc;
}

/// The angle, riding at the pointer.
void paintRider(const OverlayContext& to, const SweepMark& sweep)
{
    QFont font = scaledFont(to.font, 1.15);
    font.setBold(true);
    const double turned = *sweep.turned;
    const QString sign = turned > 0 ? QStringLiteral("+") : QString();
    const RingShape& ring = to.scene.rings[static_cast<std::size_t>(sweep.ring)];
    const QString text = ringText(ring) + QStringLiteral("   ") + sign + degreesText(turned);
    const QFontMetricsF metrics(font);
    QRectF box(sweep.pointer + QPointF(18, -38),
               QSizeF(metrics.horizontalAdvance(text) + 16, metrics.height() + 6));
    const QSizeF size = to.projection.size();
    box.moveLeft(std::clamp(box.left(), 4.0, std::max(4.0, size.width() - box.width() - 4)));
    box.moveTop(std::clamp(box.top(), 4.0, std::max(4.0, size.height() - box.height() - 4)));
    to.painter.setPen(Qt::NoPen);
    to.painter.setBrush(to.palette.axis(ring.axis));
    to.painter.drawRoundedRect(box, 6, 6);
    to.painter.setFont(font);
    to.painter.setPen(to.palette.sheet);
    to.painter.drawText(box, Qt::AlignCenter, text);
}

void paintSweep(const OverlayContext& to, const SweepMark& sweep)
{
    const RingShape& ring = to.scene.rings[static_cast<std::size_t>(sweep.ring)];
    const QColor colour = to.palette.axis(ring.axis);
    to.painter.setBrush(Qt::NoBrush);
    to.painter.setPen(QPen(colour, 1.2, Qt::DashLine));
    to.painter.drawPolyline(arcOf(to, sweep, 2 * rotcore::kPi));
    if (!sweep.turned) return;
    const double shown = std::remainder(*sweep.turned, 2 * rotcore::kPi);
    QPolygonF sector = arcOf(to, sweep, shown);
    const QPolygonF arc = sector;
    if (const auto foot = to.projection.project(sweep.from_W.dot(sweep.pin_W) * sweep.pin_W))
        sector << foot->at;
    QColor fill = colour;
    fill.setAlphaF(0.18F);
    to.painter.setPen(Qt::NoPen);
    to.painter.setBrush(fill);
    to.painter.drawPolygon(sector);
    to.painter.setBrush(Qt::NoBrush);
    to.painter.setPen(QPen(colour, 3.0, Qt::SolidLine, Qt::RoundCap));
    to.painter.drawPolyline(arc);
}

}  // namespace

void paintOverlay(QPainter& painter, const Scene& scene, const Projection& projection,
                  Scheme scheme, const OverlayState& state)
{
    painter.save();
    painter.setRenderHints(QPainter::Antialiasing | QPainter::TextAntialiasing);
    const Palette& palette = paletteOf(scheme);
    const OverlayContext to{painter, scene, projection, palette, painter.font()};
    paintLock(to);
    if (state.sweep) paintSweep(to, *state.sweep);
    const auto labels = labelsOf(scene, projection, palette, to.font);
    const bool riding = state.sweep && state.sweep->turned;  // the angle is at the pointer then
    const int ridden = riding ? state.sweep->ring : -1;
    for (const StageLabel& label : labels)
        if (label.kind != StageLabel::Kind::chip) paintLabel(to, label);
    for (const StageLabel& label : labels)
        if (label.kind == StageLabel::Kind::chip && label.ring != ridden) paintLabel(to, label);
    paintWords(to, state.hint);
    if (riding) paintRider(to, *state.sweep);
    painter.restore();
}

}  // namespace ui
