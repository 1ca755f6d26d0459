"use client";

import clsx from "clsx";
import { TextField, type TextFieldProps } from "./TextField";

/**
 * A figure as people write it (4k7, 2.2 µ, 1e-3). It stays text: the caller parses, and says in `description` or
 * `error` what it understood. A number input would throw away what it cannot read.
 */
export function QuantityField({ isBench = false, inputClassName, ...rest }: TextFieldProps & { isBench?: boolean }) {
  return (
    <TextField
      inputMode="decimal"
      autoComplete="off"
      spellCheck="false"
      autoCorrect="off"
      mono
      {...rest}
      inputClassName={clsx(isBench && "min-h-16 text-3xl font-semibold", inputClassName)}
    />
  );
}
