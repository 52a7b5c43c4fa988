import type { PracticeId } from '../../project/model.ts';
import { leastDistances } from '../holes.ts';
import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
import { strengthOf } from '../tension/aisc.ts';
import { partialFactors } from '../tension/en.ts';
import { resistance, Working } from '../working.ts';
import { boltStrength, clearDistances, shankArea, stressArea } from './fasteners.ts';

/** Bolts or welds of one end, as a first check: shear, bearing on the bar, the weld itself. What the gusset takes is not looked at. */
export function endResistances(question: TensionQuestion, end: ResistingEnd): readonly Resistance[] {
  return end.kind === 'bolted' ? [shear(question, end), bearing(question, end)] : [weld(question, end)];
}

interface Rule {
  readonly standard: string;
  readonly clause: string;
  readonly sure: boolean;
  /** N for the whole group, with its working. */
  readonly of: (question: TensionQuestion, end: ResistingEnd, working: Working) => number;
}

function made(
  rule: Rule,
  question: TensionQuestion,
  end: ResistingEnd,
  working: Working,
  kind: Resistance['kind'],
  title: string,
  note: string | null,
): Resistance {
  return resistance(
    {
      kind,
      title,
      against: 'either',
      end: end.end,
      resistance: rule.of(question, end, working),
      standard: rule.standard,
      clause: rule.clause,
      confidence: rule.sure ? 'from memory, sure' : 'from memory, verify',
      note,
    },
    working,
  );
}

function shear(question: TensionQuestion, end: ResistingEnd): Resistance {
  const note =
    end.bolts < 2
      ? 'One bolt holds this end: two at least are good practice (common practice, no source).'
      : null;
  return made(
    SHEAR[question.practice],
    question,
    end,
    new Working(),
    'bolt shear',
    'Bolts in single shear',
    note,
  );
}

function bearing(question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  const least = leastDistances(question.practice, end.boltDiameter, end.hole);
  const found = made(
    BEARING[question.practice],
    question,
    end,
    working,
    'bolt bearing',
    'Bolts bearing on the bar',
    null,
  );
  const told = new Working();
  const says = (what: string, mm: number): string => `${what} at least ${mm.toFixed(1)} mm (${least.clause})`;
  told.requires(
    says('end distance', least.end),
    end.endDistance >= least.end - 1e-9,
    `${end.endDistance} mm`,
  );
  told.requires(
    says('edge distance', least.edge),
    end.edgeDistance >= least.edge - 1e-9,
    `${end.edgeDistance.toFixed(1)} mm`,
  );
  if (end.bolts > end.rows)
    told.requires(says('pitch', least.pitch), end.pitch >= least.pitch - 1e-9, `${end.pitch} mm`);
  // A distance below the least is told, and the figure still stands.
  return {
    ...found,
    conditions: [...found.conditions, ...told.conditions],
    applies: told.conditions.every(({ met }) => met),
  };
}

function weld(question: TensionQuestion, end: ResistingEnd): Resistance {
  return made(
    WELD[question.practice],
    question,
    end,
    new Working(),
    'weld',
    'Two fillet welds along the leg',
    null,
  );
}

function boltArea(end: ResistingEnd, working: Working): number {
  return end.threadsInShear
    ? working.step('stress area', 'A_s', 'π/4 (d − 0.9382 p)²', stressArea(end.boltDiameter), 'area')
    : working.step('shank area', 'A_b', 'πd²/4', shankArea(end.boltDiameter), 'area');
}

const countOf = (end: ResistingEnd, working: Working): number =>
  working.given('bolts', 'n', end.bolts, 'count');
const strength = (end: ResistingEnd, working: Working): number =>
  working.given(`strength of ${end.boltGrade}`, 'f_ub', boltStrength(end.boltGrade), 'stress');

