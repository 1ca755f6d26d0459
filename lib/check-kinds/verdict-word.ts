import type { CheckState, Verdict } from "@/db/schema/travelers";
import { VERDICT_WORDS } from "@/lib/calc/conformity";

/** Each verdict in words, and the state whose glyph and hue it has. */
export const VERDICTS: Record<Verdict, { word: string; state: CheckState }> = {
  conforms: { word: VERDICT_WORDS.conforms, state: "passed" },
  "guard-band": { word: VERDICT_WORDS["guard-band"], state: "doubtful" },
  "does-not-conform": { word: VERDICT_WORDS["does-not-conform"], state: "failed" },
};
