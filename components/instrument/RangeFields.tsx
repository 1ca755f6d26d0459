"use client";

import { useFieldArray, useFormContext } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect } from "@/components/ui/form/bound-fields";
import { EMPTY_RANGE, RANGE_UNITS } from "@/lib/instrument/range-schema";
import { MAX_RANGES, type SaveInstrumentTyped } from "@/lib/instrument/schema";

const UNIT_OPTIONS = RANGE_UNITS.map(({ unit, label }) => ({ id: unit, label }));

/** The ranges as the data sheet lists them: ± (% of reading + counts + % of range). */
export function RangeFields() {
  const { control, getValues } = useFormContext<SaveInstrumentTyped>();
  const { fields, append, remove } = useFieldArray({ control, name: "ranges" });
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold">Ranges and accuracy</legend>
      <p className="mt-0.5 text-sm text-ink-soft">
        One line a range, as the data sheet has it: ± (% of reading + counts + % of range). A scope has its vertical
        accuracy as % of range.
      </p>
      <ol className="mt-2 flex flex-col">
        {fields.map((field, index) => (
          <li
            key={field.id}
            className="grid grid-cols-2 items-start gap-x-3 gap-y-2.5 border-t border-rule py-3 sm:grid-cols-[minmax(8rem,1.2fr)_repeat(5,minmax(0,1fr))_5rem]"
          >
            <FormSelect name={`ranges.${index}.unit`} label="Measures" options={UNIT_OPTIONS} />
            <FormQuantityField name={`ranges.${index}.fullScale`} label="Full scale" placeholder="20 V" />
            <FormQuantityField name={`ranges.${index}.resolution`} label="Resolution" placeholder="1 mV" />
            <FormQuantityField name={`ranges.${index}.percentOfReading`} label="% of reading" placeholder="0.5" />
            <FormQuantityField name={`ranges.${index}.counts`} label="Counts" placeholder="2" />
            <FormQuantityField name={`ranges.${index}.percentOfRange`} label="% of range" placeholder="0" />
            <Button
              size="sm"
              kind="quiet"
              aria-label={`Remove range ${index + 1}`}
              onPress={() => remove(index)}
              className="col-span-2 justify-self-end sm:col-span-1 sm:mt-[1.9rem]"
            >
              Remove
            </Button>
          </li>
        ))}
      </ol>
      {fields.length === 0 && (
        <p className="border-t border-rule py-3 text-sm text-ink-soft">
          Without a range its readings are judged as they stand: no uncertainty is known.
        </p>
      )}
      <Button
        size="sm"
        isDisabled={fields.length >= MAX_RANGES}
        onPress={() =>
          append(getValues("ranges").at(-1) ?? EMPTY_RANGE, { focusName: `ranges.${fields.length}.fullScale` })
        }
      >
        Add a range
      </Button>
    </fieldset>
  );
}
