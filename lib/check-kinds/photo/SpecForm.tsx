"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="grid gap-3">
      <TextField
        label="What the photo must show"
        value={value.expects}
        error={errors.expects}
        onChange={(expects) => onChange({ ...value, expects })}
      />
      <TextField
        label="Photos, at least"
        inputMode="numeric"
        value={value.minimum}
        error={errors.minimum}
        onChange={(minimum) => onChange({ ...value, minimum })}
      />
    </div>
  );
}
