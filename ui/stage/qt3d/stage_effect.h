// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>

#include <Qt3DRender/QEffect>
#include <Qt3DRender/QParameter>

namespace ui {

/// How everything on the stage is shaded: one program for all, so that a colour of the palette
/// comes out as it stands in the palette where the light falls on it. The lights stand with the
/// viewer: a key light from the upper left and a soft second one from the right. Nothing casts a
/// shadow.
class StageEffect : public Qt3DRender::QEffect {
public:
    explicit StageEffect(Qt3DCore::QNode* parent);

    /// What distant halves of rings fade into.
    void setBackground(const QColor& colour) { m_background->setValue(colour); }

private:
    Qt3DRender::QParameter* m_background;  // owned by this effect
};

/// What the program writes as alpha wherever something is drawn, of 255: tells it from a picture
/// that was never drawn, which is all 0 or all opaque.
inline constexpr int kDrawnAlpha = 128;

}  // namespace ui
