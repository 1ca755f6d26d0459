"use client";

import clsx from "clsx";
import type { Ref } from "react";
import {
  TextArea as AriaTextArea,
  TextField as AriaTextField,
  type TextFieldProps as AriaTextFieldProps,
} from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import { inputBox } from "./field-style";

export type TextAreaProps = Omit<AriaTextFieldProps, "children" | "className" | "style" | "isInvalid"> &
  FieldTexts & { placeholder?: string; rows?: number; mono?: boolean; inputRef?: Ref<HTMLTextAreaElement> };

/** Grows with its text where the browser can; otherwise it scrolls and can be pulled taller. */
export function TextArea({
  label,
  description,
  error,
  isLabelHidden,
  className,
  placeholder,
  rows = 4,
  mono,
  inputRef,
  ...rest
}: TextAreaProps) {
  return (
    <AriaTextField {...rest} isInvalid={Boolean(error)} className={fieldBox(className)} validationBehavior="aria">
      <Field {...{ label, description, error, isLabelHidden, isRequired: rest.isRequired }}>
        <AriaTextArea
          ref={inputRef ?? null}
          rows={rows}
          placeholder={placeholder}
          className={clsx(inputBox, "field-sizing-content max-h-[60vh] resize-y py-2", mono && "mono text-sm")}
          style={{ minHeight: `${rows * 1.5 + 1}rem` }}
        />
      </Field>
    </AriaTextField>
  );
}
