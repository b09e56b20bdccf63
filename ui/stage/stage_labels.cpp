// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/stage_labels.h"

#include <QFontMetricsF>
#include <cmath>

#include "ui/stage/picking.h"
#include "ui/stage/stage_words.h"

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr double kMargin = 4.0;         // logical pixels, between words and to the picture's edge
constexpr double kChipPadding = 7.0;    // beside a chip's text
constexpr double kChipDistance = 11.0;  // from the ring's centre line to the chip's edge

double length(const QPointF& v)
{
    return std::hypot(v.x(), v.y());
}

QPointF unitOf(const QPointF& v)
{
    const double size = length(v);
    return size < 1e-6 ? QPointF(0, -1) : v / size;
}

double overlap(const QRectF& a, const QRectF& b)
{
    const QRectF common = a.intersected(b);
    return common.isEmpty() ? 0.0 : common.width() * common.height();
}

/// Places words one after another, each where it costs least.
class Placer {
public:
    Placer(const Scene& scene, const Projection& projection, const Palette& palette,
           const QFont& font)
        : m_scene(scene), m_projection(projection), m_palette(palette), m_font(font)
    {
        m_eye_W = projection.rayThrough({}).origin;
        if (const auto centre = projection.project(Vector3d::Zero())) m_centre = centre->at;
        for (std::size_t n = 0; n < 3; ++n)
            for (int place = 0; place < 48; ++place) {
                const double angle = 2 * rotcore::kPi * place / 48;
                if (const auto seen = projection.project(pointOn(scene.rings[n], angle)))
                    m_ringPlaces[n].push_back(seen->at);
            }
    }

    std::vector<StageLabel> placeAll()
    {
        for (const AxisShape& axis : m_scene.axes)
            if (axis.frame == AxisShape::Frame::world) placeWorldName(axis);
        for (const AxisShape& axis : m_scene.axes)
            if (axis.frame == AxisShape::Frame::body) placeBodyLetter(axis);
        for (const int n : {0, 1, 2})
            placeChip(n);
        for (const Mesh::Tip& tip : m_scene.body->tips)
            placeTipWord(tip);
        return std::move(m_labels);
    }

private:
    double crowdingOf(const QRectF& box) const
    {
        const QSizeF size = m_projection.size();
        const QRectF room = QRectF(QPointF(), size).adjusted(kMargin, kMargin, -kMargin, -kMargin);
        const double area = box.width() * box.height();
        double covered = area - overlap(box, room);
        covered += overlap(box, hintBox(size, m_font));
        if (!lockText(m_scene).isEmpty()) covered += overlap(box, lockWordsBox(size, m_font));
        for (const StageLabel& other : m_labels)
            covered += overlap(box, other.box.adjusted(-kMargin, -kMargin, kMargin, kMargin));
        return covered / area;
    }

    static QRectF boxAround(const QPointF& centre, const QFont& font, const QString& text,
                            const QSizeF& padding)
    {
        const QFontMetricsF metrics(font);
        const QSizeF size(metrics.horizontalAdvance(text) + 2 * padding.width(),
                          metrics.height() + 2 * padding.height());
        return {centre.x() - size.width() / 2, centre.y() - size.height() / 2, size.width(),
                size.height()};
    }

    /// On a ray of directions about `outward`, the place at some distance that is least crowded.
    QRectF bestAround(const QPointF& anchor, const QPointF& outward, double distance,
                      const QFont& font, const QString& text) const
    {
        QRectF best;
        double least = HUGE_VAL;
        const double heading = std::atan2(outward.y(), outward.x());
        for (const double offset : {0.0, 0.5, -0.5, 1.0, -1.0, 1.6, -1.6, 2.3, -2.3, 3.1}) {
            const QPointF side(std::cos(heading + offset), std::sin(heading + offset));
            QRectF box = boxAround({}, font, text, {2, 0});
            box.moveCenter(anchor + QPointF(side.x() * (distance + box.width() / 2),
                                            side.y() * (distance + box.height() / 2)));
            const double cost = crowdingOf(box) * 10 + std::abs(offset) * 0.3;
            if (cost >= least) continue;
            least = cost;
            best = box;
        }
        return best;
    }

    void placeWorldName(const AxisShape& axis)
    {
        const Vector3d& up = m_scene.up_W;
        const bool level = std::abs(axis.direction_W.dot(up)) < 0.5;
        const bool down = !level && axis.direction_W.dot(up) < 0;
        const Vector3d foot = m_scene.groundHeight * up;
        const Vector3d end = level  ? Vector3d(foot + axis.length * axis.direction_W)
                             : down ? foot
                                    : Vector3d(axis.length * up);
        const auto seen = m_projection.project(end);
        const auto from = m_projection.project(level ? foot : Vector3d(Vector3d::Zero()));
        if (!seen || !from) return;
        QFont font = scaledFont(m_font, 1.15);
        font.setWeight(QFont::DemiBold);
        const QString text = QString::fromStdString(axis.name);
        const QPointF outward = level ? unitOf(seen->at - from->at) : QPointF(0.8, 0.6);
        m_labels.push_back({StageLabel::Kind::worldName, text,
                            bestAround(seen->at, outward, 5, font, text), seen->at,
                            m_palette.axis(axis.axis), font});
    }

