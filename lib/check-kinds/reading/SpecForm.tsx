"use client";

import { QuantityField } from "@/components/ui/QuantityField";
import type { SpecFormProps } from "../kind";
import { LimitsField } from "../LimitsField";
import { UnitField } from "../UnitField";
import type { Typed } from "./schema";

export function SpecForm({ value, onChange, errors }: SpecFormProps<Typed>) {
  return (
    <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)]">
      <UnitField label="Unit" unit={value.unit} onUnit={(unit) => onChange({ ...value, unit })} error={errors.unit} />
      <LimitsField
        label="Limits"
        unit={value.unit}
        typed={value.limits}
        onTyped={(limits) => onChange({ ...value, limits })}
        error={errors.limits}
      />
      <QuantityField
        label="Expected value"
        className="sm:col-span-2"
        value={value.expected}
        error={errors.expected}
        maxLength={40}
        onChange={(expected) => onChange({ ...value, expected })}
        description="What a healthy board shows, for the builder's eye. May stay empty; the limits decide."
      />
    </div>
  );
}
