"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { TextField } from "@/components/ui/TextField";
import { toast } from "@/components/ui/toast-store";
import { FILE_LIMITS } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import type { EvidenceActions } from "./use-evidence-acts";

type Props = { project: string; evidence: EvidenceView; action: EvidenceActions["caption"] };

/** The caption is also what a screen reader says of the picture. */
export function CaptionForm({ project, evidence, action }: Props) {
  const router = useRouter();
  const [caption, setCaption] = useState(evidence.caption);
  // One id for this wording: pressing twice saves once.
  const [writeId, setWriteId] = useState(() => crypto.randomUUID());
  const { submit, isPending, error } = useSubmit(action, {
    onDone: () => {
      toast({ text: "Saved the caption." });
      setWriteId(crypto.randomUUID());
      router.refresh();
    },
  });
  return (
    <form
      className="flex flex-wrap items-end gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        void submit({ project, writeId, attachmentId: evidence.id, caption });
      }}
    >
      <TextField
        label="Caption"
        value={caption}
        onChange={setCaption}
        maxLength={FILE_LIMITS.captionCharacters}
        error={error?.fields?.caption ?? error?.message}
        className="min-w-48 flex-1"
      />
      <Button type="submit" isPending={isPending} isDisabled={caption.trim() === evidence.caption}>
        Save
      </Button>
    </form>
  );
}
