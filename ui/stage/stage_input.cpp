// SPDX-License-Identifier: GPL-3.0-or-later
// The hand and the keys of the stage.
#include <QFocusEvent>
#include <QKeyEvent>
#include <QMouseEvent>
#include <QWheelEvent>
#include <cmath>

#include "ui/stage/picking.h"
#include "ui/stage/stage_widget.h"

namespace ui {

namespace {

constexpr double kOrbitPerPixel = 0.008;  // radians
constexpr double kOrbitPerKey = rotcore::fromDegrees(5.0);
constexpr double kZoomPerNotch = 0.12;  // natural logarithm of the distance
constexpr double kTurnPerKey = rotcore::fromDegrees(1.0);

DragGrain grainOf(Qt::KeyboardModifiers modifiers)
{
    if (modifiers.testFlag(Qt::ShiftModifier)) return DragGrain::snapped;
    if (modifiers.testFlag(Qt::ControlModifier)) return DragGrain::fine;
    return DragGrain::plain;
}

}  // namespace

bool StageWidget::isEditing() const
{
    return m_editing;
}

void StageWidget::beginEdit()
{
    if (m_editing) return;
    m_editing = true;
    m_undoAtStart = m_model.undoStack().index();
    m_model.beginGesture();
}

void StageWidget::endEdit()
{
    if (!m_editing) return;
    m_editing = false;
    m_model.endGesture();
}

void StageWidget::endGrip()
{
    endEdit();
    m_grip = {};
}

void StageWidget::cancelGrip()
{
    if (const auto* orbit = std::get_if<Orbit>(&m_grip)) setCamera(orbit->camera);
    const bool edited = m_editing;
    endGrip();
    if (edited && m_model.undoStack().index() > m_undoAtStart) m_model.undoStack().undo();
    point({});
    changed();
}

void StageWidget::hover(const QPointF& at)
{
    const Picked picked = pickAt(m_scene, projection(), at);
    Pointing pointing;
    pointing.overBody = picked.body_W.has_value();
    m_hovered_W.reset();
    if (picked.ring) {
        pointing.hoveredRing = picked.ring->ring;
        m_hovered_W = picked.ring->at_W;
    }
    point(pointing);
    if (picked.ring) update();  // the arc of freedom goes through the pointer
}

void StageWidget::mousePressEvent(QMouseEvent* event)
{
    if (event->button() != Qt::LeftButton || !std::holds_alternative<std::monostate>(m_grip))
        return;
    m_byKeys = false;
    endEdit();  // a key still held
    const QPointF at = event->position();
    const Picked picked = pickAt(m_scene, projection(), at);
    Pointing pointing;
    if (picked.ring) {
        const RingShape& ring = m_scene.rings.at(static_cast<std::size_t>(picked.ring->ring));
        m_grip =
            RingTurn{picked.ring->ring, RingDrag(ring, picked.ring->at_W, at, projection()), at};
        m_chosen = picked.ring->ring;
        pointing.draggedRing = m_chosen;
        beginEdit();
    } else if (picked.body_W) {
        m_grip = Arcball(m_scene.q_WB, *picked.body_W, at, projection());
        pointing.overBody = true;
        m_pointing.overBody = false;  // so that the cursor is set anew
        beginEdit();
    } else {
        m_grip = Orbit{at, m_camera};
    }
    point(pointing);
}

void StageWidget::mouseMoveEvent(QMouseEvent* event)
{
    const QPointF at = event->position();
    if (auto* turn = std::get_if<RingTurn>(&m_grip)) {
        turn->pointer = at;
        const double angle = turn->drag.moveTo(at, projection(), grainOf(event->modifiers()));
        m_model.setAngle(m_scene.rings.at(static_cast<std::size_t>(turn->ring)).listed, angle);
        update();
    } else if (const auto* ball = std::get_if<Arcball>(&m_grip)) {
        m_model.setPose(ball->poseAt(at, projection()), tr("turn the body"));
    } else if (const auto* orbit = std::get_if<Orbit>(&m_grip)) {
        const QPointF moved = at - orbit->press;
        Camera camera = orbit->camera;
        camera.azimuth -= moved.x() * kOrbitPerPixel;
        camera.elevation += moved.y() * kOrbitPerPixel;
        setCamera(camera);
    } else {
        hover(at);
    }
}

void StageWidget::mouseReleaseEvent(QMouseEvent* event)
{
    if (event->button() != Qt::LeftButton) return;
    endGrip();
    m_pointing.overBody = false;
    hover(event->position());
    changed();
}

void StageWidget::mouseDoubleClickEvent(QMouseEvent* event)
{
    const Picked picked = pickAt(m_scene, projection(), event->position());
    if (picked.ring || picked.body_W)
        mousePressEvent(event);  // a second grip in quick succession
    else
        resetCamera();
}

void StageWidget::wheelEvent(QWheelEvent* event)
{
    Camera camera = m_camera;
    camera.distance *= std::exp(-event->angleDelta().y() / 120.0 * kZoomPerNotch);
    setCamera(camera);
    event->accept();
}

void StageWidget::leaveEvent(QEvent* /*event*/)
{
    if (!std::holds_alternative<std::monostate>(m_grip)) return;
    m_hovered_W.reset();
    point({});
}

bool StageWidget::orbitBy(double azimuth, double elevation)
{
    Camera camera = m_camera;
    camera.azimuth += azimuth;
    camera.elevation += elevation;
    setCamera(camera);
    return true;
}

bool StageWidget::cameraKey(const QKeyEvent& event)
{
    Camera camera = m_camera;
    switch (event.key()) {
        case Qt::Key_Plus:
        case Qt::Key_Equal:
            camera.distance *= std::exp(-kZoomPerNotch);
            break;
        case Qt::Key_Minus:
            camera.distance *= std::exp(kZoomPerNotch);
            break;
        case Qt::Key_Home:
            camera = Camera{};
            break;
        default:
            if (!event.modifiers().testFlag(Qt::AltModifier)) return false;
            switch (event.key()) {
                case Qt::Key_Left:
                    return orbitBy(-kOrbitPerKey, 0);
                case Qt::Key_Right:
                    return orbitBy(kOrbitPerKey, 0);
                case Qt::Key_Up:
                    return orbitBy(0, kOrbitPerKey);
                case Qt::Key_Down:
                    return orbitBy(0, -kOrbitPerKey);
                default:
                    return false;
            }
    }
    setCamera(camera);
    return true;
}

void StageWidget::turnChosen(double radians)
{
    if (!m_chosen) return;
    beginEdit();  // ends when the key is let go: a held key undoes as one step
    const RingShape& ring = m_scene.rings.at(static_cast<std::size_t>(*m_chosen));
    m_model.setAngle(ring.listed, ring.angle + radians);
}

bool StageWidget::ringKey(const QKeyEvent& event)
{
    const int key = event.key();
    if (key >= Qt::Key_1 && key <= Qt::Key_3) {
        m_chosen = key - Qt::Key_1;
        m_byKeys = true;
        present();
        emit ringPointedAt(m_scene.rings.at(static_cast<std::size_t>(*m_chosen)).listed);
        return true;
    }
    if ((key != Qt::Key_Left && key != Qt::Key_Right) || !m_chosen) return false;
    double step = kTurnPerKey;
    if (event.modifiers().testFlag(Qt::ShiftModifier)) step = kSnapStep;
    if (event.modifiers().testFlag(Qt::ControlModifier)) step *= kFineShare;
    turnChosen(key == Qt::Key_Left ? -step : step);
    return true;
}

void StageWidget::keyPressEvent(QKeyEvent* event)
{
    const bool gripped = !std::holds_alternative<std::monostate>(m_grip);
    if (event->key() == Qt::Key_Escape && gripped)
        cancelGrip();
    else if (gripped || (!cameraKey(*event) && !ringKey(*event)))
        QWidget::keyPressEvent(event);
}

void StageWidget::keyReleaseEvent(QKeyEvent* event)
{
    const bool gripped = !std::holds_alternative<std::monostate>(m_grip);
    if (!event->isAutoRepeat() && !gripped) endEdit();
    QWidget::keyReleaseEvent(event);
}

void StageWidget::focusInEvent(QFocusEvent* event)
{
    QWidget::focusInEvent(event);
    m_byKeys = event->reason() == Qt::TabFocusReason || event->reason() == Qt::BacktabFocusReason ||
               event->reason() == Qt::ShortcutFocusReason;
    present();
}

void StageWidget::focusOutEvent(QFocusEvent* event)
{
    QWidget::focusOutEvent(event);
    if (std::holds_alternative<std::monostate>(m_grip)) endEdit();
    present();
}

}  // namespace ui
