"use client";

import { Select } from "@/components/ui/Select";
import { UNITS } from "@/lib/calc/units";

type Props = {
  label: string;
  unit: string;
  onUnit: (unit: string) => void;
  error: string | undefined;
  isLabelHidden?: boolean;
};

/** A list has no empty id, so the plain number goes by a name of its own inside it. */
const PLAIN = "plain";

export function UnitField({ label, unit, onUnit, error, isLabelHidden }: Props) {
  return (
    <Select
      label={label}
      value={unit === "" ? PLAIN : unit}
      onChange={(id) => onUnit(id === PLAIN ? "" : id)}
      error={error}
      isLabelHidden={isLabelHidden ?? false}
      options={UNITS.map((one) => ({ id: one.unit === "" ? PLAIN : one.unit, label: one.label }))}
    />
  );
}
