import type { JSX } from 'react';
import type { DiagonalAssessment } from '../../../core/assessment.ts';
import type { Practice, Verdict } from '../../../core/practice/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { STATUS_WORDS, StatusGlyph } from '../../glyphs/StatusGlyph.tsx';

interface VerdictsProps {
  readonly diagonal: DiagonalAssessment;
  readonly before: DiagonalAssessment | null;
  readonly practice: Practice;
}

/** Handling and in service, each with its own length and radius, and whether the practice asks for it. */
export function Verdicts({ diagonal, before, practice }: VerdictsProps): JSX.Element | null {
  const { handling, inService, limit } = diagonal;
  if (handling === null || inService === null) return null;
  return (
    <div className="verdicts">
      <VerdictBox
        name="handling"
        verdict={handling}
        was={before?.handling ?? null}
        says="whole, over least r"
        diagonal={diagonal}
      />
      <VerdictBox
        name="in service"
        verdict={inService}
        was={before?.inService ?? null}
        says=""
        diagonal={diagonal}
      />
      <p className="verdict-source">
        Limit {limit.limit}:{' '}
        {limit.source === 'practice' ? `${practice.name}, ${limit.clause}` : limit.source}
        {limit.standing === 'advice' && ', advice'}
        {inService.bound !== null && ` · exact; the rule’s safe bound is ${showSlenderness(inService.bound)}`}
        {limit.source === 'practice' && limit.confidence === 'from memory, verify' && (
          <span className="verify"> · from memory, verify</span>
        )}
      </p>
    </div>
  );
}

interface VerdictBoxProps {
  readonly name: string;
  readonly verdict: Verdict;
  readonly was: Verdict | null;
  readonly says: string;
  readonly diagonal: DiagonalAssessment;
}

function VerdictBox({ name, verdict, was, says, diagonal }: VerdictBoxProps): JSX.Element {
  const figure = showSlenderness(verdict.slenderness, verdict.limit);
  const figureWas = was === null ? figure : showSlenderness(was.slenderness, was.limit);
  const status = statusOf(verdict, diagonal);
  return (
    <div
      className="verdict"
      data-asked={verdict.asked || undefined}
      data-over={(verdict.asked && !verdict.ok) || undefined}
    >
      <em>
        {name}, {verdict.asked ? 'asked for' : 'not asked for here'}
      </em>
      <span className="verdict-line">
        {figureWas !== figure && <s className="was">{figureWas}</s>}
        <b>{figure}</b>
        {figureWas === figure && (
          <span className="verdict-says">{says === '' ? `limit ${verdict.limit}` : says}</span>
        )}
        {(verdict.asked || !verdict.ok) && (
          <span className="verdict-status">
            {verdict.asked ? <StatusGlyph status={status} /> : null}
            {verdict.asked ? STATUS_WORDS[status] : ''}
          </span>
        )}
      </span>
    </div>
  );
}

function statusOf(verdict: Verdict, diagonal: DiagonalAssessment): DiagonalAssessment['status'] {
  if (!verdict.ok) return 'over';
  return diagonal.status === 'near' ? 'near' : 'within';
}
