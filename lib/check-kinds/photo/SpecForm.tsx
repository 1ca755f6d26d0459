"use client";

import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_9rem]">
      <TextField
        label="What the photo must show"
        placeholder="solder side, whole board, in focus"
        maxLength={200}
        value={value.expects}
        error={errors.expects}
        onChange={(expects) => onChange({ ...value, expects })}
      />
      <TextField
        label="Photos, at least"
        inputMode="numeric"
        maxLength={3}
        mono
        value={value.minimum}
        error={errors.minimum}
        onChange={(minimum) => onChange({ ...value, minimum })}
      />
    </div>
  );
}
