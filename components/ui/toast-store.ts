export type Toast = {
  id: number;
  text: string;
  kind: "passed" | "info" | "error";
  /** Takes the act back. The toast then stays long enough to be reached by keyboard. */
  undo?: { label?: string; run: () => void | Promise<void> };
  milliseconds: number | null;
};

export type NewToast = { text: string; kind?: Toast["kind"]; undo?: Toast["undo"]; milliseconds?: number | null };

const MAX = 3;
const NONE: readonly Toast[] = [];
let shown: readonly Toast[] = NONE;
let nextId = 1;
const listeners = new Set<() => void>();

function set(toasts: readonly Toast[]) {
  shown = toasts;
  listeners.forEach((listener) => listener());
}

/** Errors stay until they are closed; others for 6 s, with an undo for 12 s. */
export function toast({ text, kind = "passed", undo, milliseconds }: NewToast): number {
  const id = nextId++;
  const lasts = milliseconds === undefined ? (kind === "error" ? null : undo ? 12_000 : 6_000) : milliseconds;
  set([...shown, { id, text, kind, milliseconds: lasts, ...(undo ? { undo } : {}) }].slice(-MAX));
  return id;
}

export function dismissToast(id: number): void {
  set(shown.filter((entry) => entry.id !== id));
}

export const toastStore = {
  subscribe: (listener: () => void) => {
    listeners.add(listener);
    return () => void listeners.delete(listener);
  },
  read: () => shown,
  readOnServer: () => NONE,
};
