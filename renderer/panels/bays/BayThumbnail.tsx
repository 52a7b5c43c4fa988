import type { JSX } from 'react';
import type { Pattern, Recipe, RecipeKind, RoofRecipe, WallRecipe } from '../../../core/project/model.ts';

const WIDTH = 46;
const HEIGHT = 36;

/** A bay's recipe as a few strokes: proportions and patterns, not to scale. */
export function BayThumbnail({ recipe }: { readonly recipe: Recipe }): JSX.Element {
  return (
    <svg className="bay-thumbnail" width={WIDTH} height={HEIGHT} aria-hidden="true">
      <Strokes recipe={recipe} />
    </svg>
  );
}

const SAMPLE_TIERS: WallRecipe['tiers'] = [
  { id: 't1', height: 1, pattern: 'crossed' },
  { id: 't2', height: 1, pattern: 'crossed' },
];

/** A sample of each kind, where there is no bay yet. */
export function BayKindThumbnail({ kind }: { readonly kind: RecipeKind }): JSX.Element {
  return (
    <svg className="bay-thumbnail" width={WIDTH} height={HEIGHT} aria-hidden="true">
      {kind === 'wall' && <WallStrokes tiers={SAMPLE_TIERS} />}
      {kind === 'roof' && <RoofStrokes panels={SAMPLE_TIERS} lines={[0.3, 0.7]} />}
      {kind === 'knee' && <KneeStrokes both />}
      {kind === 'free' && <FreeStrokes />}
    </svg>
  );
}

function Strokes({ recipe }: { readonly recipe: Recipe }): JSX.Element {
  switch (recipe.kind) {
    case 'wall':
      return <WallStrokes tiers={recipe.tiers} />;
    case 'roof':
      return <RoofStrokes panels={recipe.slopes.flatMap(({ panels }) => panels)} lines={linesOf(recipe)} />;
    case 'knee':
      return <KneeStrokes both={recipe.sides === 'both'} />;
    case 'free':
      return <FreeStrokes />;
    default:
      return recipe satisfies never;
  }
}

type Corner = readonly [number, number];

function WallStrokes({ tiers }: { readonly tiers: WallRecipe['tiers'] }): JSX.Element {
  const at = (x: number, y: number): Corner => [8 + 30 * x, 34 - 32 * y];
  return (
    <>
      <path d="M8 2v32M38 2v32" strokeWidth="1.6" />
      <TierStrokes tiers={tiers} at={at} />
    </>
  );
}

function RoofStrokes({
  panels,
  lines,
}: {
  readonly panels: WallRecipe['tiers'];
  readonly lines: readonly number[];
}): JSX.Element {
  const at = (x: number, y: number): Corner => [3 + 29 * x + 11 * y, 31 - 26 * y];
  return (
    <>
      <path d="M3 31 14 5M32 31 43 5" strokeWidth="1.6" />
      <path d="M3 31h29" />
      {lines.map((y) => (
        <path key={y} d={line(at(0, y), at(1, y))} strokeDasharray="2.5 1.8" />
      ))}
      <TierStrokes tiers={panels} at={at} />
    </>
  );
}

function TierStrokes({
  tiers,
  at,
}: {
  readonly tiers: WallRecipe['tiers'];
  at(x: number, y: number): Corner;
}): JSX.Element {
  const total = tiers.reduce((sum, { height }) => sum + height, 0);
  let below = 0;
  return (
    <>
      {tiers.map((tier, index) => {
        const from = below / total;
        below += tier.height;
        const to = below / total;
        return (
          // biome-ignore lint/suspicious/noArrayIndexKey: the slopes of a roof may use one id twice; order tells them apart.
          <g key={index}>
            <path d={line(at(0, to), at(1, to))} />
            <path d={patternPath(tier.pattern, (x, y) => at(x, from + (to - from) * y))} />
          </g>
        );
      })}
    </>
  );
}

function patternPath(pattern: Pattern, at: (x: number, y: number) => Corner): string {
  const rise = line(at(0, 0), at(1, 1));
  const fall = line(at(0, 1), at(1, 0));
  switch (pattern) {
    case 'crossed':
      return rise + fall;
    case 'rising':
      return rise;
    case 'falling':
      return fall;
    case 'peaked':
      return line(at(0, 0), at(0.5, 1)) + line(at(0.5, 1), at(1, 0));
    case 'vee':
      return line(at(0, 1), at(0.5, 0)) + line(at(0.5, 0), at(1, 1));
    case 'open':
      return '';
    default:
      return pattern satisfies never;
  }
}

function KneeStrokes({ both }: { readonly both: boolean }): JSX.Element {
  return (
    <>
      <path d="M3 8h40" strokeWidth="1.6" />
      <path d="M23 8v19" />
      <path d={both ? 'M10 8 23 27 36 8' : 'M23 27 36 8'} />
      <circle cx="23" cy="28" r="2.4" />
    </>
  );
}

function FreeStrokes(): JSX.Element {
  return (
    <>
      <path d="M6 30 18 6 40 12 34 31ZM6 30 40 12M18 6 34 31" />
      <path d="M6 30h.1M18 6h.1M40 12h.1M34 31h.1" strokeWidth="4" strokeLinecap="round" />
    </>
  );
}

const MOST_LINES = 5;

/** Where the purlins lie, as parts of the slopes laid end to end. */
function linesOf(recipe: RoofRecipe): readonly number[] {
  const lengths = recipe.slopes.map(({ panels }) => panels.reduce((sum, { height }) => sum + height, 0));
  const total = lengths.reduce((sum, length) => sum + length, 0);
  let before = 0;
  const found: number[] = [];
  recipe.slopes.forEach((slope, index) => {
    for (const { at } of slope.lines) found.push((before + at) / total);
    before += lengths[index] ?? 0;
  });
  // A small picture with many lines says less than one with none.
  return found.length > MOST_LINES ? [] : [...new Set(found)];
}

function line([x1, y1]: Corner, [x2, y2]: Corner): string {
  return `M${x1.toFixed(1)} ${y1.toFixed(1)}L${x2.toFixed(1)} ${y2.toFixed(1)}`;
}
