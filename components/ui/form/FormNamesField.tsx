"use client";

import { NamesField, type NamesFieldProps } from "../NamesField";
import { useBound } from "./useBound";

type Props = Omit<NamesFieldProps, "names" | "onChange" | "error"> & { name: string };

/** The names field tied to the surrounding Form. */
export function FormNamesField({ name, ...rest }: Props) {
  const { value, onChange, error } = useBound(name);
  return (
    <NamesField {...rest} names={Array.isArray(value) ? value.map(String) : []} onChange={onChange} error={error} />
  );
}
