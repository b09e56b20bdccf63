// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/stage_effect.h"

#include <Qt3DRender/QGraphicsApiFilter>
#include <Qt3DRender/QRenderPass>
#include <Qt3DRender/QShaderProgram>
#include <Qt3DRender/QTechnique>

namespace ui {

namespace {

// Qt3D fills the uniforms from modelView to projectionMatrix. `beyond` is how far a point lies
// behind the centre of the stage, which is the origin of the world.
constexpr auto kVertexProgram = R"(#version 150 core
in vec3 vertexPosition;
in vec3 vertexNormal;
uniform mat4 modelView;
uniform mat3 modelViewNormal;
uniform mat4 viewMatrix;
uniform mat4 projectionMatrix;
uniform float swell;
out vec3 eyePosition;
out vec3 eyeNormal;
out float beyond;
void main()
{
    vec4 eye = modelView * vec4(vertexPosition + swell * vertexNormal, 1.0);
    eyePosition = eye.xyz;
    eyeNormal = modelViewNormal * vertexNormal;
    beyond = viewMatrix[3].z - eye.z;
    gl_Position = projectionMatrix * eye;
}
)";

constexpr auto kFragmentProgram = R"(#version 150 core
in vec3 eyePosition;
in vec3 eyeNormal;
in float beyond;
uniform vec3 colour;
uniform vec3 background;
uniform float shade;
uniform float gloss;
uniform float fade;
out vec4 fragment;
const vec3 kKey = vec3(-0.479, 0.639, 0.602);
const vec3 kSecond = vec3(0.862, 0.123, 0.492);
void main()
{
    vec3 normal = normalize(eyeNormal);
    if (!gl_FrontFacing) normal = -normal;
    vec3 toEye = normalize(-eyePosition);
    float light = 0.48 + 0.58 * max(dot(normal, kKey), 0.0) + 0.20 * max(dot(normal, kSecond), 0.0);
    float shine = gloss * pow(max(dot(normal, normalize(kKey + toEye)), 0.0), 40.0);
    vec3 seen = colour * mix(1.0, light, shade) + vec3(shine);
    seen = mix(seen, background, fade * smoothstep(-0.25, 0.35, beyond));
    fragment = vec4(clamp(seen, 0.0, 1.0), 128.0 / 255.0);
}
)";

Qt3DRender::QTechnique* makeTechnique()
{
    auto* program = new Qt3DRender::QShaderProgram;
    program->setVertexShaderCode(kVertexProgram);
    program->setFragmentShaderCode(kFragmentProgram);
    auto* pass = new Qt3DRender::QRenderPass;
    pass->setShaderProgram(program);

    auto* technique = new Qt3DRender::QTechnique;
    Qt3DRender::QGraphicsApiFilter* api = technique->graphicsApiFilter();
    api->setApi(Qt3DRender::QGraphicsApiFilter::OpenGL);
    api->setProfile(Qt3DRender::QGraphicsApiFilter::CoreProfile);
    api->setMajorVersion(3);
    api->setMinorVersion(2);
    technique->addRenderPass(pass);
    return technique;
}

}  // namespace

StageEffect::StageEffect(Qt3DCore::QNode* parent)
    : Qt3DRender::QEffect(parent),
      m_background(new Qt3DRender::QParameter(QStringLiteral("background"), QColor(Qt::gray), this))
{
    addParameter(m_background);
    addTechnique(makeTechnique());
}

}  // namespace ui
