import { describe, expect, it } from 'vitest';
import type { Project } from '../../../core/project/model.ts';
import { newProject } from '../../../core/project/newProject.ts';
import {
  type History,
  recorded,
  redoLabel,
  redone,
  startedHistory,
  undoLabel,
  undone,
} from '../../../renderer/store/history.ts';

const named = (name: string): Project => ({ ...newProject('shed'), name });

function renamed(history: History, name: string, key: string | null, at: number): History {
  return recorded(history, { project: named(name), label: `Name it ${name}`, key, at });
}

describe('the history of a project', () => {
  it('has nothing to undo or redo when it starts', () => {
    const history = startedHistory(named('a'));
    expect([undoLabel(history), redoLabel(history)]).toEqual([null, null]);
    expect(undone(history)).toBe(history);
    expect(redone(history)).toBe(history);
  });

  it('goes back and forth through its steps, each with its label', () => {
    const history = renamed(renamed(startedHistory(named('a')), 'b', null, 1), 'c', null, 2);
    expect(undoLabel(history)).toBe('Name it c');
    const back = undone(history);
    expect([back.present.project.name, undoLabel(back), redoLabel(back)]).toEqual([
      'b',
      'Name it b',
      'Name it c',
    ]);
    expect(redone(back).present.project.name).toBe('c');
  });

  it('gives the very project back that was there, so that "saved" is told by identity', () => {
    const first = named('a');
    const history = renamed(startedHistory(first), 'b', null, 1);
    expect(undone(history).present.project).toBe(first);
  });

  it('takes edits of one field that follow each other soon as one step', () => {
    const history = renamed(renamed(startedHistory(named('a')), 'b', 'name', 100), 'c', 'name', 900);
    expect(history.past).toHaveLength(1);
    expect(undone(history).present.project.name).toBe('a');
  });

  it('keeps edits of one field apart when time has passed, and edits of two fields always', () => {
    const slow = renamed(renamed(startedHistory(named('a')), 'b', 'name', 100), 'c', 'name', 5000);
    const two = renamed(renamed(startedHistory(named('a')), 'b', 'name', 100), 'c', 'width', 200);
    expect([slow.past.length, two.past.length]).toEqual([2, 2]);
  });

  it('never joins steps without a key', () => {
    const history = renamed(renamed(startedHistory(named('a')), 'b', null, 1), 'c', null, 2);
    expect(history.past).toHaveLength(2);
  });

  it('does not join a new edit to a step that was gone back to', () => {
    const history = undone(renamed(renamed(startedHistory(named('a')), 'b', 'name', 100), 'c', 'width', 200));
    const again = renamed(history, 'd', 'name', 300);
    expect(undone(again).present.project.name).toBe('b');
  });

  it('forgets what was undone once something else is done', () => {
    const back = undone(renamed(startedHistory(named('a')), 'b', null, 1));
    const other = renamed(back, 'c', null, 2);
    expect(redoLabel(other)).toBe(null);
    expect(redone(other)).toBe(other);
  });

  it('lets the oldest steps go beyond two hundred', () => {
    let history = startedHistory(named('0'));
    for (let step = 1; step <= 250; step++) history = renamed(history, String(step), null, step);
    expect(history.past).toHaveLength(200);
    expect(history.past[0]?.project.name).toBe('50');
  });
});
