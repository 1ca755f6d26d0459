"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="grid gap-3">
      {value.columns.map((column, c) => (
        <TextField
          key={c}
          label={`Column ${c + 1}`}
          value={column}
          error={errors[`columns.${c}`]}
          onChange={(name) =>
            onChange({ ...value, columns: value.columns.map((other, i) => (i === c ? name : other)) })
          }
        />
      ))}
      {value.rows.map((row, r) => (
        <div key={r} className="grid gap-2">
          {(["label", "unit", "limits"] as const).map((part) => (
            <TextField
              key={part}
              label={`Row ${r + 1}, ${part}`}
              value={row[part]}
              error={errors[`rows.${r}.${part}`]}
              onChange={(text) =>
                onChange({
                  ...value,
                  rows: value.rows.map((other, i) => (i === r ? { ...other, [part]: text } : other)),
                })
              }
            />
          ))}
        </div>
      ))}
    </div>
  );
}
