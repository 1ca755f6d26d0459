"use client";

import { useRef, useState } from "react";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Checkbox } from "@/components/ui/Checkbox";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import { takeRows } from "@/lib/pin-map-file/take-rows";
import type { takePinMapsInput } from "@/lib/pin-map/schema";
import type { TakeRead } from "./use-take-state";

type Input = z.input<typeof takePinMapsInput>;
type Taken = { connectors: number; pins: number };
type Props = {
  read: TakeRead;
  project: string;
  take: (input: Input) => Promise<Reply<Taken>>;
  onTaken: (taken: Taken) => void;
};

/** The last word: nothing before it changes anything, and bad rows are left out only when somebody says so. */
export function TakeConfirm({ read: { plan, judged }, project, take, onTaken }: Props) {
  const [isWithout, setWithout] = useState(false);
  const sent = useRef<{ of: typeof plan; writeId: string }>(undefined);
  const { submit, isPending, error } = useSubmit(take, { onDone: onTaken });
  const changes = plan.added + plan.changed + plan.cleared;
  const bad = judged.bad.length;
  const isHeld = changes === 0 || (bad > 0 && !isWithout);

  function press() {
    // The same plan sent again is the same change; another plan is another one.
    const writeId = sent.current?.of === plan ? sent.current.writeId : crypto.randomUUID();
    sent.current = { of: plan, writeId };
    void submit({ project, writeId, connectors: takeRows(plan) });
  }

  return (
    <Panel>
      {bad > 0 && (
        <Checkbox
          label={`Take the ${counted(judged.rows - bad, "good row")} without the ${counted(bad, "row")} that cannot be taken`}
          value={isWithout}
          onChange={setWithout}
          className="mb-3"
        />
      )}
      {error && (
        <Notice kind="failed" className="mb-3">
          {error.message}{" "}
          {error.code === "conflict" && "Reload the page, open the file again and look at what would change now."}
        </Notice>
      )}
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button kind="primary" isDisabled={isHeld} isPending={isPending} onPress={press}>
          {changes === 0 ? "Take it" : `Take ${counted(changes, "change")}`}
        </Button>
        <p className="max-w-prose text-sm text-ink-soft">
          {changes === 0
            ? "The pins carry what the file says already; there is nothing to take."
            : "All of it or nothing. The machine is checked again with it; accepted findings whose facts change are open again."}
        </p>
      </div>
    </Panel>
  );
}
