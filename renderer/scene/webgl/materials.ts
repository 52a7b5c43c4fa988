import { ShaderMaterial, Vector2, Vector3 } from 'three';
import type { Rgb, SceneColours } from '../colours.ts';
import { PAINTS } from '../geometry/steelPart.ts';
import { LIGHT, LIT, TURNED } from '../view/light.ts';

/**
 * The materials of the drawing. Colours go to the screen as the theme gives them, with no tone mapping: these are inks and papers, not
 * lit surfaces.
 */
export interface SceneMaterials {
  readonly solids: ShaderMaterial;
  readonly edges: ShaderMaterial;
  readonly fineEdges: ShaderMaterial;
  readonly contextSolids: ShaderMaterial;
  readonly contextEdges: ShaderMaterial;
  readonly selectedSolids: ShaderMaterial;
  readonly selectedEdges: ShaderMaterial;
  readonly selectedFineEdges: ShaderMaterial;
  readonly hoveredEdges: ShaderMaterial;
  readonly halo: ShaderMaterial;
}

/** How far the tones of neighbouring frames go over to the sheet. */
const CONTEXT_FADE = 0.78;

/** Width of the halo, px. */
const HALO_WIDTH = 18;

const SOLID_VERTEX = /* glsl */ `
attribute float paint;
uniform vec3 tones[9];
uniform vec3 light;
varying vec3 tone;
varying vec3 place;
void main() {
  vec3 facing = normalize(normalMatrix * normal);
  float lit = dot(facing, light);
  int at = int(paint + 0.5) * 3;
  vec3 lower = mix(tones[at + 2], tones[at + 1], smoothstep(${glsl(TURNED.from)}, ${glsl(TURNED.to)}, lit));
  tone = mix(lower, tones[at], smoothstep(${glsl(LIT.from)}, ${glsl(LIT.to)}, lit));
  vec4 at4 = modelMatrix * vec4(position, 1.0);
  place = at4.xyz;
  gl_Position = projectionMatrix * viewMatrix * at4;
}
`;

const FADING = /* glsl */ `
uniform vec3 sheet;
uniform float fade;
uniform vec3 subject;
uniform float reach;
varying vec3 place;
// What lies far from the bay in hand goes over to the sheet.
float faded() {
  float away = reach <= 0.0 ? 0.0 : smoothstep(1.0, 3.0, distance(place, subject) / reach);
  return 1.0 - (1.0 - fade) * (1.0 - away);
}
`;

const SOLID_FRAGMENT = /* glsl */ `
varying vec3 tone;
${FADING}
void main() {
  gl_FragColor = vec4(mix(tone, sheet, faded()), 1.0);
}
`;

const EDGE_VERTEX = /* glsl */ `
varying vec3 place;
void main() {
  vec4 at4 = modelMatrix * vec4(position, 1.0);
  place = at4.xyz;
  gl_Position = projectionMatrix * viewMatrix * at4;
}
`;

const EDGE_FRAGMENT = /* glsl */ `
uniform vec3 ink;
${FADING}
void main() {
  gl_FragColor = vec4(mix(ink, sheet, faded()), 1.0);
}
`;

/** A band of constant width on the screen with round ends, from `position` to `other`. `corner`: which end (0, 1) and which side (−1, 1). */
const HALO_VERTEX = /* glsl */ `
attribute vec3 other;
attribute vec2 corner;
uniform vec2 sheetSize;
uniform float halfWidth;
varying float along;
varying float across;
varying float bandLength;
void main() {
  mat4 toClip = projectionMatrix * modelViewMatrix;
  vec4 a = toClip * vec4(position, 1.0);
  vec4 b = toClip * vec4(other, 1.0);
  vec2 run = (b.xy - a.xy) * sheetSize * 0.5;
  bandLength = length(run);
  vec2 way = bandLength > 0.001 ? run / bandLength : vec2(1.0, 0.0);
  float beyond = (corner.x * 2.0 - 1.0) * halfWidth;
  along = corner.x * bandLength + beyond;
  across = corner.y * halfWidth;
  vec4 end = mix(a, b, corner.x);
  end.xy += (way * beyond + vec2(-way.y, way.x) * across) * 2.0 / sheetSize;
  gl_Position = end;
}
`;

const HALO_FRAGMENT = /* glsl */ `
uniform vec3 ink;
uniform float opacity;
uniform float halfWidth;
varying float along;
varying float across;
varying float bandLength;
void main() {
  float past = max(max(-along, along - bandLength), 0.0);
  float away = length(vec2(past, across));
  gl_FragColor = vec4(ink, opacity * (1.0 - smoothstep(halfWidth - 1.0, halfWidth, away)));
}
`;

function glsl(value: number): string {
  return value.toFixed(3);
}

