import clsx from "clsx";
import type { ReactNode } from "react";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { Verdict } from "@/db/schema/travelers";
import { VERDICTS } from "@/lib/check-kinds/verdict-word";

const HUES: Record<Verdict, string> = {
  conforms: "text-passed",
  "guard-band": "text-doubtful",
  "does-not-conform": "text-failed",
};

/** A reading or a word with the glyph of its verdict; the verdict is also said, so that colour never stands alone. */
export function VerdictFigure({ verdict, children }: { verdict: Verdict; children: ReactNode }) {
  return (
    <span className={clsx("mono inline-flex items-center gap-1.5 font-semibold whitespace-nowrap", HUES[verdict])}>
      <StateGlyph state={VERDICTS[verdict].state} size={12} />
      <span>{children}</span>
      <span className="sr-only">({VERDICTS[verdict].word})</span>
    </span>
  );
}
