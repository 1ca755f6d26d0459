import { useSyncExternalStore } from "react";
import { draftOf, keepDraft, watchDrafts, type Draft } from "./draft-store";

/** What was typed for a check; undefined while nothing was. Reloads keep it. */
export function useDraft(userId: string, checkId: string): [Draft | undefined, (draft: Draft | undefined) => void] {
  const draft = useSyncExternalStore(
    watchDrafts,
    () => draftOf(userId, checkId),
    () => undefined,
  );
  return [draft, (next) => keepDraft(userId, checkId, next)];
}
