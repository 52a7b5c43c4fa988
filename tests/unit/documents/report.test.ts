import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { cssString, markup, styleText } from '../../../core/documents/markup.ts';
import { projectState } from '../../../core/documents/projectState.ts';
import { reportHtml } from '../../../core/documents/report.ts';
import { bay, knee, line, project, roof, vouched } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';
import { crossedTier } from './given.ts';

const options = { units: 'metric', date: '1 December 2026' } as const;

describe('markup', () => {
  it('escapes whatever is put in, and only that', () => {
    const name = `<script>alert("1 & 'one'")</script>`;
    expect(markup`<b title="${name}">${name}</b>`.text).toBe(
      '<b title="&lt;script&gt;alert(&quot;1 &amp; &#39;one&#39;&quot;)&lt;/script&gt;">&lt;script&gt;alert(&quot;1 &amp; &#39;one&#39;&quot;)&lt;/script&gt;</b>',
    );
    expect(markup`<p>${[markup`<i>${'<'}</i>`, null, 1.005]}</p>`.text).toBe('<p><i>&lt;</i>1</p>');
  });

  it('leaves out characters that HTML cannot hold', () => {
    expect(markup`${'a\u0000\u0008b\tc'}`.text).toBe('ab\tc');
  });

  it('writes a string for a style sheet that nothing can end', () => {
    expect(cssString('a"}</style>')).toBe('"a\\22 \\7d \\3c \\2f style\\3e "');
  });

  it('refuses style text that would end the style sheet', () => {
    expect(() => styleText('a{}</style><script>')).toThrow(/closing tag/);
  });
});

describe('the report', () => {
  const html = reportHtml(crossedTier({ join: { kind: 'bolted' } }), options);

  it('stands alone: no script, nothing fetched', () => {
    expect(html.startsWith('<!doctype html>')).toBe(true);
    expect(html).not.toMatch(/<script|\son\w+=|javascript:|https?:|@import|<link|<img/i);
  });

  it('says what it is not, on its first sheet and at the foot of every page', () => {
    expect(html).toContain('An aid for people competent in structural steel.');
    expect(html).toContain('A partly braced frame is dangerous during erection');
    expect(html).toContain('counter(page) &quot; of &quot; counter(pages)'.replaceAll('&quot;', '"'));
  });

  it('shows the clause with how sure it is, and a box to agree or not', () => {
    expect(html).toMatch(/L\/r ≤ 300 \(tension member\), 10\.4\.2\.2 \(from memory, sure\)/);
    expect(html).toContain('<i class="box"></i>');
  });

  it('draws the bay and gives each diagonal its lanes, verdicts and holds', () => {
    expect(html).toContain('aria-label="Elevation of B"');
    expect(html.match(/aria-label="Lanes"/g)).toHaveLength(2);
    expect(html.match(/class="verdict asked"/g)).toHaveLength(2);
    expect(html).toContain('D2 is met end-on, and both its halves reach held points.');
  });

  it('keeps the head of a diagonal on one page with its lanes, and its findings with what stands above them', () => {
    for (const sheet of html.split('<h2 class="bar">').slice(1))
      expect(sheet.slice(0, sheet.indexOf('aria-label="Lanes"'))).not.toContain('class="keep"');
    expect(html).toContain('<div class="keep last"><h3>Findings</h3>');
  });

  it('is the same each time, and leaves out a date that is not given', () => {
    expect(reportHtml(crossedTier({ join: { kind: 'bolted' } }), options)).toBe(html);
    expect(reportHtml(crossedTier(), { units: 'metric', date: null })).not.toContain('December');
  });

  it('lets no text of the project become markup or style', () => {
    const evil = `</title></style><script>alert(1)</script>"&'`;
    const overrides = [{ axis: 'y', length: 4000, factor: 1, reason: evil }] as const;
    const assessment = crossedTier({
      name: evil,
      join: { kind: 'bolted' },
      bars: { 't1.rise': { mark: evil, grade: evil, section: evil }, 't1.fall': { overrides } },
    });
    const named = { ...assessment, project: { ...assessment.project, name: evil } };
    const text = reportHtml(named, options);
    expect(text).not.toContain('<script');
    expect(text.match(/<\/style>/g)).toHaveLength(1);
    expect(text).toContain('&lt;script&gt;alert(1)&lt;/script&gt;');
  });

  it('keeps the other bars of a bay when one has no section in stock', () => {
    const text = reportHtml(crossedTier({ bars: { 't1.rise': { section: '71x71x6' } } }), options);
    expect(text).toContain('71×71×6');
    expect(text.match(/aria-label="Lanes"/g)).toHaveLength(1);
  });

  it('shows remedies with what they do, where they are given', () => {
    const assessment = crossedTier();
    const [finding] = assessment.findings;
    const remedies = new Map([
      [finding?.id ?? '', [{ label: 'Join it', effect: { before: 365, after: 235 } }]],
    ]);
    expect(reportHtml(assessment, { ...options, remedies })).toContain('Join it (365 → 235)');
    expect(reportHtml(assessment, options)).not.toContain('Would answer it</th>');
  });

  it('draws each slope of a roof, and alike pairs of knees once', () => {
    const lines = [line('P1', 2000, vouched)];
    const slopes = bay(roof(6000, 8, [[4500, 'crossed']], lines, [line('P2', 1500)]));
    const knees = { ...bay(knee({ count: 3 })), id: 'K' };
    const text = reportHtml(assess(project([slopes, knees]), CATALOGUES), options);
    expect(text.match(/aria-label="Elevation of B"/g)).toHaveLength(2);
    expect(text.match(/aria-label="Elevation of K"/g)).toHaveLength(1);
    expect(text).toContain('the same for');
    expect(text).toContain('tied by the sheeting');
  });

  it('has something to say of a bay that is open, and of no bay', () => {
    const open = bay(roof(6000, 8, [[4500, 'open']]));
    expect(reportHtml(assess(project([open]), CATALOGUES), options)).toContain('The bay has no diagonals.');
    expect(reportHtml(assess(project([]), CATALOGUES), options)).toContain('Nothing was found.');
  });

  it('names a different state for a different project', () => {
    const { project: one } = crossedTier();
    expect(projectState(one)).toMatch(/^[0-9a-f]{4}·[0-9a-f]{4}$/);
    expect(projectState({ ...one, name: 'another' })).not.toBe(projectState(one));
  });
});
