import type { Selection } from "./selection";
import type { CellChange } from "./table-text";

/** One act of editing, as it is undone and redone: all its cells, and where one was. */
export type Step = { changes: readonly CellChange[]; selection: Selection };

export type History = { past: readonly Step[]; future: readonly Step[] };

export const NO_HISTORY: History = { past: [], future: [] };

const MOST_STEPS = 200;

/** A new step ends what could be redone. */
export const addStep = ({ past }: History, step: Step): History => ({
  past: [...past, step].slice(-MOST_STEPS),
  future: [],
});

export const reversed = (changes: readonly CellChange[]): CellChange[] =>
  changes.map(({ before, after, ...key }) => ({ ...key, before: after, after: before })).reverse();

/** The changes that take the last step back, and the history after that. */
export function undoStep({ past, future }: History): { step: Step; history: History } | undefined {
  const last = past.at(-1);
  if (!last) return undefined;
  const step = { changes: reversed(last.changes), selection: last.selection };
  return { step, history: { past: past.slice(0, -1), future: [last, ...future] } };
}

export function redoStep({ past, future }: History): { step: Step; history: History } | undefined {
  const [next, ...rest] = future;
  return next && { step: next, history: { past: [...past, next], future: rest } };
}
