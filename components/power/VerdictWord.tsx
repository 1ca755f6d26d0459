import clsx from "clsx";
import type { CheckState } from "@/db/schema/travelers";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";

const LOOKS = {
  good: { state: "passed", text: "text-passed" },
  scant: { state: "doubtful", text: "text-doubtful" },
  bad: { state: "failed", text: "text-failed" },
  unknown: { state: "untested", text: "text-ink-soft" },
} as const satisfies Record<string, { state: CheckState; text: string }>;
export type Standing = keyof typeof LOOKS;

/** How a figure stands, glyph and word. */
export function VerdictWord({ standing, children }: { standing: Standing; children: string }) {
  const { state, text } = LOOKS[standing];
  return (
    <span className={clsx("inline-flex items-center gap-1.5 whitespace-nowrap font-semibold", text)}>
      <StateGlyph state={state} size={12} />
      {children}
    </span>
  );
}
