// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

namespace ui {

/// What main() must do first, before anything of Qt is built: which of Qt3D's renderers to use
/// (unless QT3D_RENDERER says so already) and the format of every surface. Waiting for the screen
/// is off: on Wayland each picture would wait for a frame of the compositor.
void prepareOpenGl();

/// The argument by which a program is to call runGlProbe() and exit with its result.
inline constexpr auto kProbeArgument = "--probe-gl";

/// Draws and reads back one picture with OpenGL 3.2 or later: 0 if that works. Some broken drivers
/// end the process instead, so it runs in one of its own. Builds a QGuiApplication unless there is
/// one.
int runGlProbe();

/// Whether OpenGL works here, asked of a child process: the running program with kProbeArgument.
/// False without a display, and if there is no answer in 3 s.
bool openGlWorks();

/// The same with another program.
bool openGlWorks(const QString& program);

}  // namespace ui