/** CSA 13.12.1.2 and the SANS rule it grew from. */
const canadian = (standard: string, sure: boolean): Rule => ({
  standard,
  clause: standard.startsWith('CSA') ? '13.12.1.2(c)' : '13.12.1.1',
  sure,
  of: (_, end, working) => {
    const n = countOf(end, working);
    const fu = strength(end, working);
    const A = working.step('shank area', 'A_b', 'πd²/4', shankArea(end.boltDiameter), 'area');
    const threads = end.threadsInShear ? 0.7 : 1;
    return working.step(
      'resistance',
      'V_r',
      `0.60 × 0.80 n A_b f_ub${end.threadsInShear ? ' × 0.70, threads in shear' : ''}`,
      0.6 * 0.8 * n * A * fu * threads,
      'force',
    );
  },
});

const SHEAR: Readonly<Record<PracticeId, Rule>> = {
  sans10162: canadian('SANS 10162-1', false),
  csaS16: canadian('CSA S16', true),
  aisc360: {
    standard: 'AISC 360',
    clause: 'J3.7 (J3.6 before 2022), Table J3.2',
    sure: true,
    of: ({ options }, end, working) => {
      const n = countOf(end, working);
      const Fu = strength(end, working);
      const F = working.step(
        'nominal shear stress',
        'F_nv',
        end.threadsInShear ? '0.45 F_u, threads in shear' : '0.563 F_u',
        (end.threadsInShear ? 0.45 : 0.563) * Fu,
        'stress',
      );
      const A = working.step('shank area', 'A_b', 'πd²/4', shankArea(end.boltDiameter), 'area');
      const Rn = working.step('nominal strength', 'R_n', 'n F_nv A_b', n * F * A, 'force');
      return strengthOf(Rn, 0.75, 2, options, working, 'R_n');
    },
  },
  en1993: {
    standard: 'EN 1993-1-8',
    clause: 'Table 3.4',
    sure: true,
    of: ({ options }, end, working) => {
      const n = countOf(end, working);
      const fub = strength(end, working);
      const weak = end.threadsInShear && end.boltGrade === '10.9';
      const alpha = working.given('factor', 'α_v', weak ? 0.5 : 0.6, 'factor');
      const A = boltArea(end, working);
      const gamma = working.given('partial factor', 'γ_M2', partialFactors(options).M2, 'factor');
      return working.step(
        'resistance',
        'n F_v,Rd',
        'n α_v f_ub A/γ_M2',
        (n * alpha * fub * A) / gamma,
        'force',
      );
    },
  },
  as4100: {
    standard: 'AS 4100',
    clause: '9.2.2.1 (9.3.2.1 in 1998)',
    sure: true,
    of: (_, end, working) => {
      const n = countOf(end, working);
      const fuf = strength(end, working);
      const A = end.threadsInShear
        ? working.step(
            'core area',
            'A_c',
            'π/4 (d − 1.2268 p)², taken as 0.95 A_s',
            0.95 * stressArea(end.boltDiameter),
            'area',
          )
        : working.step('shank area', 'A_o', 'πd²/4', shankArea(end.boltDiameter), 'area');
      return working.step('capacity', 'φV_f', '0.80 × 0.62 f_uf n A', 0.8 * 0.62 * fuf * n * A, 'force');
    },
  },
  is800: {
    standard: 'IS 800',
    clause: '10.3.3',
    sure: true,
    of: (_, end, working) => {
      const n = countOf(end, working);
      const fub = strength(end, working);
      const A = boltArea(end, working);
      return working.step(
        'resistance',
        'V_dsb',
        'n f_ub A/(√3 × 1.25)',
        (n * fub * A) / (Math.sqrt(3) * 1.25),
        'force',
      );
    },
  },
};

