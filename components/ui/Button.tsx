"use client";

import { Button as AriaButton, type ButtonProps as AriaButtonProps } from "react-aria-components";
import type { ReactNode } from "react";
import { buttonStyle, type ButtonKind, type ButtonSize } from "./button-style";
import { Pulse } from "./Pulse";

export type ButtonProps = Omit<AriaButtonProps, "children" | "className" | "style"> & {
  kind?: ButtonKind;
  size?: ButtonSize;
  className?: string;
  children: ReactNode;
};

/** While `isPending` it keeps its width, its focus and its name, ignores presses and tells assistive technology. */
export function Button({ kind, size, className, children, ...rest }: ButtonProps) {
  return (
    <AriaButton {...rest} className={buttonStyle(kind, size, className)}>
      {({ isPending }) => (
        <>
          <span className={isPending ? "opacity-55" : "contents"}>{children}</span>
          {isPending && <Pulse />}
        </>
      )}
    </AriaButton>
  );
}
