// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/desktop/desktop_options.h"

int main(int argc, char** argv)
{
    const auto options = trunnion::parseDesktopOptions({argv + 1, argv + argc});
    if (const int* done = std::get_if<int>(&options)) return *done;
    return trunnion::runDesktop(std::get<trunnion::DesktopOptions>(options), argc, argv);
}
