import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import { forceIn, showForce } from '../../../core/units/loads.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { useSize } from '../../controls/useSize.ts';
import { niceStep } from '../shortlist/chart.ts';

export interface PlotLine {
  readonly look: 'main' | 'rule';
  readonly label: string;
  /** Loads N over whatever runs to the right. */
  readonly points: readonly { readonly at: number; readonly N: number }[];
}

export interface PlotLevel {
  readonly N: number;
  /** As slenderness: "300". */
  readonly label: string;
  readonly look: 'limit' | 'marks';
}

interface LoadPlotProps {
  readonly name: string;
  readonly from: number;
  readonly to: number;
  readonly ticks: readonly { readonly at: number; readonly label: string }[];
  /** Under the ticks: at the left, the middle and the right. */
  readonly words: readonly [string, string, string];
  readonly lines: readonly PlotLine[];
  readonly levels: readonly PlotLevel[];
  readonly present: { readonly at: number; readonly N: number; readonly says: string };
  readonly units: UnitSystem;
}

const MARGIN = { left: 30, right: 30, top: 17, bottom: 31 };

/** A critical load against something that runs to the right, with the state of things marked and slendernesses on the right edge. */
export function LoadPlot(props: LoadPlotProps): JSX.Element {
  const [ref, size] = useSize<HTMLDivElement>();
  return (
    <div ref={ref} className="load-plot">
      {size !== null && size.width > 120 && size.height > 80 && (
        <Sheet {...props} width={size.width} height={size.height} />
      )}
    </div>
  );
}

function Sheet({
  name,
  from,
  to,
  ticks,
  words,
  lines,
  levels,
  present,
  units,
  width,
  height,
}: LoadPlotProps & { readonly width: number; readonly height: number }): JSX.Element {
  const left = MARGIN.left;
  const right = width - MARGIN.right;
  const top = MARGIN.top;
  const bottom = height - MARGIN.bottom;
  const most = Math.max(...lines.flatMap(({ points }) => points.map(({ N }) => N)), present.N);
  const step = niceStep((forceIn(most, units) * 1.08) / 3);
  const high = Math.ceil((forceIn(most, units) * 1.02) / step) * step;
  const x = (at: number): number => left + ((at - from) / (to - from)) * (right - left);
  const y = (N: number): number => bottom - (forceIn(N, units) / high) * (bottom - top);
  const path = (points: PlotLine['points']): string =>
    points.map(({ at, N }, k) => `${k === 0 ? 'M' : 'L'}${x(at).toFixed(1)} ${y(N).toFixed(1)}`).join('');
  const limit = levels.find(({ look }) => look === 'limit');
  const loads = Array.from({ length: Math.round(high / step) + 1 }, (_, k) => k * step);
  const at = Math.min(to, Math.max(from, present.at));
  const end = x(at) > (left + right) / 2 ? 'end' : 'start';
  return (
    <svg width={width} height={height} role="img" aria-label={`${name}. ${present.says}`}>
      {limit !== undefined && y(limit.N) < bottom && (
        <rect
          x={left}
          y={Math.max(top, y(limit.N))}
          width={right - left}
          height={bottom - Math.max(top, y(limit.N))}
          fill="url(#hatch-ground)"
        />
      )}
      {loads.map((load) => (
        <g key={load}>
          <path className="chart-grid" d={`M${left} ${bottom - (load / high) * (bottom - top)}H${right}`} />
          <text
            className="chart-tick"
            x={left - 5}
            y={bottom - (load / high) * (bottom - top) + 4}
            textAnchor="end"
          >
            {Number(load.toPrecision(3))}
          </text>
        </g>
      ))}
      <text className="chart-tick" x={left - 5} y={9} textAnchor="end">
        {unitNames(units).force}
      </text>
      <text className="chart-tick" x={width - 1} y={9} textAnchor="end">
        as L/r
      </text>
      {ticks.map((tick) => (
        <g key={tick.at}>
          <path className="chart-limit-tick" d={`M${x(tick.at)} ${bottom}v4`} />
          <text className="chart-tick" x={x(tick.at)} y={bottom + 14} textAnchor="middle">
            {tick.label}
          </text>
        </g>
      ))}
      {levels
        .filter(({ N }) => y(N) >= top - 1)
        .map((level) => (
          <g key={level.look}>
            <path className={`plot-level ${level.look}`} d={`M${left} ${y(level.N)}H${right}`} />
            <text
              className={`chart-tick ${level.look === 'limit' ? 'chart-strong' : ''}`}
              x={right + 4}
              y={levelWordsAt(level, levels, y)}
            >
              {level.label}
            </text>
          </g>
        ))}
      {lines.map((line) => (
        <path key={line.look} className={`plot-line ${line.look}`} d={path(line.points)} />
      ))}
      <path className="plot-present" d={`M${x(at)} ${y(present.N)}V${bottom}`} />
      <circle className="plot-present-dot" cx={x(at)} cy={y(present.N)} r="4.5" />
      <circle className="plot-present-pip" cx={x(at)} cy={y(present.N)} r="1.6" />
      <text
        className="chart-strong halo"
        x={x(at) + (end === 'end' ? -3 : 3)}
        y={Math.max(top - 5, y(present.N) - 9)}
        textAnchor={end}
      >
        {showForce(present.N, units)}
      </text>
      {words.map((text, k) => (
        <text
          key={text}
          className={k === 1 ? 'chart-tick chart-strong' : 'chart-tick'}
          x={k === 0 ? left : k === 1 ? (left + right) / 2 : right}
          y={bottom + 27}
          textAnchor={k === 0 ? 'start' : k === 1 ? 'middle' : 'end'}
        >
          {text}
        </text>
      ))}
    </svg>
  );
}

/** Two numbers that would lie on each other step apart. */
function levelWordsAt(level: PlotLevel, all: readonly PlotLevel[], y: (N: number) => number): number {
  const other = all.find((each) => each !== level);
  const at = y(level.N);
  if (other === undefined || Math.abs(y(other.N) - at) > 12) return at + 4;
  return at + (level.N > other.N ? -2 : 10);
}
