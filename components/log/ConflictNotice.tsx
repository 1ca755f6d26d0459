"use client";

import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import type { Conflict } from "./use-entry-editor";

/** Two people saved one entry: both texts stand side by side, nothing is merged behind anybody's back. */
export function ConflictNotice({
  conflict,
  onSettle,
}: {
  conflict: Conflict;
  onSettle: (choice: "mine" | "theirs") => void;
}) {
  return (
    <Notice
      kind="error"
      title="Somebody saved this entry meanwhile."
      actions={
        <>
          <Button size="sm" onPress={() => onSettle("mine")}>
            Go on with mine
          </Button>
          <Button size="sm" onPress={() => onSettle("theirs")}>
            Take theirs
          </Button>
        </>
      }
    >
      <p>Yours is still above. This is what stands in the log now:</p>
      <div className="mt-2 max-h-72 overflow-auto whitespace-pre-wrap rounded border border-rule bg-raised p-3 text-sm">
        <strong>{conflict.title}</strong>
        {"\n\n"}
        {conflict.body}
      </div>
    </Notice>
  );
}
