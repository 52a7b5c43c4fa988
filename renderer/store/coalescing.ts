import type { Edit } from '../../core/project/edit.ts';

/**
 * What an edit changes, as a key: edits with one key that follow each other soon are one step of undo.
 * Null for an edit that always stands alone, such as a mark at a crossing.
 */
export function coalescingKey(edits: readonly Edit[]): string | null {
  const [edit, ...more] = edits;
  if (edit === undefined || more.length > 0) return null;
  switch (edit.kind) {
    case 'name project':
      return edit.kind;
    case 'settings':
      return `settings ${fields(edit.change)}`;
    case 'bay':
      return `bay ${edit.bay} ${fields(edit.change)}`;
    case 'recipe':
      return `recipe ${edit.bay} ${edit.what}`;
    case 'diagonals':
      return `diagonals ${edit.bay} ${fields(edit.change)}`;
    case 'bars':
      return `bars ${edit.bars.join(' ')} ${fields(edit.change)} ${(edit.clear ?? []).join(' ')}`;
    case 'tension share':
      return `tension share ${edit.bay} ${edit.crossing}`;
    case 'own stock':
    case 'add bay':
    case 'remove bay':
    case 'rename bay':
    case 'join':
    case 'line holder':
      return null;
    case 'load':
      return `load ${edit.loadCase} ${edit.id}`;
    case 'load case':
    case 'combination':
    case 'combinations':
    case 'carry':
      return null;
    default:
      return edit satisfies never;
  }
}

function fields(change: object): string {
  return Object.keys(change).sort().join(' ');
}
