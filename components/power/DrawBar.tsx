import clsx from "clsx";
import { percent } from "./figures";

const FILLS = {
  passed: "bg-passed",
  doubtful: "bg-doubtful",
  failed: "bg-failed",
  waiting: "bg-solder",
} as const;
export type BarTone = keyof typeof FILLS;

type Props = {
  typical?: number;
  worst: number;
  /** Drawn as an end stop; null while nobody knows it. */
  limit: number | null;
  tone: BarTone;
  /** The same in words. */
  label: string;
  className?: string;
};

/** A current against its limit: typical filled, up to the worst in outline, the limit as an end stop. */
export function DrawBar({ typical, worst, limit, tone, label, className }: Props) {
  const scale = Math.max(worst, limit ?? 0) * 1.06 || 1;
  const at = (value: number) => percent(value / scale);
  return (
    <div role="img" aria-label={label} className={clsx("relative h-4 print:[print-color-adjust:exact]", className)}>
      <span className="absolute inset-x-0 top-1/2 h-px bg-rule-strong" />
      <span
        className={clsx("absolute left-0 top-1/2 h-2 -translate-y-1/2 rounded-r-sm opacity-40", FILLS[tone])}
        style={{ width: at(worst) }}
      />
      <span
        className={clsx("absolute left-0 top-1/2 h-2 -translate-y-1/2", FILLS[tone])}
        style={{ width: at(typical ?? worst) }}
      />
      <span
        className={clsx("absolute top-1/2 h-3 w-0.5 -translate-x-full -translate-y-1/2", FILLS[tone])}
        style={{ left: at(worst) }}
      />
      {limit !== null && (
        <span className="absolute top-0 h-full w-0.5 -translate-x-1/2 bg-ink" style={{ left: at(limit) }} />
      )}
    </div>
  );
}
