"use client";

import { useRef, useState } from "react";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { TextField } from "@/components/ui/TextField";
import type { Reply } from "@/components/ui/form/reply";

type Props = {
  /** What goes, with its article: "the project", "PSU-01". */
  what: string;
  /** What it is called in the question: "Purge Tide computer for good?" */
  name: string;
  /** "Type the name of the project: Tide computer" */
  ask: string;
  consequences: readonly string[];
  size?: "sm" | "md";
  purge: (asked: { writeId: string; confirmation: string }) => Promise<Reply<unknown>>;
  onGone: () => void;
};

/** Removing something for good: says what goes with it and wants its name typed. */
export function PurgeDialog({ what, name, ask, consequences, size = "md", purge, onGone }: Props) {
  const [typed, setTyped] = useState("");
  const writeId = useRef(crypto.randomUUID());
  return (
    <ConfirmDialog
      title={`Purge ${name} for good?`}
      trigger={
        <Button kind="danger" size={size}>
          Purge {what}
        </Button>
      }
      consequences={[...consequences, "It cannot be undone."]}
      confirmLabel="Purge it for good"
      onConfirm={async () => {
        const reply = await purge({ writeId: writeId.current, confirmation: typed });
        if (!reply.ok) return reply.error.fields?.confirmation ?? reply.error.message;
        onGone();
      }}
    >
      <TextField label={ask} value={typed} onChange={setTyped} autoComplete="off" />
    </ConfirmDialog>
  );
}