/** Bearing, each bolt by the room in front of it. */
const BEARING: Readonly<Record<PracticeId, Rule>> = {
  sans10162: {
    standard: 'SANS 10162-1',
    clause: '13.10(c)',
    sure: false,
    of: ({ section, steel }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const n = countOf(end, working);
      const bear = working.step(
        'bearing',
        'B_1',
        '3 × 0.67 t d n f_u',
        3 * 0.67 * t * end.boltDiameter * n * steel.fu,
        'force',
      );
      const torn = working.step(
        'towards the end',
        'B_2',
        '0.67 a t n f_u',
        0.67 * end.endDistance * t * n * steel.fu,
        'force',
      );
      return working.step('resistance', 'B_r', 'the lesser', Math.min(bear, torn), 'force');
    },
  },
  csaS16: {
    standard: 'CSA S16',
    clause: '13.12.1.2(a)',
    sure: true,
    of: ({ section, steel }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const n = countOf(end, working);
      return working.step(
        'resistance',
        'B_r',
        '3 × 0.80 n t d F_u',
        3 * 0.8 * n * t * end.boltDiameter * steel.fu,
        'force',
      );
    },
  },
  aisc360: {
    standard: 'AISC 360',
    clause: 'J3.11 (J3.10 before 2022)',
    sure: true,
    of: ({ section, steel, options }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const { end: atEnd, inner, atEnd: last, within } = clearDistances(end);
      const most = 2.4 * end.boltDiameter * t * steel.fu;
      const one = (clear: number): number => Math.min(1.2 * Math.max(0, clear) * t * steel.fu, most);
      const e = working.step('last bolt', 'r_e', '1.2 l_c t F_u ≤ 2.4 d t F_u', one(atEnd), 'force');
      const i =
        within > 0
          ? working.step('other bolts', 'r_i', '1.2 l_c t F_u ≤ 2.4 d t F_u', one(inner), 'force')
          : 0;
      const Rn = working.step('nominal strength', 'R_n', 'Σ r', last * e + within * i, 'force');
      return strengthOf(Rn, 0.75, 2, options, working, 'R_n');
    },
  },
  en1993: {
    standard: 'EN 1993-1-8',
    clause: 'Table 3.4, 3.7',
    sure: true,
    of: ({ section, steel, options }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const gamma = partialFactors(options).M2;
      const k1 = working.step(
        'across',
        'k_1',
        'min(2.8 e_2/d_0 − 1.7, 2.5)',
        Math.max(0, Math.min((2.8 * end.edgeDistance) / end.hole - 1.7, 2.5)),
        'factor',
      );
      const bolt = boltStrength(end.boltGrade) / steel.fu;
      const one = (alpha: number): number =>
        (k1 * Math.max(0, Math.min(alpha, bolt, 1)) * steel.fu * end.boltDiameter * t) / gamma;
      const e = working.step(
        'last bolt',
        'F_b,e',
        'k_1 α_b f_u d t/γ_M2, α_b = e_1/(3d_0)',
        one(end.endDistance / (3 * end.hole)),
        'force',
      );
      const { atEnd, within } = clearDistances(end);
      const i =
        within > 0
          ? working.step(
              'other bolts',
              'F_b,i',
              'α_b = p_1/(3d_0) − 1/4',
              one(end.pitch / (3 * end.hole) - 0.25),
              'force',
            )
          : e;
      // 3.7: the sum where the bolts are strong enough in shear for it, else the weakest times their number: the careful one is taken.
      return working.step(
        'resistance',
        'F_b,Rd',
        'n times the least',
        (atEnd + within) * Math.min(e, i),
        'force',
      );
    },
  },
  as4100: {
    standard: 'AS 4100',
    clause: '9.2.2.4 (9.3.2.4 in 1998)',
    sure: true,
    of: ({ section, steel }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const { atEnd, within } = clearDistances(end);
      const bear = 3.2 * end.boltDiameter * t * steel.fu;
      const e = working.step(
        'last bolt',
        'V_be',
        '3.2 d t f_u ≤ a_e t f_u',
        Math.min(bear, end.endDistance * t * steel.fu),
        'force',
      );
      const i =
        within > 0
          ? working.step(
              'other bolts',
              'V_bi',
              '3.2 d t f_u ≤ a_e t f_u, a_e = pitch − d_h/2',
              Math.min(bear, (end.pitch - end.hole / 2) * t * steel.fu),
              'force',
            )
          : 0;
      return working.step('capacity', 'φV_b', '0.90 Σ V', 0.9 * (atEnd * e + within * i), 'force');
    },
  },
  is800: {
    standard: 'IS 800',
    clause: '10.3.4',
    sure: true,
    of: ({ section, steel }, end, working) => {
      const t = working.given('thickness', 't', section.thickness, 'length');
      const n = countOf(end, working);
      const along = end.bolts > end.rows ? end.pitch / (3 * end.hole) - 0.25 : 1;
      const kb = working.step(
        'factor',
        'k_b',
        'min(e/(3d_0), p/(3d_0) − 0.25, f_ub/f_u, 1)',
        Math.max(
          0,
          Math.min(end.endDistance / (3 * end.hole), along, boltStrength(end.boltGrade) / steel.fu, 1),
        ),
        'factor',
      );
      return working.step(
        'resistance',
        'V_dpb',
        '2.5 k_b n d t f_u/1.25',
        (2.5 * kb * n * end.boltDiameter * t * steel.fu) / 1.25,
        'force',
      );
    },
  },
};

