/** What resistances are asked, put together from a bar as it is laid out. */

import type { StockAngle } from '../catalogue/model.ts';
import type { ResistanceSettings } from '../project/model.ts';
import type {
  CompressionQuestion,
  Plate,
  ResistanceOptions,
  ResistingSection,
  TensionQuestion,
} from '../resistance/model.ts';
import { resistingEnd } from '../resistance/resistingEnd.ts';
import { angleProperties } from '../section/angleProperties.ts';
import type { BarShape } from '../section/barShape.ts';
import type { CheckInput } from './input.ts';
import type { PlacedSection } from './placedSection.ts';

export function tensionQuestion(
  { project, practice }: CheckInput,
  { angle, stock, steel }: Pick<PlacedSection, 'angle' | 'stock' | 'steel'>,
): TensionQuestion {
  const section = resistingSection(stock, angle.spec.legInPlane);
  const end = (name: 'i' | 'j') =>
    resistingEnd(name, angle.ends[name], {
      practice: practice.id,
      leg: section.connectedLeg,
      gauge: angle.placement.gauge,
      gusset: angle.spec.gusset,
    });
  return {
    practice: practice.id,
    section,
    steel,
    ends: [end('i'), end('j')],
    options: resistanceOptions(project.settings.resistance ?? {}),
  };
}

export function resistingSection(stock: StockAngle, legInPlane: 'longer' | 'shorter'): ResistingSection {
  if (stock.outline.shape) return resistingShape(stock, stock.outline.shape);
  const { outline, properties } = stock;
  const longer = legInPlane === 'longer';
  return {
    designation: stock.designation,
    shape: 'angle',
    properties,
    connectedLeg: longer ? outline.longLeg : outline.shortLeg,
    outstandingLeg: longer ? outline.shortLeg : outline.longLeg,
    thickness: outline.thickness,
    rootRadius: outline.rootRadius,
    // The outer face of the leg on the gusset is the heel's.
    offCentroid: longer ? properties.centroidX : properties.centroidY,
  };
}

/** Of a pair, legs and face are those of one angle; of the others the part against the gusset is the leg that is connected. */
function resistingShape({ designation, outline, properties }: StockAngle, shape: BarShape): ResistingSection {
  const common = { designation, shape: shape.kind, properties, rootRadius: 0 } as const;
  if (shape.kind === 'angles back to back' || shape.kind === 'starred angles') {
    const { angle } = shape;
    return {
      ...common,
      connectedLeg: angle.longLeg,
      outstandingLeg: angle.shortLeg,
      thickness: angle.thickness,
      rootRadius: angle.rootRadius,
      offCentroid: angleProperties(angle).centroidX,
    };
  }
  return {
    ...common,
    connectedLeg: outline.longLeg,
    outstandingLeg: outline.shortLeg,
    thickness: outline.thickness,
    offCentroid: properties.centroidX,
    ...(shape.kind === 'tee' || shape.kind === 'channel' ? { plates: platesOf(shape) } : {}),
  };
}

function platesOf(shape: Extract<BarShape, { readonly kind: 'tee' | 'channel' }>): readonly Plate[] {
  const { depth, width, web, flange } = shape;
  return shape.kind === 'tee'
    ? [
        { name: 'flange', width: width / 2, thickness: flange },
        { name: 'stem', width: depth, thickness: web },
      ]
    : [
        { name: 'flange', width, thickness: flange },
        { name: 'web', width: depth - 2 * flange, thickness: web },
      ];
}

export function resistanceOptions(chosen: ResistanceSettings): ResistanceOptions {
  return {
    method: chosen.method ?? 'LRFD',
    partialFactors: {
      gammaM0: chosen.gammaM0 ?? null,
      gammaM1: chosen.gammaM1 ?? null,
      gammaM2: chosen.gammaM2 ?? null,
    },
    blockTearing: chosen.blockTearing ?? 'off the middle',
    punchedHoles: chosen.punchedHoles ?? false,
    gussetFixity: chosen.gussetFixity ?? 'hinged',
  };
}

export function compressionQuestion(
  question: TensionQuestion,
  { bar, restraint, criticalLoad }: Pick<PlacedSection, 'bar' | 'restraint' | 'criticalLoad'>,
  { project }: CheckInput,
): CompressionQuestion {
  const { x, y, u, v } = restraint.lanes;
  const inner = restraint.stations.slice(1, -1);
  return {
    ...question,
    length: bar.length,
    unbraced: { x: x.unbraced, y: y.unbraced, u: u.unbraced, v: v.unbraced },
    lengthsByHand: [x, y, u, v].flatMap(({ axis, override }) =>
      override ? [{ axis, reason: override.reason }] : [],
    ),
    twistLength: longestBetween([
      restraint.stations[0]?.at ?? 0,
      ...inner.filter(({ twistHeld }) => twistHeld).map(({ at }) => at),
      restraint.stations.at(-1)?.at ?? bar.length,
    ]),
    criticalLoad,
    system: 'planar',
    loadedAcross: (project.actions?.cases ?? []).some(({ loads }) =>
      loads.some((load) => load.kind === 'line' && load.bar === bar.id),
    ),
    joinedBetween: inner.some(({ held }) => held.ways > 0),
  };
}

const longestBetween = (places: readonly number[]): number =>
  places.slice(1).reduce((most, at, k) => Math.max(most, at - (places[k] ?? 0)), 0);
