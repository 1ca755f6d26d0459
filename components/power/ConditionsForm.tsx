"use client";

import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { conditionsNow, saveConditionsInput, type Conditions } from "@/lib/plan-conditions/schema";
import { typedConditions } from "@/lib/plan-conditions/typed-conditions";
import type { PowerActs } from "./power-acts";

type Values = z.input<typeof saveConditionsInput>;

type Props = {
  project: string;
  conditions: Conditions;
  save: PowerActs["saveConditions"];
  onDone: () => void;
  onCancel: () => void;
};

const FIELDS = {
  ambientC: "Air at the connectors",
  logicVolts: "Logic runs at",
  logicRail: "From the rail",
  pinCapacitancePf: "A connector pin adds",
  sparesPercent: "Spare parts to order",
  currency: "Currency",
} as const satisfies Record<keyof ReturnType<typeof typedConditions>, string>;

/** What the whole plan takes for granted. */
export function ConditionsForm({ project, conditions, save, onDone, onCancel }: Props) {
  const stale = useStaleEdit(conditions.version, (details) => conditionsNow.safeParse(details).data);
  return (
    <Form<Values, { version: number }>
      label="Conditions"
      schema={saveConditionsInput}
      defaults={{
        project,
        writeId: crypto.randomUUID(),
        version: conditions.version,
        ...typedConditions(conditions),
      }}
      action={(values) => stale.send((asked) => save({ ...values, ...asked }))}
      onDone={onDone}
      submitLabel="Save the conditions"
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-2">
            <FormQuantityField
              name="ambientC"
              label={FIELDS.ambientC}
              description="The hottest there; contacts bear less when they are warm."
            />
            <FormQuantityField
              name="pinCapacitancePf"
              label={FIELDS.pinCapacitancePf}
              description="With the copper that leads to it."
            />
            <FormQuantityField name="logicVolts" label={FIELDS.logicVolts} />
            <FormTextField name="logicRail" label={FIELDS.logicRail} mono autoComplete="off" />
            <FormQuantityField name="sparesPercent" label={FIELDS.sparesPercent} />
            <FormTextField name="currency" label={FIELDS.currency} mono autoComplete="off" maxLength={3} />
          </div>
          {stale.theirs && <Theirs theirs={stale.theirs} yours={form.getValues()} />}
        </>
      )}
    </Form>
  );
}

function Theirs({ theirs, yours }: { theirs: Conditions; yours: Values }) {
  const typed = typedConditions(theirs);
  // Object.keys() gives the very keys of the record; the compiler widens them to string.
  const names = Object.keys(FIELDS) as (keyof typeof FIELDS)[];
  return <TheirVersion rows={names.map((name) => ({ name: FIELDS[name], theirs: typed[name], yours: yours[name] }))} />;
}
