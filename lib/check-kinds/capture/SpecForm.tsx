"use client";

import { QuantityField } from "@/components/ui/QuantityField";
import { TextField } from "@/components/ui/TextField";
import { formatLimits, parseLimits } from "@/lib/calc/units";
import type { SpecFormProps } from "../kind";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="flex flex-col gap-4">
      <TextField
        label="What the capture must show"
        placeholder="CLK at U3 pin 9, one whole period, 20 ns a division"
        description="A scope picture or scope data is asked for before the check can be recorded."
        maxLength={200}
        value={value.expects}
        error={errors.expects}
        onChange={(expects) => onChange({ ...value, expects })}
      />
      <div className="grid gap-4 sm:grid-cols-[minmax(0,1.6fr)_minmax(0,1fr)]">
        <TextField
          label="Measured in it"
          placeholder="A0 rising to S15, at 50 %"
          description="May stay empty. With limits the builder knows what to measure in the picture."
          maxLength={120}
          value={value.windowOf}
          error={errors.windowOf}
          onChange={(windowOf) => onChange({ ...value, windowOf })}
        />
        <QuantityField
          label="Within"
          placeholder="120 … 260 ns"
          description={errors.window ? undefined : heard(value.window)}
          inputMode="text"
          maxLength={80}
          value={value.window}
          error={errors.window}
          onChange={(window) => onChange({ ...value, window })}
        />
      </div>
    </div>
  );
}

function heard(typed: string): string | undefined {
  if (typed.trim() === "") return undefined;
  const limits = parseLimits(typed);
  if (!limits.ok) return limits.message;
  return `Understood as ${formatLimits({ ...limits.value, nominal: undefined, tolerance: undefined })}`;
}
