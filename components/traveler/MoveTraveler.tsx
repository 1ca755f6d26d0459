"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { stageName } from "@/lib/procedure/stages";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { reach } from "@/components/ui/form/reply";
import { Notice } from "@/components/ui/Notice";
import { toast } from "@/components/ui/toast-store";
import { counted } from "@/components/workshop/counted";
import type { MoveView } from "@/lib/traveler/load-move";
import type { Difference } from "@/lib/traveler/compare-versions";
import type { TravelerActs } from "./traveler-acts";

type Props = { project: string; move: MoveView; act: TravelerActs["move"] };

/** Moving a traveler over to the newest procedure: what changes is shown before anything does. */
export function MoveTraveler({ project, move, act }: Props) {
  return (
    <Dialog
      title={`Move ${move.serial} to procedure version ${move.to}`}
      width="lg"
      trigger={<Button>Move to version {move.to}</Button>}
    >
      {(close) => <MoveForm project={project} move={move} act={act} onDone={close} />}
    </Dialog>
  );
}

function MoveForm({ project, move, act, onDone }: Props & { onDone: () => void }) {
  const router = useRouter();
  const writeId = useRef(crypto.randomUUID());
  const [refused, setRefused] = useState<string>();
  const [isPending, setPending] = useState(false);
  const { difference } = move;

  async function go() {
    setPending(true);
    const reply = await reach(() =>
      act({ project, writeId: writeId.current, unit: move.serial, from: move.from, to: move.to }),
    );
    setPending(false);
    if (!reply.ok) return setRefused(reply.error.message);
    toast({ text: `${move.serial} is on version ${move.to}.` });
    onDone();
    router.refresh();
  }

  return (
    <div className="grid gap-4">
      <p className="text-ink-soft">{whatFollows(difference)}</p>
      <Group title="Start afresh" checks={difference.changed} />
      <Group title="New" checks={difference.added} />
      <Group title="No longer asked for" checks={difference.dropped} />
      <Group title="Kept, worded or placed anew" checks={difference.kept.filter((check) => check.edits.length > 0)} />
      {refused && <Notice kind="failed">{refused}</Notice>}
      <DialogActions>
        <Button slot="close">Stay on version {move.from}</Button>
        <Button kind="primary" isPending={isPending} onPress={() => void go()}>
          Move to version {move.to}
        </Button>
      </DialogActions>
    </div>
  );
}

/** One sentence for each thing that happens, and none for what does not. */
function whatFollows({ kept, changed, dropped }: MoveView["difference"]): string {
  const leaves = changed.length + dropped.length > 0;
  return [
    kept.length > 0 && `${counted(kept.length, "check keeps its attempts", "checks keep their attempts")}.`,
    changed.length > 0 &&
      `${counted(changed.length, "asks for something else now and starts afresh", "ask for something else now and start afresh")}.`,
    dropped.length > 0 && `${counted(dropped.length, "is no longer asked for", "are no longer asked for")}.`,
    leaves && "What was recorded for those stays as history.",
  ]
    .filter(Boolean)
    .join(" ");
}

type Line = Difference["added"][number] & Partial<Pick<Difference["changed"][number], "edits">>;

function Group({ title, checks }: { title: string; checks: readonly Line[] }) {
  if (checks.length === 0) return null;
  return (
    <section>
      <h3 className="text-base">
        {title} <span className="text-ink-soft font-text text-sm font-normal">{checks.length}</span>
      </h3>
      <ul className="mt-1">
        {checks.map((check) => (
          <li key={check.key} className="border-rule border-b py-2">
            {check.title} <span className="text-ink-soft text-sm">{stageName(check.stage)}</span>
            {check.edits?.map((edit) => (
              <p key={edit.what} className="text-sm">
                <span className="text-ink-soft">{edit.what}: </span>
                <del className="text-failed">{edit.from || "nothing"}</del>{" "}
                <ins className="text-passed no-underline">{edit.to || "nothing"}</ins>
              </p>
            ))}
          </li>
        ))}
      </ul>
    </section>
  );
}
