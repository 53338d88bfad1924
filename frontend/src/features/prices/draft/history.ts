import { type Draft, EMPTY_DRAFT } from './draft';

/** A draft with the steps before it and those that were undone. */
export interface DraftHistory {
  past: readonly Draft[];
  present: Draft;
  future: readonly Draft[];
}

export const NO_HISTORY: DraftHistory = { past: [], present: EMPTY_DRAFT, future: [] };

const MOST_STEPS = 200;

export type DraftStep =
  /** A change that can be undone. */
  | { type: 'change'; to: (draft: Draft) => Draft }
  /** What is only noted at the draft, such as the server's refusals. */
  | { type: 'note'; to: (draft: Draft) => Draft }
  | { type: 'undo' }
  | { type: 'redo' }
  /** All of it is saved. */
  | { type: 'saved' };

export function stepHistory(history: DraftHistory, step: DraftStep): DraftHistory {
  const { past, present, future } = history;
  if (step.type === 'saved') return NO_HISTORY;
  if (step.type === 'note') return { ...history, present: step.to(present) };
  if (step.type === 'undo')
    return past.length === 0
      ? history
      : { past: past.slice(0, -1), present: past.at(-1)!, future: [present, ...future] };
  if (step.type === 'redo')
    return future.length === 0
      ? history
      : { past: [...past, present], present: future[0], future: future.slice(1) };
  return { past: [...past, present].slice(-MOST_STEPS), present: step.to(present), future: [] };
}
