// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>
#include <optional>

#include "ui/stage/camera.h"
#include "ui/stage/scene.h"

namespace ui {

inline constexpr double kPickTolerance = 8.0;  ///< logical pixels from a ring's centre line
inline constexpr double kBackHalfPenalty = 4.0;
inline constexpr double kTieWidth = 2.0;  ///< nearer to each other than this, depth decides

/// A ring under the pointer and where on it.
struct RingHit {
    int ring = 0;  ///< 0 outer to 2 inner
    Eigen::Vector3d at_W = Eigen::Vector3d::Zero();
    double distance = 0.0;  ///< logical pixels
    double depth = 0.0;     ///< stage units from the eye
    bool front = true;      ///< on the half towards the eye
};

/// The point of a ring at `angle` in its plane, from the pins (x) towards the next pins (y).
Eigen::Vector3d pointOn(const RingShape& ring, double angle);

/// Whether a point on a sphere about the origin lies on the half towards the eye.
bool isFront(const Eigen::Vector3d& point_W, const Eigen::Vector3d& eye_W);

std::optional<RingHit> ringHit(const Scene& scene, const Projection& projection,
                               const QPointF& point);

/// The ring that a press at `point` takes, by ringHit alone.
std::optional<int> ringAt(const Scene& scene, const Projection& projection, const QPointF& point);

/// The nearest point of the body's surface under `point`, in the world.
std::optional<Eigen::Vector3d> bodyAt(const Scene& scene, const Projection& projection,
                                      const QPointF& point);

/// What a press takes: a ring, else the body, else neither. The body hides the rings behind it.
struct Picked {
    std::optional<RingHit> ring;
    std::optional<Eigen::Vector3d> body_W;
};
Picked pickAt(const Scene& scene, const Projection& projection, const QPointF& point);

/// Where the line from the centre along `direction_W` (unit) last leaves the body; 0 if never.
double reachOfBody(const Scene& scene, const Eigen::Vector3d& direction_W);

}  // namespace ui
