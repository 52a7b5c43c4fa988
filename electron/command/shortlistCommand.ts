import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import type { CatalogueId } from '../../core/catalogue/model.ts';
import { textTable } from '../../core/documents/textTable.ts';
import { PRACTICES } from '../../core/practice/practices.ts';
import type { PracticeId } from '../../core/project/model.ts';
import { AXES } from '../../core/section/model.ts';
import type { Candidate, Shortlist } from '../../core/shortlist/model.ts';
import { shortlist } from '../../core/shortlist/shortlist.ts';
import { grouped } from '../../core/units/figures.ts';
import { showLength, showSlenderness } from '../../core/units/quantity.ts';
import { builtInCatalogues, CATALOGUE_IDS } from './catalogues.ts';
import { crossedPair } from './crossedPair.ts';
import type { Ending } from './ending.ts';
import { FINE, LIMIT_BROKEN } from './exitCode.ts';
import { jsonText } from './json.ts';
import { countValue, lengthValue, slendernessValue } from './values.ts';

interface ShortlistOptions {
  readonly length: number;
  readonly crossing: 'joined' | 'free';
  readonly limit?: number;
  readonly practice: PracticeId;
  readonly catalogue: CatalogueId;
  readonly legs: 'longer' | 'shorter' | 'both';
  readonly countedOn: 'tension' | 'both';
  readonly bolt: number;
  readonly show: number;
  readonly format: 'table' | 'json';
}

export function addShortlistCommand(program: Command, ending: Ending): void {
  program
    .command('shortlist')
    .description('stock angles for one of two crossed diagonals, tried in place, lightest first')
    .requiredOption(
      '-l, --length <length>',
      'set-out length of the diagonal: 4000 (mm) or "4 m"',
      lengthValue,
    )
    .addOption(
      new Option('-x, --crossing <how>', 'whether the two are joined where they cross, at mid-length')
        .choices(['joined', 'free'])
        .default('free'),
    )
    .option('--limit <L/r>', 'limit of slenderness; without it that of the practice', slendernessValue)
    .addOption(
      new Option('--practice <id>', 'design standard')
        .choices(PRACTICES.map(({ id }) => id))
        .default('sans10162'),
    )
    .addOption(new Option('-c, --catalogue <list>', 'stock list').choices(CATALOGUE_IDS).default('en'))
    .addOption(
      new Option('--legs <leg>', 'which leg lies in the plane of the bay')
        .choices(['longer', 'shorter', 'both'])
        .default('both'),
    )
    .addOption(
      new Option('--counted-on <forces>', 'tension only, or compression too')
        .choices(['tension', 'both'])
        .default('tension'),
    )
    .option('--bolt <diameter>', 'of the end bolts, mm: they must fit the leg', lengthValue, 16)
    .option('--show <count>', 'rows of the table', countValue, 12)
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .action((options: ShortlistOptions) => {
      const pair = crossedPair(options, null);
      if (!pair.ok) return ending.trouble(pair.trouble);
      const catalogues = builtInCatalogues();
      const assessment = assess(pair.value.project, catalogues);
      const list = shortlist(assessment, catalogues, [pair.value.bar], {
        placements: options.legs === 'both' ? 'both' : 'as placed',
      });
      ending.terminal.out(
        options.format === 'json' ? jsonText(shortlistJson(list, options)) : shortlistText(list, options),
      );
      if (list.first === null)
        ending.terminal.err(
          'No angle of the list passes. Join the crossing, hold the bar once more, or take another list.\n',
        );
      ending.with(list.first === null ? LIMIT_BROKEN : FINE);
    });
}

function shortlistJson(
  list: Shortlist,
  { length, crossing, practice, catalogue, countedOn }: ShortlistOptions,
) {
  const { limit, neededRadius, first, passing, candidates } = list;
  return {
    length,
    crossing,
    practice,
    catalogue,
    countedOn,
    limit,
    neededRadius,
    first,
    passing,
    candidates,
  };
}

function shortlistText(list: Shortlist, options: ShortlistOptions): string {
  const { length, crossing, show } = options;
  const needed = AXES.map((axis) => `${axis} ${grouped(list.neededRadius[axis], 1)}`).join(', ');
  const head = [
    `A diagonal of ${showLength(length, 'metric')}, ${crossing === 'joined' ? 'joined to its partner at mid-length' : 'not joined to its partner'}; L/r ≤ ${showSlenderness(list.limit)}.`,
    `Radius wanted about each axis with the ${options.legs === 'shorter' ? 'shorter' : 'longer'} leg in the plane, mm: ${needed}.`,
    list.first === null
      ? 'None passes.'
      : `First that passes: ${named(list.first)}. ${reasonFor(list.first, options)}`,
  ];
  const { rows, lighter, heavier } = shown(list, show);
  const table = textTable(
    [
      { head: '', align: 'left' },
      { head: 'angle', align: 'left' },
      { head: 'leg in plane', align: 'left' },
      { head: 'kg/m', align: 'right' },
      { head: 'L/r', align: 'right' },
      { head: 'axis', align: 'left' },
      { head: 'handling', align: 'right' },
      { head: 'why not', align: 'left' },
    ],
    rows.map((candidate) => [
      candidate === list.first ? '→' : '',
      candidate.designation,
      candidate.kind === 'equal' ? 'either' : candidate.legInPlane,
      grouped(candidate.massPerMetre, 2),
      showSlenderness(candidate.slenderness, candidate.limit),
      candidate.axis,
      showSlenderness(candidate.handling, candidate.limit),
      [candidate.why, candidate.fit].filter((part) => part !== null).join('; '),
    ]),
  );
  const before = lighter > 0 ? `${lighter} lighter ones fail too (--show ${lighter + show} for more)\n` : '';
  return `${head.join('\n')}\n\n${before}${table}${heavier > 0 ? `… and ${heavier} heavier\n` : ''}`;
}

/** Rows around the first that passes: two thirds of them lighter, to show why they fail; the heaviest of all where none passes. */
function shown({ candidates, first }: Shortlist, show: number) {
  const place = first === null ? candidates.length - 1 : candidates.indexOf(first);
  const from = Math.max(0, place - Math.floor((show * 2) / 3));
  const rows = candidates.slice(from, from + show);
  return { rows, lighter: from, heavier: candidates.length - from - rows.length };
}

function named({ designation, kind, legInPlane, massPerMetre }: Candidate): string {
  const leg = kind === 'equal' ? '' : ` with the ${legInPlane} leg in the plane`;
  return `${designation}${leg}, ${grouped(massPerMetre, 2)} kg/m`;
}

/** Why the bar bows where it does, as an assessment with that angle says it. */
function reasonFor({ designation, legInPlane }: Candidate, options: ShortlistOptions): string {
  const pair = crossedPair({ ...options, legs: legInPlane }, designation);
  if (!pair.ok) return '';
  const { project, bar } = pair.value;
  return assess(project, builtInCatalogues()).diagonals.get(bar)?.reason ?? '';
}
