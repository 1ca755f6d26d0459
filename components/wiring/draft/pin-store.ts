import { addStep, NO_HISTORY, redoStep, undoStep, type History, type Step } from "../grid/history";
import type { Selection } from "../grid/selection";
import type { CellChange } from "../grid/table-text";
import { putOnShelf, readShelf, type ShelfOf } from "./draft-shelf";
import {
  afterSave,
  applyChanges,
  rebased,
  typedSince,
  withoutDraft,
  type Drafts,
  type KeptMap,
  type KeptRows,
  type SentRow,
} from "./pin-drafts";

/** Who saved what stands in the way of a draft, where the server said so. */
export type TheirSave = { by: string; at: string | null };

export type PinState = {
  kept: KeptMap;
  drafts: Drafts;
  history: History;
  /** By connector. */
  theirs: Readonly<Record<string, TheirSave>>;
  /** Pins that were found on this device when the page was opened. */
  restored: number;
  /** False while the device does not keep what is typed. */
  isShelved: boolean;
};

export type PinStore = ReturnType<typeof createPinStore>;

/**
 * What is kept on the server and what was typed over it, outside of React, so that a key press, a save that comes back
 * and a reload all work on the same thing. Every change is put on the device's shelf at once.
 */
export function createPinStore(kept: KeptMap, shelf: ShelfOf) {
  const first: PinState = { kept, drafts: {}, history: NO_HISTORY, theirs: {}, restored: 0, isShelved: true };
  let state = first;
  let hasStarted = false;
  const listeners = new Set<() => void>();

  function put(change: Partial<PinState>) {
    const before = state;
    state = { ...state, ...change };
    if (state.drafts !== before.drafts) {
      state = { ...state, isShelved: putOnShelf(shelf, before.drafts, state.drafts) };
    }
    listeners.forEach((listener) => listener());
  }

  /** In the browser only: the server knows nothing of what was typed, and the first picture must be the same. */
  function start() {
    if (hasStarted) return;
    hasStarted = true;
    const found = readShelf(shelf);
    const drafts = Object.fromEntries(
      Object.entries(found).flatMap(([id, draft]) => {
        const now = state.kept[id];
        const same = now && now.version === draft.version ? rebased(draft, now) : draft;
        return same ? [[id, same] as const] : [];
      }),
    );
    const restored = Object.values(drafts).reduce((sum, { pins }) => sum + Object.keys(pins).length, 0);
    if (Object.keys(found).length > 0) put({ drafts, restored });
  }

  function follow(step: Step | undefined, history: History | undefined) {
    if (!step || !history) return undefined;
    put({ drafts: applyChanges(state.drafts, state.kept, step.changes), history });
    return step;
  }

  function settle(connectorId: string, draft: Drafts[string] | undefined) {
    const drafts = withoutDraft(state.drafts, connectorId);
    const { [connectorId]: _settled, ...theirs } = state.theirs;
    // Steps of before speak of cells as they were before somebody else's save.
    put({ drafts: draft ? { ...drafts, [connectorId]: draft } : drafts, theirs, history: NO_HISTORY });
  }

  return {
    subscribe(listener: () => void) {
      listeners.add(listener);
      queueMicrotask(start);
      return () => void listeners.delete(listener);
    },
    read: () => state,
    readOnServer: () => first,

    apply(changes: readonly CellChange[], selection: Selection) {
      if (changes.length === 0) return;
      const history = addStep(state.history, { changes, selection });
      put({ drafts: applyChanges(state.drafts, state.kept, changes), history });
    },
    undo() {
      const undone = undoStep(state.history);
      return follow(undone?.step, undone?.history);
    },
    redo() {
      const redone = redoStep(state.history);
      return follow(redone?.step, redone?.history);
    },

    saved(connectorId: string, version: number, sent: readonly SentRow[]) {
      const now = afterSave(state.kept, connectorId, version, sent);
      const draft = state.drafts[connectorId];
      const rest = draft && now[connectorId] && rebased(typedSince(draft, sent), now[connectorId]);
      const drafts = withoutDraft(state.drafts, connectorId);
      put({ kept: now, drafts: rest ? { ...drafts, [connectorId]: rest } : drafts, restored: 0 });
    },
    /** What the server has now: after a refused save, or when the page was loaded anew. Older answers are ignored. */
    receive(rows: KeptMap, theirs: Readonly<Record<string, TheirSave>> = {}) {
      const newer = Object.entries(rows).filter(([id, { version }]) => version > (state.kept[id]?.version ?? 0));
      if (newer.length > 0)
        put({ kept: { ...state.kept, ...Object.fromEntries(newer) }, theirs: { ...state.theirs, ...theirs } });
    },
    /** The connectors that are there: a removed one is no longer kept, its draft waits to be thrown away. */
    keepOnly(ids: readonly string[]) {
      const gone = Object.keys(state.kept).filter((id) => !ids.includes(id));
      if (gone.length > 0)
        put({ kept: Object.fromEntries(Object.entries(state.kept).filter(([id]) => ids.includes(id))) });
    },
    /** After a conflict: one's own typing over what the server has now, to be saved next. */
    goOnWithMine(connectorId: string) {
      const draft = state.drafts[connectorId];
      const now: KeptRows | undefined = state.kept[connectorId];
      settle(connectorId, draft && now && rebased(draft, now));
    },
    takeTheirs: (connectorId: string) => settle(connectorId, undefined),
    discard: () => put({ drafts: {}, history: NO_HISTORY, theirs: {}, restored: 0 }),
    forgetRestored: () => put({ restored: 0 }),
  };
}

/** Connectors whose draft was typed against another version than the server has now. */
export const conflictsOf = ({ kept, drafts }: PinState): string[] =>
  Object.entries(drafts).flatMap(([id, { version }]) => {
    const now = kept[id];
    return now && now.version !== version ? [id] : [];
  });

/** Drafts of connectors that are gone. */
export const strayDrafts = ({ kept, drafts }: PinState): string[] => Object.keys(drafts).filter((id) => !kept[id]);
