"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Spec } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Spec>) {
  return (
    <TextField
      label="What one should find"
      value={value.expects}
      error={errors.expects}
      onChange={(expects) => onChange({ ...value, expects })}
    />
  );
}
