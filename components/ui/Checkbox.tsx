"use client";

import clsx from "clsx";
import type { ReactNode, Ref } from "react";
import { CheckboxButton, CheckboxField, FieldError, Text } from "react-aria-components";
import { Icon } from "./Icon";

export type CheckboxProps = {
  label: ReactNode;
  value: boolean;
  onChange: (isOn: boolean) => void;
  onBlur?: () => void;
  name?: string;
  description?: ReactNode;
  error?: string | undefined;
  isIndeterminate?: boolean;
  isDisabled?: boolean;
  className?: string;
  inputRef?: Ref<HTMLInputElement | null>;
};

export function Checkbox(props: CheckboxProps) {
  const { label, description, error, className, inputRef } = props;
  return (
    <CheckboxField
      name={props.name}
      isSelected={props.value}
      onChange={props.onChange}
      onBlur={() => props.onBlur?.()}
      isIndeterminate={props.isIndeterminate ?? false}
      isDisabled={props.isDisabled ?? false}
      isInvalid={Boolean(error)}
      validationBehavior="aria"
      inputRef={inputRef ?? null}
      className={clsx("flex flex-col", className)}
    >
      <CheckboxButton className="group flex min-h-8 cursor-pointer items-start gap-2.5 py-1 text-[0.9375rem] outline-none data-disabled:text-ink-faint">
        {({ isSelected, isIndeterminate, isFocusVisible }) => (
          <>
            <span
              className={clsx(
                "mt-0.5 flex size-5 shrink-0 items-center justify-center rounded-sm border",
                isSelected || isIndeterminate ? "border-copper bg-copper text-on-copper" : "border-edge bg-raised",
                "group-hover:border-ink-soft group-data-invalid:border-failed",
                isFocusVisible && "outline-2 outline-offset-2 outline-focus",
              )}
            >
              {isIndeterminate ? <Icon name="minus" size={14} /> : isSelected && <Icon name="check" size={14} />}
            </span>
            <span>{label}</span>
          </>
        )}
      </CheckboxButton>
      {description && (
        <Text slot="description" className="-mt-0.5 pl-[1.875rem] text-sm text-ink-soft">
          {description}
        </Text>
      )}
      <FieldError className="pl-[1.875rem] text-sm font-medium text-failed">{error}</FieldError>
    </CheckboxField>
  );
}
