"use client";

import { QuantityField } from "@/components/ui/QuantityField";
import { formatLimits, isUnit, parseLimits } from "@/lib/calc/units";

type Props = {
  label: string;
  unit: string;
  typed: string;
  onTyped: (typed: string) => void;
  error: string | undefined;
  /** What holds when it is left empty. */
  whenEmpty?: string;
  isLabelHidden?: boolean;
};

/** Limits as people write them; beside the field stands what was understood, or what is not clear yet. */
export function LimitsField({ label, unit, typed, onTyped, error, whenEmpty, isLabelHidden }: Props) {
  const said = understood(typed, unit);
  return (
    <QuantityField
      label={label}
      value={typed}
      onChange={onTyped}
      // While one types the sentence is a hint; once it is refused the same sentence is the error, said once.
      error={error}
      maxLength={80}
      inputMode="text"
      placeholder={whenEmpty ?? "4.75 … 5.25 V"}
      isLabelHidden={isLabelHidden ?? false}
      description={
        (said === error ? undefined : said) ??
        (error || whenEmpty || isLabelHidden ? undefined : "4.75 … 5.25 V, 5 V ± 5 %, < 0.5 Ω, > 1 MΩ")
      }
    />
  );
}

function understood(typed: string, unit: string): string | undefined {
  if (typed.trim() === "" || !isUnit(unit)) return undefined;
  const parsed = parseLimits(typed, unit);
  if (!parsed.ok) return parsed.message;
  // A tolerance is shown as the bounds it comes to, since those are what is judged by.
  return `Understood as ${formatLimits({ ...parsed.value, nominal: undefined, tolerance: undefined })}`;
}
