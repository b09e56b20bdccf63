// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/palette.h"

namespace ui {

namespace {

Palette lightPalette()
{
    return {.paper = QColor(0xF6F5F1),
            .sheet = QColor(0xFFFFFF),
            .stageTop = QColor(0xEDEFF1),
            .stageBottom = QColor(0xD9DDE1),
            .ink = QColor(0x1B1D20),
            .quietInk = QColor(0x5E646B),
            .hairline = QColor(0xD8D6CF),
            .accent = QColor(0x7A4E9F),
            .axes = {QColor(0xB84E00), QColor(0x007F5C), QColor(0x0069A6)},
            .nearingLock = QColor(0x8A5A00),
            .atLock = QColor(0xB3261E),
            .ground = QColor(0xF7F7F3),
            .groundLine = QColor(0xA9AEB3),
            .materials = {QColor(0xCBCED2), QColor(0x5B6572), QColor(0xB5A688), QColor(0x2B2350)}};
}

Palette darkPalette()
{
    return {.paper = QColor(0x17191C),
            .sheet = QColor(0x1F2226),
            .stageTop = QColor(0x23272C),
            .stageBottom = QColor(0x15171A),
            .ink = QColor(0xECEBE6),
            .quietInk = QColor(0x9AA1A8),
            .hairline = QColor(0x33373C),
            .accent = QColor(0xB58AD6),
            .axes = {QColor(0xFF8A3D), QColor(0x2CC796), QColor(0x4FA8E8)},
            .nearingLock = QColor(0xE6B450),
            .atLock = QColor(0xFF7A70),
            .ground = QColor(0x1F2327),
            .groundLine = QColor(0x545B62),
            .materials = {QColor(0xA9AEB5), QColor(0x566070), QColor(0x9C8A66), QColor(0x3B2F73)}};
}

}  // namespace

const Palette& paletteOf(Scheme scheme)
{
    static const Palette kLight = lightPalette();
    static const Palette kDark = darkPalette();
    return scheme == Scheme::light ? kLight : kDark;
}

QColor mixed(const QColor& under, const QColor& over, double share)
{
    const auto mix = [share](int a, int b) { return static_cast<int>(a + (b - a) * share + 0.5); };
    return {mix(under.red(), over.red()), mix(under.green(), over.green()),
            mix(under.blue(), over.blue())};
}

}  // namespace ui
