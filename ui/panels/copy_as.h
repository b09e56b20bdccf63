// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <array>

#include "rotcore/case/findings.h"

namespace ui {

/// The ways in which a pose can be taken along as text.
enum class CopyFormat {
    angles,
    quaternionWxyz,
    quaternionXyzw,
    matrixRows,
    eigenQuaternion,
    eigenMatrix,
    scipyRotation,
    numpyMatrix,
    json,
};

inline constexpr std::array<CopyFormat, 9> kAllCopyFormats{
    CopyFormat::angles,        CopyFormat::quaternionWxyz,  CopyFormat::quaternionXyzw,
    CopyFormat::matrixRows,    CopyFormat::eigenQuaternion, CopyFormat::eigenMatrix,
    CopyFormat::scipyRotation, CopyFormat::numpyMatrix,     CopyFormat::json};

/// For a menu: "Quaternion, w x y z". The angles' convention is that of `shown`.
QString copyLabel(CopyFormat format, const rotcore::Convention& shown);

/// The pose as text: ASCII, every number with all its digits. Quaternions are Hamilton's; poses
/// take body to world.
QString copyText(const rotcore::Findings& found, CopyFormat format);

}  // namespace ui
