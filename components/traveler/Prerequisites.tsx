"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { reach } from "@/components/ui/form/reply";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { IconButton } from "@/components/ui/IconButton";
import { toast } from "@/components/ui/toast-store";
import type { BlockerView, CheckView } from "@/lib/traveler/traveler-view";
import { PickCheck } from "./PickCheck";
import type { TravelerFrame } from "./traveler-acts";

type Props = { check: CheckView; frame: TravelerFrame; canEdit: boolean };

/** What must hold before this check, on this unit or another, passed or not. */
export function Prerequisites({ check, frame, canEdit }: Props) {
  const router = useRouter();
  const own = check.prerequisites;
  if (own.length === 0 && !canEdit) return null;

  async function remove(needed: BlockerView) {
    const input = { project: frame.project, checkId: check.id, needsCheckId: needed.checkId };
    const reply = await reach(() => frame.acts.removePrerequisite({ ...input, writeId: crypto.randomUUID() }));
    if (!reply.ok) return void toast({ kind: "error", text: reply.error.message });
    const undo = () =>
      reach(() => frame.acts.addPrerequisite({ ...input, writeId: crypto.randomUUID() })).then(() => router.refresh());
    toast({ text: `It no longer waits for “${needed.title}”.`, undo: { run: undo } });
    router.refresh();
  }

  async function add(needsCheckId: string): Promise<string | undefined> {
    const input = { project: frame.project, writeId: crypto.randomUUID(), checkId: check.id, needsCheckId };
    const reply = await reach(() => frame.acts.addPrerequisite(input));
    if (!reply.ok) return reply.error.message;
    toast({ text: "Added. The check waits until that one holds." });
    router.refresh();
    return undefined;
  }

  return (
    <section aria-label="Waits for">
      <h3 className="text-base">Waits for</h3>
      {own.length === 0 && <p className="text-ink-soft mt-1 text-sm">Nothing but the hold points before it.</p>}
      <ul className="mt-1">
        {own.map((needed) => (
          <li
            key={`${needed.checkId} ${needed.why}`}
            className="border-rule flex min-h-11 items-center gap-2.5 border-b"
          >
            <StateGlyph state={needed.state} label={needed.state} size={12} />
            <Link
              className="hover:text-copper min-w-0 flex-1 py-1 text-sm"
              href={`/projects/${frame.project}/units/${encodeURIComponent(needed.serial)}?check=${needed.checkId}`}
            >
              {needed.title}
              {needed.serial !== frame.serial && <span className="mono text-ink-soft"> {needed.serial}</span>}
              <span className="text-ink-soft block text-xs">{needed.why}</span>
            </Link>
            {canEdit && needed.why === "prerequisite" && (
              <IconButton
                icon="close"
                label={`No longer wait for ${needed.title}`}
                onPress={() => void remove(needed)}
              />
            )}
          </li>
        ))}
      </ul>
      {canEdit && (
        <Dialog
          title="Which check must hold first?"
          trigger={
            <Button kind="quiet" size="sm" className="mt-2">
              Add a check it waits for
            </Button>
          }
        >
          {(close) => <PickCheck project={frame.project} not={check.id} onPick={add} onDone={close} />}
        </Dialog>
      )}
    </section>
  );
}
