// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/gl_probe.h"

#include <QCoreApplication>
#include <QGuiApplication>
#include <QImage>
#include <QOffscreenSurface>
#include <QOpenGLContext>
#include <QOpenGLFramebufferObject>
#include <QOpenGLFunctions>
#include <QProcess>
#include <QSurfaceFormat>

namespace ui {

namespace {

constexpr int kProbeLimitMs = 3000;

bool hasDisplay()
{
#if defined(Q_OS_UNIX) && !defined(Q_OS_DARWIN)
    return !qEnvironmentVariableIsEmpty("DISPLAY") ||
           !qEnvironmentVariableIsEmpty("WAYLAND_DISPLAY");
#else
    return true;
#endif
}

/// Clears a small picture to red and looks.
bool readsBackRed(QOpenGLContext& context)
{
    QOpenGLFramebufferObject target(16, 16, QOpenGLFramebufferObject::Depth);
    if (!target.isValid() || !target.bind()) return false;
    context.functions()->glClearColor(1.0F, 0.0F, 0.0F, 1.0F);
    context.functions()->glClear(GL_COLOR_BUFFER_BIT | GL_DEPTH_BUFFER_BIT);
    return target.toImage().pixel(8, 8) == qRgb(255, 0, 0);
}

bool drawsHere()
{
    QOffscreenSurface surface;
    surface.setFormat(QSurfaceFormat::defaultFormat());
    surface.create();
    QOpenGLContext context;
    if (!surface.isValid() || !context.create() || !context.makeCurrent(&surface)) return false;
    const bool good = context.format().version() >= qMakePair(3, 2) && readsBackRed(context);
    context.doneCurrent();
    return good;
}

}  // namespace

void prepareOpenGl()
{
    if (!qEnvironmentVariableIsSet("QT3D_RENDERER")) qputenv("QT3D_RENDERER", "opengl");
    QSurfaceFormat format;
    format.setRenderableType(QSurfaceFormat::OpenGL);
    format.setVersion(3, 3);
    format.setProfile(QSurfaceFormat::CoreProfile);
    format.setDepthBufferSize(24);
    format.setSamples(0);
    format.setSwapInterval(0);
    QSurfaceFormat::setDefaultFormat(format);
}

int runGlProbe()
{
    if (!hasDisplay()) return 1;
    if (QCoreApplication::instance() != nullptr) return drawsHere() ? 0 : 1;
    prepareOpenGl();
    char name[] = "probe";
    char* arguments[] = {name, nullptr};
    int count = 1;
    const QGuiApplication application(count, arguments);
    return drawsHere() ? 0 : 1;
}

bool openGlWorks()
{
    return openGlWorks(QCoreApplication::applicationFilePath());
}

bool openGlWorks(const QString& program)
{
    if (!hasDisplay()) return false;
    QProcess probe;
    probe.setStandardOutputFile(QProcess::nullDevice());
    probe.setStandardErrorFile(QProcess::nullDevice());
    probe.start(program, {QString::fromLatin1(kProbeArgument)});
    if (!probe.waitForFinished(kProbeLimitMs)) {
        probe.kill();
        probe.waitForFinished(kProbeLimitMs);
        return false;
    }
    return probe.exitStatus() == QProcess::NormalExit && probe.exitCode() == 0;
}

}  // namespace ui
