"use client";

import { ComboBox } from "@/components/ui/ComboBox";
import { asText, useBound } from "@/components/ui/form/useBound";
import { gateFunctionName, LOGIC_PARTS } from "@/lib/calc/logic-parts";

const OPTIONS = [...new Set(LOGIC_PARTS.map((part) => part.gateFunction))].map((id) => ({
  id,
  label: gateFunctionName(id),
}));

/** A known function, or a name of the project's own for what no part of the table does. */
export function GateFunctionField() {
  const { value, onChange, onBlur, error } = useBound("logic.gateFunction");
  const text = asText(value);
  const known = OPTIONS.find(({ id }) => id === text);
  return (
    <ComboBox
      label="What one gate does"
      options={OPTIONS}
      value={known?.id ?? null}
      onChange={(id) => id !== null && onChange(id)}
      text={gateFunctionName(text)}
      onText={(typed) => onChange(OPTIONS.find(({ label }) => label === typed)?.id ?? typed)}
      onBlur={onBlur}
      error={error}
    />
  );
}
