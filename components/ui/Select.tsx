"use client";

import clsx from "clsx";
import type { Ref } from "react";
import { Button, ListBox, Popover, Select as AriaSelect, SelectValue } from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import { dropList, inputBox } from "./field-style";
import { Icon } from "./Icon";
import type { Option } from "./option";
import { OptionLine } from "./OptionLine";

export type SelectProps = FieldTexts & {
  options: readonly Option[];
  /** Id of the chosen option; null or "" when none is chosen yet. */
  value: string | null;
  onChange: (id: string) => void;
  onBlur?: () => void;
  name?: string;
  placeholder?: string;
  isRequired?: boolean;
  isDisabled?: boolean;
  inputRef?: Ref<HTMLButtonElement>;
};

export function Select(props: SelectProps) {
  const { label, description, error, isLabelHidden, className, options, value, onChange, onBlur, inputRef } = props;
  return (
    <AriaSelect
      name={props.name}
      value={value || null}
      onChange={(key) => key !== null && onChange(String(key))}
      placeholder={props.placeholder ?? "Choose"}
      isRequired={props.isRequired ?? false}
      isDisabled={props.isDisabled ?? false}
      isInvalid={Boolean(error)}
      validationBehavior="aria"
      className={fieldBox(className)}
    >
      <Field {...{ label, description, error, isLabelHidden, isRequired: props.isRequired }}>
        <Button
          ref={inputRef ?? null}
          onBlur={() => onBlur?.()}
          className={clsx(
            inputBox,
            "flex items-center justify-between gap-2 text-left group-data-invalid/field:border-failed",
          )}
        >
          <SelectValue className="min-w-0 truncate data-placeholder:text-ink-faint">
            {({ isPlaceholder, selectedText, defaultChildren }) => (isPlaceholder ? defaultChildren : selectedText)}
          </SelectValue>
          <Icon name="chevron-down" className="text-ink-soft" />
        </Button>
        <Popover offset={4} className={dropList}>
          <ListBox items={options} className="outline-none">
            {(option) => <OptionLine option={option} />}
          </ListBox>
        </Popover>
      </Field>
    </AriaSelect>
  );
}
