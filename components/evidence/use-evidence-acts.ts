"use client";

import { useRouter } from "next/navigation";
import { useSubmit } from "@/components/ui/form/useSubmit";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import type { AttachmentInput, CaptionInput } from "@/lib/attachment/schema";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

/** The server actions that change a file; handed in by the page. */
export type EvidenceActions = {
  caption: (input: CaptionInput) => Promise<Reply<{ caption: string }>>;
  remove: (input: AttachmentInput) => Promise<Reply<{ id: string }>>;
  restore: (input: AttachmentInput) => Promise<Reply<{ id: string }>>;
};

/** Removing with an undo that stands long enough to be reached. The page is loaded anew after each change. */
export function useRemoval(project: string, actions: EvidenceActions, onRemoved: () => void) {
  const router = useRouter();
  const restore = useSubmit(actions.restore);
  const remove = useSubmit(actions.remove);

  async function bringBack(evidence: EvidenceView) {
    const reply = await restore.submit({ project, writeId: crypto.randomUUID(), attachmentId: evidence.id });
    if (!reply.ok) toast({ kind: "error", text: reply.error.message });
    router.refresh();
  }

  async function takeAway(evidence: EvidenceView) {
    const reply = await remove.submit({ project, writeId: crypto.randomUUID(), attachmentId: evidence.id });
    if (!reply.ok) return void toast({ kind: "error", text: reply.error.message });
    toast({ text: `Removed ${evidence.fileName}.`, undo: { run: () => bringBack(evidence) } });
    onRemoved();
    router.refresh();
  }

  return { takeAway, isPending: remove.isPending || restore.isPending };
}
