"use client";

import clsx from "clsx";
import type { Ref } from "react";
import { Button, Input, Label, SearchField as AriaSearchField } from "react-aria-components";
import { inputBox } from "./field-style";
import { Icon } from "./Icon";

export type SearchFieldProps = {
  /** Accessible name and placeholder. */
  label: string;
  value: string;
  onChange: (text: string) => void;
  onSubmit?: (text: string) => void;
  autoFocus?: boolean;
  inputRef?: Ref<HTMLInputElement>;
  className?: string;
};

export function SearchField({ label, value, onChange, onSubmit, autoFocus, inputRef, className }: SearchFieldProps) {
  return (
    <AriaSearchField
      value={value}
      onChange={onChange}
      onSubmit={(text) => onSubmit?.(text)}
      autoFocus={autoFocus ?? false}
      className={clsx("group relative flex", className)}
    >
      <Label className="sr-only">{label}</Label>
      <Icon name="search" className="pointer-events-none absolute left-3 top-1/2 -translate-y-1/2 text-ink-soft" />
      <Input
        ref={inputRef ?? null}
        placeholder={label}
        className={clsx(inputBox, "px-9 [&::-webkit-search-cancel-button]:hidden")}
      />
      <Button className="absolute inset-y-1 right-1 flex w-8 items-center justify-center rounded text-ink-soft hover:bg-ink/8 group-data-empty:hidden">
        <Icon name="close" size={12} />
      </Button>
    </AriaSearchField>
  );
}
