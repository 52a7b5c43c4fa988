import type { BowingInput } from '../bowing/bowings.ts';
import { type InServiceReading, inServiceSlenderness } from '../bowing/exactSlenderness.ts';
import type { Catalogues } from '../catalogue/model.ts';
import { stockOf } from '../catalogue/stock.ts';
import type { Judged } from '../findings/subject.ts';
import { forcesOf } from '../forces/forces.ts';
import type { Forces } from '../forces/model.ts';
import { layOut } from '../layout/layOut.ts';
import type { AngleBar, Bar, BarId, Layout } from '../layout/model.ts';
import { limitInForce } from '../practice/limit.ts';
import type { Practice, Verdict } from '../practice/model.ts';
import { practiceFor } from '../practice/practices.ts';
import { endFixityOf } from '../project/endFixity.ts';
import type { Project } from '../project/model.ts';
import {
  type RestraintContext,
  restraintContext,
  restraintOf,
  turningWaysOf,
} from '../restraint/restraint.ts';

/** A project set out and judged by the marks: what all that is worked out bay by bay begins from. */
export interface Prepared {
  readonly project: Project;
  readonly practice: Practice;
  readonly layout: Layout;
  readonly forces: Forces | null;
  readonly byMarks: ReadonlyMap<BarId, Judged>;
  readonly bowingInput: BowingInput;
}

export function prepared(project: Project, catalogues: Catalogues): Prepared {
  const practice = practiceFor(project.settings.practice);
  const stock = stockOf(project.settings.catalogue, project.ownStock, catalogues);
  const layout = layOut(project, stock);
  const context = restraintContext(layout);
  const forces = project.actions ? forcesOf(project.actions, layout, practice) : null;
  const byMarks = judgedDiagonals(project, practice, layout, context);
  const restraints = new Map(
    [...byMarks].flatMap(([id, { restraint }]) => (restraint ? [[id, restraint] as const] : [])),
  );
  const ends = endFixityOf(project.settings);
  const bowingInput = { layout, context, restraints, steel: practice.steel, ends, forces };
  return { project, practice, layout, forces, byMarks, bowingInput };
}

function judgedDiagonals(
  project: Project,
  practice: Practice,
  layout: Layout,
  context: RestraintContext,
): ReadonlyMap<BarId, Judged> {
  const judged = new Map<BarId, Judged>();
  for (const bay of layout.bays)
    for (const id of bay.diagonals) {
      const bar = layout.bars.get(id);
      if (bar) addJudged(judged, bar, project, practice, context);
    }
  return judged;
}

function addJudged(
  judged: Map<BarId, Judged>,
  bar: Bar,
  project: Project,
  practice: Practice,
  context: RestraintContext,
): void {
  const { angle } = bar;
  if (!angle) return;
  const limit = limitInForce(practice, project.settings, angle.spec.countedOn);
  const steel = angle.cut.total > 0;
  const { lengthBasis } = project.settings;
  const restraint = steel ? restraintOf(context, bar, lengthBasis) : null;
  const turns = steel && !restraint ? turningWaysOf(context, bar, lengthBasis) : null;
  const verdict = (asks: Practice['asks'], reading: InServiceReading): Verdict => ({
    ...reading,
    limit: limit.limit,
    ok: reading.slenderness <= limit.limit,
    asked: practice.asks === asks && !isExempt(practice, angle),
  });
  const piece = angle.cut.pieces.reduce((most, each) => Math.max(most, each.to - each.from), 0);
  const least = angle.stock?.properties.rv ?? null;
  judged.set(bar.id, {
    bar,
    angle,
    restraint,
    turns,
    limit,
    handling:
      (restraint || turns) && least
        ? verdict('handling', { slenderness: piece / least, length: piece, radius: least, bound: null })
        : null,
    inService:
      restraint && angle.stock
        ? verdict('inService', inServiceSlenderness(angle.stock.properties, restraint))
        : null,
    bowing: null,
    checks: null,
  });
}

/** The standard's limit does not speak of such a shape, as AISC 360 leaves rods out. */
export function isExempt({ exempt }: Practice, { stock, spec }: AngleBar): boolean {
  const kind = stock?.outline.shape?.kind;
  return kind !== undefined && spec.countedOn === 'tension' && exempt.includes(kind);
}
