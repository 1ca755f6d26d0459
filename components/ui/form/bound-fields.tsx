"use client";

import { Checkbox, type CheckboxProps } from "../Checkbox";
import { ComboBox, type ComboBoxProps } from "../ComboBox";
import { PasswordField, type PasswordFieldProps } from "../PasswordField";
import { QuantityField } from "../QuantityField";
import { RadioGroup, type RadioGroupProps } from "../RadioGroup";
import { Select, type SelectProps } from "../Select";
import { TextArea, type TextAreaProps } from "../TextArea";
import { TextField, type TextFieldProps } from "../TextField";
import { asText, useBound } from "./useBound";

/** The fields of components/ui tied to the surrounding Form by name; everything else is passed through. */
type Bound<Props> = Omit<Props, "name" | "value" | "defaultValue" | "onChange" | "onBlur" | "error" | "inputRef"> & {
  name: string;
};

export function FormTextField({ name, ...rest }: Bound<TextFieldProps>) {
  const { value, ...bound } = useBound(name);
  return <TextField {...rest} {...bound} value={asText(value)} />;
}

export function FormQuantityField({ name, ...rest }: Bound<TextFieldProps> & { isBench?: boolean }) {
  const { value, ...bound } = useBound(name);
  return <QuantityField {...rest} {...bound} value={asText(value)} />;
}

export function FormPasswordField({ name, ...rest }: Bound<PasswordFieldProps>) {
  const { value, ...bound } = useBound(name);
  return <PasswordField {...rest} {...bound} value={asText(value)} />;
}

export function FormTextArea({ name, ...rest }: Bound<TextAreaProps>) {
  const { value, ...bound } = useBound(name);
  return <TextArea {...rest} {...bound} value={asText(value)} />;
}

export function FormSelect({ name, ...rest }: Bound<SelectProps>) {
  const { value, ...bound } = useBound(name);
  return <Select {...rest} {...bound} value={asText(value)} />;
}

export function FormComboBox({ name, ...rest }: Bound<Omit<ComboBoxProps, "text" | "onText">>) {
  const { value, onChange, ...bound } = useBound(name);
  return <ComboBox {...rest} {...bound} value={asText(value)} onChange={(id) => onChange(id ?? "")} />;
}

export function FormRadioGroup({ name, ...rest }: Bound<RadioGroupProps>) {
  const { value, ...bound } = useBound(name);
  return <RadioGroup {...rest} {...bound} value={asText(value)} />;
}

export function FormCheckbox({ name, ...rest }: Bound<CheckboxProps>) {
  const { value, ...bound } = useBound(name);
  return <Checkbox {...rest} {...bound} value={value === true} />;
}
