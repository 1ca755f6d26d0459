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
  const heard = understood(typed, unit);
  // While one types, what is unclear is a hint; once it was refused, it is the error. Either way it is said once,
  // and an error goes as soon as the limits are clear.
  const isRefused = error !== undefined && heard?.isClear === false;
  return (
    <QuantityField
      label={label}
      value={typed}
      onChange={onTyped}
      error={heard?.isClear ? undefined : isRefused ? heard.text : error}
      maxLength={80}
      inputMode="text"
      placeholder={whenEmpty ?? "4.75 … 5.25 V"}
      isLabelHidden={isLabelHidden ?? false}
      description={
        isRefused
          ? undefined
          : (heard?.text ?? (whenEmpty || isLabelHidden ? undefined : "4.75 … 5.25 V, 5 V ± 5 %, < 0.5 Ω, > 1 MΩ"))
      }
    />
  );
}

function understood(typed: string, unit: string): { isClear: boolean; text: string } | undefined {
  if (typed.trim() === "" || !isUnit(unit)) return undefined;
  const parsed = parseLimits(typed, unit);
  if (!parsed.ok) return { isClear: false, text: parsed.message };
  // A tolerance is shown as the bounds it comes to, since those are what is judged by.
  const bounds = formatLimits({ ...parsed.value, nominal: undefined, tolerance: undefined });
  return { isClear: true, text: `Understood as ${bounds}` };
}
