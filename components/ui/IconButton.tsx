"use client";

import { Button as AriaButton, type ButtonProps as AriaButtonProps } from "react-aria-components";
import clsx from "clsx";
import { Icon, type IconName } from "./Icon";
import { Tooltip } from "./Tooltip";

export type IconButtonProps = Omit<AriaButtonProps, "children" | "className" | "style" | "aria-label"> & {
  icon: IconName;
  /** Its accessible name and its tooltip. */
  label: string;
  size?: "sm" | "md" | "bench";
  className?: string;
  /** Off where the label stands beside it anyway. */
  tooltip?: boolean;
};

const SIZES = { sm: "size-8", md: "size-10", bench: "size-16" };

export function IconButton({ icon, label, size = "md", className, tooltip = true, ...rest }: IconButtonProps) {
  const button = (
    <AriaButton
      {...rest}
      aria-label={label}
      className={clsx(
        "inline-flex items-center justify-center rounded-md text-ink-soft transition-colors duration-100 hover:bg-ink/8 hover:text-ink active:translate-y-px",
        "data-disabled:text-ink-faint data-disabled:opacity-50 data-disabled:hover:bg-transparent",
        SIZES[size],
        className,
      )}
    >
      <Icon name={icon} size={size === "bench" ? 24 : size === "sm" ? 16 : 18} />
    </AriaButton>
  );
  return tooltip ? <Tooltip text={label}>{button}</Tooltip> : button;
}
