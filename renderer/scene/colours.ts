import type { Paint } from './geometry/steelPart.ts';

/** A colour as three parts from 0 to 1, as screens take them (sRGB). */
export type Rgb = readonly [number, number, number];

/** Lit, facing, turned away. */
export type Tones = readonly [Rgb, Rgb, Rgb];

/** The inks and tones that the steel is drawn in, resolved from the theme. */
export interface SceneColours {
  readonly sheet: Rgb;
  readonly edge: Rgb;
  readonly context: Rgb;
  readonly accent: Rgb;
  readonly marker: Rgb;
  readonly selectedEdge: Rgb;
  readonly tones: Readonly<Record<Paint, Tones>>;
  readonly selected: Tones;
}

/** Where a colour of the style sheets is missing, as in a page without them. */
const MISSING = '#808080';

/** Reads the colours in force at an element from the theme's variables. */
export function sceneColours(element: Element): SceneColours {
  const style = getComputedStyle(element);
  const read = (name: string): Rgb => rgb(style.getPropertyValue(name).trim() || MISSING);
  const tones = (name: string): Tones => [read(`--${name}1`), read(`--${name}2`), read(`--${name}3`)];
  const gusset = read('--gu');
  return {
    sheet: read('--sheet'),
    edge: read('--edge'),
    context: read('--ctx'),
    accent: read('--accent'),
    marker: read('--marker'),
    selectedEdge: read('--onlight'),
    tones: {
      member: tones('st'),
      diagonal: tones('dg'),
      // A gusset has one tone in the theme; its turned faces borrow the member's.
      plate: [gusset, gusset, read('--st3')],
    },
    selected: tones('se'),
  };
}

/** Reads #rgb or #rrggbb; anything else is taken as mid grey. */
export function rgb(text: string): Rgb {
  const short = /^#([0-9a-f])([0-9a-f])([0-9a-f])$/i.exec(text);
  const hex = short
    ? `#${short
        .slice(1)
        .map((digit) => digit + digit)
        .join('')}`
    : text;
  const long = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(hex);
  if (!long) return [0.5, 0.5, 0.5];
  const part = (at: 1 | 2 | 3): number => Number.parseInt(long[at] ?? '80', 16) / 255;
  return [part(1), part(2), part(3)];
}
