"use client";

import { useFieldArray, useFormContext } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import type { SavePartTyped } from "@/lib/part/schema";
import { EMPTY_FIGURES } from "@/lib/part/type-logic";

const PER = [
  { id: "gate", label: "a gate" },
  { id: "package", label: "a package" },
];

/** One line a family; empty figures are left out of every sum and told there. */
export function FigureFields() {
  const { control } = useFormContext<SavePartTyped>();
  const { fields, append, remove } = useFieldArray({ control, name: "logic.figures" });
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold">Figures by family</legend>
      <ol className="flex flex-col">
        {fields.map((field, index) => (
          <li
            key={field.id}
            className="grid grid-cols-2 items-start gap-x-3 gap-y-2.5 border-b border-rule py-3 sm:grid-cols-[5rem_repeat(2,minmax(0,1fr))_8rem_repeat(2,minmax(0,1fr))]"
          >
            <FormTextField name={`logic.figures.${index}.family`} label="Family" mono placeholder="HC" />
            <FormQuantityField name={`logic.figures.${index}.staticA`} label="At rest, most" placeholder="20 µA" />
            <FormQuantityField name={`logic.figures.${index}.cpdPf`} label="Cpd" placeholder="22 pF" />
            <FormSelect name={`logic.figures.${index}.cpdPer`} label="Cpd is of" options={PER} />
            <FormQuantityField name={`logic.figures.${index}.tpdTypicalS`} label="Delay, typical" placeholder="7 ns" />
            <FormQuantityField name={`logic.figures.${index}.tpdMaxS`} label="at most" placeholder="18 ns" />
            <FormTextField
              name={`logic.figures.${index}.note`}
              label="Conditions"
              className="col-span-2 sm:col-span-5"
              placeholder="4.5 V, 50 pF, −40 … 85 °C"
              maxLength={200}
            />
            <Button
              size="sm"
              kind="quiet"
              aria-label={`Take out family ${index + 1}`}
              className="col-span-2 justify-self-end sm:col-span-1 sm:mt-[1.9rem]"
              onPress={() => remove(index)}
            >
              Take out
            </Button>
          </li>
        ))}
      </ol>
      <Button
        size="sm"
        className="mt-2.5"
        isDisabled={fields.length >= 20}
        onPress={() => append(EMPTY_FIGURES, { focusName: `logic.figures.${fields.length}.family` })}
      >
        Add a family
      </Button>
    </fieldset>
  );
}
