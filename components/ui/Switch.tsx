"use client";

import clsx from "clsx";
import type { ReactNode, Ref } from "react";
import { SwitchButton, SwitchField, Text } from "react-aria-components";

export type SwitchProps = {
  label: ReactNode;
  value: boolean;
  onChange: (isOn: boolean) => void;
  onBlur?: () => void;
  name?: string;
  description?: ReactNode;
  isDisabled?: boolean;
  className?: string;
  inputRef?: Ref<HTMLInputElement | null>;
};

/** One position of a slide switch in its housing. It takes effect at once; in a form that is sent, use Checkbox. */
export function Switch({ label, value, description, className, onBlur, inputRef, isDisabled, ...rest }: SwitchProps) {
  return (
    <SwitchField
      {...rest}
      isSelected={value}
      isDisabled={isDisabled ?? false}
      onBlur={() => onBlur?.()}
      inputRef={inputRef ?? null}
      className={clsx("flex flex-col", className)}
    >
      <SwitchButton className="flex min-h-8 cursor-pointer items-start gap-3 py-1 text-[0.9375rem] outline-none data-disabled:text-ink-faint">
        {({ isSelected, isFocusVisible }) => (
          <>
            <span
              className={clsx(
                "relative mt-0.5 h-5 w-9 shrink-0 rounded-sm border p-0.5 transition-colors duration-100",
                isSelected ? "border-copper bg-copper" : "border-edge bg-rule",
                isFocusVisible && "outline-2 outline-offset-2 outline-focus",
              )}
            >
              <span
                className={clsx(
                  "block h-full w-3.5 rounded-[1px] transition-transform duration-100",
                  isSelected ? "translate-x-4 bg-on-copper" : "bg-ink-soft",
                )}
              />
            </span>
            <span>{label}</span>
          </>
        )}
      </SwitchButton>
      {description && (
        <Text slot="description" className="-mt-0.5 pl-12 text-sm text-ink-soft">
          {description}
        </Text>
      )}
    </SwitchField>
  );
}
