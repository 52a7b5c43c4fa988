import { DropdownMenu } from 'radix-ui';
import type { JSX } from 'react';
import { PATTERNS, type Pattern } from '../../../core/project/model.ts';
import { useOverlays } from '../../controls/useOverlays.ts';
import { PATTERN_WORDS, PatternGlyph } from '../../glyphs/PatternGlyph.tsx';

interface PatternMenuProps {
  /** "tier 2". */
  readonly of: string;
  readonly pattern: Pattern;
  /** Null while it is the only one. */
  readonly onRemove: (() => void) | null;
  onChange(pattern: Pattern): void;
}

/** The pattern of one tier or panel behind a small button, beside its height. */
export function PatternMenu({ of, pattern, onRemove, onChange }: PatternMenuProps): JSX.Element {
  const overlays = useOverlays();
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger
        className="pattern-button"
        aria-label={`Pattern of ${of}: ${PATTERN_WORDS[pattern].toLowerCase()}`}
        title={`${PATTERN_WORDS[pattern]}: change the pattern of ${of}`}
      >
        <PatternGlyph pattern={pattern} />
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal container={overlays}>
        <DropdownMenu.Content className="menu" align="end" sideOffset={3} collisionPadding={6}>
          <DropdownMenu.RadioGroup
            value={pattern}
            onValueChange={(value) => {
              const chosen = PATTERNS.find((each) => each === value);
              if (chosen !== undefined) onChange(chosen);
            }}
          >
            {PATTERNS.map((each) => (
              <DropdownMenu.RadioItem key={each} value={each} className="menu-item">
                <PatternGlyph pattern={each} />
                <span>{PATTERN_WORDS[each]}</span>
                <span>{each === pattern ? '✓' : ''}</span>
              </DropdownMenu.RadioItem>
            ))}
          </DropdownMenu.RadioGroup>
          {onRemove !== null && (
            <>
              <DropdownMenu.Separator className="menu-rule" />
              <DropdownMenu.Item className="menu-item" onSelect={onRemove}>
                <span />
                <span>Remove {of}</span>
              </DropdownMenu.Item>
            </>
          )}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
