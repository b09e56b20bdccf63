// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/picking.h"

#include <algorithm>
#include <cmath>

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr int kSegments = 128;

/// How far along `ray` a triangle is hit (Moeller & Trumbore 1997, J. Graphics Tools 2(1), 21-28).
std::optional<double> hitOf(const Ray& ray, const Mesh::Triangle& triangle)
{
    const auto& [a, b, c] = triangle.vertices;
    const Vector3d ab = b - a;
    const Vector3d ac = c - a;
    const Vector3d p = ray.direction.cross(ac);
    const double determinant = ab.dot(p);
    if (std::abs(determinant) < 1e-14) return std::nullopt;  // seen edge-on
    const Vector3d s = ray.origin - a;
    const double u = s.dot(p) / determinant;
    if (u < 0 || u > 1) return std::nullopt;
    const Vector3d q = s.cross(ab);
    const double v = ray.direction.dot(q) / determinant;
    if (v < 0 || u + v > 1) return std::nullopt;
    const double along = ac.dot(q) / determinant;
    if (along <= 0) return std::nullopt;
    return along;
}

/// The part of the way from a to b that comes nearest to p, 0 to 1, on the picture.
double nearestShare(const QPointF& a, const QPointF& b, const QPointF& p)
{
    const QPointF ab = b - a;
    const double squared = QPointF::dotProduct(ab, ab);
    if (squared < 1e-12) return 0.0;
    return std::clamp(QPointF::dotProduct(p - a, ab) / squared, 0.0, 1.0);
}

std::optional<RingHit> nearestOn(const RingShape& ring, const Projection& projection,
                                 const Vector3d& eye_W, const QPointF& point)
{
    std::optional<RingHit> best;
    double least = kPickTolerance;
    for (int n = 0; n < kSegments; ++n) {
        const double step = 2 * rotcore::kPi / kSegments;
        const auto from = projection.project(pointOn(ring, n * step));
        const auto to = projection.project(pointOn(ring, (n + 1) * step));
        if (!from || !to) continue;
        const double share = nearestShare(from->at, to->at, point);
        const QPointF miss = from->at + share * (to->at - from->at) - point;
        const Vector3d at = pointOn(ring, (n + share) * step);
        const bool front = isFront(at, eye_W);
        const double distance = std::hypot(miss.x(), miss.y());
        const double counted = distance + (front ? 0.0 : kBackHalfPenalty);
        if (distance > kPickTolerance || (best && counted >= least)) continue;
        least = counted;
        best = RingHit{.at_W = at,
                       .distance = counted,
                       .depth = from->depth + share * (to->depth - from->depth),
                       .front = front};
    }
    return best;
}

}  // namespace

Vector3d pointOn(const RingShape& ring, double angle)
{
    return ring.q_WR * Vector3d(ring.radius * std::cos(angle), ring.radius * std::sin(angle), 0.0);
}

bool isFront(const Vector3d& point_W, const Vector3d& eye_W)
{
    return point_W.dot(eye_W) > 0;
}

std::optional<RingHit> ringHit(const Scene& scene, const Projection& projection,
                               const QPointF& point)
{
    const Vector3d eye_W = projection.rayThrough(point).origin;
    std::optional<RingHit> best;
    for (int n = 0; n < 3; ++n) {
        auto hit = nearestOn(scene.rings[static_cast<std::size_t>(n)], projection, eye_W, point);
        if (!hit) continue;
        hit->ring = n;
        const bool tie = best && std::abs(hit->distance - best->distance) <= kTieWidth;
        const bool wins =
            !best || (tie ? hit->depth < best->depth : hit->distance < best->distance);
        if (wins) best = hit;
    }
    return best;
}

std::optional<int> ringAt(const Scene& scene, const Projection& projection, const QPointF& point)
{
    const auto hit = ringHit(scene, projection, point);
    if (!hit) return std::nullopt;
    return hit->ring;
}

std::optional<Vector3d> bodyAt(const Scene& scene, const Projection& projection,
                               const QPointF& point)
{
    const Ray ray_W = projection.rayThrough(point);
    const auto q_BW = scene.q_WB.conjugate();
    const Ray ray_B{q_BW * ray_W.origin, q_BW * ray_W.direction};
    std::optional<double> nearest;
    for (const auto& triangle : scene.body->triangles) {
        const auto along = hitOf(ray_B, triangle);
        if (along && (!nearest || *along < *nearest)) nearest = along;
    }
    if (!nearest) return std::nullopt;
    return ray_W.origin + *nearest * ray_W.direction;
}

Picked pickAt(const Scene& scene, const Projection& projection, const QPointF& point)
{
    Picked picked{ringHit(scene, projection, point), bodyAt(scene, projection, point)};
    if (picked.ring && picked.body_W && !picked.ring->front) picked.ring.reset();
    if (picked.ring) picked.body_W.reset();
    return picked;
}

double reachOfBody(const Scene& scene, const Vector3d& direction_W)
{
    const Ray ray_B{Vector3d::Zero(), scene.q_WB.conjugate() * direction_W};
    double reach = 0.0;
    for (const auto& triangle : scene.body->triangles)
        reach = std::max(reach, hitOf(ray_B, triangle).value_or(0.0));
    return reach;
}

}  // namespace ui
