"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Spec } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Spec>) {
  return (
    <TextField
      label="What one should find"
      placeholder="no bridge, every pin wetted"
      description="May stay empty when the title says it all."
      maxLength={200}
      value={value.expects}
      error={errors.expects}
      onChange={(expects) => onChange({ ...value, expects })}
    />
  );
}
