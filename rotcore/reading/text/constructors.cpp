// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/constructors.h"

#include <array>
#include <string>

namespace rotcore {
namespace {

using enum Arguments;
constexpr auto kFirst = ScalarPlace::first;
constexpr auto kLast = ScalarPlace::last;
constexpr auto kRadians = AngleUnit::radians;
constexpr auto kDegrees = AngleUnit::degrees;

constexpr Constructor quaternion(std::string_view name, ScalarPlace scalar)
{
    return {.name = name, .kind = Kind::quaternion, .scalar = scalar};
}
constexpr Constructor angles(std::string_view name, Order order, About about, AngleUnit unit,
                             Arguments arguments = asListed)
{
    return {.name = name,
            .kind = Kind::euler,
            .arguments = arguments,
            .order = order,
            .about = about,
            .unit = unit};
}
constexpr Constructor turn(std::string_view name, Arguments arguments, AngleUnit unit)
{
    return {.name = name, .kind = Kind::axisAngle, .arguments = arguments, .unit = unit};
}
constexpr Constructor vector(std::string_view name)
{
    return {.name = name, .kind = Kind::rotationVector, .unit = kRadians};
}
constexpr Constructor matrix(std::string_view name)
{
    return {.name = name, .kind = Kind::matrix, .storage = Storage::rows};
}

// The longer of two names that both fit comes first. Sources: the documentation of each library as
// named, or "from memory" where it was not at hand.
constexpr std::array kConstructors{
    // Eigen, class Quaternion: the constructor takes w, x, y, z; coeffs() are stored and printed x,
    // y, z, w.
    quaternion("quaterniond", kFirst),
    quaternion("quaternionf", kFirst),
    quaternion("eigen.quaternion", kFirst),
    quaternion("coeffs", kLast),
    // Eigen, class AngleAxis: the angle, in radians, then the axis.
    turn("angleaxisd", angleThenAxis, kRadians),
    turn("angleaxisf", angleThenAxis, kRadians),
    turn("eigen.angleaxis", angleThenAxis, kRadians),
    // SciPy, class Rotation: scalar last; capitals are intrinsic, small letters extrinsic; radians
    // unless degrees=True; rotation vectors in radians.
    quaternion("from_quat", kLast),
    Constructor{.name = "from_euler", .kind = Kind::euler, .unit = kRadians, .caseSaysAbout = true},
    vector("from_rotvec"),
    matrix("from_matrix"),
    matrix("from_dcm"),
    // three.js, classes Quaternion and Euler: (x, y, z, w); (x, y, z, order), radians, intrinsic,
    // and the three stay angles about x, y, z for every order. `new Quaternion(x, y, z, w)` is
    // common practice in the script languages of graphics.
    quaternion("three.quaternion", kLast),
    quaternion("new quaternion", kLast),
    angles("three.euler", Order::xyz, About::body, kRadians, byAxis),
    angles("new euler", Order::xyz, About::body, kRadians, byAxis),
    turn("setfromaxisangle", asListed, kRadians),
    // Qt, class QQuaternion: (scalar, x, y, z); fromAxisAndAngle takes the axis, then degrees.
    turn("qquaternion.fromaxisandangle", asListed, kDegrees),
    quaternion("qquaternion", kFirst),
    // GLM: quat(w, x, y, z) unless built otherwise; angleAxis(radians, axis). From memory.
    quaternion("glm.quat", kFirst),
    quaternion("glm.dquat", kFirst),
    quaternion("glm.fquat", kFirst),
    turn("glm.angleaxis", angleThenAxis, kRadians),
    // tf, tf2 and Bullet, class Quaternion: (x, y, z, w); setRPY(roll, pitch, yaw) about fixed
    // axes.
    quaternion("tf.quaternion", kLast),
    quaternion("tf2.quaternion", kLast),
    quaternion("btquaternion", kLast),
    angles("setrpy", Order::xyz, About::space, kRadians),
    angles("createquaternionmsgfromrollpitchyaw", Order::xyz, About::space, kRadians),
    // KDL, class Rotation (frames.hpp): Quaternion(x, y, z, w); RPY about fixed x, y, z; EulerZYX
    // and EulerZYZ about the moving axes.
    quaternion("rotation.quaternion", kLast),
    angles("rotation.rpy", Order::xyz, About::space, kRadians),
    angles("rotation.eulerzyx", Order::zyx, About::body, kRadians),
    angles("rotation.eulerzyz", Order::zyz, About::body, kRadians),
    // transformations.py and transforms3d: three angles, by default 'sxyz', static axes; radians.
    angles("quaternion_from_euler", Order::xyz, About::space, kRadians),
    angles("euler_matrix", Order::xyz, About::space, kRadians),
    angles("euler2quat", Order::xyz, About::space, kRadians),
    angles("euler2mat", Order::xyz, About::space, kRadians),
    // Unity, UnityEngine.Quaternion.Euler(x, y, z): degrees, about fixed z, then x, then y
    // (documentation; its other quaternion.Euler takes radians). Its axes are left-handed, which is
    // not made up for here.
    Constructor{.name = "quaternion.euler",
                .kind = Kind::euler,
                .arguments = byAxis,
                .order = Order::zxy,
                .about = About::space,
                .unit = kDegrees,
                .spelling = "Quaternion.Euler"},
    // Blender, module mathutils: Quaternion((w, x, y, z)); Euler((x, y, z), order), radians, the
    // first letter of the order turning first about fixed axes. From memory.
    quaternion("mathutils.quaternion", kFirst),
    angles("mathutils.euler", Order::xyz, About::space, kRadians, byAxis),
    // numpy-quaternion: (w, x, y, z). From memory.
    quaternion("np.quaternion", kFirst),
    quaternion("quaternion.quaternion", kFirst),
    // GTSAM, class Rot3: Quaternion(w, x, y, z); Ypr(y, p, r) is Rz Ry Rx; RzRyRx(x, y, z). From
    // memory.
    quaternion("rot3.quaternion", kFirst),
    angles("rot3.ypr", Order::zyx, About::body, kRadians),
    angles("rot3.rzryrx", Order::xyz, About::space, kRadians),
    // MATLAB, eul2quat and eul2rotm: ZYX by default, intrinsic, radians (documentation of
    // eul2quat); quaternions scalar first; axang is axis, then radians (from memory).
    angles("eul2quat", Order::zyx, About::body, kRadians),
    angles("eul2rotm", Order::zyx, About::body, kRadians),
    quaternion("quat2rotm", kFirst),
    quaternion("quat2eul", kFirst),
    turn("axang2rotm", asListed, kRadians),
    turn("axang2quat", asListed, kRadians),
    // OpenCV, Rodrigues: a rotation vector in radians. Sophus, SO3::exp: the same.
    vector("rodrigues"),
    vector("so3d.exp"),
    vector("so3.exp"),
};

/// Lower case, all qualifiers joined with points.
std::string normalName(std::string_view word, bool afterNew)
{
    std::string name = afterNew ? "new " : "";
    for (std::size_t n = 0; n < word.size(); ++n) {
        const std::string_view rest = word.substr(n, 2);
        if (rest == "::" || rest == "->") {
            name += '.';
            ++n;
        } else {
            const char c = word[n];
            name += c >= 'A' && c <= 'Z' ? static_cast<char>(c + 32) : c;
        }
    }
    return name;
}

bool endsWithName(std::string_view name, std::string_view known)
{
    if (!name.ends_with(known)) return false;
    if (name.size() == known.size()) return true;
    const char before = name[name.size() - known.size() - 1];
    return before == '.' || before == ' ';
}

}  // namespace

const Constructor* constructorOf(std::string_view word, bool afterNew)
{
    constexpr std::size_t kLongestName = 200;
    if (word.size() > kLongestName) return nullptr;
    const std::string name = normalName(word, afterNew);
    for (const Constructor& known : kConstructors)
        if (endsWithName(name, known.name) && word.ends_with(known.spelling)) return &known;
    return nullptr;
}

}  // namespace rotcore
