import { describe, expect, it } from 'vitest';
import type { Project } from '../../../core/project/model.ts';
import { newProject } from '../../../core/project/newProject.ts';
import { sameProject } from '../../../renderer/store/sameProject.ts';

const project = newProject('a shed');

describe('two projects', () => {
  it('say the same when nothing in them differs', () => {
    expect(sameProject(project, { ...project, settings: { ...project.settings } })).toBe(true);
  });

  it('differ by anything that a project holds, what acts on it too', () => {
    const acted: Project = { ...project, actions: { cases: [], combinations: [], carries: [] } };
    expect(sameProject(project, acted)).toBe(false);
    expect(sameProject(project, { ...project, name: 'another' })).toBe(false);
  });
});
