import { type Command, Option } from 'commander';
import type { CatalogueId } from '../../core/catalogue/model.ts';
import { stockOf } from '../../core/catalogue/stock.ts';
import { layOut } from '../../core/layout/layOut.ts';
import { PRACTICES } from '../../core/practice/practices.ts';
import type { Bay, Join, PracticeId, Project, Tier, UnitSystem } from '../../core/project/model.ts';
import { newKneeBay, newRoofBay, newWallBay } from '../../core/project/newBay.ts';
import { newProject } from '../../core/project/newProject.ts';
import { readProject } from '../../core/project/readProject.ts';
import { writeProject } from '../../core/project/writeProject.ts';
import { builtInCatalogues, CATALOGUE_IDS } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { deliver } from './output.ts';
import {
  angleValue,
  countValue,
  each,
  lengthValue,
  pitchValue,
  type TierValue,
  tierValue,
} from './values.ts';

/** Options that every kind of bay takes. */
interface CommonOptions {
  readonly out: string;
  readonly force?: boolean;
  readonly project: string;
  readonly id?: string;
  readonly name?: string;
  readonly section?: string;
  readonly legs: 'longer' | 'shorter';
  readonly crossings?: 'none' | 'bolted' | 'welded';
  readonly practice: PracticeId;
  readonly catalogue: CatalogueId;
  readonly units: UnitSystem;
}

interface WallOptions extends CommonOptions {
  readonly width: number;
  readonly tier?: readonly TierValue[];
}

interface RoofOptions extends CommonOptions {
  readonly width: number;
  readonly pitch: number;
  readonly panel?: readonly TierValue[];
  readonly purlin?: readonly number[];
  readonly bothSlopes?: boolean;
}

interface KneeOptions extends CommonOptions {
  readonly count: number;
  readonly spacing: number;
  readonly drop: number;
  readonly angle: number;
  readonly sides: 'one' | 'both';
}

export function addNewCommand(program: Command, ending: Ending): void {
  const making = program.command('new').description('a new project file with one bay in it');
  addWallBay(making, ending);
  addRoofBay(making, ending);
  addKnee(making, ending);
}

function addWallBay(making: Command, ending: Ending): void {
  withCommonOptions(making.command('wall-bay').description('two columns, any number of tiers'))
    .option('--width <length>', 'between the columns', lengthValue, 6000)
    .option(
      '--tier <height:pattern>',
      `a tier, from the ground up; give it again for the next (${PATTERN_WORDS})`,
      each(tierValue),
    )
    .action(async (options: WallOptions) => {
      const made = newWallBay(options.id ?? 'W1', options.name ?? 'wall bay', options.catalogue);
      if (made.recipe.kind !== 'wall') throw new Error('a wall bay with another recipe');
      const tiers = options.tier ? numbered('t', options.tier) : made.recipe.tiers;
      await make({ ...made, recipe: { ...made.recipe, width: options.width, tiers } }, options, ending);
    });
}

function addRoofBay(making: Command, ending: Ending): void {
  withCommonOptions(
    making.command('roof-bay').description('two rafters, panels up the slope, purlins across'),
  )
    .option('--width <length>', 'between the rafters', lengthValue, 6000)
    .option('--pitch <degrees>', 'of the slope', pitchValue, 8)
    .option(
      '--panel <length:pattern>',
      `a panel, from the eaves up; give it again for the next (${PATTERN_WORDS})`,
      each(tierValue),
    )
    .option(
      '--purlin <length>',
      'a purlin, so far up the slope; give it again for the next',
      each(lengthValue),
    )
    .option('--both-slopes', 'the same slope again beyond the ridge')
    .action(async (options: RoofOptions) => {
      const made = newRoofBay(options.id ?? 'R1', options.name ?? 'roof bay', options.catalogue);
      const first = made.recipe.kind === 'roof' ? made.recipe.slopes[0] : undefined;
      if (made.recipe.kind !== 'roof' || !first) throw new Error('a roof bay with another recipe');
      const panels = options.panel ? numbered('p', options.panel) : first.panels;
      const rise = panels.reduce((sum, panel) => sum + panel.height, 0);
      // With panels of their own the purlins of the first sketch would stand anywhere.
      const places = options.purlin ?? (options.panel ? [] : first.lines.map(({ at }) => at));
      const slopes = (options.bothSlopes ? ['a', 'b'] : ['a']).map((id, slope) => ({
        id,
        pitch: options.pitch,
        panels,
        lines: places.map((at, index) => ({
          id: `P${slope * places.length + index + 1}`,
          at,
          heldBy: { kind: 'nothing' } as const,
        })),
      }));
      const past = places.find((at) => at > rise);
      if (past !== undefined)
        return ending.trouble({
          kind: 'bad value',
          what: `A purlin at ${past} mm lies past the top of the slope, ${rise} mm.`,
          todo: 'Give --purlin as the length from the eaves up the slope.',
        });
      await make({ ...made, recipe: { ...made.recipe, width: options.width, slopes } }, options, ending);
    });
}

