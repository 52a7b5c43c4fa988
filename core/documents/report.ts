import type { Assessment } from '../assessment.ts';
import { RING_CLIP } from './elevation/sectionInPlace.ts';
import { HATCHES } from './hatches.ts';
import { markup, styleText } from './markup.ts';
import type { ReportOptions } from './reportOptions.ts';
import { actionsSheet } from './sheets/actionsSheet.ts';
import { baySheet } from './sheets/baySheet.ts';
import { pageStyle, sheetStyle } from './sheets/reportStyle.ts';
import { titleSheet } from './sheets/titleSheet.ts';

/**
 * The report for a checker: one HTML document that stands alone, without script, to print on A4 in black and white.
 * All text of the user's is escaped.
 */
export function reportHtml(assessment: Assessment, options: ReportOptions): string {
  const { project, layout } = assessment;
  const pages = layout.bays.map((bay, index) => ({ bay, page: `bay-${index + 1}` }));
  const style = [
    options.fonts ?? '',
    sheetStyle,
    pageStyle(
      project.name,
      pages.map(({ bay, page }) => ({ page, title: `${bay.id}: ${bay.name}` })),
    ),
  ].join('\n');
  const document = markup`<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${project.name}: bracing report</title><style>${styleText(style)}</style></head><body>${HATCHES}${RING_CLIP}
${titleSheet(assessment, options)}
${actionsSheet(assessment, options.units)}
${pages.map(({ bay, page }) => baySheet(assessment, bay, options, page))}
</body></html>
`;
  return document.text;
}
