"use client";

import { useFieldArray, useFormContext, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { FormComboBox, FormQuantityField, FormTextField } from "@/components/ui/form/bound-fields";
import { IconButton } from "@/components/ui/IconButton";
import { stepOfPart } from "@/lib/calc/delay";
import { formatQuantity } from "@/lib/calc/units";
import type { DelayView } from "@/lib/delay-path/load-delay-paths";
import type { DelayFields } from "./DelayEditor";
import { quietError, RowError } from "./RowError";
import { EMPTY_STEP, partChoices, partOf } from "./delay-draft";

const FIGURES = [
  { field: "minS", label: "Lowest" },
  { field: "typicalS", label: "Typical" },
  { field: "maxS", label: "Highest" },
] as const;

/** The chain in the order of the signal. Figures that stay empty are the part's; they stand in grey. */
export function StepRows({ view }: { view: DelayView }) {
  const { control } = useFormContext<DelayFields>();
  const { fields, append, remove } = useFieldArray({ control, name: "path.steps" });
  const steps = useWatch<DelayFields, "path.steps">({ name: "path.steps" });
  const options = partChoices(view.own);
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold">The signal passes</legend>
      {fields.length === 0 && <p className="mt-1 text-sm text-ink-soft">Nothing yet.</p>}
      <ol className="mt-1.5 flex flex-col">
        {fields.map((row, index) => {
          const step = steps[index];
          const part = step && partOf(view.own, step.part);
          const known = part && step && stepOfPart(part, step.family, 1);
          return (
            <li
              key={row.id}
              className="grid grid-cols-3 items-start gap-2 border-b border-rule py-2.5 lg:grid-cols-[4.5rem_minmax(0,1.5fr)_5.5rem_repeat(3,minmax(0,1fr))_2rem]"
            >
              <FormQuantityField
                name={`path.steps.${index}.count`}
                label="Count"
                inputMode="numeric"
                maxLength={8}
                className={quietError}
              />
              <div className="col-span-2 flex flex-col gap-2 lg:col-span-1">
                <FormComboBox
                  name={`path.steps.${index}.part`}
                  label={`Part ${index + 1}`}
                  options={options}
                  placeholder="Something else"
                />
                {step?.part === "" && (
                  <FormTextField
                    name={`path.steps.${index}.name`}
                    label={`Name of part ${index + 1}`}
                    isLabelHidden
                    placeholder="What it is"
                    maxLength={80}
                  />
                )}
              </div>
              <FormTextField
                name={`path.steps.${index}.family`}
                label="Family"
                mono
                maxLength={40}
                className="max-lg:col-span-3"
              />
              {FIGURES.map(({ field, label }) => (
                <FormQuantityField
                  key={field}
                  name={`path.steps.${index}.${field}`}
                  label={label}
                  placeholder={figureText(known?.[field])}
                  maxLength={40}
                />
              ))}
              <IconButton
                icon="close"
                size="sm"
                label={`Take out step ${index + 1}`}
                className="justify-self-end lg:mt-8"
                onPress={() => remove(index)}
              />
              <RowError name={`path.steps.${index}.count`} />
            </li>
          );
        })}
      </ol>
      <Button
        size="sm"
        className="mt-2.5"
        isDisabled={fields.length >= 100}
        onPress={() =>
          append(
            { ...EMPTY_STEP, family: steps.at(-1)?.family ?? EMPTY_STEP.family },
            { focusName: `path.steps.${fields.length}.part` },
          )
        }
      >
        Add a step
      </Button>
    </fieldset>
  );
}

const figureText = (seconds: number | null | undefined) =>
  seconds === null || seconds === undefined ? "–" : formatQuantity({ value: seconds, unit: "s" });
