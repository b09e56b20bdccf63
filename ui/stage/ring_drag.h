// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>

#include "ui/stage/camera.h"
#include "ui/stage/scene.h"

namespace ui {

/// How the hand's motion is taken.
enum class DragGrain { plain, snapped, fine };

inline constexpr double kSnapStep = rotcore::fromDegrees(15.0);
inline constexpr double kFineShare = 0.1;

/// One drag of a ring. The grabbed point can only move on its circle about the pins; each move
/// takes it to the place on that circle that looks nearest to the pointer, close to where it was
/// before, so that the ring neither jumps to the far side nor runs away when the circle is seen
/// edge-on.
class RingDrag {
public:
    RingDrag(const RingShape& ring, const Eigen::Vector3d& grabbed_W, const QPointF& press,
             const Projection& projection);

    /// Takes the pointer to `point` and gives the ring's angle, radians, beyond a half turn if
    /// dragged there.
    double moveTo(const QPointF& point, const Projection& projection, DragGrain grain);

    double angleAtPress() const { return m_angleAtPress; }
    double turned() const { return m_shown - m_angleAtPress; }  ///< radians, since the press
    const Eigen::Vector3d& pin_W() const { return m_pin_W; }
    const Eigen::Vector3d& grabbed_W() const { return m_handle_W; }  ///< as it was at the press

private:
    double missOf(double turn, const QPointF& target, const Projection& projection) const;

    Eigen::Vector3d m_pin_W;
    Eigen::Vector3d m_handle_W;
    QPointF m_offset;  ///< from the pointer to the handle at the press
    double m_angleAtPress;
    double m_followed =
        0.0;                ///< how far the handle has gone round to stay with the pointer, radians
    double m_turned = 0.0;  ///< the same as taken, fine motion counting less
    double m_shown;
};

/// The place on the circle of `point_W` about the pin after a turn.
Eigen::Vector3d turnedAbout(const Eigen::Vector3d& pin_W, double turn,
                            const Eigen::Vector3d& point_W);

}  // namespace ui
