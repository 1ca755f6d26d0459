/** What was entered for a check and not recorded yet. Evidence already uploaded is named by id. */
export type Draft = { record: unknown; note: string; attachmentIds: string[] };

const key = (userId: string, checkId: string) => `boardwake-draft:${userId}:${checkId}`;

function isDraft(value: unknown): value is Draft {
  if (typeof value !== "object" || value === null) return false;
  const { note, attachmentIds } = value as Partial<Record<keyof Draft, unknown>>;
  return typeof note === "string" && Array.isArray(attachmentIds) && attachmentIds.every((id) => typeof id === "string");
}

/** The draft kept for a check, if any. Storage may be forbidden or full; then nothing is kept and nothing breaks. */
export function readDraft(userId: string, checkId: string): Draft | undefined {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(key(userId, checkId)) ?? "null");
    return isDraft(value) ? value : undefined;
  } catch {
    return undefined;
  }
}

export function keepDraft(userId: string, checkId: string, draft: Draft | undefined): void {
  try {
    if (draft) localStorage.setItem(key(userId, checkId), JSON.stringify(draft));
    else localStorage.removeItem(key(userId, checkId));
  } catch {
    // Full or forbidden: the draft lives as long as the page.
  }
}
