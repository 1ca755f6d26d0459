"use client";

import { useWatch, type Control } from "react-hook-form";
import { z } from "zod";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { Notice } from "@/components/ui/Notice";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { FAMILIES, findFamily, type Family } from "@/lib/calc/levels";
import { FIGURE_NAMES, figureOf } from "@/lib/family/figure-list";
import type { FamilyLine } from "@/lib/family/load-families";
import { familyFigures, saveFamilyInput } from "@/lib/family/schema";
import { figureText, typedFigures, type SaveFamily } from "./family-acts";

type Values = z.input<typeof saveFamilyInput>;
type Saved = { id: string; name: string; version: number };

const current = z.object({ name: z.string(), figures: familyFigures, version: z.int() });
const TECHNOLOGIES = [
  { id: "CMOS", label: "CMOS" },
  { id: "bipolar", label: "Bipolar (TTL)" },
];

type Props = {
  line?: FamilyLine & { id: string };
  from?: Family;
  project: string;
  save: SaveFamily;
  onDone: (saved: Saved) => void;
  onCancel: () => void;
};

/** A data sheet's figures as the sheet prints them: worst case over the temperature range, with their units. */
export function FamilyForm({ line, from, project, save, onDone, onCancel }: Props) {
  const family = line?.family ?? from;
  const stale = useStaleEdit(line?.version ?? 0, (details) => current.safeParse(details).data);
  const [writeId] = useState(() => crypto.randomUUID());
  return (
    <Form<Values, Saved>
      label="Family"
      schema={saveFamilyInput}
      defaults={{
        project,
        writeId,
        familyId: line?.id ?? "",
        version: line?.version ?? 0,
        name: family?.name ?? "",
        technology: family?.technology ?? "CMOS",
        source: line?.family.source ?? "",
        typed: typedFigures(family),
      }}
      action={(values) => stale.send((asked) => save({ ...values, ...asked }))}
      onDone={onDone}
      submitLabel="Save the figures"
      actions={<Button onPress={onCancel}>Close without saving</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-[1fr_12rem]">
            <FormTextField
              name="name"
              label="Name"
              mono
              autoComplete="off"
              description="As pins name it. A name of the built-in table takes its place: 74HC and HC are the same."
            />
            <FormSelect name="technology" label="Made of" options={TECHNOLOGIES} />
          </div>
          <WhatItReplaces control={form.control} />
          <FormTextField
            name="source"
            label="Source"
            autoComplete="off"
            description="Maker, sheet and page, so that somebody can look again."
          />
          <fieldset className="min-w-0 border-t border-rule pt-3">
            <legend className="sr-only">Figures</legend>
            <p className="mb-3 text-sm text-ink-soft">
              Worst case over the temperature range. Write units as the sheet does: 3.84 V, 4 mA, 400 µA, 3.5 pF, 9 ns.
              Signs of currents say their direction and are left out.
            </p>
            <div className="grid gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
              {FIGURE_NAMES.map((name) => {
                const { label, example, optional } = figureOf(name);
                return (
                  <FormQuantityField
                    key={name}
                    name={`typed.${name}`}
                    label={optional ? `${label} (may be empty)` : label}
                    placeholder={example}
                    className="justify-end"
                  />
                );
              })}
            </div>
          </fieldset>
          {stale.theirs && <Theirs theirs={stale.theirs} yours={form.getValues()} />}
        </>
      )}
    </Form>
  );
}

function WhatItReplaces({ control }: { control: Control<Values> }) {
  const name = useWatch({ control, name: "name" });
  const builtIn = findFamily(FAMILIES, name);
  if (!builtIn) return null;
  return (
    <Notice kind="info">
      These figures take the place of the built-in {builtIn.name}, for every pin that names it.
    </Notice>
  );
}

function Theirs({ theirs, yours }: { theirs: z.output<typeof current>; yours: Values }) {
  const figures = FIGURE_NAMES.map((name) => ({
    name: figureOf(name).label,
    theirs: figureText(theirs.figures, name),
    yours: yours.typed[name],
  }));
  return (
    <TheirVersion
      rows={[
        { name: "Name", theirs: theirs.name, yours: yours.name },
        { name: "Source", theirs: theirs.figures.source, yours: yours.source },
        ...figures,
      ]}
    />
  );
}
