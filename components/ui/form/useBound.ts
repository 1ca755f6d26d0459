"use client";

import { useController, useFormContext } from "react-hook-form";

/** One field of the surrounding Form as props: value, onChange, onBlur, name, inputRef, error, isDisabled. */
export function useBound(name: string) {
  const { control } = useFormContext();
  const { field, fieldState } = useController({ name, control });
  if (field.value === undefined) throw new Error(`The form has no default for the field "${name}".`);
  return {
    name: field.name,
    value: field.value as unknown,
    onChange: (value: unknown) => field.onChange(value),
    onBlur: field.onBlur,
    inputRef: field.ref,
    error: fieldState.error?.message,
  };
}

export const asText = (value: unknown): string =>
  typeof value === "string" ? value : value === null ? "" : String(value);
