"use client";

import clsx from "clsx";
import type { HTMLInputAutoCompleteAttribute, ReactNode, Ref } from "react";
import { Input, TextField as AriaTextField, type TextFieldProps as AriaTextFieldProps } from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import { inputBox } from "./field-style";

export type TextFieldProps = Omit<AriaTextFieldProps, "children" | "className" | "style" | "isInvalid"> &
  FieldTexts & {
    placeholder?: string;
    autoComplete?: HTMLInputAutoCompleteAttribute;
    inputRef?: Ref<HTMLInputElement>;
    /** Pin names, serials, keys: set in the figures' face. */
    mono?: boolean;
    /** Stands inside the box at its end, e.g. a unit. */
    suffix?: ReactNode;
    inputClassName?: string;
  };

export function TextField({
  label,
  description,
  error,
  isLabelHidden,
  className,
  placeholder,
  inputRef,
  mono,
  suffix,
  inputClassName,
  ...rest
}: TextFieldProps) {
  return (
    <AriaTextField {...rest} isInvalid={Boolean(error)} className={fieldBox(className)} validationBehavior="aria">
      <Field {...{ label, description, error, isLabelHidden, isRequired: rest.isRequired }}>
        <span className="relative flex">
          <Input
            ref={inputRef ?? null}
            placeholder={placeholder}
            className={clsx(inputBox, mono && "mono text-[0.9375rem]", Boolean(suffix) && "pr-12", inputClassName)}
          />
          {suffix && (
            <span className="mono pointer-events-none absolute inset-y-0 right-3 flex items-center text-sm text-ink-soft">
              {suffix}
            </span>
          )}
        </span>
      </Field>
    </AriaTextField>
  );
}
