/** Files of every version that was ever given out must open for good. They are never regenerated: what they hold is what users have. */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { readProject } from '../../../core/project/readProject.ts';
import { writeProject } from '../../../core/project/writeProject.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const folder = new URL('../../fixtures/projects/v1/', import.meta.url);
const files = readdirSync(folder).filter((name) => name.endsWith('.json'));

describe('files of version 1', () => {
  it('are there for every kind of bay, and for a project without any', () => {
    expect(files.sort()).toEqual(['empty.json', 'free.json', 'knee.json', 'roof.json', 'wall.json']);
  });

  it.each(files)('%s opens, says again what it said, and can be assessed', (name) => {
    const text = readFileSync(new URL(name, folder), 'utf8');
    const read = readProject(text);
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    expect(read.migratedFrom).toBeNull();
    expect(JSON.parse(writeProject(read.project))).toEqual(JSON.parse(text));
    expect(() => assess(read.project, CATALOGUES)).not.toThrow();
  });

  it('keep every mark of a bar: the wall of every pattern still shows its own section, roll and overrides', () => {
    const read = readProject(readFileSync(new URL('wall.json', folder), 'utf8'));
    if (!read.ok) throw new Error('does not open');
    const { layout } = assess(read.project, CATALOGUES);
    const angle = layout.bars.get('W1/t1.rise')?.angle;
    expect(angle?.stock?.designation).toBe('80x80x8');
    expect(angle?.mark.overrides).toHaveLength(2);
    expect(layout.crossings.get('W1/t1.fall+t1.rise')?.join).toEqual({ kind: 'cut', cutBar: 't1.fall' });
  });
});
