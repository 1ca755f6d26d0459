import clsx from "clsx";
import type { ReactNode } from "react";
import { STATE_TEXT, type GlyphState } from "./StateGlyph";

/**
 * The states at 7 × 12 for runs of dozens. Each keeps one trait of its large drawing and differs from every other in
 * outline, not only in colour: full, dashed, leaning, lifted, arch, bare pad, hatch.
 */
const DRAWINGS: Record<GlyphState, ReactNode> = {
  passed: <path d="M0 0h7v12H0z" fill="currentColor" stroke="none" />,
  doubtful: <path d="M0.5 3.5v-3h2M4.5 0.5h2v3M6.5 5v2.5M0.5 5v2.5M0.5 9v2.5h2M4.5 11.5h2V9" />,
  failed: <path d="M0 12 3 0h4L4 12z" fill="currentColor" stroke="none" />,
  reopened: (
    <>
      <path d="M0.75 0.75h5.5v5H0.75z" strokeWidth="1.5" />
      <path d="M0 10h7v2H0z" fill="currentColor" stroke="none" />
    </>
  ),
  conceded: <path d="M1 12V6.5C1 1 6 1 6 6.5V12" strokeWidth="2" />,
  untested: <path d="M0.5 8.5h6v3h-6z" />,
  waiting: <path strokeWidth="1.25" d="M0.5 11.5 3 6M4 11.5 6.5 6" />,
};

export function MiniGlyph({ state, isMarked = false }: { state: GlyphState; isMarked?: boolean }) {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 7 12"
      width="7"
      height="12"
      fill="none"
      stroke="currentColor"
      className={clsx("overflow-visible", STATE_TEXT[state], isMarked && "mx-1")}
    >
      <g>{DRAWINGS[state]}</g>
      {isMarked && <path d="M-2.5 -2.5h12v17h-12z" stroke="var(--copper)" strokeWidth="1.5" />}
    </svg>
  );
}
