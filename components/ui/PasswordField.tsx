"use client";

import clsx from "clsx";
import { useState } from "react";
import { Input, TextField as AriaTextField, ToggleButton } from "react-aria-components";
import { Field, fieldBox } from "./Field";
import { inputBox } from "./field-style";
import { Icon } from "./Icon";
import type { TextFieldProps } from "./TextField";

export type PasswordFieldProps = Omit<TextFieldProps, "type" | "mono" | "suffix" | "placeholder">;

/** Shows what was typed only on request; pasting and password managers work. */
export function PasswordField({
  label,
  description,
  error,
  isLabelHidden,
  className,
  inputRef,
  inputClassName,
  ...rest
}: PasswordFieldProps) {
  const [isShown, setShown] = useState(false);
  return (
    <AriaTextField
      {...rest}
      type={isShown ? "text" : "password"}
      isInvalid={Boolean(error)}
      className={fieldBox(className)}
      validationBehavior="aria"
    >
      <Field {...{ label, description, error, isLabelHidden, isRequired: rest.isRequired }}>
        <span className="relative flex">
          <Input ref={inputRef ?? null} className={clsx(inputBox, "pr-11", isShown && "mono", inputClassName)} />
          <ToggleButton
            isSelected={isShown}
            onChange={setShown}
            aria-label="Show the password"
            className="absolute inset-y-1 right-1 flex w-9 items-center justify-center rounded text-ink-soft hover:bg-ink/8 hover:text-ink"
          >
            <Icon name={isShown ? "eye" : "eye-shut"} />
          </ToggleButton>
        </span>
      </Field>
    </AriaTextField>
  );
}
