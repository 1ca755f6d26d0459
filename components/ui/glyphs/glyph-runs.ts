import type { GlyphState } from "./StateGlyph";

export type GlyphRun = { start: number; state: GlyphState; count: number; isMarked: boolean };

/** So many stay together on a line; a longer run may be broken between two pictures. */
const LONGEST = 6;

/** Neighbours of one state as one picture each: a rack of thousands of checks stays light. The marked one stands alone. */
export function glyphRuns(states: readonly GlyphState[], marked?: number): GlyphRun[] {
  const runs: GlyphRun[] = [];
  states.forEach((state, index) => {
    const last = runs.at(-1);
    const isMarked = index === marked;
    if (last && last.state === state && !isMarked && !last.isMarked && last.count < LONGEST) last.count += 1;
    else runs.push({ start: index, state, count: 1, isMarked });
  });
  return runs;
}
