import type { UnitSystem } from '../project/model.ts';
import type { Governing, Lane, LaneCut, Piece, Restraint, Station } from '../restraint/model.ts';
import { AXES } from '../section/model.ts';
import { grouped } from '../units/figures.ts';
import { showLength, showRadius, showSlenderness } from '../units/quantity.ts';
import { type NumberedClaim, numberOf } from './claimNumbers.ts';
import { nearnessFill } from './hatches.ts';
import { type Markup, markup } from './markup.ts';

const WIDTH = 702;
const START = 78;
const END = 690;
const HEAD = 34;
const STEP = 28;
const DEEP = 19;
/** Pieces narrower than this show only their slenderness, or nothing at all, px. */
const ROOM_FOR_BOTH = 104;
const ROOM_FOR_ONE = 44;

/** One strip an axis, cut where a station stops that motion; the governing piece outlined; numbers point to the holds table. */
export function laneStrips(
  restraint: Restraint,
  limit: number,
  claims: readonly NumberedClaim[],
  units: UnitSystem,
): Markup {
  const { governing, stations } = restraint;
  const [first, last] = [stations[0]?.at ?? 0, stations.at(-1)?.at ?? 1];
  const along = (at: number): number => START + ((END - START) * (at - first)) / (last - first);
  const ownStrip = governing.axis === 'free' || governing.basis === 'mixed bound';
  const height = HEAD + STEP * (AXES.length + (ownStrip ? 1 : 0)) + 4;
  const strips = AXES.map((axis, index) => {
    const top = HEAD + STEP * index;
    const governs = !ownStrip && governing.axis === axis ? governing : null;
    return strip(restraint.lanes[axis], top, along, limit, governs, claims, units);
  });
  const extra = ownStrip ? governingStrip(governing, HEAD + STEP * AXES.length, along, limit, units) : null;
  return markup`<svg class="lanes" width="${WIDTH}" height="${height}" viewBox="0 0 ${WIDTH} ${height}" role="img" aria-label="Lanes">${stationRow(stations, along, units)}${strips}${extra}</svg>`;
}

function stationRow(stations: readonly Station[], along: (at: number) => number, units: UnitSystem): Markup {
  const last = stations.length - 1;
  return markup`<text x="0" y="26" class="small">axis, r ${units === 'us' ? 'in' : 'mm'}</text>${stations.map(
    ({ label, at }, index) => {
      const anchor = index === 0 ? 'start' : index === last ? 'end' : 'middle';
      return markup`<text class="strong" x="${along(at)}" y="12" text-anchor="${anchor}">${label}</text><text class="small" x="${along(at)}" y="26" text-anchor="${anchor}">${showLength(at, units, 'spoken')}</text>`;
    },
  )}`;
}

function strip(
  lane: Lane,
  top: number,
  along: (at: number) => number,
  limit: number,
  governs: Governing | null,
  claims: readonly NumberedClaim[],
  units: UnitSystem,
): Markup {
  const tags = lane.cuts.map(({ at }) => along(at));
  const pieces = lane.pieces.map((piece) => pieceBox(piece, lane, top, along, tags, limit, units));
  const cuts = lane.cuts.map((cut) => cutMark(cut, top, along, claims));
  const override =
    lane.override === null
      ? null
      : note(
          (START + END) / 2,
          top,
          `set by hand: ${showLength(lane.unbraced, units, 'spoken')}, L/r ${showSlenderness(lane.slenderness, limit)}`,
        );
  return markup`<text x="0" y="${top + 15}" class="axis">${lane.axis}</text><text x="20" y="${top + 14}">${showRadius(lane.radius, units, 'bare')}</text>${pieces}${ends(top, lane)}${cuts}${override}${governs && outline(governs, top, along)}`;
}

function pieceBox(
  { from, to, counts }: Piece,
  lane: Lane,
  top: number,
  along: (at: number) => number,
  tags: readonly number[],
  limit: number,
  units: UnitSystem,
): Markup {
  const [left, right] = [along(from), along(to)];
  const slenderness = counts / lane.radius;
  const clear = widestGap(left, right, tags);
  return markup`<rect x="${left}" y="${top}" width="${right - left}" height="${DEEP}" fill="url(#${nearnessFill(slenderness / limit)})" stroke="#000" stroke-width=".8"/>${pieceFigures(clear, top, showLength(counts, units, 'spoken'), showSlenderness(slenderness, limit))}`;
}

