"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="grid gap-3">
      <TextField
        label="Unit"
        value={value.unit}
        error={errors.unit}
        onChange={(unit) => onChange({ ...value, unit })}
      />
      <TextField
        label="Limits"
        value={value.limits}
        error={errors.limits}
        onChange={(limits) => onChange({ ...value, limits })}
      />
      <TextField
        label="Expected"
        value={value.expected}
        error={errors.expected}
        onChange={(expected) => onChange({ ...value, expected })}
      />
    </div>
  );
}
