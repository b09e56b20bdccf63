// SPDX-License-Identifier: GPL-3.0-or-later
#include <QMessageBox>

#include "ui/window/main_window.h"

namespace ui {

void showAbout(QWidget* parent)
{
    QMessageBox::about(parent, QObject::tr("About Trunnion"),
                       QObject::tr("<h3>Trunnion " TRUNNION_VERSION "</h3>"
                                   "<p>Finds out why a body points the wrong way. A trunnion is "
                                   "the pin a gimbal ring turns on.</p>"
                                   "<p><b>Caution.</b> Rotations drive machines that can hurt "
                                   "people. Trunnion explains numbers; it "
                                   "does not release motion. Try a fix at reduced speed and with "
                                   "people clear, and follow the "
                                   "equipment's manual, the site's rules, local codes and the "
                                   "judgement of whoever is licensed for "
                                   "the work.</p>"
                                   "<p>Free software under the GNU General Public License, version "
                                   "3 or later, without any warranty. "
                                   "The port of Dunmarrow and its crane are invented.</p>"));
}

}  // namespace ui
