"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { toast } from "@/components/ui/toast-store";
import type { EntryView } from "@/lib/log-entry/entry-view";
import type { EntryInput } from "@/lib/log-entry/schema";

type EntryAction = (input: EntryInput) => Promise<Reply<{ id: string }>>;
/** The server actions on a whole entry; handed in by the page. */
export type EntryActions = { archive: EntryAction; restore: EntryAction };

type Props = { project: string; entry: EntryView; actions: EntryActions };

/** Archives at once and offers to take it back: nothing is lost. */
export function ArchiveEntry({ project, entry, actions }: Props) {
  const { act, isPending } = useEntryAct(project, entry, actions);
  return (
    <Button isPending={isPending} onPress={() => void act("archive")}>
      Archive
    </Button>
  );
}

export function RestoreEntry({ project, entry, actions }: Props) {
  const { act, isPending } = useEntryAct(project, entry, actions);
  return (
    <Button kind="primary" isPending={isPending} onPress={() => void act("restore")}>
      Restore
    </Button>
  );
}

function useEntryAct(project: string, entry: EntryView, actions: EntryActions) {
  const router = useRouter();
  const archive = useSubmit(actions.archive);
  const restore = useSubmit(actions.restore);

  async function act(verb: keyof EntryActions): Promise<void> {
    const { submit } = verb === "archive" ? archive : restore;
    const reply = await submit({ project, writeId: crypto.randomUUID(), entryId: entry.id });
    if (!reply.ok) return void toast({ kind: "error", text: reply.error.message });
    if (verb === "archive") toast({ text: `Archived “${entry.title}”.`, undo: { run: () => act("restore") } });
    else toast({ text: `Restored “${entry.title}”.` });
    router.refresh();
  }

  return { act, isPending: archive.isPending || restore.isPending };
}
