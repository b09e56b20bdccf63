// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include <Eigen/Geometry>

#include "rotcore/case/findings.h"
#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/axis.h"
#include "ui/model/view.h"

namespace ui {

/// A triangle mesh in coordinates of its own, flat-shaded: three vertices a triangle, each with its
/// normal.
struct Mesh {
    struct Triangle {
        std::array<Eigen::Vector3d, 3> vertices;  ///< counter-clockwise seen from outside
        Eigen::Vector3d normal;                   ///< unit, outward
        int part = 0;                             ///< index into `parts`
    };
    /// What a part is made of, so that each scheme can colour it.
    enum class Material { housing, dark, metal, glass };
    std::vector<Triangle> triangles;
    std::vector<Material> parts;
    /// The body's tips with the words that say which way they point, in mesh coordinates.
    struct Tip {
        Eigen::Vector3d at;
        std::string word;
    };
    std::vector<Tip> tips;
};

/// One ring of the rig, in world coordinates. It turns about its pins, which lie along R's x axis;
/// the circle lies in R's xy plane, and R's y axis points to where the next inner ring's pins are
/// held.
struct RingShape {
    Eigen::Quaterniond q_WR = Eigen::Quaterniond::Identity();
    double radius = 1.0;                    ///< stage units; the body fits in a unit sphere
    rotcore::Axis axis = rotcore::Axis::z;  ///< gives letter, colour and tick pattern
    int listed = 0;                         ///< which of the listed angles turns it, 0 to 2
    double angle = 0.0;                     ///< radians, as shown
    Eigen::Vector3d pin_W =
        Eigen::Vector3d::UnitZ();  ///< unit; a positive angle turns right-handed about it
    bool hovered = false;
    bool dragged = false;
};

/// A named direction of the world or of the body: a line from the centre with its letter at the
/// end.
struct AxisShape {
    enum class Frame { world, body };
    Frame frame = Frame::world;
    rotcore::Axis axis = rotcore::Axis::x;
    Eigen::Vector3d direction_W = Eigen::Vector3d::UnitX();  ///< unit
    double length = 1.0;
    std::string name;  ///< "X", "east", ... for the world; "x", "y", "z" for the body
};

/// What marks lock: the pin axes that fall together and the direction no ring turns about.
struct LockShape {
    Eigen::Vector3d pins_W = Eigen::Vector3d::UnitX();
    Eigen::Vector3d lost_W = Eigen::Vector3d::UnitY();
    bool atLock = false;  ///< else near: within the view's threshold
};

/// Outer to inner; every ring clears the pins of the next.
inline constexpr std::array<double, 3> kRingRadii{1.75, 1.5, 1.25};

/// Nearer than this the pins are marked; farther than kNearingLock nothing is said. Radians.
inline constexpr double kNearLock = rotcore::fromDegrees(10.0);
inline constexpr double kNearingLock = rotcore::fromDegrees(30.0);

/// What is drawn, in world coordinates and in double; both renderers read it and neither adds to
/// it. The world's third axis is up unless the view's names say otherwise; the centre of everything
/// is the origin.
struct Scene {
    Eigen::Quaterniond q_WB = Eigen::Quaterniond::Identity();
    std::shared_ptr<const Mesh> body;
    std::array<RingShape, 3> rings;  ///< outer to inner
    std::vector<AxisShape> axes;
    double groundHeight = -2.0;  ///< the ground disc's place along the world's up direction
    Eigen::Vector3d up_W = Eigen::Vector3d::UnitZ();
    double groundRadius = 1.85;  ///< of the ground disc
    double lockDistance =
        rotcore::kPi / 2;           ///< radians, between the outer and inner pins taken as lines
    std::optional<LockShape> lock;  ///< present near lock and at it
};

/// What the hand is at.
struct Pointing {
    std::optional<int> hoveredRing;  ///< 0 outer to 2 inner
    std::optional<int> draggedRing;
    bool overBody = false;
};

/// Pure: the same findings, view and pointing give the same scene.
Scene sceneOf(const rotcore::Findings& found, const View& view, const Pointing& pointing = {});

/// The rings of three angles as they really stand, outer to inner. About space the rig is the
/// mechanically equal reversed order about body; `listed` says which listed angle each ring is.
std::array<RingShape, 3> ringsOf(const rotcore::EulerAngles& angles);

/// The scanner head of Dunmarrow: snout along body x, mast along body z, pod along body y; no
/// symmetry at all.
std::shared_ptr<const Mesh> scannerHead();

}  // namespace ui
