"use client";

import clsx from "clsx";
import type { ReactNode } from "react";
import { FieldError, Label, Text } from "react-aria-components";
import { fieldLabel } from "./field-style";

/** What every field can say. `error` is one sentence; it also marks the field invalid. */
export type FieldTexts = {
  label: string;
  description?: ReactNode;
  error?: string | undefined;
  /** Hides the label from sight, not from assistive technology. */
  isLabelHidden?: boolean;
  className?: string;
};

export const fieldBox = (className?: string) => clsx("group/field flex min-w-0 flex-col gap-1.5", className);

/** Label, control, description and error in their order; the surrounding react-aria field ties them together. */
export function Field({
  label,
  description,
  error,
  isLabelHidden,
  isRequired,
  children,
}: Omit<FieldTexts, "className"> & { isRequired?: boolean | undefined; children: ReactNode }) {
  return (
    <>
      <Label className={isLabelHidden ? "sr-only" : fieldLabel}>
        {label}
        {isRequired && <span className="ml-1.5 text-xs font-normal text-ink-faint">required</span>}
      </Label>
      {children}
      {description && (
        <Text slot="description" className="text-sm text-ink-soft">
          {description}
        </Text>
      )}
      <FieldError className="flex gap-1.5 text-sm font-medium text-failed before:mt-[0.45em] before:size-1.5 before:shrink-0 before:bg-failed">
        {error}
      </FieldError>
    </>
  );
}
