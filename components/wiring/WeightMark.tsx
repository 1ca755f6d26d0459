import clsx from "clsx";
import type { Weight } from "@/lib/calc/interconnect";

/** What is asked of the reader, as a heading and beside a finding. */
export const WEIGHT_WORDS: Record<Weight, string> = {
  must: "Must be mended",
  should: "Should be mended",
  look: "Worth a look",
};

export const WEIGHT_TEXT: Record<Weight, string> = {
  must: "text-failed",
  should: "text-doubtful",
  look: "text-conceded",
};

/** Two conductors from above: bridged by a blob of solder, nearly touching, or one with a lens over it. */
const DRAWINGS: Record<Weight, { path: string; filled?: string }> = {
  must: { path: "M1 4h18M1 12h18", filled: "M7 3h6v10H7z" },
  should: { path: "M1 4h18M1 12h18M10 4v2M10 10v2" },
  look: { path: "M1 8h5M14 8h5M10 4a4 4 0 1 0 0 8 4 4 0 0 0 0-8" },
};

type Props = { weight: Weight; size?: number; className?: string };

/** Always beside its word; on its own it says nothing to a screen reader. */
export function WeightMark({ weight, size = 16, className }: Props) {
  const { path, filled } = DRAWINGS[weight];
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 20 16"
      width={(size * 20) / 16}
      height={size}
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      className={clsx("shrink-0", WEIGHT_TEXT[weight], className)}
    >
      <path d={path} />
      {filled && <path d={filled} fill="currentColor" stroke="none" />}
    </svg>
  );
}
