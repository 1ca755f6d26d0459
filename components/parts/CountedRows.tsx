"use client";

import { useFieldArray, useFormContext } from "react-hook-form";
import type { KeyboardEvent } from "react";
import { Button } from "@/components/ui/Button";
import { FormComboBox, FormQuantityField } from "@/components/ui/form/bound-fields";
import { IconButton } from "@/components/ui/IconButton";
import type { Option } from "@/components/ui/option";
import { quietError, RowError } from "./RowError";

type Props = {
  /** Field of the form that holds the rows, and the field of a row that names what is counted. */
  name: string;
  of: string;
  legend: string;
  /** What one row names: "Gate". */
  what: string;
  options: readonly Option[];
  addLabel: string;
  whenEmpty: string;
  most: number;
};

/** Rows of "so many of that". Enter in a count goes on to the next row, and makes one after the last. */
export function CountedRows({ name, of, legend, what, options, addLabel, whenEmpty, most }: Props) {
  const { control, setFocus } = useFormContext();
  const { fields, append, remove } = useFieldArray({ control, name });
  const add = () => append({ [of]: "", count: "1" }, { focusName: `${name}.${fields.length}.${of}` });

  function goOn(event: KeyboardEvent, index: number) {
    if (event.key !== "Enter" || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    if (index + 1 < fields.length) setFocus(`${name}.${index + 1}.${of}`);
    else if (fields.length < most) add();
  }

  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold">{legend}</legend>
      {fields.length === 0 ? (
        <p className="mt-1 text-sm text-ink-soft">{whenEmpty}</p>
      ) : (
        <ol className="mt-1.5 flex flex-col gap-2">
          {fields.map((field, index) => (
            <li key={field.id} className="grid grid-cols-[4.75rem_minmax(0,1fr)_2rem] items-start gap-2">
              <div className={quietError} onKeyDown={(event) => goOn(event, index)}>
                <FormQuantityField
                  name={`${name}.${index}.count`}
                  label={`Count, row ${index + 1}`}
                  isLabelHidden
                  inputMode="numeric"
                  inputClassName="text-right"
                  maxLength={8}
                />
              </div>
              <FormComboBox
                name={`${name}.${index}.${of}`}
                label={`${what}, row ${index + 1}`}
                isLabelHidden
                options={options}
                placeholder="Type to find"
              />
              <IconButton
                icon="close"
                size="sm"
                label={`Take out row ${index + 1}`}
                className="mt-1"
                onPress={() => remove(index)}
              />
              <RowError name={`${name}.${index}.count`} />
            </li>
          ))}
        </ol>
      )}
      <Button size="sm" className="mt-2.5" isDisabled={fields.length >= most} onPress={add}>
        {addLabel}
      </Button>
    </fieldset>
  );
}
