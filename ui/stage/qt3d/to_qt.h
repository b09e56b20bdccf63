// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QMatrix4x4>
#include <QQuaternion>
#include <QVector3D>

#include <Eigen/Geometry>

namespace ui {

// The only step from double to float: nothing comes back from the other side.

inline QVector3D toQt(const Eigen::Vector3d& vector)
{
    return {static_cast<float>(vector.x()), static_cast<float>(vector.y()),
            static_cast<float>(vector.z())};
}

inline QQuaternion toQt(const Eigen::Quaterniond& rotation)
{
    const Eigen::Quaternionf single = rotation.normalized().cast<float>();
    return {single.w(), single.x(), single.y(), single.z()};
}

inline QMatrix4x4 toQt(const Eigen::Matrix4d& matrix)
{
    const Eigen::Matrix<float, 4, 4, Eigen::RowMajor> single = matrix.cast<float>();
    return QMatrix4x4(single.data());
}

}  // namespace ui