    void placeBodyLetter(const AxisShape& axis)
    {
        const auto seen = m_projection.project(axis.length * axis.direction_W);
        if (!seen) return;
        QFont font = scaledFont(m_font, 1.1);
        font.setBold(true);
        font.setItalic(true);
        const QString text = QString::fromStdString(axis.name);
        QRectF box(0, 0, 18, 18);
        const QPointF outward = seen->at - m_centre;
        box.moveCenter(seen->at + (length(outward) < 12 ? QPointF(0, 0) : unitOf(outward) * 9));
        m_labels.push_back({StageLabel::Kind::bodyLetter, text, box, seen->at,
                            m_palette.axis(axis.axis), font, !isFront(axis.direction_W, m_eye_W)});
    }

    void placeTipWord(const Mesh::Tip& tip)
    {
        const Vector3d tip_W = m_scene.q_WB * tip.at;
        const auto seen = m_projection.project(tip_W);
        if (!seen) return;
        const QFont font = scaledFont(m_font, 0.9);
        const QString text = QString::fromStdString(tip.word);
        const QPointF away = unitOf(seen->at - m_centre);
        const QPointF outward(away.x() < 0 ? -0.94 : 0.94, away.y() < 0 ? -0.34 : 0.34);
        m_labels.push_back({StageLabel::Kind::tipWord, text,
                            bestAround(seen->at, outward, 14, font, text), seen->at, m_palette.ink,
                            font, !isFront(tip_W, m_eye_W)});
    }

    void placeChip(int n)
    {
        const RingShape& ring = m_scene.rings[static_cast<std::size_t>(n)];
        QFont font = m_font;
        font.setBold(true);
        StageLabel chip{
            StageLabel::Kind::chip, ringText(ring), {}, {}, m_palette.axis(ring.axis), font};
        chip.lit = ring.hovered || ring.dragged;
        chip.ring = n;
        const QRectF plain = boxAround({}, font, chip.text, {kChipPadding, 3});
        double least = HUGE_VAL;
        constexpr int kPlaces = 36;
        // Away from the pins, each ring by its own angle, so that chips do not start out together.
        const double wanted = 0.9 + 0.25 * n;
        for (int place = 0; place < kPlaces; ++place) {
            const double angle = 2 * rotcore::kPi * place / kPlaces;
            const Vector3d at = pointOn(ring, angle);
            const auto seen = m_projection.project(at);
            if (!seen) continue;
            const QPointF outward = unitOf(seen->at - m_centre);
            const QRectF box = chipBeside(seen->at, outward, plain);
            const double cost = crowdingOf(box) * 100 + (isFront(at, m_eye_W) ? 0.0 : 6.0) +
                                4 * (1 - std::cos(angle - wanted)) + lineCost(box, n);
            if (cost >= least) continue;
            least = cost;
            chip.box = box;
            chip.anchor = seen->at;
            chip.behind = !isFront(at, m_eye_W);
        }
        m_labels.push_back(chip);
    }

    static QRectF chipBeside(const QPointF& anchor, const QPointF& outward, QRectF box)
    {
        const double reach = std::min(box.width() / 2 / std::max(std::abs(outward.x()), 1e-3),
                                      box.height() / 2 / std::max(std::abs(outward.y()), 1e-3));
        box.moveCenter(anchor + outward * (kChipDistance + reach));
        return box;
    }

    /// How many places of the other rings a chip would cover.
    double lineCost(const QRectF& box, int own) const
    {
        double cost = 0.0;
        for (int n = 0; n < 3; ++n)
            if (n != own)
                for (const QPointF& place : m_ringPlaces[static_cast<std::size_t>(n)])
                    if (box.contains(place)) cost += 0.8;
        return cost;
    }

    const Scene& m_scene;
    const Projection& m_projection;
    const Palette& m_palette;
    QFont m_font;
    Vector3d m_eye_W;
    QPointF m_centre;
    std::array<std::vector<QPointF>, 3> m_ringPlaces;
    std::vector<StageLabel> m_labels;
};

}  // namespace

QFont scaledFont(const QFont& font, double share)
{
    QFont scaled = font;
    if (font.pointSizeF() > 0)
        scaled.setPointSizeF(font.pointSizeF() * share);
    else
        scaled.setPixelSize(static_cast<int>(font.pixelSize() * share + 0.5));
    return scaled;
}

QRectF hintBox(const QSizeF& size, const QFont& font)
{
    const double height = QFontMetricsF(font).height();
    return {14, 8, std::max(0.0, size.width() - 28), height};
}

QRectF lockWordsBox(const QSizeF& size, const QFont& font)
{
    QFont bold = font;
    bold.setBold(true);
    const double height = QFontMetricsF(font).height();
    const double width = QFontMetricsF(bold).averageCharWidth() * 46;
    return {14, size.height() - height - 12, std::min(width, size.width() - 28), height};
}

std::vector<StageLabel> labelsOf(const Scene& scene, const Projection& projection,
                                 const Palette& palette, const QFont& font)
{
    return Placer(scene, projection, palette, font).placeAll();
}

}  // namespace ui
