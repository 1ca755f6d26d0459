"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { z } from "zod";
import { NO_ANSWER, type Refused } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { fieldErrors } from "@/lib/actions/field-errors";
import type { Answer } from "@/lib/actions/answer";
import type { EntryView } from "@/lib/log-entry/entry-view";
import { editEntryInput, writeEntryInput, type EditEntryInput, type WriteEntryInput } from "@/lib/log-entry/schema";
import { draftKey, forgetDraft, freshDraft, keepDraft, readDraft, type EntryDraft } from "./entry-draft";

export type WriteAction = (input: WriteEntryInput) => Promise<Answer<{ id: string }>>;
export type EditAction = (input: EditEntryInput) => Promise<Answer<{ id: string }>>;

export type EditorWiring = {
  project: string;
  unit: string;
  entry?: EntryView | undefined;
  write?: WriteAction | undefined;
  edit?: EditAction | undefined;
};

const conflictSchema = z.object({ current: z.object({ title: z.string(), body: z.string(), version: z.number() }) });
export type Conflict = z.infer<typeof conflictSchema>["current"];

/** What is typed, kept on the device with each change, and the way it is saved. Runs in the browser only. */
export function useEntryEditor({ project, unit, entry, write, edit }: EditorWiring) {
  const router = useRouter();
  const key = draftKey(project, entry?.id);
  const [start] = useState(() => readDraft(key));
  const [draft, setDraft] = useState(() => start ?? freshDraft(entry, unit));
  const [restoredAt, setRestoredAt] = useState(start?.savedAt ?? null);
  const [isKept, setKept] = useState(true);
  const [isPending, setPending] = useState(false);
  const [error, setError] = useState<Refused>();
  const [conflict, setConflict] = useState<Conflict>();

  // Beside the state, so that two changes in one event both count and each is kept on the device at once.
  const latest = useRef(draft);

  function put(next: EntryDraft) {
    latest.current = next;
    setDraft(next);
  }

  function change(part: Partial<EntryDraft> | ((before: EntryDraft) => Partial<EntryDraft>)) {
    const before = latest.current;
    put({ ...before, ...(typeof part === "function" ? part(before) : part) });
    setKept(keepDraft(key, latest.current));
  }

  function discard() {
    forgetDraft(key);
    put(freshDraft(entry, unit));
    setRestoredAt(null);
    setError(undefined);
  }

  function refused(refusal: Refused & { details?: Record<string, unknown> }) {
    setError(refusal);
    setConflict(conflictSchema.safeParse(refusal.details).data?.current);
  }

  async function save() {
    const { writeId, title, body, version } = draft;
    const pictures = draft.pictures.map(({ id, caption }) => ({ id, caption }));
    const input = { project, writeId, title, body, unit: draft.unit, pictures };
    const checked = entry
      ? editEntryInput.safeParse({ ...input, entryId: entry.id, version })
      : writeEntryInput.safeParse(input);
    if (!checked.success)
      return refused({ code: "invalid", message: "Something needs another look.", fields: fieldErrors(checked.error) });
    setPending(true);
    const answer = await send(input, version).finally(() => setPending(false));
    if (!answer.ok) return refused(answer.error);
    forgetDraft(key);
    toast({ text: entry ? "Saved the entry." : "The entry stands in the log." });
    router.push(`/projects/${project}/log/${answer.value.id}`);
    router.refresh();
  }

  async function send(input: WriteEntryInput, version: number): Promise<Answer<{ id: string }>> {
    try {
      if (entry && edit) return await edit({ ...input, entryId: entry.id, version });
      if (write) return await write(input);
    } catch {
      // The network is gone; what was typed is still here.
    }
    return { ok: false, error: { code: "unavailable", message: NO_ANSWER.message } };
  }

  /** After a conflict: go on with one's own text over theirs, or take theirs and lose one's own. */
  function settle(choice: "mine" | "theirs") {
    if (!conflict) return;
    const { version } = conflict;
    change({
      version,
      writeId: crypto.randomUUID(),
      ...(choice === "theirs" ? { title: conflict.title, body: conflict.body } : {}),
    });
    setConflict(undefined);
    setError(undefined);
  }

  return { draft, change, discard, save, settle, restoredAt, isKept, isPending, error, conflict };
}
