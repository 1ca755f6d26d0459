"use client";

import clsx from "clsx";
import { Label, ProgressBar as AriaProgressBar } from "react-aria-components";

export type ProgressBarProps = {
  label: string;
  /** 0 … 1; without it nobody knows how long it takes. */
  value?: number;
  /** Instead of the percentage: "128 of 128". */
  text?: string;
  tone?: "copper" | "passed" | "failed";
  isLabelHidden?: boolean;
  className?: string;
};

const FILLS = { copper: "bg-copper", passed: "bg-passed", failed: "bg-failed" };

export function ProgressBar({ label, value, text, tone = "copper", isLabelHidden, className }: ProgressBarProps) {
  return (
    <AriaProgressBar
      minValue={0}
      maxValue={1}
      value={value ?? 0}
      isIndeterminate={value === undefined}
      {...(text === undefined ? {} : { valueLabel: text })}
      className={clsx("flex min-w-24 flex-col gap-1", className)}
    >
      {({ percentage, valueText }) => (
        <>
          <div className={clsx("flex items-baseline justify-between gap-3 text-sm", isLabelHidden && "sr-only")}>
            <Label>{label}</Label>
            <span className="mono whitespace-nowrap text-xs text-ink-soft">{text ?? valueText}</span>
          </div>
          <div className="h-2 overflow-hidden rounded-sm bg-rule">
            <div
              className={clsx(
                "h-full rounded-sm",
                FILLS[tone],
                percentage === undefined ? "motion-travel w-2/5" : "transition-[width] duration-200",
              )}
              style={percentage === undefined ? undefined : { width: `${percentage}%` }}
            />
          </div>
        </>
      )}
    </AriaProgressBar>
  );
}
