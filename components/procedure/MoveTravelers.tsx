"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { toast } from "@/components/ui/toast-store";
import { useSubmit } from "@/components/ui/form/useSubmit";
import type { MoveView } from "@/lib/traveler/load-move";
import { DifferenceSheet } from "./DifferenceSheet";
import type { ProcedureActs } from "./procedure-acts";

/** Units whose traveler follows an older version, each with what moving it over would change. */
export function MoveTravelers({
  project,
  moves,
  move,
}: {
  project: string;
  moves: readonly MoveView[];
  move: ProcedureActs["move"];
}) {
  return (
    <Panel title="On an older version" note={moves.length === 1 ? "1 unit" : `${moves.length} units`}>
      <ul className="flex flex-col gap-2">
        {moves.map((one) => (
          <li key={one.serial} className="flex flex-wrap items-center justify-between gap-2">
            <span>
              <span className="mono text-sm font-semibold">{one.serial}</span>{" "}
              <span className="text-sm text-ink-soft">version {one.from}</span>
            </span>
            <Dialog
              title={`Move ${one.serial} from version ${one.from} to ${one.to}`}
              width="lg"
              trigger={<Button size="sm">Move over</Button>}
            >
              {(close) => <Move project={project} one={one} move={move} close={close} />}
            </Dialog>
          </li>
        ))}
      </ul>
    </Panel>
  );
}

type MoveProps = { project: string; one: MoveView; move: ProcedureActs["move"]; close: () => void };

function Move({ project, one, move, close }: MoveProps) {
  const router = useRouter();
  const [writeId] = useState(() => crypto.randomUUID());
  const { submit, isPending, error } = useSubmit(move, {
    onDone: () => {
      close();
      toast({ text: `${one.serial} follows version ${one.to} now.` });
      router.refresh();
    },
  });
  const { changed, dropped } = one.difference;
  return (
    <>
      <p className="mb-3 text-[0.9375rem] text-ink-soft">
        Attempts of unchanged checks stay.{" "}
        {changed.length + dropped.length > 0 &&
          "Changed and dropped checks are kept on the traveler as history; changed ones are to be done again."}
      </p>
      <DifferenceSheet difference={one.difference} />
      {error && (
        <Notice kind="error" className="mt-3">
          {error.message}
        </Notice>
      )}
      <DialogActions>
        <Button onPress={close}>Leave it</Button>
        <Button
          kind="primary"
          isPending={isPending}
          onPress={() => void submit({ project, writeId, unit: one.serial, from: one.from, to: one.to })}
        >
          Move {one.serial} over
        </Button>
      </DialogActions>
    </>
  );
}