/** Throat of 0.707 of the leg, both welds. */
function throat(end: ResistingEnd, working: Working): number {
  working.given('leg of the weld', 's', end.weldSize, 'length');
  working.given('length of each weld', 'l', end.weldLength, 'length');
  return working.step(
    'area of the throats',
    'A_w',
    '2 × 0.707 s l',
    2 * 0.707 * end.weldSize * end.weldLength,
    'area',
  );
}

const canadianWeld = (standard: string): Rule => ({
  standard,
  clause: '13.13.2.2',
  sure: false,
  of: (_, end, working) =>
    working.step(
      'resistance',
      'V_r',
      '0.67 × 0.67 A_w X_u, X_u = 490',
      0.67 * 0.67 * throat(end, working) * 490,
      'force',
    ),
});

const WELD: Readonly<Record<PracticeId, Rule>> = {
  sans10162: canadianWeld('SANS 10162-1'),
  csaS16: canadianWeld('CSA S16'),
  aisc360: {
    standard: 'AISC 360',
    clause: 'J2.4, Table J2.5',
    sure: true,
    of: ({ options }, end, working) => {
      const Rn = working.step(
        'nominal strength',
        'R_n',
        '0.60 F_EXX A_w, F_EXX = 482',
        0.6 * 482 * throat(end, working),
        'force',
      );
      return strengthOf(Rn, 0.75, 2, options, working, 'R_n');
    },
  },
  en1993: {
    standard: 'EN 1993-1-8',
    clause: '4.5.3.3',
    sure: true,
    of: ({ steel, options }, end, working) => {
      const beta = working.given(
        'correlation factor',
        'β_w',
        steel.fu >= 469 ? 0.9 : steel.fu >= 405 ? 0.85 : 0.8,
        'factor',
      );
      const gamma = partialFactors(options).M2;
      return working.step(
        'resistance',
        'F_w,Rd',
        'f_u A_w/(√3 β_w γ_M2)',
        (steel.fu * throat(end, working)) / (Math.sqrt(3) * beta * gamma),
        'force',
      );
    },
  },
  as4100: {
    standard: 'AS 4100',
    clause: '9.6.3.10 (9.7.3.10 in 1998)',
    sure: true,
    of: (_, end, working) =>
      working.step(
        'capacity',
        'φV_w',
        '0.80 × 0.6 f_uw A_w, f_uw = 490, category SP',
        0.8 * 0.6 * 490 * throat(end, working),
        'force',
      ),
  },
  is800: {
    standard: 'IS 800',
    clause: '10.5.7.1.1',
    sure: true,
    of: ({ steel }, end, working) =>
      working.step(
        'resistance',
        'P_dw',
        'f_u A_w/(√3 × 1.25)',
        (Math.min(steel.fu, 410) * throat(end, working)) / (Math.sqrt(3) * 1.25),
        'force',
      ),
  },
};