const vector = ([r, g, b]: Rgb): Vector3 => new Vector3(r, g, b);

const nothing = (): Vector3 => new Vector3();

function fading(fade: number) {
  return {
    sheet: { value: nothing() },
    fade: { value: fade },
    subject: { value: nothing() },
    reach: { value: 0 },
  };
}

function solids(fade: number): ShaderMaterial {
  return new ShaderMaterial({
    vertexShader: SOLID_VERTEX,
    fragmentShader: SOLID_FRAGMENT,
    uniforms: {
      ...fading(fade),
      light: { value: new Vector3(...LIGHT) },
      tones: { value: Array.from({ length: 3 * PAINTS.length }, nothing) },
    },
    // Lines lie on the faces that they outline: push the faces back by a hair, or the lines would flicker through them.
    polygonOffset: true,
    polygonOffsetFactor: 1,
    polygonOffsetUnits: 1,
  });
}

function edges(fade: number): ShaderMaterial {
  return new ShaderMaterial({
    vertexShader: EDGE_VERTEX,
    fragmentShader: EDGE_FRAGMENT,
    uniforms: { ...fading(fade), ink: { value: nothing() } },
  });
}

function halo(): ShaderMaterial {
  return new ShaderMaterial({
    vertexShader: HALO_VERTEX,
    fragmentShader: HALO_FRAGMENT,
    uniforms: {
      ink: { value: nothing() },
      opacity: { value: 0.9 },
      halfWidth: { value: HALO_WIDTH / 2 },
      sheetSize: { value: new Vector2(1, 1) },
    },
    transparent: true,
    depthWrite: false,
  });
}

export function makeMaterials(): SceneMaterials {
  const materials: SceneMaterials = {
    solids: solids(0),
    edges: edges(0),
    fineEdges: edges(0),
    contextSolids: solids(CONTEXT_FADE),
    contextEdges: edges(0),
    selectedSolids: solids(0),
    selectedEdges: edges(0),
    selectedFineEdges: edges(0),
    hoveredEdges: edges(0),
    halo: halo(),
  };
  // The halo is see-through, and so comes after all that is not; what it lies behind must come later still.
  for (const over of [materials.selectedSolids, materials.selectedEdges, materials.hoveredEdges])
    over.transparent = true;
  return materials;
}

/** Gives the materials the colours of a theme. */
export function colourMaterials(materials: SceneMaterials, colours: SceneColours): void {
  const plain = PAINTS.flatMap((paint) => colours.tones[paint]);
  setTones(materials.solids, plain);
  setTones(materials.contextSolids, plain);
  setTones(
    materials.selectedSolids,
    PAINTS.flatMap(() => colours.selected),
  );
  set(materials.edges, 'ink', vector(colours.edge));
  set(materials.fineEdges, 'ink', vector(colours.edge));
  set(materials.contextEdges, 'ink', vector(colours.context));
  set(materials.selectedEdges, 'ink', vector(colours.selectedEdge));
  set(materials.selectedFineEdges, 'ink', vector(colours.selectedEdge));
  set(materials.hoveredEdges, 'ink', vector(colours.accent));
  set(materials.halo, 'ink', vector(colours.marker));
  for (const material of Object.values(materials)) {
    if (material.uniforms.sheet) set(material, 'sheet', vector(colours.sheet));
  }
  // Fine lines fade into the face that they lie on.
  set(materials.fineEdges, 'sheet', vector(colours.tones.diagonal[1]));
  set(materials.selectedFineEdges, 'sheet', vector(colours.selected[1]));
}

/** Where the bay in hand is, in the world's metres, and how far from its middle it reaches: neighbours fade from there. 0: no fading. */
export function setSubject(materials: SceneMaterials, middle: Vector3, reach: number): void {
  for (const material of [materials.contextSolids, materials.contextEdges]) {
    set(material, 'subject', middle);
    set(material, 'reach', reach);
  }
}

/** What follows the view: the size of the sheet in px, and how much of the fine lines is left, 0 to 1. */
export function setView(materials: SceneMaterials, width: number, height: number, fineLeft: number): void {
  set(materials.halo, 'sheetSize', new Vector2(width, height));
  set(materials.fineEdges, 'fade', 1 - fineLeft);
  set(materials.selectedFineEdges, 'fade', 1 - fineLeft);
}

export function disposeMaterials(materials: SceneMaterials): void {
  for (const material of Object.values(materials)) material.dispose();
}

function setTones(material: ShaderMaterial, tones: readonly Rgb[]): void {
  set(material, 'tones', tones.map(vector));
}

function set(material: ShaderMaterial, name: string, value: unknown): void {
  const uniform = material.uniforms[name];
  if (!uniform) throw new Error(`the material has no ${name}`);
  uniform.value = value;
}
