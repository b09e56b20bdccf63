// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/offscreen_engine.h"

#include <QSurfaceFormat>
#include <memory>

#include <Qt3DRender/QCameraSelector>
#include <Qt3DRender/QClearBuffers>
#include <Qt3DRender/QNoDraw>
#include <Qt3DRender/QRenderAspect>
#include <Qt3DRender/QRenderCapture>
#include <Qt3DRender/QRenderSettings>
#include <Qt3DRender/QRenderSurfaceSelector>
#include <Qt3DRender/QRenderTarget>
#include <Qt3DRender/QRenderTargetOutput>
#include <Qt3DRender/QRenderTargetSelector>
#include <Qt3DRender/QSubtreeEnabler>
#include <Qt3DRender/QTexture>
#include <Qt3DRender/QViewport>

#include "ui/stage/qt3d/to_qt.h"

namespace ui {

using namespace Qt3DRender;

namespace {

// The first frame draws the picture and the second only hands it out, so that one need not draw.
// Where it has not come after four it never will.
constexpr int kMostFrames = 4;

}  // namespace

OffscreenEngine::OffscreenEngine() : m_root(new Qt3DCore::QEntity), m_camera(new QCamera(m_root))
{
    m_surface.setFormat(QSurfaceFormat::defaultFormat());
    m_surface.create();
    m_engine.setRunMode(Qt3DCore::QAspectEngine::Manual);
    m_engine.registerAspect(new QRenderAspect);
    createFrameGraph();
}

OffscreenEngine::~OffscreenEngine()
{
    if (!m_started) m_engine.setRootEntity(Qt3DCore::QEntityPtr(m_root));
    m_engine.setRootEntity(Qt3DCore::QEntityPtr());
}

void OffscreenEngine::createFrameGraph()
{
    m_selector = new QRenderSurfaceSelector;
    m_selector->setSurface(&m_surface);
    auto* cameraSelector = new QCameraSelector(new QViewport(createTarget(m_selector)));
    cameraSelector->setCamera(m_camera);

    m_drawing = new QSubtreeEnabler(cameraSelector);
    m_clear = new QClearBuffers(m_drawing);  // first branch: clear and draw everything
    m_clear->setBuffers(QClearBuffers::ColorDepthBuffer);
    m_capture = new QRenderCapture(new QNoDraw(cameraSelector));  // second: read back

    auto* settings = new QRenderSettings;
    settings->setActiveFrameGraph(m_selector);
    m_root->addComponent(settings);
}

Qt3DCore::QNode* OffscreenEngine::createTarget(Qt3DCore::QNode* parent)
{
    auto* targetSelector = new QRenderTargetSelector(parent);
    auto* target = new QRenderTarget(targetSelector);
    for (const bool depth : {false, true}) {
        auto* texture = new QTexture2D;
        texture->setFormat(depth ? QAbstractTexture::D24 : QAbstractTexture::RGBA8_UNorm);
        auto* output = new QRenderTargetOutput(target);
        output->setTexture(texture);
        output->setAttachmentPoint(depth ? QRenderTargetOutput::Depth
                                         : QRenderTargetOutput::Color0);
        target->addOutput(output);
        m_textures[depth ? 1 : 0] = texture;
    }
    targetSelector->setTarget(target);
    return targetSelector;
}

void OffscreenEngine::setView(const Projection& projection)
{
    const Eigen::Matrix3d R_EW = projection.viewMatrix().topLeftCorner<3, 3>();
    const Eigen::Vector3d eye_W =
        -R_EW.transpose() * projection.viewMatrix().topRightCorner<3, 1>();
    m_camera->setPosition(toQt(eye_W));
    m_camera->setViewCenter(toQt(Eigen::Vector3d(eye_W - R_EW.row(2).transpose())));
    m_camera->setUpVector(toQt(Eigen::Vector3d(R_EW.row(1).transpose())));
    m_camera->setProjectionMatrix(toQt(projection.projectionMatrix()));
}

void OffscreenEngine::setClearColour(const QColor& colour)
{
    m_clear->setClearColor(colour);
}

QImage OffscreenEngine::capture(const QSize& pixels)
{
    for (QTexture2D* texture : m_textures)
        texture->setSize(pixels.width(), pixels.height());
    m_selector->setExternalRenderTargetSize(pixels);
    if (!m_started) m_engine.setRootEntity(Qt3DCore::QEntityPtr(m_root));
    m_started = true;
    const std::unique_ptr<QRenderCaptureReply> reply(m_capture->requestCapture());
    for (int frame = 0; frame < kMostFrames && !reply->isComplete(); ++frame) {
        m_drawing->setEnabled(frame != 1);
        m_engine.processFrame();
    }
    return reply->isComplete() ? reply->image() : QImage();
}

}  // namespace ui
