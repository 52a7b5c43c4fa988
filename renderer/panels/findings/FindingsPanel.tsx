import { useVirtualizer } from '@tanstack/react-virtual';
import { type JSX, type KeyboardEvent, useRef } from 'react';
import { useWindow } from '../../shell/services.tsx';
import { beforeAssessment, shownAssessment } from '../../store/shown.ts';
import { FindingRow } from './FindingRow.tsx';
import { findingItems } from './findingGroups.ts';
import './findings.css';

/** Guess at a row's height before it is measured, px. */
const ROW = 64;

/** What wants looking at, heaviest first, each with its remedies. `bay` narrows it to one bay. */
export function FindingsPanel({ bay }: { readonly bay: string | null }): JSX.Element {
  const assessment = useWindow(shownAssessment);
  const before = useWindow(beforeAssessment);
  const scroller = useRef<HTMLElement>(null);
  const items = assessment === null ? [] : findingItems(assessment, before, bay);
  const virtual = useVirtualizer({
    count: items.length,
    getScrollElement: () => scroller.current,
    estimateSize: (index) => (items[index]?.kind === 'group' ? 24 : ROW),
    getItemKey: (index) => {
      const item = items[index];
      return item === undefined
        ? index
        : item.kind === 'group'
          ? item.title
          : `${item.state} ${item.finding.id}`;
    },
    overscan: 4,
  });
  if (assessment !== null && items.length === 0)
    return (
      <p className="findings-none">
        Nothing found{bay === null ? '' : ` in ${bay}`}: every crossing is marked, every limit kept, and
        nothing clashes.
      </p>
    );
  return (
    <section ref={scroller} className="findings" aria-label="Findings" onKeyDown={moveAlong}>
      <div style={{ height: virtual.getTotalSize(), position: 'relative' }}>
        {virtual.getVirtualItems().map((row) => {
          const item = items[row.index];
          if (item === undefined || assessment === null) return null;
          return (
            <div
              key={row.key}
              ref={virtual.measureElement}
              data-index={row.index}
              style={{
                position: 'absolute',
                top: 0,
                left: 0,
                right: 0,
                transform: `translateY(${row.start}px)`,
              }}
            >
              {item.kind === 'group' ? (
                <h3 className="finding-group">
                  {item.title} <small>{item.aside}</small>
                </h3>
              ) : (
                <FindingRow
                  finding={item.finding}
                  state={item.state}
                  assessment={assessment}
                  before={before}
                />
              )}
            </div>
          );
        })}
      </div>
    </section>
  );
}

/** Up and down go from finding to finding. */
function moveAlong(event: KeyboardEvent<HTMLElement>): void {
  const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (step === 0) return;
  const rows = [...event.currentTarget.querySelectorAll<HTMLElement>('.finding-words')];
  const at = rows.findIndex((row) => row.closest('.finding')?.contains(document.activeElement));
  const next = rows[at + step];
  if (next === undefined) return;
  event.preventDefault();
  next.focus();
  next.scrollIntoView({ block: 'nearest' });
}
