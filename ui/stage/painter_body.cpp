// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <numeric>

#include "ui/stage/painter_parts.h"

namespace ui {

using Eigen::AlignedBox3d;
using Eigen::Vector3d;

namespace {

struct Part {
    AlignedBox3d box;  // in body coordinates
    std::vector<const Mesh::Triangle*> facing;
};

std::vector<Part> partsOf(const Mesh& mesh, const Vector3d& eye_B)
{
    std::vector<Part> parts(mesh.parts.size());
    for (const auto& triangle : mesh.triangles) {
        Part& part = parts[static_cast<std::size_t>(triangle.part)];
        for (const Vector3d& vertex : triangle.vertices)
            part.box.extend(vertex);
        if (triangle.normal.dot(eye_B - triangle.vertices[0]) > 0) part.facing.push_back(&triangle);
    }
    return parts;
}

/// Whether a plane between the boxes has `first` behind it and the eye on the other side.
bool mustPrecede(const AlignedBox3d& first, const AlignedBox3d& second, const Vector3d& eye_B)
{
    constexpr double kTouch = 1e-9;
    for (int axis = 0; axis < 3; ++axis) {
        if (first.max()[axis] <= second.min()[axis] + kTouch)
            if (eye_B[axis] > first.max()[axis]) return true;
        if (first.min()[axis] >= second.max()[axis] - kTouch)
            if (eye_B[axis] < first.min()[axis]) return true;
    }
    return false;
}

/// Farthest first. Between convex parts that a plane separates the order is exact, whatever their
/// sizes.
std::vector<std::size_t> drawingOrder(const std::vector<Part>& parts, const Vector3d& eye_B)
{
    std::vector<std::size_t> waiting(parts.size());
    std::iota(waiting.begin(), waiting.end(), std::size_t{0});
    const auto distance = [&](std::size_t n) { return (parts[n].box.center() - eye_B).norm(); };
    std::stable_sort(waiting.begin(), waiting.end(),
                     [&](std::size_t a, std::size_t b) { return distance(a) > distance(b); });
    std::vector<std::size_t> order;
    while (!waiting.empty()) {
        const auto isFree = [&](std::size_t candidate) {
            return std::none_of(waiting.begin(), waiting.end(), [&](std::size_t other) {
                return other != candidate &&
                       mustPrecede(parts[other].box, parts[candidate].box, eye_B) &&
                       !mustPrecede(parts[candidate].box, parts[other].box, eye_B);
            });
        };
        auto next = std::find_if(waiting.begin(), waiting.end(), isFree);
        if (next == waiting.end()) next = waiting.begin();
        order.push_back(*next);
        waiting.erase(next);
    }
    return order;
}

/// Lit from the viewer's upper left, and softly from the right.
QColor lit(const QColor& material, const Vector3d& normal_E)
{
    static const Vector3d kKey = Vector3d(-0.55, 0.72, 0.55).normalized();
    static const Vector3d kFill = Vector3d(0.8, -0.1, 0.6).normalized();
    const double light =
        0.42 + 0.56 * std::max(0.0, normal_E.dot(kKey)) + 0.2 * std::max(0.0, normal_E.dot(kFill));
    const auto shade = [light](int part) {
        return std::clamp(static_cast<int>(part * light + 0.5), 0, 255);
    };
    return {shade(material.red()), shade(material.green()), shade(material.blue())};
}

}  // namespace

void paintBody(const PaintContext& to)
{
    const Mesh& mesh = *to.scene.body;
    const Vector3d eye_B = to.scene.q_WB.conjugate() * to.eye_W;
    const Eigen::Matrix3d R_EB =
        to.projection.viewMatrix().topLeftCorner<3, 3>() * to.scene.q_WB.toRotationMatrix();
    std::vector<Part> parts = partsOf(mesh, eye_B);
    for (const std::size_t n : drawingOrder(parts, eye_B)) {
        auto& facing = parts[n].facing;
        std::sort(facing.begin(), facing.end(), [&](const auto* a, const auto* b) {
            const auto far = [&](const Mesh::Triangle& t) {
                return (t.vertices[0] + t.vertices[1] + t.vertices[2] - 3 * eye_B).squaredNorm();
            };
            return far(*a) > far(*b);
        });
        for (const auto* triangle : facing) {
            std::array<QPointF, 3> corners;
            bool visible = true;
            for (std::size_t c = 0; c < 3; ++c) {
                const auto seen = to.projection.project(to.scene.q_WB * triangle->vertices[c]);
                visible = visible && seen.has_value();
                if (seen) corners[c] = seen->at;
            }
            if (!visible) continue;
            const QColor colour = lit(to.palette.material(mesh.parts[n]), R_EB * triangle->normal);
            to.painter.setPen(QPen(colour, 0.6, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
            to.painter.setBrush(colour);
            to.painter.drawPolygon(corners.data(), 3);
        }
    }
}

}  // namespace ui
