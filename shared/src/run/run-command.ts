import type {
  Circuit,
  ConductorGroup,
  Environment,
  PathElement,
  PlannedPull,
  PullConditions,
  Raceway,
  Rules,
  RunDocument,
} from './run-document';

/**
 * Every edit of a run document. `applyCommand(document, command)` is pure: document in, document out; it throws a
 * `CommandError` for an id that is not there and never returns a half-done edit. Fixes are the same commands.
 */
export type RunCommand =
  | { command: 'set-identity'; args: { tag?: string; title?: string } }
  | { command: 'set-raceway'; args: { raceway: Raceway } }
  | { command: 'set-rules'; args: { rules: Rules } }
  | { command: 'set-start'; args: { start: NonNullable<RunDocument['start']> } }
  | { command: 'set-sets'; args: { sets: number } }
  | { command: 'set-environment'; args: { environment: Environment } }
  | { command: 'set-circuit'; args: { circuit: Circuit } }
  /** All of them; a field given as undefined goes back to the company's or the default. */
  | { command: 'set-conditions'; args: { conditions: PullConditions } }
  /** The whole plan; a section no pull covers is pulled by itself. */
  | { command: 'set-pulls'; args: { pulls: PlannedPull[] } }
  /** `afterId` null: at the start. */
  | { command: 'insert-elements'; args: { afterId: string | null; elements: PathElement[] } }
  /** Fields given replace; a field given as undefined is removed; `kind` and `id` never change. */
  | { command: 'set-element'; args: { elementId: string; patch: Record<string, unknown> } }
  /** Another kind in the same place, under the same id. */
  | { command: 'replace-element'; args: { elementId: string; element: PathElement } }
  | { command: 'remove-elements'; args: { elementIds: string[] } }
  /** `by` places along the path, negative toward the start. */
  | { command: 'move-element'; args: { elementId: string; by: number } }
  /** Cuts a straight `at` inches from its start and puts the element in the cut. */
  | {
      command: 'split-straight';
      args: { elementId: string; at: number; element: PathElement; restId: string };
    }
  | { command: 'add-conductors'; args: { group: ConductorGroup } }
  | { command: 'set-conductors'; args: { group: ConductorGroup } }
  | { command: 'remove-conductors'; args: { groupId: string } };

export type RunCommandName = RunCommand['command'];
