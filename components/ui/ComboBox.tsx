"use client";

import clsx from "clsx";
import type { Ref } from "react";
import { Button, ComboBox as AriaComboBox, Input, ListBox, Popover } from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import { dropList, inputBox } from "./field-style";
import { Icon } from "./Icon";
import type { Option } from "./option";
import { OptionLine } from "./OptionLine";

export type ComboBoxProps = FieldTexts & {
  options: readonly Option[];
  value: string | null;
  onChange: (id: string | null) => void;
  onBlur?: () => void;
  /** With it the text itself is an answer: what was typed and matches no option goes to `onText`. */
  text?: string;
  onText?: (text: string) => void;
  name?: string;
  placeholder?: string;
  isRequired?: boolean;
  isDisabled?: boolean;
  mono?: boolean;
  inputRef?: Ref<HTMLInputElement>;
};

export function ComboBox(props: ComboBoxProps) {
  const { label, description, error, isLabelHidden, className, options, value, onChange, onBlur, text, onText } = props;
  return (
    <AriaComboBox
      defaultItems={options}
      value={value || null}
      onChange={(key) => onChange(key === null ? null : String(key))}
      {...(text === undefined ? {} : { inputValue: text })}
      {...(onText ? { onInputChange: onText, allowsCustomValue: true } : {})}
      onBlur={() => onBlur?.()}
      isRequired={props.isRequired ?? false}
      isDisabled={props.isDisabled ?? false}
      isInvalid={Boolean(error)}
      validationBehavior="aria"
      menuTrigger="focus"
      className={fieldBox(className)}
    >
      <Field {...{ label, description, error, isLabelHidden, isRequired: props.isRequired }}>
        <span className="relative flex">
          <Input
            ref={props.inputRef ?? null}
            name={props.name}
            placeholder={props.placeholder}
            className={clsx(inputBox, "pr-10", props.mono && "mono text-[0.9375rem]")}
          />
          <Button className="absolute inset-y-1 right-1 flex w-8 items-center justify-center rounded text-ink-soft hover:bg-ink/8">
            <Icon name="chevron-down" />
          </Button>
        </span>
        <Popover offset={4} className={dropList}>
          <ListBox<Option>
            className="max-h-80 outline-none"
            renderEmptyState={() => <p className="px-2.5 py-2 text-sm text-ink-soft">Nothing matches.</p>}
          >
            {(option) => <OptionLine option={option} />}
          </ListBox>
        </Popover>
      </Field>
    </AriaComboBox>
  );
}
