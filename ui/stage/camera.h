// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>
#include <QSizeF>
#include <optional>

#include <Eigen/Geometry>

namespace ui {

/// Where the viewer stands: on a sphere about the origin, looking at it, `up_W` upwards.
struct Camera {
    double azimuth =
        0.9;  ///< radians, right-handed about up, from the first axis at right angles to it
    double elevation = 0.42;   ///< radians above the ground, in (-pi/2, pi/2)
    double distance = 8.7;     ///< stage units
    double fieldOfView = 0.6;  ///< radians, of the smaller side of the picture
    double lift =
        0.1;  ///< how far above the picture's middle the origin lies, of half the picture's height
    Eigen::Vector3d up_W = Eigen::Vector3d::UnitZ();
    friend bool operator==(const Camera&, const Camera&) = default;
};

/// Eye position in world coordinates.
Eigen::Vector3d eyeOf(const Camera& camera);

struct Ray {
    Eigen::Vector3d origin;
    Eigen::Vector3d direction;  ///< unit
};

/// A point on the picture.
struct Projected {
    QPointF at;  ///< logical pixels, y downwards
    double depth =
        0.0;  ///< distance from the eye along its view direction, stage units, positive in front
};

/// The camera with a picture's size: everything that takes the world to pixels and back, in double.
class Projection {
public:
    Projection(const Camera& camera, const QSizeF& size);

    /// Nothing if the point is not in front of the near plane.
    std::optional<Projected> project(const Eigen::Vector3d& point_W) const;
    Ray rayThrough(const QPointF& pixel) const;

    const Eigen::Matrix4d& viewMatrix() const
    {
        return m_view;
    }  ///< world to eye, eye looks along -z
    const Eigen::Matrix4d& projectionMatrix() const { return m_projection; }  ///< OpenGL clip space
    const QSizeF& size() const { return m_size; }

private:
    QSizeF m_size;
    Eigen::Matrix4d m_view;
    Eigen::Matrix4d m_projection;
};

inline constexpr double kNearPlane = 0.1;
inline constexpr double kFarPlane = 60.0;

}  // namespace ui
