import type { JSX } from 'react';
import { BOLT_GRADES, type EndConnection, type UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { SelectField } from '../../controls/SelectField.tsx';

interface EndFieldsProps {
  readonly ends: EndConnection;
  readonly units: UnitSystem;
  /** The usual gauge of the leg, mm, to begin with when it is set by hand. */
  readonly usualGauge: number;
  onChange(change: Partial<EndConnection>, what: string): string | null;
}

/** How the end of a diagonal is connected, and how far from the set-out point. */
export function EndFields({ ends, units, usualGauge, onChange }: EndFieldsProps): JSX.Element {
  return (
    <>
      <Segmented
        label="Connected"
        value={ends.kind}
        options={[
          { value: 'bolted', label: 'Bolted' },
          { value: 'welded', label: 'Welded' },
        ]}
        onChange={(kind) =>
          onChange(
            kind === 'welded' && ends.weldLength === 0 ? { kind, weldLength: FIRST_WELD } : { kind },
            'end connection',
          )
        }
      />
      {ends.kind === 'bolted' ? (
        <BoltFields ends={ends} units={units} usualGauge={usualGauge} onChange={onChange} />
      ) : (
        <LengthField
          label="Weld length"
          mm={ends.weldLength}
          units={units}
          most={2000}
          step={10}
          onChange={(weldLength) => onChange({ weldLength }, 'weld length')}
        />
      )}
      {ends.kind === 'welded' && (
        <LengthField
          label="Weld size"
          mm={ends.weldSize ?? 6}
          units={units}
          least={2}
          most={30}
          step={1}
          small
          onChange={(weldSize) => onChange({ weldSize }, 'weld size')}
        />
      )}
      <Segmented
        label="By"
        value={ends.legs}
        options={[
          { value: 'one', label: 'One leg' },
          { value: 'both', label: 'Both legs' },
        ]}
        onChange={(legs) => onChange({ legs }, 'connected legs')}
      />
      <LengthField
        label="Set-back"
        mm={ends.setBack}
        units={units}
        most={5000}
        step={10}
        onChange={(setBack) => onChange({ setBack }, 'set-back')}
      />
    </>
  );
}

/** mm, along each side of the leg, to begin with. */
const FIRST_WELD = 100;

function BoltFields({ ends, units, usualGauge, onChange }: EndFieldsProps): JSX.Element {
  return (
    <>
      <NumberField
        label="Bolts"
        value={ends.bolts}
        least={1}
        most={20}
        onChange={(bolts) => onChange({ bolts }, 'number of bolts')}
      />
      <SelectField
        label="Bolt size"
        value={String(ends.boltDiameter)}
        options={boltSizes(ends.boltDiameter, units).map((mm) => ({
          value: String(mm),
          label: boltName(mm, units),
        }))}
        onChange={(mm) => onChange({ boltDiameter: Number(mm) }, 'bolt size')}
      />
      <LengthField
        label="Pitch"
        mm={ends.pitch}
        units={units}
        least={10}
        most={1000}
        step={5}
        small
        onChange={(pitch) => onChange({ pitch }, 'pitch')}
      />
      <LengthField
        label="End distance"
        mm={ends.endDistance}
        units={units}
        least={5}
        most={1000}
        step={5}
        small
        onChange={(endDistance) => onChange({ endDistance }, 'end distance')}
      />
      <div className="recipe-checks">
        <CheckField
          label="Usual gauge for the leg"
          checked={ends.gauge === null}
          onChange={(usual) => onChange({ gauge: usual ? null : usualGauge }, 'gauge')}
        />
      </div>
      {ends.gauge !== null && (
        <LengthField
          label="Gauge"
          mm={ends.gauge}
          units={units}
          least={5}
          most={300}
          step={1}
          small
          onChange={(gauge) => onChange({ gauge }, 'gauge')}
        />
      )}
      <SelectField
        label="Rows along it"
        value={ends.rows === 2 ? (ends.staggered ? 'staggered' : 'two') : 'one'}
        options={[
          { value: 'one', label: 'one' },
          { value: 'two', label: 'two, side by side' },
          { value: 'staggered', label: 'two, staggered' },
        ]}
        onChange={(rows) =>
          onChange(
            rows === 'one'
              ? { rows: 1, staggered: false }
              : {
                  rows: 2,
                  staggered: rows === 'staggered',
                  rowSpacing: ends.rowSpacing ?? 3 * ends.boltDiameter,
                },
            'rows of bolts',
          )
        }
      />
      {ends.rows === 2 && (
        <LengthField
          label="Rows apart"
          mm={ends.rowSpacing ?? 3 * ends.boltDiameter}
          units={units}
          least={10}
          most={300}
          step={5}
          small
          onChange={(rowSpacing) => onChange({ rowSpacing }, 'distance of the rows')}
        />
      )}
      <SelectField
        label="Bolt grade"
        value={ends.boltGrade ?? 'usual'}
        options={[
          ...(ends.boltGrade === undefined ? [{ value: 'usual', label: 'usual' }] : []),
          ...BOLT_GRADES.map((grade) => ({ value: grade, label: grade })),
        ]}
        onChange={(grade) => {
          const boltGrade = BOLT_GRADES.find((known) => known === grade);
          if (boltGrade) onChange({ boltGrade }, 'bolt grade');
        }}
      />
      <div className="recipe-checks">
        <CheckField
          label="Threads in the plane of shear"
          checked={ends.threadsInShear ?? true}
          onChange={(threadsInShear) => onChange({ threadsInShear }, 'where the threads lie')}
        />
      </div>
    </>
  );
}

const METRIC_BOLTS = [12, 16, 20, 22, 24, 27, 30];
const US_BOLTS = [12.7, 15.875, 19.05, 22.225, 25.4, 28.575];

function boltSizes(present: number, units: UnitSystem): readonly number[] {
  const usual = units === 'us' ? US_BOLTS : METRIC_BOLTS;
  return usual.includes(present) ? usual : [...usual, present].sort((a, b) => a - b);
}

/** "M16", or 5/8". */
export function boltName(mm: number, units: UnitSystem): string {
  // A metric bolt keeps its name in either system.
  return units === 'us' && !METRIC_BOLTS.includes(mm)
    ? showLength(mm, units, 'small')
    : `M${Number(mm.toFixed(1))}`;
}

/** "2 × M16, one leg", "welded 120 mm". */
export function endText(ends: EndConnection, units: UnitSystem): string {
  const legs = ends.legs === 'one' ? 'one leg' : 'both legs';
  return ends.kind === 'bolted'
    ? `${ends.bolts} × ${boltName(ends.boltDiameter, units)}, ${legs}`
    : `welded ${showLength(ends.weldLength, units, 'tape')}, ${legs}`;
}
