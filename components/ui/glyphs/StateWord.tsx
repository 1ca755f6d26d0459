import clsx from "clsx";
import type { ReactNode } from "react";
import { STATE_TEXT, StateGlyph, type GlyphState } from "./StateGlyph";

export type StateWordProps = {
  state: GlyphState;
  /** Instead of the state's own word, e.g. "conforms" or "7 in doubt". */
  children?: ReactNode;
  size?: "sm" | "md" | "lg";
  /** "soft" keeps the word in quiet ink, for legends. */
  tone?: "state" | "soft";
  className?: string;
};

const SIZES = {
  sm: { glyph: 12, text: "text-sm gap-2" },
  md: { glyph: 14, text: "text-[0.9375rem] gap-2" },
  lg: { glyph: 18, text: "text-lg gap-2.5" },
};

/** Glyph and word together: colour never stands alone. */
export function StateWord({ state, children, size = "md", tone = "state", className }: StateWordProps) {
  return (
    <span
      className={clsx(
        "inline-flex items-center whitespace-nowrap",
        SIZES[size].text,
        tone === "soft" ? "text-ink-soft" : [STATE_TEXT[state], "font-semibold"],
        className,
      )}
    >
      <StateGlyph state={state} size={SIZES[size].glyph} />
      <span>{children ?? state}</span>
    </span>
  );
}
