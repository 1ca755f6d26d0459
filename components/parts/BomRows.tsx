"use client";

import type { ClipboardEvent, KeyboardEvent } from "react";
import { useFieldArray, useFormContext } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormTextField } from "@/components/ui/form/bound-fields";
import { IconButton } from "@/components/ui/IconButton";
import { Kbd } from "@/components/ui/Kbd";
import { quietError, RowError } from "./RowError";
import { pastedLines } from "./pasted-lines";

type Line = { partNumber: string; description: string; count: string; designators: string };
const EMPTY: Line = { partNumber: "", description: "", count: "1", designators: "" };
const MOST = 400;

/** Rows like a sheet: Enter goes down, a block from a spreadsheet is pasted over the rows from here on. */
export function BomRows() {
  const { control, setFocus, getValues, formState } = useFormContext<{ lines: Line[] }>();
  const { fields, append, remove, replace } = useFieldArray({ control, name: "lines" });
  const add = () => append(EMPTY, { focusName: `lines.${fields.length}.partNumber` });

  function goDown(event: KeyboardEvent, index: number, field: keyof Line) {
    if (event.key !== "Enter" || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    if (index + 1 < fields.length) setFocus(`lines.${index + 1}.${field}`);
    else if (fields.length < MOST) add();
  }

  function paste(event: ClipboardEvent, index: number) {
    const pasted = pastedLines(event.clipboardData.getData("text/plain"));
    if (!pasted) return;
    event.preventDefault();
    const lines = getValues("lines");
    const isBlank = lines[index]?.partNumber === "" && lines[index]?.description === "";
    replace([...lines.slice(0, index), ...pasted, ...lines.slice(isBlank ? index + 1 : index)].slice(0, MOST));
  }

  return (
    <div className="flex flex-col gap-2.5">
      <ol className="flex flex-col gap-3 md:gap-2">
        <li
          aria-hidden="true"
          className="hidden grid-cols-[4.75rem_minmax(0,1.1fr)_minmax(0,1.4fr)_minmax(0,1fr)_2rem] gap-2 text-sm font-semibold text-ink-soft md:grid"
        >
          <span className="text-right">Count</span>
          <span>Part</span>
          <span>What it is</span>
          <span>On the board</span>
        </li>
        {fields.map((row, index) => (
          <li
            key={row.id}
            onPaste={(event) => paste(event, index)}
            className="grid grid-cols-[4.75rem_minmax(0,1fr)_2rem] items-start gap-2 border-b border-rule pb-3 md:grid-cols-[4.75rem_minmax(0,1.1fr)_minmax(0,1.4fr)_minmax(0,1fr)_2rem] md:border-0 md:pb-0"
          >
            <div className={quietError} onKeyDown={(event) => goDown(event, index, "count")}>
              <FormQuantityField
                name={`lines.${index}.count`}
                label={`Count, row ${index + 1}`}
                isLabelHidden
                inputMode="numeric"
                inputClassName="text-right"
                maxLength={8}
              />
            </div>
            <div onKeyDown={(event) => goDown(event, index, "partNumber")}>
              <FormTextField
                name={`lines.${index}.partNumber`}
                label={`Part, row ${index + 1}`}
                isLabelHidden
                mono
                placeholder="27C256-70"
                maxLength={80}
              />
            </div>
            <div
              className="col-span-3 max-md:order-last md:col-span-1"
              onKeyDown={(event) => goDown(event, index, "description")}
            >
              <FormTextField
                name={`lines.${index}.description`}
                label={`What it is, row ${index + 1}`}
                isLabelHidden
                placeholder="What it is"
                maxLength={200}
              />
            </div>
            <div
              className="col-span-3 max-md:order-last md:col-span-1"
              onKeyDown={(event) => goDown(event, index, "designators")}
            >
              <FormTextField
                name={`lines.${index}.designators`}
                label={`On the board, row ${index + 1}`}
                isLabelHidden
                mono
                placeholder="R1–R8"
                maxLength={200}
              />
            </div>
            <IconButton
              icon="close"
              size="sm"
              label={`Take out row ${index + 1}`}
              className="mt-1"
              onPress={() => remove(index)}
            />
            <RowError name={`lines.${index}.count`} />
          </li>
        ))}
      </ol>
      {formState.errors.lines?.message && (
        <p className="text-sm font-medium text-failed">{formState.errors.lines.message}</p>
      )}
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button size="sm" isDisabled={fields.length >= MOST} onPress={add}>
          Add a row
        </Button>
        <p className="text-sm text-ink-soft max-sm:hidden">
          <Kbd>Enter</Kbd> next row <span className="mx-1.5">·</span> <Kbd>Ctrl V</Kbd> rows of a spreadsheet: count,
          part, what it is, on the board
        </p>
      </div>
    </div>
  );
}
