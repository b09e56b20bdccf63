// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/camera.h"

#include <algorithm>
#include <cmath>

namespace ui {

using Eigen::Matrix4d;
using Eigen::Vector3d;
using Eigen::Vector4d;

Vector3d eyeOf(const Camera& camera)
{
    const Vector3d up = camera.up_W.normalized();
    const Vector3d first = std::abs(up.x()) < 0.5 ? Vector3d::UnitX() : Vector3d::UnitY();
    const Vector3d ahead = (first - first.dot(up) * up).normalized();
    const Vector3d aside = up.cross(ahead);
    const Vector3d level = std::cos(camera.azimuth) * ahead + std::sin(camera.azimuth) * aside;
    return camera.distance * (std::cos(camera.elevation) * level + std::sin(camera.elevation) * up);
}

namespace {

Matrix4d viewMatrixOf(const Camera& camera)
{
    const Vector3d eye = eyeOf(camera);
    const Vector3d backward = eye.normalized();
    const Vector3d right = camera.up_W.cross(backward).normalized();
    const Vector3d upward = backward.cross(right);
    Matrix4d view = Matrix4d::Identity();
    view.row(0) << right.transpose(), -right.dot(eye);
    view.row(1) << upward.transpose(), -upward.dot(eye);
    view.row(2) << backward.transpose(), -backward.dot(eye);
    return view;
}

Matrix4d perspectiveOf(const Camera& camera, const QSizeF& size)
{
    const double smaller = std::min(size.width(), size.height());
    const double scale = smaller / std::tan(camera.fieldOfView / 2);
    Matrix4d projection = Matrix4d::Zero();
    projection(0, 0) = scale / size.width();
    projection(1, 1) = scale / size.height();
    projection(1, 2) = -camera.lift;  // a shifted lens: verticals stay as they are
    projection(2, 2) = -(kFarPlane + kNearPlane) / (kFarPlane - kNearPlane);
    projection(2, 3) = -2 * kFarPlane * kNearPlane / (kFarPlane - kNearPlane);
    projection(3, 2) = -1;
    return projection;
}

}  // namespace

Projection::Projection(const Camera& camera, const QSizeF& size)
    : m_size(std::max(size.width(), 1.0), std::max(size.height(), 1.0)),
      m_view(viewMatrixOf(camera)),
      m_projection(perspectiveOf(camera, m_size))
{
}

std::optional<Projected> Projection::project(const Vector3d& point_W) const
{
    const Vector4d clip = m_projection * (m_view * point_W.homogeneous());
    if (clip.w() <= kNearPlane) return std::nullopt;
    const double x = (1 + clip.x() / clip.w()) / 2 * m_size.width();
    const double y = (1 - clip.y() / clip.w()) / 2 * m_size.height();
    return Projected{QPointF(x, y), clip.w()};
}

Ray Projection::rayThrough(const QPointF& pixel) const
{
    const double x = 2 * pixel.x() / m_size.width() - 1;
    const double y = 1 - 2 * pixel.y() / m_size.height();
    const Vector3d direction_E((x + m_projection(0, 2)) / m_projection(0, 0),
                               (y + m_projection(1, 2)) / m_projection(1, 1), -1.0);
    const Eigen::Matrix3d R_EW = m_view.topLeftCorner<3, 3>();
    return {-(R_EW.transpose() * m_view.topRightCorner<3, 1>()),
            (R_EW.transpose() * direction_E).normalized()};
}

}  // namespace ui
