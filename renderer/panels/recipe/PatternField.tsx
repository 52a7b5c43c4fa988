import type { JSX } from 'react';
import { PATTERNS, type Pattern } from '../../../core/project/model.ts';
import { Segmented } from '../../controls/Segmented.tsx';
import { PATTERN_WORDS, PatternGlyph } from '../../glyphs/PatternGlyph.tsx';

interface PatternFieldProps {
  readonly label: string;
  /** Null where the tiers differ. */
  readonly pattern: Pattern | null;
  readonly bare?: boolean;
  onChange(pattern: Pattern): void;
}

export function PatternField({ label, pattern, bare = false, onChange }: PatternFieldProps): JSX.Element {
  return (
    <Segmented
      label={label}
      bare={bare}
      value={pattern}
      options={PATTERNS.map((value) => ({
        value,
        label: PATTERN_WORDS[value],
        sign: <PatternGlyph pattern={value} />,
      }))}
      onChange={onChange}
    />
  );
}
