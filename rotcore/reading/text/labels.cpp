// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/labels.h"

#include <algorithm>
#include <array>
#include <string>
#include <unordered_map>

#include "rotcore/reading/text/expression.h"

namespace rotcore {
namespace {

struct Meaning {
    Topic topic = Topic::unknown;
    Component component = Component::none;
    Topic within = Topic::unknown;
};

constexpr Meaning component(Component which, Topic within = Topic::unknown)
{
    return {Topic::component, which, within};
}

using Vocabulary = std::unordered_map<std::string_view, Meaning>;

void add(Vocabulary& words, Meaning meaning, std::initializer_list<std::string_view> names)
{
    for (const std::string_view name : names)
        words.emplace(name, meaning);
}

void addComponents(Vocabulary& words)
{
    using enum Component;
    add(words, component(w), {"w", "real", "scalar"});
    add(words, component(x), {"x"});
    add(words, component(y), {"y"});
    add(words, component(z), {"z"});
    add(words, component(w, Topic::quaternion), {"qw"});
    add(words, component(x, Topic::quaternion), {"qx", "qi"});
    add(words, component(y, Topic::quaternion), {"qy", "qj"});
    add(words, component(z, Topic::quaternion), {"qz", "qk"});
    add(words, component(roll), {"roll", "bank"});
    add(words, component(pitch), {"pitch", "theta", "tilt", "\u03B8"});
    add(words, component(yaw), {"yaw", "heading", "hdg", "psi", "\u03C8"});
    add(words, component(omega), {"omega", "\u03C9"});
    add(words, component(phi), {"phi", "\u03C6"});
    add(words, component(kappa), {"kappa", "\u03BA"});
    add(words, component(turnX), {"rx", "rotx", "anglex", "eulerx"});
    add(words, component(turnY), {"ry", "roty", "angley", "eulery"});
    add(words, component(turnZ), {"rz", "rotz", "anglez", "eulerz"});
    add(words, component(axisX), {"ax", "ux", "axisx"});
    add(words, component(axisY), {"ay", "uy", "axisy"});
    add(words, component(axisZ), {"az", "uz", "axisz"});
    add(words, component(axis), {"axis"});
    add(words, component(angle), {"angle"});
    add(words, component(position), {"tx", "ty", "tz", "px", "py", "pz", "posx", "posy", "posz"});
    add(words, component(other), {"vx", "vy", "vz", "wx", "wy", "wz", "gx", "gy", "gz"});
}

void addTopics(Vocabulary& words)
{
    add(words, {Topic::orientation}, {"orientation", "rotation", "rot", "attitude", "orient"});
    add(words, {Topic::position},
        {"position", "pos", "translation", "trans", "translate", "location", "loc", "tvec",
         "origin", "displacement", "offset"});
    add(words, {Topic::other},
        {"velocity",  "vel",      "linear",     "angular", "acceleration", "accel",
         "gyro",      "mag",      "scale",      "size",    "time",         "stamp",
         "timestamp", "sec",      "secs",       "nsec",    "nsecs",        "seq",
         "nanosec",   "id",       "covariance", "gravity", "shape",        "cuda",
         "rate",      "speed",    "mass",       "index",   "confidence",   "dimensions",
         "device",    "error",    "rgba",       "ms",      "count",        "score",
         "fov",       "distance", "radius",     "norm"});
    add(words, {Topic::quaternion}, {"quaternion", "quat", "quaternions", "q", "quats", "qvec"});
    add(words, {Topic::euler}, {"euler", "angles", "eulers", "eulerangles"});
    add(words, {Topic::rollPitchYaw}, {"rpy", "rollpitchyaw"});
    add(words, {Topic::yawPitchRoll}, {"ypr", "yawpitchroll"});
    add(words, {Topic::matrix},
        {"matrix", "dcm", "rotmat", "rmat", "matrix3d", "matrix4d", "transform"});
    add(words, {Topic::rotationVector}, {"rotvec", "rvec", "rotationvector", "so3", "rodrigues"});
    add(words, {Topic::vector}, {"vector", "vec"});
    add(words, {Topic::axisAngle}, {"axisangle", "axang"});
    add(words, {Topic::filler},
        {"array", "ndarray", "tensor",  "float",     "double",   "float32",  "float64",
         "f32",   "f64",     "const",   "constexpr", "static",   "let",      "var",
         "auto",  "val",     "value",   "new",       "return",   "list",     "tuple",
         "vec3",  "vec4",    "vector3", "vector4",   "vector3d", "vector4d", "vector3f",
         "dvec3", "dvec4",   "in",      "of",        "as",       "is",       "the",
         "a",     "and",     "dtype",   "torch",     "np",       "numpy",    "eigen",
         "std",   "true",    "false",   "n",         "r",        "qvector3d"});
}

const Meaning* meaningOf(std::string_view lowerCaseWord)
{
    static const Vocabulary kVocabulary = [] {
        Vocabulary words;
        addComponents(words);
        addTopics(words);
        return words;
    }();
    const auto found = kVocabulary.find(lowerCaseWord);
    return found == kVocabulary.end() ? nullptr : &found->second;
}

bool isDigit(char c)
{
    return c >= '0' && c <= '9';
}
bool isUpper(char c)
{
    return c >= 'A' && c <= 'Z';
}
char lowered(char c)
{
    return isUpper(c) ? static_cast<char>(c + 32) : c;
}

/// The parts of a name, cut at anything but letters and digits and before a capital after a small
/// letter.
std::vector<std::string> partsOf(std::string_view word)
{
    std::vector<std::string> parts(1);
    for (std::size_t n = 0; n < word.size(); ++n) {
        const char c = word[n];
        const bool letter = isUpper(c) || (c >= 'a' && c <= 'z') || isDigit(c) ||
                            static_cast<unsigned char>(c) >= 0x80;
        const bool hump = n > 0 && isUpper(c) && word[n - 1] >= 'a' && word[n - 1] <= 'z';
        if ((!letter || hump) && !parts.back().empty()) parts.emplace_back();
        if (letter) parts.back() += lowered(c);
    }
    if (parts.back().empty()) parts.pop_back();
    return parts;
}

/// An order of three different letters, or `sxyz` / `rzyx` with s(tatic) or r(otating) axes in
/// front.
bool readOrder(std::string_view word, Label& label)
{
    std::string_view letters = word;
    if (letters.size() == 4 && (letters[0] == 's' || letters[0] == 'r')) {
        label.about = letters[0] == 's' ? About::space : About::body;
        letters.remove_prefix(1);
    }
    if (letters.size() != 3) return false;
    std::array<Axis, 3> axes{};
    for (std::size_t n = 0; n < 3; ++n) {
        const char c = lowered(letters[n]);
        if (c < 'x' || c > 'z') return false;
        axes[n] = axisAt(c - 'x');
    }
    const auto order = orderOf(axes);
    if (!order) return false;
    label.order = *order;
    label.topic = Topic::order;
    return true;
}

/// q0, q1, ..., r11, m00, ...
bool readNumbered(std::string_view part, Label& label)
{
    if (part.size() == 2 && part[0] == 'q' && isDigit(part[1])) {
        label.topic = Topic::component;
        label.component = Component::numbered;
        label.number = part[1] - '0';
        return true;
    }
    if (part.size() == 3 && (part[0] == 'r' || part[0] == 'm') && part[1] >= '0' &&
        part[1] <= '3' && part[2] >= '0' && part[2] <= '3') {
        label.topic = Topic::component;
        label.component = Component::element;
        label.number = 10 * (part[1] - '0') + (part[2] - '0');
        return true;
    }
    return false;
}

bool isSection(Topic topic)
{
    return topic != Topic::unknown && topic != Topic::filler && topic != Topic::component;
}

Component shifted(Component first, Component xyz)
{
    return static_cast<Component>(static_cast<int>(first) + static_cast<int>(xyz) -
                                  static_cast<int>(Component::x));
}

/// `pos_x`, `euler.z`, `axis_y`: what x, y, z are of.
void placeWithin(Label& label)
{
    using enum Component;
    const Component c = label.component;
    if (label.within == Topic::other) label.component = other;
    if (c != x && c != y && c != z) return;
    if (label.within == Topic::position) label.component = position;
    if (label.within == Topic::euler) label.component = shifted(turnX, c);
    if (label.within == Topic::axisAngle) label.component = shifted(axisX, c);
}

void takePart(const Meaning& meaning, Label& label)
{
    using enum Component;
    if (meaning.topic == Topic::filler) return;
    if (meaning.topic == Topic::vector && label.topic == Topic::orientation) {
        label.topic = Topic::rotationVector;
        return;
    }
    const bool axisBefore = label.topic == Topic::component && label.component == axis;
    const bool angleBefore = label.topic == Topic::component && label.component == angle;
    if ((axisBefore && meaning.component == angle) || (angleBefore && meaning.component == axis)) {
        label.topic = Topic::axisAngle;
        return;
    }
    if (label.topic == Topic::component && !axisBefore && !angleBefore) {
        // the first component stands (`x_offset`), unless it is the rate of something
        if (meaning.topic == Topic::other) label.component = other;
        return;
    }
    if (axisBefore) label.within = Topic::axisAngle;
    if (angleBefore) label.within = Topic::euler;
    if (isSection(label.topic)) label.within = label.topic;
    if (label.topic == Topic::other) return;
    if (isSection(meaning.topic) && label.topic == Topic::euler) return;  // `euler_angles`
    label.topic = meaning.topic;
    label.component = meaning.component;
    if (meaning.within != Topic::unknown) label.within = meaning.within;
}

bool readWhole(std::string_view word, Label& label)
{
    if (isSameWord(word, "wxyz") || isSameWord(word, "xyzw")) {
        label.topic = Topic::quaternion;
        label.scalar = isSameWord(word, "wxyz") ? ScalarPlace::first : ScalarPlace::last;
        return true;
    }
    const std::string_view name = lastName(word);
    if (name.size() == 5 && name.starts_with("Unit") && name[4] >= 'X' && name[4] <= 'Z') {
        label.topic = Topic::unitAxis;
        label.axis = axisAt(name[4] - 'X');
        return true;
    }
    label.unit = unitOfWord(word);
    if (label.unit) label.topic = Topic::unit;
    return label.unit || readOrder(word, label);
}

}  // namespace

Label labelOf(std::string_view word)
{
    constexpr std::size_t kLongestLabel = 80;
    Label label;
    if (word.size() > kLongestLabel || readWhole(word, label)) return label;
    bool endsInFiller = false;
    for (const std::string& part : partsOf(word)) {
        if (const auto unit = unitOfWord(part)) {
            label.unit = unit;
            continue;
        }
        const Meaning* meaning = meaningOf(part);
        endsInFiller = meaning && meaning->topic == Topic::filler;
        if (meaning) takePart(*meaning, label);
        Label inPart;
        if (!meaning && label.topic != Topic::component) {
            if (readNumbered(part, inPart)) label = inPart;
            if (readOrder(part, inPart)) label.order = inPart.order;
        }
    }
    placeWithin(label);
    if (label.topic == Topic::unknown && label.order) label.topic = Topic::order;
    if (label.topic == Topic::unknown && label.unit) label.topic = Topic::unit;
    if (label.topic == Topic::unknown && endsInFiller) label.topic = Topic::filler;
    return label;
}

std::optional<Order> shortOrder(std::string_view text)
{
    if (text.empty() || text.size() > 2) return std::nullopt;
    for (const char c : text)
        if (lowered(c) < 'x' || lowered(c) > 'z') return std::nullopt;
    const Axis first = axisAt(lowered(text[0]) - 'x');
    const Axis second =
        text.size() == 2 ? axisAt(lowered(text[1]) - 'x') : axisAt(indexOf(first) + 2);
    if (first == second) return std::nullopt;
    const auto order = orderOf({first, second, otherThan(first, second)});
    return order ? std::optional(*order) : std::nullopt;
}

}  // namespace rotcore
