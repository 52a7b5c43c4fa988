/** What a document says that can be checked: its commands, the scripts it names and the paths it names. */

export interface DocumentedCommand {
  /** As it stands in the document, without the prompt or the remark. */
  readonly line: string;
  /** "README.md:41" */
  readonly where: string;
  /** From a remark behind it that says "exit code 1" or "ends with 1"; 0 without one. */
  readonly exitCode: number;
}

const TAUTLINE = 'npm run --silent tautline --';

/** Commands of the command line that stand in fenced blocks, in order. A line that ends in "\" goes on in the next one. */
export function documentedCommands(name: string, markdown: string): readonly DocumentedCommand[] {
  const commands: DocumentedCommand[] = [];
  let fenced = false;
  let begun: { readonly text: string; readonly number: number } | null = null;
  for (const [index, raw] of markdown.split('\n').entries()) {
    if (/^\s*(```|~~~)/.test(raw)) fenced = !fenced;
    else if (fenced) {
      const text: string = `${begun === null ? '' : `${begun.text} `}${raw.trim().replace(/^\$ /, '')}`;
      const number: number = begun?.number ?? index + 1;
      begun = text.endsWith('\\') ? { text: text.slice(0, -1).trim(), number } : null;
      if (begun === null && text.includes(TAUTLINE)) commands.push(commandOf(text, `${name}:${number}`));
    }
  }
  return commands;
}

function commandOf(text: string, where: string): DocumentedCommand {
  // A remark is set off by a blank, as in a shell.
  const at = text.search(/\s#(\s|$)/);
  const line = at < 0 ? text : text.slice(0, at).trim();
  const remark = at < 0 ? '' : text.slice(at);
  const code = /\b(?:exits?|ends)(?: with)?(?: code)?:? (\d)\b/.exec(remark)?.[1];
  return { line, where, exitCode: Number(code ?? 0) };
}

/** Names of scripts in "npm run NAME", "npm start" and "npm test". */
export function documentedScripts(markdown: string): readonly string[] {
  const run = [...markdown.matchAll(/\bnpm run (?:--silent )?([a-z][\w:-]*)/g)].map((one) => one[1] ?? '');
  const short = [...markdown.matchAll(/\bnpm (start|test)\b/g)].map((one) => one[1] ?? '');
  return [...new Set([...run, ...short])];
}

/** Text between backticks that names a file or a folder of the project, by its shape. */
export function documentedPaths(markdown: string, folders: readonly string[]): readonly string[] {
  const prose = markdown.replace(/^\s*(```|~~~)[\s\S]*?^\s*\1/gm, '');
  const quoted = [...prose.matchAll(/`([^`\n]+)`/g)].map((one) => one[1] ?? '');
  const links = [...prose.matchAll(/\]\((?!https?:|#|mailto:)([^)\s#]+)[^)]*\)/g)].map((one) => one[1] ?? '');
  const paths = quoted.filter(
    (text) =>
      /^[\w.@{},*/-]+$/.test(text) &&
      (folders.includes(text.split('/')[0] ?? '') ? text.includes('/') : /^[A-Z]+\.md$|^LICENSE$/.test(text)),
  );
  return [...new Set([...paths, ...links])];
}
