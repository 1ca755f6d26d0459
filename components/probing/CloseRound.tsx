"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { TextArea } from "@/components/ui/TextArea";
import { toast } from "@/components/ui/toast-store";
import type { RoundPage } from "@/lib/probing/load-round-page";
import type { closeRoundInput } from "@/lib/probing/schema";

export type CloseAct = (
  input: z.input<typeof closeRoundInput>,
) => Promise<Reply<{ said: string; conforms: boolean; attemptId: string | null }>>;

type Props = { page: RoundPage; project: string; close: CloseAct };

const NO_CHECK = "none";

/** The end of a round: it becomes an attempt of a check, whose verdict follows from the answers. */
export function CloseRound({ page: { round, said, conforms, checks }, project, close }: Props) {
  const router = useRouter();
  const known = checks.find(({ id }) => id === round.checkId) ?? checks[0];
  const [checkId, setCheck] = useState(known?.id ?? NO_CHECK);
  const [note, setNote] = useState("");
  // One attempt and one write, however often it is pressed.
  const ids = useRef<{ writeId: string; attemptId: string }>(undefined);
  const { submit, isPending, error } = useSubmit(close, {
    onDone: (value) => {
      toast({ text: `The round is closed: ${value.said}.` });
      router.refresh();
    },
  });
  const press = () => {
    ids.current ??= { writeId: crypto.randomUUID(), attemptId: crypto.randomUUID() };
    void submit({ project, plan: round.id, ...ids.current, checkId: checkId === NO_CHECK ? null : checkId, note });
  };
  return (
    <Panel title="Close the round">
      <div className="flex flex-col gap-4">
        {checks.length === 0 ? (
          <p className="text-[0.9375rem] text-ink-soft">
            No continuity check of {round.unit.serial} takes a statement, so the round is closed without an attempt.
          </p>
        ) : (
          <Select
            label="Record it as an attempt of"
            options={[...checks.map(({ id, title }) => ({ id, label: title })), { id: NO_CHECK, label: "No check" }]}
            value={checkId}
            onChange={(id) => {
              // Another check is another attempt.
              ids.current = undefined;
              setCheck(id);
            }}
          />
        )}
        {checkId !== NO_CHECK && (
          <Notice kind={conforms ? "passed" : "failed"} role="none">
            {conforms ? "Will be recorded as conforming: " : "Will be recorded as not conforming: "}
            {said}.
          </Notice>
        )}
        {checkId !== NO_CHECK && <TextArea label="Note" value={note} onChange={setNote} />}
        {error && <Notice kind="error">{error.message}</Notice>}
        <Button kind="primary" isPending={isPending} onPress={press}>
          {checkId === NO_CHECK ? "Close the round" : "Record and close"}
        </Button>
        <p className="text-sm text-ink-soft">Every answer stays; nothing more can be added.</p>
      </div>
    </Panel>
  );
}
