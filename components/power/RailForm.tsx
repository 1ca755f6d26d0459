"use client";

import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { PowerView } from "@/lib/power/power-view";
import { INLET, railNow, saveRailInput, type RailNow } from "@/lib/rail/schema";
import { typedRail } from "@/lib/rail/typed-rail";
import type { PowerActs } from "./power-acts";

type Values = z.input<typeof saveRailInput>;
type Saved = { id: string; version: number };

type Props = {
  project: string;
  rail: RailNow | null;
  /** What a new one begins with, e.g. the logic's rail that nobody has described. */
  begin?: Partial<Values>;
  sources: PowerView["sources"];
  save: PowerActs["saveRail"];
  onDone: (saved: Saved, values: Values) => void;
  onCancel: () => void;
};

const NAMES: [keyof ReturnType<typeof typedRail>, string][] = [
  ["name", "Name"],
  ["volts", "Voltage"],
  ["tolerancePercent", "Tolerance"],
  ["capacityA", "Supply gives at most"],
  ["segmentMm", "Slot to slot"],
  ["widthMm", "Width"],
  ["thicknessUm", "Thickness"],
];

/** A rail of the machine: what it is, what feeds it, and the copper that leads it along the slots. */
export function RailForm({ project, rail, begin, sources, save, onDone, onCancel }: Props) {
  const stale = useStaleEdit(rail?.version ?? 0, (details) => railNow.safeParse(details).data);
  return (
    <Form<Values, Saved>
      label="Rail"
      schema={saveRailInput}
      defaults={{
        project,
        writeId: crypto.randomUUID(),
        rail: rail?.id ?? "",
        version: rail?.version ?? 0,
        ...typedRail(rail ?? undefined),
        ...begin,
      }}
      action={(values) => stale.send((asked) => save({ ...values, ...asked }))}
      onDone={onDone}
      submitLabel={rail ? "Save the rail" : "Add the rail"}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-3">
            <FormTextField name="name" label="Name" mono autoComplete="off" description="As the pin map has it: +5V." />
            <FormQuantityField name="volts" label="Voltage" placeholder="5 V" />
            <FormQuantityField name="tolerancePercent" label="Tolerance" placeholder="5 %" />
          </div>
          <div className="grid gap-4 sm:grid-cols-2">
            <FormQuantityField
              name="capacityA"
              label="Its supply gives at most"
              placeholder="3 A"
              description="Empty while nobody knows."
            />
            <FormSelect
              name="source"
              label="Fed by"
              options={[
                { id: INLET, label: "The backplane's own inlet" },
                ...sources.map(({ id, code, name }) => ({ id, label: `${code} ${name}` })),
              ]}
            />
          </div>
          <fieldset className="min-w-0 border-t border-rule pt-3">
            <legend className="text-sm font-semibold">Copper on the backplane</legend>
            <p className="mt-0.5 mb-3 text-sm text-ink-soft">
              Of one rail between two neighbouring slots; the ground is taken to be alike. With it the drop along the
              slots is worked out.
            </p>
            <div className="grid gap-4 sm:grid-cols-3">
              <FormQuantityField name="segmentMm" label="Slot to slot" placeholder="20.32 mm" />
              <FormQuantityField name="widthMm" label="Width" placeholder="5 mm" />
              <FormQuantityField name="thicknessUm" label="Thickness" placeholder="35 µm" />
            </div>
          </fieldset>
          {stale.theirs && <Theirs theirs={stale.theirs} yours={form.getValues()} />}
        </>
      )}
    </Form>
  );
}

function Theirs({ theirs, yours }: { theirs: RailNow; yours: Values }) {
  const typed = typedRail(theirs);
  return <TheirVersion rows={NAMES.map(([field, name]) => ({ name, theirs: typed[field], yours: yours[field] }))} />;
}
