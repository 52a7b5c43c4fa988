/** The look of the report: A4, black and white, hairlines and hatches. */
import { cssString } from '../markup.ts';
import { CAUTION } from './caution.ts';

/** Margins with the project, the bay and the page number on every page. */
export function pageStyle(
  project: string,
  bays: readonly { readonly page: string; readonly title: string }[],
): string {
  const small = "font: 400 8.25pt/11pt 'IBM Plex Sans', Arial, sans-serif; color: #000;";
  const pages = bays.map(
    ({ page, title }) =>
      `@page ${page} { @top-right { content: ${cssString(title)}; } }\n.${page} { page: ${page}; }`,
  );
  return `@page {
  size: A4 portrait;
  margin: 17mm 12mm 20mm;
  @top-left { content: ${cssString(`Tautline · ${project}`)}; ${small} white-space: nowrap; }
  @top-right { content: ""; ${small} white-space: nowrap; }
  @bottom-left { content: ${cssString(`${CAUTION} Check every figure before use.`)}; ${small} width: 140mm; text-align: left; border-top: 1pt solid #000; }
  @bottom-right { content: "page " counter(page) " of " counter(pages); ${small} font-weight: 600; border-top: 1pt solid #000; }
}
${pages.join('\n')}`;
}

export const sheetStyle = `
* { box-sizing: border-box; margin: 0; }
html { background: #fff; }
body { width: 702px; margin: 0 auto; font: 400 11.5px/16px 'IBM Plex Sans', Arial, sans-serif; color: #000; font-variant-numeric: tabular-nums lining-nums; text-rendering: geometricPrecision; -webkit-print-color-adjust: exact; print-color-adjust: exact; }
svg text, table, .cells, .legend, .key, .scale-line, figcaption { font-family: 'IBM Plex Sans Condensed', 'Arial Narrow', 'IBM Plex Sans', Arial, sans-serif; }
svg { display: block; overflow: visible; }
svg text { font-size: 12px; fill: #000; }
svg .small { font-size: 11px; }
svg .axis { font-weight: 600; font-size: 14px; }
.strong { font-weight: 600; }
.halo { paint-order: stroke; stroke: #fff; stroke-width: 4px; stroke-linejoin: round; }
.hatches { position: absolute; }
h1 { font-weight: 600; font-size: 22px; line-height: 28px; margin-bottom: 6px; }
h1 small { display: block; font: 400 12px/16px 'IBM Plex Sans', Arial, sans-serif; }
h2, h3 { font-weight: 600; font-size: 12.5px; line-height: 18px; border-top: 1.5px solid #000; padding-top: 4px; margin: 9px 0 4px; display: flex; gap: 12px; break-after: avoid; }
h3 { border-top-width: .8px; font-size: 11.5px; margin-top: 7px; }
h2.bar { font-size: 16px; line-height: 22px; }
h2 small, h3 small { font-weight: 400; font-size: 11px; margin-left: auto; text-align: right; }
p { margin-bottom: 4px; orphans: 3; widows: 3; }
p.small { font-size: 11px; line-height: 14px; margin-top: 4px; }
.cells { display: flex; border-top: 1px solid #000; border-bottom: 1px solid #000; }
.cells > div { flex: 1 1 auto; padding: 4px 8px 5px; }
.cells > div + div { border-left: .8px solid #000; }
.cells em { font-style: normal; font-size: 10.5px; line-height: 13px; display: block; }
.signed { display: flex; gap: 16px; margin: 12px 0 8px; }
.signed > div { flex: 1; display: flex; align-items: flex-end; gap: 5px; font-size: 11px; border-top: 1.4px solid #000; border-left: 2.4px solid #000; padding: 4px 0 0 6px; height: 38px; }
.signed b { font-size: 12px; align-self: flex-start; margin-top: -2px; }
.signed i { flex: 1; border-bottom: .7px solid #000; }
.signed i.short { flex: .6; }
.two { display: grid; grid-template-columns: 1fr 1fr; gap: 0 24px; }
.found { list-style: none; padding: 0; }
.found li { display: grid; grid-template-columns: 18px 1fr; line-height: 15.5px; margin-bottom: 3px; break-inside: avoid; }
.sign { display: inline-block; vertical-align: -1px; }
.found .sign { margin-top: 2px; }
table { border-collapse: collapse; width: 100%; break-inside: auto; }
thead { display: table-header-group; }
tr { break-inside: avoid; }
th { font-weight: 500; font-size: 10.5px; line-height: 12px; text-align: right; vertical-align: bottom; padding: 2px 4px 3px; border-bottom: 1px solid #000; }
th sub { font-size: 9px; line-height: 0; }
td { font-size: 12px; line-height: 15px; text-align: right; vertical-align: top; padding: 3px 4px; border-bottom: .6px solid #777; white-space: nowrap; }
.l { text-align: left; }
.pad { padding-left: 14px; }
.wrap { white-space: normal; }
.answers { width: 210px; }
td i { font-style: italic; }
b { font-weight: 600; }
.second { margin-top: 10px; }
.governs td { background: #fff; border-top: 1.4px solid #000; border-bottom: 1.4px solid #000; }
.countsnot td { color: #000; text-decoration-thickness: .8px; }
.countsnot td:nth-child(5), .countsnot td:nth-child(4) { text-decoration: line-through; }
.check td:nth-child(n+3), .check th:nth-child(n+3) { width: 62px; text-align: center; }
.check td:first-child { width: 20px; }
.tick { width: 36px; text-align: center; }
.verdicts { margin-top: 6px; }
.box { display: inline-block; width: 12px; height: 12px; border: 1.2px solid #000; vertical-align: -2px; }
.no { display: inline-block; min-width: 15px; height: 15px; border: 1px solid #000; border-radius: 8px; font-weight: 600; font-size: 10.5px; line-height: 13px; text-align: center; padding: 0 3px; }
.chip { display: inline-block; vertical-align: -1px; margin-right: 5px; }
.bay { break-before: page; }
.diagonal { margin: 18px 0; }
.keep { break-inside: avoid; }
.last { break-before: avoid; }
.topline { display: grid; grid-template-columns: 220px 1fr; gap: 18px; align-items: start; }
.topline p { margin-top: 7px; }
.key { font-size: 11px; display: flex; flex-wrap: wrap; gap: 6px; align-items: center; margin-top: 5px; }
.key svg, .scale-line svg { display: inline-block; }
.drawings { display: grid; grid-template-columns: 1fr 228px; gap: 18px; }
.drawings.stacked { display: block; }
.stacked .side { display: grid; grid-template-columns: 1fr 1fr 1fr; gap: 14px; }
.stacked figure { width: 346px; }
.stacked .scale-line { margin-left: 40px; line-height: 13px; }
.planes { display: flex; flex-wrap: wrap; gap: 10px; align-content: flex-start; }
figure { break-inside: avoid; }
figcaption { font-weight: 600; }
.scale-line { display: flex; align-items: center; gap: 14px; font-size: 11px; margin: 2px 0 0 60px; }
.legend { list-style: none; padding: 0; }
.legend li { display: flex; gap: 10px; align-items: center; min-height: 20px; line-height: 14px; font-size: 12px; }
.legend svg { flex: none; }
.legend-line { font-size: 11px; line-height: 15px; }
.legend-line span { white-space: nowrap; }
.verdict { border: 1px solid #000; padding: 4px 10px 5px; margin-bottom: 6px; break-inside: avoid; }
.verdict.asked { border-width: 2.2px; }
.verdict em { display: block; font-style: normal; font-size: 11px; line-height: 14px; }
.verdict > b { font-size: 20px; line-height: 24px; margin-right: 8px; }
.verdict .said { float: right; margin-top: 4px; }
.st, .dg, .gu, .flag, .bar, .cutnear { fill: #fff; stroke: #000; }
.st, .dg, .dgf, .bar { stroke-width: .9; }
.dgf, .cutfar { fill: url(#far); stroke: #000; }
.dg.unknown { stroke-dasharray: 3 2; }
.gu { stroke-width: .7; }
.flag { stroke-width: 1; }
.cutnear { stroke-width: 1.4; }
.cutnear.dotted { fill: url(#near-1); }
.cutfar { stroke-width: 1.2; }
.packer { fill: #000; }
.edl, .edh, .centre, .dim, .dims, .earth, .hld, .cross, .ax, .gb, .held, .free, .stop, .nostop { fill: none; stroke: #000; }
.edl { stroke-width: .5; }
.edh { stroke-width: .5; stroke-dasharray: 3 2; }
.centre { stroke-width: .5; stroke-dasharray: 9 2 2 2; }
.dim { stroke-width: .6; }
.dims { stroke-width: 1.4; }
.earth { stroke-width: .8; }
.heldpoint { fill: none; stroke: #000; stroke-width: 1; }
.hld { stroke-width: 2; }
.cross { stroke-width: 1; }
.gl, .tag { fill: #fff; stroke: #000; stroke-width: 1.6; }
.tag { stroke-width: 1; }
.tagtext { font-size: 10.5px; font-weight: 600; }
.gb { stroke-width: 1.6; }
.ax { stroke-width: .6; stroke-dasharray: 9 2 2 2; }
.held { stroke-width: 1.6; }
.free { stroke-width: 5; }
.stop { stroke-width: 2.4; }
.nostop { stroke-width: 1.2; stroke-dasharray: 2.5 2; }
@media screen { body { padding: 32px 0; } .bay { margin-top: 40px; } }
`;
