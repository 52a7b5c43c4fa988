/** Usual gauge lines (back marks): the distance from the heel to a single line of bolts, mm. */

/** Whose habits: metric bolts in metric legs, or the US workable gages. */
export type GaugeHabit = 'metric' | 'us';

export interface UsualGauge {
  /** Heel to the line of bolts, mm. */
  readonly gauge: number;
  /** Largest usual bolt on that line, diameter in mm; 0 where none fits. */
  readonly maxBolt: number;
  /** Where the figure is from and how sure it is. */
  readonly source: string;
}

interface GaugeRow {
  readonly leg: number;
  readonly gauge: number;
  /** Null: the tables read give none. */
  readonly maxBolt: number | null;
  readonly source: string;
}

const INCH = 25.4;
const METRIC_HABIT = 'usual metric back mark, from memory, verify';
const HANDBOOK = 'usual gauge of the Canadian handbook, read in a source';
const WORKABLE = 'US workable gage, from memory, sure';

/** Legs of 125 mm and more take two lines in metric practice; one line there follows the Canadian table. */
const METRIC: readonly GaugeRow[] = [
  { leg: 25.4, gauge: 15.9, maxBolt: null, source: WORKABLE },
  { leg: 31.75, gauge: 19.05, maxBolt: null, source: WORKABLE },
  { leg: 38.1, gauge: 22.2, maxBolt: null, source: WORKABLE },
  { leg: 45, gauge: 25, maxBolt: 12, source: METRIC_HABIT },
  // Metric practice names no largest bolt for 50 and 55; the Canadian table has the same gauge for 50, with M16.
  { leg: 50, gauge: 28, maxBolt: 16, source: `${METRIC_HABIT}; bolt: ${HANDBOOK}` },
  { leg: 55, gauge: 30, maxBolt: 16, source: `${METRIC_HABIT}; bolt as for 50` },
  { leg: 60, gauge: 35, maxBolt: 16, source: METRIC_HABIT },
  { leg: 65, gauge: 35, maxBolt: 20, source: METRIC_HABIT },
  { leg: 70, gauge: 40, maxBolt: 20, source: METRIC_HABIT },
  { leg: 75, gauge: 45, maxBolt: 20, source: METRIC_HABIT },
  { leg: 80, gauge: 45, maxBolt: 20, source: METRIC_HABIT },
  { leg: 90, gauge: 50, maxBolt: 24, source: METRIC_HABIT },
  { leg: 100, gauge: 55, maxBolt: 24, source: METRIC_HABIT },
  { leg: 125, gauge: 80, maxBolt: 30, source: HANDBOOK },
  { leg: 150, gauge: 90, maxBolt: 36, source: HANDBOOK },
  { leg: 200, gauge: 115, maxBolt: 36, source: HANDBOOK },
];

const US: readonly GaugeRow[] = (
  [
    [1, 0.625],
    [1.25, 0.75],
    [1.5, 0.875],
    [1.75, 1],
    [2, 1.125],
    [2.5, 1.375],
    [3, 1.75],
    [3.5, 2],
    [4, 2.5],
    [5, 3],
    [6, 3.5],
    [7, 4],
    [8, 4.5],
  ] as const
).map(([leg, gauge]) => ({ leg: leg * INCH, gauge: gauge * INCH, maxBolt: null, source: WORKABLE }));

/** Bolt diameters in stock, mm; the US ones are 3/8 in to 1 1/4 in. */
const BOLTS: Readonly<Record<GaugeHabit, readonly number[]>> = {
  metric: [8, 10, 12, 16, 20, 24, 27, 30, 36],
  us: [0.375, 0.5, 0.625, 0.75, 0.875, 1, 1.125, 1.25].map((d) => d * INCH),
};

/** Edge distance over bolt diameter taken where a table names no largest bolt (common practice: about 1.25 for a rolled edge). */
const EDGE_PER_BOLT = 1.25;

/**
 * The usual gauge of a leg and the largest bolt on it. Between listed legs the gauge is interpolated (to a whole mm in metric habit)
 * and the bolt is that of the smaller leg; outside the list the nearest leg's proportions are kept.
 *
 * @param leg mm, above zero
 */
export function usualGauge(leg: number, habit: GaugeHabit = 'metric'): UsualGauge {
  const rows = habit === 'us' ? US : METRIC;
  // A tenth of a millimetre forgives legs that were converted from inches.
  const listed = rows.find((row) => Math.abs(row.leg - leg) < 0.1);
  if (listed) return finished(listed.gauge, leg, listed.maxBolt, listed.source, habit);
  const below = rows.findLast((row) => row.leg < leg);
  const above = rows.find((row) => row.leg > leg);
  const round = (gauge: number): number => (habit === 'metric' ? Math.round(gauge) : gauge);
  if (below && above) {
    const part = (leg - below.leg) / (above.leg - below.leg);
    const gauge = round(below.gauge + part * (above.gauge - below.gauge));
    const source = below.source === above.source ? below.source : `${below.source}; ${above.source}`;
    return finished(gauge, leg, below.maxBolt, `between listed legs: ${source}`, habit);
  }
  const nearest = below ?? above;
  if (!nearest) throw new Error('the table of gauges is empty');
  const gauge = round((leg * nearest.gauge) / nearest.leg);
  return finished(
    gauge,
    leg,
    below ? nearest.maxBolt : null,
    `in proportion, beyond the listed legs: ${nearest.source}`,
    habit,
  );
}

function finished(
  gauge: number,
  leg: number,
  maxBolt: number | null,
  source: string,
  habit: GaugeHabit,
): UsualGauge {
  if (maxBolt !== null) return { gauge, maxBolt, source };
  const edge = leg - gauge;
  const sizes = BOLTS[habit];
  const largest = sizes.findLast((d) => d * EDGE_PER_BOLT <= edge) ?? 0;
  return {
    gauge,
    maxBolt: largest,
    source: `${source}; largest bolt from an edge distance of ${EDGE_PER_BOLT} diameters`,
  };
}
