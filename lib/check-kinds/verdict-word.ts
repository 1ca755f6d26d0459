import type { CheckState, Verdict } from "@/db/schema/travelers";

/** Each verdict in words, and the state whose glyph and hue it has. */
export const VERDICTS: Record<Verdict, { word: string; state: CheckState }> = {
  conforms: { word: "conforms", state: "passed" },
  "guard-band": { word: "conforms, inside guard band", state: "doubtful" },
  "does-not-conform": { word: "does not conform", state: "failed" },
};
