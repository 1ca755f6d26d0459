"use client";

import { useRouter } from "next/navigation";
import { useFormContext, useWatch } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Form } from "@/components/ui/form/Form";
import { Panel } from "@/components/ui/Panel";
import { toast } from "@/components/ui/toast-store";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { BoardNames } from "@/lib/board/load-board-names";
import { STATE_WORDS } from "@/lib/fault/fault-words";
import type { FaultView } from "@/lib/fault/load-fault";
import { FAULT_STATES, faultFields } from "@/lib/fault/schema";
import type { FaultActs } from "./fault-acts";
import { CauseFields, SymptomFields } from "./FaultFields";
import { SimilarFaults } from "./SimilarFaults";

type Fields = z.input<typeof faultFields>;

const text = z.string();
const current = z.object({
  ...{ title: text, symptom: text, suspected: text, tried: text, cause: text, mend: text, lesson: text },
  nextRevision: text,
  state: z.enum(FAULT_STATES),
  version: z.int(),
});

const ROWS = [
  ["What is wrong", "title"],
  ["Symptom", "symptom"],
  ["Suspected", "suspected"],
  ["Tried", "tried"],
  ["Cause", "cause"],
  ["Mend", "mend"],
  ["Lesson", "lesson"],
  ["Next revision", "nextRevision"],
] as const;

type Props = {
  project: string;
  fault: FaultView;
  names: BoardNames;
  acts: Pick<FaultActs, "edit" | "similar">;
  onClose: () => void;
};

/** The whole record in one form; what somebody else wrote meanwhile is shown, never overwritten unseen. */
export function FaultEditor({ project, fault, names, acts, onClose }: Props) {
  const router = useRouter();
  const stale = useStaleEdit(fault.version, (details) => current.safeParse(details).data);
  const { title, symptom, suspected, tried, cause, mend, lesson, nextRevision, state, signals, pins } = fault;
  const defaults: Fields = {
    ...{ title, symptom, suspected, tried, cause, mend, lesson, nextRevision, state, signals, pins },
    hours: fault.hours === null ? "" : String(Number(fault.hours.toFixed(2))),
  };
  return (
    <Form<Fields, { number: number; version: number }>
      label={`Fault F${fault.number}`}
      schema={faultFields}
      defaults={defaults}
      action={(values) => stale.send((asked) => acts.edit({ project, faultId: fault.id, ...asked, ...values }))}
      onDone={() => {
        toast({ text: `F${fault.number} is saved.` });
        onClose();
        router.refresh();
      }}
      submitLabel="Save the fault"
      actions={<Button onPress={onClose}>Leave it as it was</Button>}
    >
      {(form) => (
        <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
          <Panel>
            <div className="flex flex-col gap-4.5">
              <SymptomFields names={names} />
              <CauseFields />
              {stale.theirs && (
                <TheirVersion
                  rows={[
                    ...ROWS.map(([name, key]) => ({
                      name,
                      theirs: stale.theirs?.[key] ?? "",
                      yours: form.getValues(key),
                    })),
                    {
                      name: "How it stands",
                      theirs: STATE_WORDS[stale.theirs.state],
                      yours: STATE_WORDS[form.getValues("state")],
                    },
                  ]}
                />
              )}
            </div>
          </Panel>
          <Similar {...{ project, fault }} find={acts.similar} />
        </div>
      )}
    </Form>
  );
}

function Similar({ project, fault, find }: Pick<Props, "project" | "fault"> & { find: FaultActs["similar"] }) {
  const { control } = useFormContext<Fields>();
  const [title, symptom, cause, signals, pins] = useWatch({
    control,
    name: ["title", "symptom", "cause", "signals", "pins"],
  });
  return (
    <SimilarFaults words={`${title} ${symptom} ${cause}`} except={fault.number} {...{ project, find, signals, pins }} />
  );
}
