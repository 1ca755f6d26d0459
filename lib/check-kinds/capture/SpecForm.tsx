"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Spec } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Spec>) {
  return (
    <TextField
      label="What the capture must show"
      placeholder="CLK at U3 pin 9, one whole period, 20 ns a division"
      description="A scope picture or scope data is asked for before the check can be recorded."
      maxLength={200}
      value={value.expects}
      error={errors.expects}
      onChange={(expects) => onChange({ ...value, expects })}
    />
  );
}
