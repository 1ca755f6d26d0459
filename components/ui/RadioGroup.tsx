"use client";

import clsx from "clsx";
import type { Ref } from "react";
import { RadioButton, RadioField, RadioGroup as AriaRadioGroup, Text } from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import type { Option } from "./option";

export type RadioGroupProps = FieldTexts & {
  options: readonly Option[];
  value: string | null;
  onChange: (id: string) => void;
  onBlur?: () => void;
  name?: string;
  isRequired?: boolean;
  isDisabled?: boolean;
  isInRow?: boolean;
  inputRef?: Ref<HTMLDivElement>;
};

export function RadioGroup(props: RadioGroupProps) {
  const { label, description, error, isLabelHidden, className, options, value, onChange, onBlur, isInRow } = props;
  return (
    <AriaRadioGroup
      ref={props.inputRef ?? null}
      name={props.name}
      value={value}
      onChange={onChange}
      onBlur={() => onBlur?.()}
      isRequired={props.isRequired ?? false}
      isDisabled={props.isDisabled ?? false}
      isInvalid={Boolean(error)}
      validationBehavior="aria"
      orientation={isInRow ? "horizontal" : "vertical"}
      className={fieldBox(className)}
    >
      <Field {...{ label, description, error, isLabelHidden, isRequired: props.isRequired }}>
        <div className={clsx("flex gap-x-5", isInRow ? "flex-row flex-wrap" : "flex-col")}>
          {options.map((option) => (
            <RadioLine key={option.id} option={option} />
          ))}
        </div>
      </Field>
    </AriaRadioGroup>
  );
}

function RadioLine({ option }: { option: Option }) {
  return (
    <RadioField value={option.id} isDisabled={option.isDisabled ?? false}>
      <RadioButton className="group flex min-h-8 cursor-pointer items-start gap-2.5 py-1 text-[0.9375rem] outline-none data-disabled:text-ink-faint">
        {({ isSelected, isFocusVisible }) => (
          <>
            <span
              className={clsx(
                "mt-0.5 flex size-5 shrink-0 items-center justify-center rounded-full border bg-raised group-hover:border-ink-soft",
                isSelected ? "border-copper" : "border-edge",
                isFocusVisible && "outline-2 outline-offset-2 outline-focus",
              )}
            >
              {isSelected && <span className="size-2.5 rounded-full bg-copper forced-colors:bg-[Highlight]" />}
            </span>
            {option.mark}
            <span>{option.label}</span>
          </>
        )}
      </RadioButton>
      {option.description && (
        <Text slot="description" className="-mt-0.5 block pb-1 pl-[1.875rem] text-sm text-ink-soft">
          {option.description}
        </Text>
      )}
    </RadioField>
  );
}
