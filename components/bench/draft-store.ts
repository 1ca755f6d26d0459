/** What was entered for a check and not recorded yet. */
export type Draft = { entry: unknown; note: string };

const kept = new Map<string, Draft | undefined>();
const watchers = new Set<() => void>();

const key = (userId: string, checkId: string) => `boardwake-draft:${userId}:${checkId}`;

function isDraft(value: unknown): value is Draft {
  return (
    typeof value === "object" && value !== null && "entry" in value && "note" in value && typeof value.note === "string"
  );
}

function read(name: string): Draft | undefined {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(name) ?? "null");
    return isDraft(value) ? value : undefined;
  } catch {
    return undefined;
  }
}

/** The draft of a check, from this page or kept from before a reload. The same object until it changes. */
export function draftOf(userId: string, checkId: string): Draft | undefined {
  const name = key(userId, checkId);
  if (!kept.has(name)) kept.set(name, read(name));
  return kept.get(name);
}

/** Keeps what was typed; undefined forgets it. Where storage is forbidden or full, it lasts as long as the page. */
export function keepDraft(userId: string, checkId: string, draft: Draft | undefined): void {
  const name = key(userId, checkId);
  kept.set(name, draft);
  try {
    if (draft) localStorage.setItem(name, JSON.stringify(draft));
    else localStorage.removeItem(name);
  } catch {
    // Kept in memory.
  }
  for (const watch of watchers) watch();
}

export function watchDrafts(watch: () => void): () => void {
  watchers.add(watch);
  return () => void watchers.delete(watch);
}
