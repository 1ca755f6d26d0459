"use client";

import { get, useFormState } from "react-hook-form";

/**
 * What is wrong with a narrow field, over the whole width of its row. The field itself says it to assistive technology;
 * its own text is hidden by the class beside.
 */
export function RowError({ name }: { name: string }) {
  const { errors } = useFormState({ name });
  const error: unknown = get(errors, name);
  const message = typeof error === "object" && error !== null && "message" in error ? error.message : undefined;
  if (typeof message !== "string") return null;
  return (
    <p
      aria-hidden="true"
      className="col-span-full -mt-1 flex gap-1.5 text-sm font-medium text-failed before:mt-[0.45em] before:size-1.5 before:shrink-0 before:bg-failed"
    >
      {message}
    </p>
  );
}

export const quietError = "[&_[slot=errorMessage]]:sr-only";
