import { GLYPH_STATES } from "@/components/ui/glyphs/StateGlyph";
import { StateWord } from "@/components/ui/glyphs/StateWord";

/** The seven states under the drawing, as the strips show them. */
export function StateLegend() {
  return (
    <ul aria-label="States of a check" className="flex flex-wrap gap-x-5 gap-y-2 px-1">
      {GLYPH_STATES.map((state) => (
        <li key={state}>
          <StateWord state={state} size="sm" tone="soft" />
        </li>
      ))}
    </ul>
  );
}
