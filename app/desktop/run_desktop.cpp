// SPDX-License-Identifier: GPL-3.0-or-later
#include <QApplication>
#include <QFileInfo>
#include <cstdio>
#include <fstream>
#include <iterator>
#include <memory>

#include "app/desktop/desktop_options.h"
#include "rotcore/case/case_json.h"
#include "ui/stage/gl_probe.h"
#include "ui/stage/painter_renderer.h"
#include "ui/stage/qt3d_renderer.h"
#include "ui/window/main_window.h"

namespace trunnion {
namespace {

constexpr int kBadInput = 3;
constexpr int kNoDisplay = 4;

bool hasDisplay()
{
    return qEnvironmentVariableIsSet("DISPLAY") || qEnvironmentVariableIsSet("WAYLAND_DISPLAY") ||
           qEnvironmentVariableIsSet("QT_QPA_PLATFORM");
}

// The scanner head as it hung in Dunmarrow's demo: slewed, luffed and swung.
rotcore::Case demoCase()
{
    rotcore::Case demo;
    demo.chain = chainOf(rotcore::EulerAngles{
        rotcore::Order::zyx,
        rotcore::About::body,
        {rotcore::fromDegrees(30), rotcore::fromDegrees(20), rotcore::fromDegrees(10)}});
    return demo;
}

rotcore::Result<rotcore::Case> loadCase(const std::string& path)
{
    std::ifstream file(path, std::ios::binary);
    if (!file) return rotcore::Fault{rotcore::Fault::Kind::badText, "the file cannot be opened"};
    const std::string text{std::istreambuf_iterator<char>(file), {}};
    auto subject = rotcore::readCase(text);
    if (!subject) return subject;
    const auto found = examine(*subject);
    if (!found) return found.error();
    return subject;
}

std::unique_ptr<ui::StageRenderer> rendererFor(RendererChoice choice, QString& note)
{
    const bool wanted = choice != RendererChoice::painter;
    if (wanted && ui::openGlWorks()) return std::make_unique<ui::Qt3dRenderer>();
    if (wanted) note = QObject::tr("OpenGL does not work here: the stage is painted without it.");
    return std::make_unique<ui::PainterRenderer>();
}

int takeSnapshot(ui::MainWindow& window, const DesktopOptions& options)
{
    window.resize(options.width, options.height);
    window.setAttribute(Qt::WA_DontShowOnScreen);
    window.show();
    QApplication::processEvents();
    if (window.picture().save(QString::fromStdString(options.snapshot), "PNG")) return 0;
    std::fprintf(stderr, "trunnion: cannot write %s\n", options.snapshot.c_str());
    return kBadInput;
}

void tellFault(const std::string& file, const rotcore::Fault& fault)
{
    if (fault.place)
        std::fprintf(stderr, "trunnion: %s, line %zu, column %zu: %s\n", file.c_str(),
                     fault.place->line, fault.place->column, fault.message.c_str());
    else
        std::fprintf(stderr, "trunnion: %s: %s\n", file.c_str(), fault.message.c_str());
}

}  // namespace

int runDesktop(const DesktopOptions& options, int argc, char** argv)
{
    if (options.probeOpenGl) return ui::runGlProbe();
    if (!hasDisplay()) {
        if (options.snapshot.empty()) {
            std::fputs(
                "trunnion: there is no display. Start it from a desktop, or use --snapshot FILE "
                "for a picture,\n"
                "or trunnion-cli for the numbers.\n",
                stderr);
            return kNoDisplay;
        }
        qputenv("QT_QPA_PLATFORM", "offscreen");
    }
    auto subject = options.caseFile.empty() ? rotcore::Result<rotcore::Case>(demoCase())
                                            : loadCase(options.caseFile);
    if (!subject) {
        tellFault(options.caseFile, subject.error());
        return kBadInput;
    }
    if (options.scale != 1.0) qputenv("QT_SCALE_FACTOR", QByteArray::number(options.scale));
    ui::prepareOpenGl();
    QApplication application(argc, argv);
    QApplication::setOrganizationName("Trunnion");
    QApplication::setApplicationName("Trunnion");
    QApplication::setApplicationVersion(TRUNNION_VERSION);

    QString note;
    auto renderer = rendererFor(options.renderer, note);
    ui::CaseModel model(*subject);
    const QString name =
        options.caseFile.empty()
            ? QObject::tr("scanner head, Dunmarrow")
            : QFileInfo(QString::fromStdString(options.caseFile)).completeBaseName();
    ui::MainWindow window(model, std::move(renderer), name, options.scheme);
    if (!note.isEmpty()) window.tell(note);
    if (!options.snapshot.empty()) return takeSnapshot(window, options);
    window.resize(1280, 800);
    window.restoreLayout();
    window.show();
    return QApplication::exec();
}

}  // namespace trunnion