/** Length and slenderness, or the slenderness alone, or nothing, as there is room. */
function pieceFigures([left, right]: Gap, top: number, length: string, slenderness: string): Markup | null {
  const wide = right - left;
  const half =
    wide >= ROOM_FOR_BOTH ? Math.min(wide / 2 - 9, 12 + 3.2 * (length.length + slenderness.length)) : 15;
  if (wide < ROOM_FOR_ONE) return null;
  const middle = (left + right) / 2;
  const text =
    wide >= ROOM_FOR_BOTH
      ? markup`${length}<tspan dx="8" class="strong">${slenderness}</tspan>`
      : markup`<tspan class="strong">${slenderness}</tspan>`;
  return markup`<rect x="${middle - half}" y="${top + 2}" width="${2 * half}" height="${DEEP - 4}" fill="#fff"/><text x="${middle}" y="${top + 14}" text-anchor="middle">${text}</text>`;
}

type Gap = readonly [number, number];

/** The widest part of a piece that no number of a hold stands in; the middle one of equals. */
function widestGap(left: number, right: number, tags: readonly number[]): Gap {
  const stops = [left, ...tags.filter((tag) => tag > left + 1 && tag < right - 1), right];
  const gaps = stops.slice(1).map((stop, index): Gap => [stops[index] ?? left, stop]);
  const widest = Math.max(...gaps.map(([from, to]) => to - from));
  const equal = gaps.filter(([from, to]) => to - from > widest - 1);
  return equal[Math.floor(equal.length / 2)] ?? [left, right];
}

/** A full tick at an end that holds this motion, a dashed one at an end that does not. */
function ends(top: number, { endsStop: [first, last] }: Lane): Markup {
  const tick = (x: number, stops: boolean): Markup =>
    markup`<path class="${stops ? 'stop' : 'nostop'}" d="M${x} ${top - 2.5}v${DEEP + 5}"/>`;
  return markup`${tick(START, first)}${tick(END, last)}`;
}

/** A full tick where the station stops the motion; a dashed one where it was claimed to and does not. */
function cutMark(
  { at, station, stops, claim }: LaneCut,
  top: number,
  along: (at: number) => number,
  claims: readonly NumberedClaim[],
): Markup | null {
  const x = along(at);
  const number = claim && numberOf(claims, station, claim);
  const tag =
    number === null
      ? null
      : markup`<circle class="tag" cx="${x}" cy="${top + DEEP / 2}" r="7"/><text x="${x}" y="${top + DEEP / 2 + 4}" text-anchor="middle" class="tagtext">${String(number)}</text>`;
  if (stops)
    return markup`<path d="M${x} ${top - 3}v${DEEP + 6}" stroke="#fff" stroke-width="7"/><path class="stop" d="M${x} ${top - 3}v${DEEP + 6}"/>${tag}`;
  return markup`<path class="nostop" d="M${x} ${top - 2}v${DEEP + 4}"/>${tag}`;
}

function outline({ from, to }: Governing, top: number, along: (at: number) => number): Markup {
  return markup`<rect x="${along(from)}" y="${top}" width="${along(to) - along(from)}" height="${DEEP}" fill="none" stroke="#000" stroke-width="2.8"/>`;
}

/** A bow that is none of the four lanes has a strip of its own, over the length that it takes. */
function governingStrip(
  governing: Governing,
  top: number,
  along: (at: number) => number,
  limit: number,
  units: UnitSystem,
): Markup {
  const { from, to, slenderness, radius, angle, axis } = governing;
  const [left, right] = [along(from), along(to)];
  const isBound = governing.basis === 'mixed bound';
  const name = axis === 'free' ? `${grouped(angle ?? 0, 0)}°` : axis;
  const kind = isBound ? `safe bound for mixed holds, about ${name}` : 'free direction';
  const words = `${kind}, ${showLength(governing.length, units, 'spoken')}`;
  const half = 30 + 3.1 * words.length;
  const middle = (left + right) / 2;
  return markup`<text x="0" y="${top + 15}" class="axis">${isBound ? '' : name}</text><text x="${isBound ? 20 : 14 + 6 * name.length}" y="${top + 14}">${showRadius(radius, units, 'bare')}</text><rect x="${left}" y="${top}" width="${right - left}" height="${DEEP}" fill="url(#${nearnessFill(slenderness / limit)})" stroke="#000" stroke-width="2.8"/><rect x="${middle - half}" y="${top + 2}" width="${2 * half}" height="${DEEP - 4}" fill="#fff"/><text x="${middle}" y="${top + 14}" text-anchor="middle">${words}<tspan dx="8" class="strong">${showSlenderness(slenderness, limit)}</tspan></text>`;
}

function note(middle: number, top: number, words: string): Markup {
  const half = 8 + 3.1 * words.length;
  return markup`<rect x="${middle - half}" y="${top + 1.5}" width="${2 * half}" height="${DEEP - 3}" fill="#fff" stroke="#000" stroke-dasharray="3 2"/><text x="${middle}" y="${top + 14}" text-anchor="middle">${words}</text>`;
}
