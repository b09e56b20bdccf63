// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/copy_as.h"

#include <string>
#include <vector>

#include "rotcore/number_text.h"
#include "ui/panels/figure_text.h"

namespace ui {
namespace {

std::string joined(const std::vector<double>& values, const std::string& between)
{
    std::string text;
    for (const double value : values) {
        if (!text.empty()) text += between;
        text += rotcore::numberText(value);
    }
    return text;
}

std::vector<double> wxyz(const Eigen::Quaterniond& q)
{
    return {q.w(), q.x(), q.y(), q.z()};
}

std::vector<double> xyzw(const Eigen::Quaterniond& q)
{
    return {q.x(), q.y(), q.z(), q.w()};
}

std::vector<double> row(const Eigen::Matrix3d& M, int n)
{
    return {M(n, 0), M(n, 1), M(n, 2)};
}

// The rows of a matrix, each between `before` and `after`.
std::string rows(const Eigen::Matrix3d& M, const std::string& before, const std::string& between,
                 const std::string& after)
{
    std::string text;
    for (int n = 0; n < 3; ++n) {
        if (n > 0) text += after;
        text += before + joined(row(M, n), between);
    }
    return text;
}

std::vector<double> shownAngles(const rotcore::Findings& found)
{
    std::vector<double> shown;
    for (const double angle : found.angles.angles)
        shown.push_back(shownAngle(angle, found.shown.unit));
    return shown;
}

std::string jsonText(const rotcore::Findings& found)
{
    const auto word = [](std::string_view name) { return "\"" + std::string(name) + "\""; };
    return "{\n  \"direction\": \"body-to-world\",\n  \"quaternion_wxyz\": [" +
           joined(wxyz(found.q_WB), ", ") + "],\n  \"matrix_rows\": [" +
           rows(found.R_WB, "[", ", ", "], ") +
           "]],\n  \"euler\": {\"order\": " + word(rotcore::nameOf(found.angles.order)) +
           ", \"about\": " + word(rotcore::nameOf(found.angles.about)) +
           ", \"unit\": " + word(rotcore::nameOf(found.shown.unit)) + ", \"values\": [" +
           joined(shownAngles(found), ", ") + "]}\n}\n";
}

std::string textOf(const rotcore::Findings& found, CopyFormat format)
{
    switch (format) {
        case CopyFormat::angles:
            return joined(shownAngles(found), " ");
        case CopyFormat::quaternionWxyz:
            return joined(wxyz(found.q_WB), " ");
        case CopyFormat::quaternionXyzw:
            return joined(xyzw(found.q_WB), " ");
        case CopyFormat::matrixRows:
            return rows(found.R_WB, "", " ", "\n");
        case CopyFormat::eigenQuaternion:
            return "Eigen::Quaterniond q_WB(" + joined(wxyz(found.q_WB), ", ") +
                   ");  // w, x, y, z";
        case CopyFormat::eigenMatrix:
            return "Eigen::Matrix3d R_WB;\nR_WB << " + rows(found.R_WB, "", ", ", ",\n    ") + ";";
        case CopyFormat::scipyRotation:
            return "Rotation.from_quat([" + joined(xyzw(found.q_WB), ", ") + "])  # x, y, z, w";
        case CopyFormat::numpyMatrix:
            return "np.array([" + rows(found.R_WB, "[", ", ", "],\n          ") + "]])";
        case CopyFormat::json:
            return jsonText(found);
    }
    return {};
}

}  // namespace

QString copyLabel(CopyFormat format, const rotcore::Convention& shown)
{
    switch (format) {
        case CopyFormat::angles:
            return QStringLiteral("Angles %1 about %2, %3")
                .arg(orderWords(shown.order), QString::fromUtf8(rotcore::nameOf(shown.about)),
                     shown.unit == rotcore::AngleUnit::degrees ? "degrees" : "radians");
        case CopyFormat::quaternionWxyz:
            return QStringLiteral("Quaternion, w x y z");
        case CopyFormat::quaternionXyzw:
            return QStringLiteral("Quaternion, x y z w");
        case CopyFormat::matrixRows:
            return QStringLiteral("Matrix, row by row");
        case CopyFormat::eigenQuaternion:
            return QStringLiteral("C++, Eigen quaternion");
        case CopyFormat::eigenMatrix:
            return QStringLiteral("C++, Eigen matrix");
        case CopyFormat::scipyRotation:
            return QStringLiteral("Python, SciPy rotation");
        case CopyFormat::numpyMatrix:
            return QStringLiteral("Python, NumPy matrix");
        case CopyFormat::json:
            return QStringLiteral("JSON, all of it");
    }
    return {};
}

QString copyText(const rotcore::Findings& found, CopyFormat format)
{
    return QString::fromStdString(textOf(found, format));
}

}  // namespace ui
