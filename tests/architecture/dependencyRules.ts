/**
 * Which module may import which, looked at with dependency-cruiser; type-only imports count. Run by itself
 * (`npm run rules`) it prints what is broken and ends with 1, or with the number of modules it has seen.
 */
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { cruise, type ICruiseResult, type IRegularForbiddenRuleType } from 'dependency-cruiser';
import extractTSConfig from 'dependency-cruiser/config-utl/extract-ts-config';
import { READS_THE_ASSESSMENT, ROOMS } from './rooms.ts';

const ROOT = path.resolve(import.meta.dirname, '../..');

const ELECTRON_PACKAGE = '(^|/)node_modules/electron/';
/** What runs inside Electron; everything else under electron/ runs in plain Node. */
const INSIDE_ELECTRON = '^electron/(main\\.ts$|preload\\.ts$|desktop/)';

function rule(
  name: string,
  comment: string,
  from: IRegularForbiddenRuleType['from'],
  to: IRegularForbiddenRuleType['to'],
): IRegularForbiddenRuleType {
  return { name, comment, severity: 'error', from, to };
}

/** Each room's rule, but for the highest ones, which may import all of core. */
function roomRules(): readonly IRegularForbiddenRuleType[] {
  const all = ROOMS.flat();
  return ROOMS.flatMap((level, index) =>
    level.flatMap((room) => {
      const below = ROOMS.slice(0, index).flat();
      const higher = all.filter((other) => other !== room && !below.includes(other)).map(pathOfRoom);
      const barred = READS_THE_ASSESSMENT.includes(room) ? higher : [...higher, '^core/assessment\\.ts$'];
      if (barred.length === 0) return [];
      const comment = 'a lower room of core never imports a higher one';
      return [
        rule(`core-${room}-knows-nothing-higher`, comment, { path: pathOfRoom(room) }, { path: barred }),
      ];
    }),
  );
}

/** Most rooms are folders; `assess` is a file of that name. */
function pathOfRoom(room: string): string {
  return `^core/${room}(/|\\.ts$)`;
}

export const RULES: readonly IRegularForbiddenRuleType[] = [
  rule(
    'core-is-pure',
    'core imports core alone: no DOM, Node, React or three',
    { path: '^core/', pathNot: '^core/project/' },
    { pathNot: '^core/' },
  ),
  rule(
    'core-reads-files-with-zod',
    'only the project room has a package, zod, for its schema',
    { path: '^core/project/' },
    { pathNot: ['^core/', '(^|/)node_modules/zod/'] },
  ),
  ...roomRules(),
  rule(
    'renderer-knows-no-machine',
    'the window reaches the machine only through its Host',
    { path: '^renderer/' },
    { path: ['^electron/', ELECTRON_PACKAGE] },
  ),
  rule(
    'renderer-uses-no-node',
    'the window runs where Node is not',
    { path: '^renderer/' },
    { dependencyTypes: ['core'] },
  ),
  rule(
    'hosts-know-the-interface-alone',
    'of the renderer the hosts know what a Host is, and nothing else',
    { path: '^electron/' },
    { path: '^renderer/', pathNot: '^renderer/host/host\\.ts$' },
  ),
  rule(
    'hosts-import-types-of-the-interface',
    'the Host interface is types; nothing of it runs in a host',
    { path: '^electron/' },
    { path: '^renderer/host/host\\.ts$', dependencyTypesNot: ['type-only'] },
  ),
  rule(
    'only-the-desktop-imports-electron',
    'importing the package from plain Node would start fetching its binary; the command line runs without it',
    { path: '^electron/', pathNot: INSIDE_ELECTRON },
    { path: ELECTRON_PACKAGE },
  ),
  rule(
    'plain-node-knows-no-desktop',
    'what runs in plain Node imports nothing that runs inside Electron',
    { path: '^electron/', pathNot: INSIDE_ELECTRON },
    { path: INSIDE_ELECTRON },
  ),
  rule(
    'nothing-made-imports-tests',
    'tests are no part of the program',
    { path: '^(core|renderer|electron|assets)/' },
    { path: '^tests/' },
  ),
  rule('no-circles', 'no module imports itself, by whatever way round', {}, { circular: true }),
  rule(
    'everything-resolves',
    'an import of the project names a module that is there',
    { path: '^(core|renderer|electron|assets|tests)/' },
    { couldNotResolve: true, path: '^\\.\\.?/', pathNot: '\\?(raw|url|worker)$' },
  ),
  rule(
    'no-orphans',
    'a module that imports nothing and is imported by nothing is left over',
    { path: '^(core|renderer|electron)/', orphan: true, pathNot: '\\.d\\.ts$' },
    {},
  ),
];

export interface RuleReport {
  /** Of the project's own; zero means that nothing was looked at. */
  readonly modules: number;
  readonly violations: readonly string[];
}

/** Looks at every import of core, renderer, electron, tests and the programs in assets. */
export async function dependencyReport(): Promise<RuleReport> {
  const result = await cruise(
    ['core', 'renderer', 'electron', 'assets', 'tests'],
    {
      baseDir: ROOT,
      ruleSet: { forbidden: [...RULES] },
      validate: true,
      doNotFollow: { path: 'node_modules' },
      exclude: { path: '\\.tsbuildinfo$' },
      tsPreCompilationDeps: true,
    },
    { extensions: ['.ts', '.tsx', '.json', '.css', '.js'] },
    { tsConfig: extractTSConfig(path.join(ROOT, 'tsconfig.base.json')) },
  );
  return summary(result.output);
}

function summary(output: ICruiseResult | string): RuleReport {
  if (typeof output === 'string')
    throw new Error('dependency-cruiser gave a text where a result was asked for');
  const own = output.modules.filter((module) =>
    /^(core|renderer|electron|assets|tests)\/.*\.tsx?$/.test(module.source),
  );
  return {
    modules: own.length,
    violations: output.summary.violations.map(
      ({ rule: { name }, from, to, cycle }) =>
        `${name}: ${from} → ${cycle === undefined ? to : cycle.map((one) => one.name).join(' → ')}`,
    ),
  };
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const { modules, violations } = await dependencyReport();
  for (const violation of violations) process.stdout.write(`${violation}\n`);
  process.stdout.write(`${modules} modules seen, ${violations.length} imports that may not be.\n`);
  if (modules === 0 || violations.length > 0) process.exitCode = 1;
}
