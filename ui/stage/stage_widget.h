// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QImage>
#include <QTimer>
#include <QWidget>
#include <memory>
#include <variant>

#include "ui/model/case_model.h"
#include "ui/stage/arcball.h"
#include "ui/stage/overlay.h"
#include "ui/stage/ring_drag.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The stage: the body in its rings, turned by hand or by keys. Draws findings; an edit is one call
/// of the model.
class StageWidget : public QWidget {
    Q_OBJECT

public:
    StageWidget(CaseModel& model, std::unique_ptr<StageRenderer> renderer,
                QWidget* parent = nullptr);
    ~StageWidget() override;

    void setRenderer(std::unique_ptr<StageRenderer> renderer);
    void setScheme(Scheme scheme);
    void setCamera(const Camera& camera);  ///< clamped; its up direction is the view's
    void resetCamera();

    /// Stage and labels as they are at rest, without the hand.
    QImage picture(const QSize& size, qreal ratio);

    const Scene& scene() const { return m_scene; }
    const Camera& camera() const { return m_camera; }
    Projection projection() const { return {m_camera, size()}; }
    const Pointing& pointing() const { return m_pointing; }
    std::optional<int> chosenRing() const { return m_chosen; }  ///< by key, 0 outer to 2 inner
    QString hint() const;
    bool isResting() const { return !m_rest.isActive(); }

    QSize sizeHint() const override { return {720, 550}; }
    QSize minimumSizeHint() const override { return {260, 220}; }

signals:
    void rendererFailed();  ///< the painter draws from now on
    void hintChanged(const QString& hint);
    /// The ring under the hand, listed as the angles are, or -1: so that other panels can light it
    /// too.
    void ringPointedAt(int listed);

protected:
    void paintEvent(QPaintEvent* event) override;
    void resizeEvent(QResizeEvent* event) override;
    void mousePressEvent(QMouseEvent* event) override;
    void mouseMoveEvent(QMouseEvent* event) override;
    void mouseReleaseEvent(QMouseEvent* event) override;
    void mouseDoubleClickEvent(QMouseEvent* event) override;
    void wheelEvent(QWheelEvent* event) override;
    void leaveEvent(QEvent* event) override;
    void keyPressEvent(QKeyEvent* event) override;
    void keyReleaseEvent(QKeyEvent* event) override;
    void focusInEvent(QFocusEvent* event) override;
    void focusOutEvent(QFocusEvent* event) override;

private:
    struct Orbit {
        QPointF press;
        Camera camera;
    };
    struct RingTurn {
        int ring;
        RingDrag drag;
        QPointF pointer;
    };
    using Grip = std::variant<std::monostate, Orbit, RingTurn, Arcball>;

    void present();                        ///< takes the scene anew from the findings
    void point(const Pointing& pointing);  ///< what the hand is at, with what follows
    void hover(const QPointF& at);
    void changed();  ///< something moved: draw fast now, well when it rests
    QImage rendered(const QSize& size, qreal ratio, bool fine);
    void endGrip();
    void cancelGrip();
    bool isEditing() const;
    void beginEdit();
    void endEdit();
    void turnChosen(double radians);
    bool orbitBy(double azimuth, double elevation);
    bool cameraKey(const QKeyEvent& event);
    bool ringKey(const QKeyEvent& event);
    std::optional<SweepMark> sweep() const;

    CaseModel& m_model;
    std::unique_ptr<StageRenderer> m_renderer;
    Scheme m_scheme = Scheme::light;
    Camera m_camera;
    Pointing m_pointing;
    std::optional<int> m_chosen;
    Scene m_scene;
    Grip m_grip;
    std::optional<Eigen::Vector3d> m_hovered_W;  ///< the place on the hovered ring
    bool m_editing = false;                      ///< a gesture of the model is under way
    int m_undoAtStart = 0;
    bool m_byKeys = false;  ///< the keyboard is in use, so the focus is shown
    QTimer m_rest;
    QImage m_image;  ///< null when it must be drawn anew
    QString m_hintTold;
};

}  // namespace ui
