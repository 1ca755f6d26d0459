import clsx from "clsx";
import { STATE_TEXT, type GlyphState } from "./StateGlyph";

/** Sub-paths as start and relative rest, so that a run of equal glyphs is one path, shifted glyph by glyph. */
type Stroke = { starts: [x: number, y: number, rest: string][]; width?: number; filled?: true };

/**
 * The states at 7 × 12 for runs of dozens. Each keeps one trait of its large drawing and differs from every other in
 * outline, not only in colour: full, dashed, leaning, lifted, arch, bare pad, hatch.
 */
const DRAWINGS: Record<GlyphState, Stroke[]> = {
  passed: [{ starts: [[0, 0, "h7v12h-7z"]], filled: true }],
  doubtful: [
    {
      starts: [
        [0.5, 3.5, "v-3h2"],
        [4.5, 0.5, "h2v3"],
        [6.5, 5, "v2.5"],
        [0.5, 5, "v2.5"],
        [0.5, 9, "v2.5h2"],
        [4.5, 11.5, "h2v-2.5"],
      ],
    },
  ],
  failed: [{ starts: [[0, 12, "l3-12h4l-3 12z"]], filled: true }],
  reopened: [
    { starts: [[0.75, 0.75, "h5.5v5h-5.5z"]], width: 1.5 },
    { starts: [[0, 10, "h7v2h-7z"]], filled: true },
  ],
  conceded: [{ starts: [[1, 12, "v-5.5c0-5.5 5-5.5 5 0v5.5"]], width: 2 }],
  untested: [{ starts: [[0.5, 8.5, "h6v3h-6z"]] }],
  waiting: [
    {
      starts: [
        [0.5, 11.5, "l2.5-5.5"],
        [4, 11.5, "l2.5-5.5"],
      ],
      width: 1.25,
    },
  ],
};

/** A glyph is 7 wide and stands 2 from the next. */
const STEP = 9;

const pathOf = (starts: Stroke["starts"], count: number) =>
  Array.from({ length: count }, (_, i) => starts.map(([x, y, rest]) => `M${x + i * STEP} ${y}${rest}`).join("")).join(
    "",
  );

type Props = { state: GlyphState; count?: number; isMarked?: boolean };

/** One glyph, or a run of equal ones drawn as one picture. */
export function MiniGlyph({ state, count = 1, isMarked = false }: Props) {
  const width = count * STEP - 2;
  return (
    <svg
      aria-hidden="true"
      viewBox={`0 0 ${width} 12`}
      width={width}
      height="12"
      fill="none"
      stroke="currentColor"
      className={clsx("overflow-visible", STATE_TEXT[state], isMarked && "mx-1")}
    >
      {DRAWINGS[state].map(({ starts, width: strokeWidth, filled }, index) => (
        <path
          key={index}
          d={pathOf(starts, count)}
          strokeWidth={strokeWidth}
          {...(filled ? { fill: "currentColor", stroke: "none" } : {})}
        />
      ))}
      {isMarked && <path d="M-2.5 -2.5h12v17h-12z" stroke="var(--copper)" strokeWidth="1.5" />}
    </svg>
  );
}
