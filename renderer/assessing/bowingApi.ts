/** What a worker of the pool does, and what it hands its finds to. Everything that crosses is plain data. */
import type { FoundBowings } from '../../core/assess/bayWork.ts';
import type { Project } from '../../core/project/model.ts';

export interface BowingApi {
  /** Sets the project out. What is found goes through the port to a `Keeper`, past the window's own thread. */
  begin(project: Project, keeper: MessagePort): void;
  /** Works some bays out, by their places in the project, and comes back once the keeper has them. */
  work(bays: readonly number[]): Promise<void>;
}

/** The other end of that port. */
export interface Keeper {
  remember(found: readonly FoundBowings[]): void;
}
