import type { ProjectProblem } from '../../core/project/problem.ts';
import type { HostProblem, RecoveryCopy } from '../host/host.ts';

/** What was asked for when unsaved changes stood in the way. */
export type NextStep =
  | { readonly kind: 'new' }
  | { readonly kind: 'example' }
  | { readonly kind: 'open' }
  | { readonly kind: 'open recent'; readonly token: string }
  | { readonly kind: 'close' };

/** The one dialog that may be open. Plain data: what it needs to be drawn. */
export type Dialog =
  | { readonly kind: 'settings' }
  | { readonly kind: 'own stock' }
  | { readonly kind: 'about' }
  | { readonly kind: 'keyboard' }
  | { readonly kind: 'report' }
  | { readonly kind: 'bay'; readonly bay: string }
  | { readonly kind: 'broken file'; readonly name: string; readonly problems: readonly ProjectProblem[] }
  | { readonly kind: 'host problem'; readonly doing: string; readonly problem: HostProblem }
  | { readonly kind: 'changed on disk'; readonly name: string; readonly next: NextStep | null }
  | { readonly kind: 'unsaved'; readonly next: NextStep }
  | { readonly kind: 'recovery'; readonly copy: RecoveryCopy };
