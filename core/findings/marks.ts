import type { Finding } from './model.ts';
import { bayPath, type FindingSubject, grouped, judgedIn } from './subject.ts';

/** Marks that more than one bar of the project goes by: on site a mark must find one bar. */
export function markFindings(subject: FindingSubject): readonly Finding[] {
  const all = subject.layout.bays.flatMap((bay) => judgedIn(subject, bay));
  return grouped(all, ({ bar }) => bar.mark).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first || group.length < 2) return [];
    // The mark was typed for one of them at least: the program gives none twice.
    const named = group.find(({ angle }) => angle.mark.mark !== undefined) ?? first;
    const { mark, bay, key } = named.bar;
    const places = group.map(({ bar }) => bar.id);
    return [
      {
        id: `mark-twice:${mark}`,
        kind: 'mark given twice',
        severity: 'look into',
        breaksLimit: false,
        bay,
        bars: places,
        crossing: null,
        title: `${group.length} bars are called ${mark}`,
        detail: `${places.join(', ')} go by one mark, and the shop and the site cannot tell them apart. Give each a mark of its own.`,
        value: null,
        limit: null,
        quantity: 'none',
        path: `${bayPath(subject, bay)}.bars.${key}.mark`,
      },
    ];
  });
}