function addKnee(making: Command, ending: Ending): void {
  withCommonOptions(
    making.command('knee').alias('knee-bay').description('knees from a lower chord or flange up to purlins'),
  )
    .option('--count <number>', 'purlins that get knees', countValue, 3)
    .option('--spacing <length>', 'of the purlins along the chord', lengthValue, 1500)
    .option('--drop <length>', 'from the purlins down to the chord', lengthValue, 1200)
    .option('--angle <degrees>', 'of the knees above level', angleValue, 45)
    .addOption(
      new Option('--sides <sides>', 'of the chord that get knees').choices(['one', 'both']).default('both'),
    )
    .action(async (options: KneeOptions) => {
      const { count, spacing, drop, angle, sides } = options;
      const made = newKneeBay(options.id ?? 'K1', options.name ?? 'knees', options.catalogue);
      if (made.recipe.kind !== 'knee') throw new Error('a knee bay with another recipe');
      await make(
        { ...made, recipe: { ...made.recipe, count, spacing, drop, angle, sides } },
        options,
        ending,
      );
    });
}

const PATTERN_WORDS = 'crossed, rising, falling, peaked, vee or open';

function withCommonOptions(command: Command): Command {
  return command
    .requiredOption('-o, --out <file>', 'project file to write')
    .option('--force', 'replace the file if it is there already')
    .option('--project <name>', 'name of the project', 'New project')
    .option('--id <id>', 'short name of the bay, such as W1')
    .option('--name <name>', 'name of the bay')
    .option('--section <designation>', 'of the diagonals: 70x70x6')
    .addOption(
      new Option('--legs <leg>', 'which leg lies in the plane of the bay')
        .choices(['longer', 'shorter'])
        .default('longer'),
    )
    .addOption(
      new Option(
        '--crossings <how>',
        'mark every crossing of two diagonals; without it they stay unmarked',
      ).choices(['none', 'bolted', 'welded']),
    )
    .addOption(
      new Option('--practice <id>', 'design standard')
        .choices(PRACTICES.map(({ id }) => id))
        .default('sans10162'),
    )
    .addOption(new Option('-c, --catalogue <list>', 'stock list').choices(CATALOGUE_IDS).default('en'))
    .addOption(
      new Option('-u, --units <units>', 'that the project is shown in')
        .choices(['metric', 'us'])
        .default('metric'),
    );
}

function numbered(letter: string, tiers: readonly TierValue[]): readonly Tier[] {
  return tiers.map(({ height, pattern }, index) => ({ id: `${letter}${index + 1}`, height, pattern }));
}

async function make(bay: Bay, options: CommonOptions, ending: Ending): Promise<void> {
  const { practice, catalogue, units } = options;
  const stock = stockOf(catalogue, [], builtInCatalogues());
  const found = stock.find(options.section ?? bay.diagonals.section);
  if (!found.ok)
    return ending.trouble({ kind: 'no such section', typed: found.typed, nearest: found.nearest });
  const blank = newProject(options.project);
  const diagonals = { ...bay.diagonals, section: found.angle.designation, legInPlane: options.legs };
  const project: Project = {
    ...blank,
    settings: { ...blank.settings, practice, catalogue, units },
    bays: [{ ...bay, diagonals }],
  };
  const text = writeProject(withCrossings(project, options));
  const read = readProject(text);
  if (!read.ok)
    return ending.trouble({ kind: 'no project', file: 'the new project', problems: read.problems });
  const delivered = await deliver(text, options.out, ending.terminal, options.force ? 'force' : 'refuse');
  if (!delivered.ok) ending.trouble(delivered.trouble);
}

/** The project with one join at every crossing of two diagonals. */
function withCrossings(project: Project, { crossings, catalogue }: CommonOptions): Project {
  if (crossings === undefined) return project;
  const layout = layOut(project, stockOf(catalogue, [], builtInCatalogues()));
  const join: Join = { kind: crossings };
  const joins = Object.fromEntries(
    [...layout.crossings.values()].filter(({ kind }) => kind === 'diagonals').map(({ key }) => [key, join]),
  );
  return { ...project, bays: project.bays.map((bay) => ({ ...bay, joins })) };
}
