import { readdir } from 'node:fs/promises';
import { beforeAll, describe, expect, it } from 'vitest';
import { dependencyReport, type RuleReport } from './dependencyRules.ts';
import { ROOMS } from './rooms.ts';

describe('imports', () => {
  let report: RuleReport;
  beforeAll(async () => {
    report = await dependencyReport();
  });

  it('were looked at: a parser that understands nothing finds no fault either', () => {
    // Well below what is there, and well above what a parser sees that gives up on TypeScript.
    expect(report.modules).toBeGreaterThan(100);
  });

  it('keep to the boundaries between rooms', () => {
    expect(report.violations).toEqual([]);
  });
});

describe('the rooms of core', () => {
  it('all have their place in the order', async () => {
    const entries = await readdir('core', { withFileTypes: true });
    const rooms = entries.filter((entry) => entry.isDirectory()).map((entry) => entry.name);
    expect(rooms.filter((room) => !ROOMS.flat().includes(room))).toEqual([]);
  });
});
