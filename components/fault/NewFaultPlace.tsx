"use client";

import { usePathname, useRouter } from "next/navigation";
import { useEffect, useRef } from "react";
import { useFormContext, useWatch } from "react-hook-form";
import type { z } from "zod";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { FormComboBox } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { Panel } from "@/components/ui/Panel";
import { toast } from "@/components/ui/toast-store";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { NewFaultView } from "@/lib/fault/load-new-fault";
import { faultFields, openFaultInput } from "@/lib/fault/schema";
import type { FaultActs } from "./fault-acts";
import { CauseFields, SymptomFields } from "./FaultFields";
import { SimilarFaults } from "./SimilarFaults";

const fields = faultFields.extend({ unit: openFaultInput.shape.unit });
type Fields = z.input<typeof fields>;

type Props = { project: string; view: NewFaultView; acts: Pick<FaultActs, "open" | "similar"> };

/** A defect is written down while it is fresh: where, what was seen. The rest may come later. */
export function NewFaultPlace({ project, view, acts }: Props) {
  const router = useRouter();
  const writeId = useRef(crypto.randomUUID());
  const { check, attemptId, probePlanId } = view;
  const defaults: Fields = {
    ...{ unit: view.unit, title: view.title, symptom: view.symptom, signals: view.signals, pins: view.pins },
    ...{ suspected: "", tried: "", cause: "", mend: "", lesson: "", nextRevision: "", hours: "", state: "open" },
  };
  return (
    <Page
      title="A new fault"
      lede={
        check
          ? `Seen at “${check.title}” on ${view.unit}.`
          : "Write down what was seen while it is fresh. Cause and mend may come later."
      }
    >
      <Form<Fields, { number: number }>
        label="New fault"
        schema={fields}
        defaults={defaults}
        action={(values) => {
          // A check belongs to the unit that it was seen on; another unit is another fault.
          const isSame = values.unit === view.unit;
          return acts.open({
            ...values,
            ...{ project, writeId: writeId.current },
            probePlanId: isSame ? probePlanId : null,
            checkId: isSame ? (check?.id ?? null) : null,
            attemptId: isSame ? attemptId : null,
          });
        }}
        onDone={({ number }) => {
          toast({ text: `It is written down as F${number}.` });
          router.push(`/projects/${project}/faults/${number}`);
          router.refresh();
        }}
        submitLabel="Write it down"
        actions={<ButtonLink href={`/projects/${project}/faults`}>Leave it</ButtonLink>}
        className="max-w-5xl"
      >
        <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
          <Panel>
            <div className="flex flex-col gap-4.5">
              <UnitField units={view.units} unit={view.unit} />
              <SymptomFields names={view.names} />
              <Disclosure summary="What is known already: cause, mend, lesson">
                <div className="flex flex-col gap-4.5">
                  <CauseFields />
                </div>
              </Disclosure>
            </div>
          </Panel>
          <Similar project={project} find={acts.similar} />
        </div>
      </Form>
    </Page>
  );
}

/** The board of the unit decides which signals and pins can be picked: they come with the address. */
function UnitField({ units, unit }: Pick<NewFaultView, "units" | "unit">) {
  const { control } = useFormContext<Fields>();
  const chosen = useWatch({ control, name: "unit" });
  const router = useRouter();
  const path = usePathname();
  useEffect(() => {
    if (chosen !== "" && chosen !== unit)
      router.replace(`${path}?unit=${encodeURIComponent(chosen)}`, { scroll: false });
  }, [chosen, unit, router, path]);
  return (
    <FormComboBox
      name="unit"
      label="Unit"
      options={units.map(({ serial, board }) => ({ id: serial, label: serial, description: board }))}
      isRequired
    />
  );
}

function Similar({ project, find }: { project: string; find: FaultActs["similar"] }) {
  const { control } = useFormContext<Fields>();
  const [title, symptom, signals, pins] = useWatch({ control, name: ["title", "symptom", "signals", "pins"] });
  return <SimilarFaults words={`${title} ${symptom}`} except={null} {...{ project, find, signals, pins }} />;
}
