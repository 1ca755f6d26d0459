import { useMemo, useSyncExternalStore } from "react";
import { filesOf, watchFiles } from "./queue/file-shelf";
import type { HeldFile } from "./queue/held-attempt";

const NONE: readonly HeldFile[] = [];

/** The files that this person took for a check and that no attempt has taken along yet. */
export function useHeldFiles(userId: string, checkId: string): readonly HeldFile[] {
  const all = useSyncExternalStore(
    watchFiles,
    () => filesOf(checkId),
    () => NONE,
  );
  return useMemo(() => all.filter((file) => file.userId === userId), [all, userId]);
}
