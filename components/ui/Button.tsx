"use client";

import type { ReactNode } from "react";
import { Button as AriaButton, type ButtonProps as AriaButtonProps } from "react-aria-components";
import { buttonStyle, type ButtonKind, type ButtonSize } from "./button-style";
import { Pulse } from "./Pulse";

export type ButtonProps = Omit<AriaButtonProps, "children" | "className" | "style"> & {
  kind?: ButtonKind;
  size?: ButtonSize;
  className?: string;
  children: ReactNode;
};

/**
 * While `isPending` it keeps its width, its focus and its name, and ignores presses. The library's own pending state
 * is not used: it leaves an announcement behind that names a button which may be gone by then.
 */
export function Button({ kind, size, className, children, isPending = false, ...rest }: ButtonProps) {
  // A button of type "button" also stops Enter in a field from sending the form a second time.
  const halt = isPending ? { type: "button" as const, onPress: () => undefined, "aria-disabled": true } : {};
  return (
    <AriaButton {...rest} {...halt} className={buttonStyle(kind, size, className)}>
      {isPending ? (
        <>
          <span className="inline-flex items-center gap-[inherit] opacity-70">{children}</span>
          <Pulse />
        </>
      ) : (
        children
      )}
    </AriaButton>
  );
}
