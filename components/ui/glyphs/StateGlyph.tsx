import clsx from "clsx";
import type { ReactNode } from "react";

/** The seven states of a check. */
export type GlyphState = "waiting" | "untested" | "passed" | "failed" | "reopened" | "doubtful" | "conceded";

/** In the order in which a legend shows them. */
export const GLYPH_STATES: readonly GlyphState[] = [
  "passed",
  "doubtful",
  "failed",
  "reopened",
  "conceded",
  "untested",
  "waiting",
];

export const STATE_TEXT: Record<GlyphState, string> = {
  passed: "text-passed",
  failed: "text-failed",
  reopened: "text-reopened",
  doubtful: "text-doubtful",
  waiting: "text-waiting",
  untested: "text-untested",
  conceded: "text-conceded",
};

const PADS = <path d="M1 13h8v2H1zM15 13h8v2h-8z" fill="currentColor" stroke="none" />;
const BARE_PADS = <path d="M1.75 12.25h6.5v2.5h-6.5zM15.75 12.25h6.5v2.5h-6.5z" />;

/**
 * A land pattern from above: two pads and what sits on them. Drawn on a 24 × 16 grid with edges on whole units, one
 * colour, no tints, so that it prints and survives 14 px.
 */
const DRAWINGS: Record<GlyphState, ReactNode> = {
  untested: BARE_PADS,
  waiting: (
    <>
      {BARE_PADS}
      <path d="M3 9.5 9.5 2M8.75 9.5 15.25 2M14.5 9.5 21 2" />
    </>
  ),
  passed: (
    <>
      {PADS}
      <path d="M1.5 13 5 9V13zM22.5 13 19 9V13z" fill="currentColor" stroke="none" />
      <path d="M5 4.5h2.75v8.5H5zM9 4.5h6v8.5H9zM16.25 4.5H19v8.5h-2.75z" fill="currentColor" stroke="none" />
    </>
  ),
  failed: (
    <>
      <path d="M1 13h8v2H1z" fill="currentColor" stroke="none" />
      <path d="M15.75 12.25h6.5v2.5h-6.5z" />
      <path d="M2 12.25 6.5 0.5 12.5 2.8 8.3 13z" fill="currentColor" stroke="none" />
    </>
  ),
  reopened: (
    <>
      {PADS}
      <path d="M5.75 1.75h12.5v6H5.75zM9.25 1.75v6M14.75 1.75v6" />
    </>
  ),
  doubtful: (
    <>
      {PADS}
      <path d="M5 7.75V5h3.5M10.25 5h3.5M15.5 5H19v2.75M19 9.5v3M5 9.5v3" />
    </>
  ),
  conceded: (
    <>
      {PADS}
      <path d="M5 13.5C5 1.5 19 1.5 19 13.5" strokeWidth="2.25" />
    </>
  ),
};

export type StateGlyphProps = {
  state: GlyphState;
  /** Height in px; the width is one and a half times that. */
  size?: number;
  /** Accessible name, where no word stands beside it. */
  label?: string;
  /** "current" takes the colour of the text around it. */
  tone?: "state" | "current";
  className?: string;
};

export function StateGlyph({ state, size = 16, label, tone = "state", className }: StateGlyphProps) {
  return (
    <svg
      viewBox="0 0 24 16"
      width={size * 1.5}
      height={size}
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      className={clsx(
        "inline-block shrink-0 print:[print-color-adjust:exact]",
        tone === "state" && STATE_TEXT[state],
        className,
      )}
      {...(label ? { role: "img", "aria-label": label } : { "aria-hidden": true })}
    >
      <g>{DRAWINGS[state]}</g>
    </svg>
  );
}
