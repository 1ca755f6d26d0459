import { drawnBoard, type Drawn } from "./drawn-board";

type Point = { xMm: number | null; yMm: number | null };
export type LitPoint = Point & { name: string; mark: "a" | "b" };

type Props = {
  points: readonly Point[];
  outline: readonly (readonly { xMm: number; yMm: number }[])[];
  lit: readonly LitPoint[];
  label: string;
  className?: string;
};

/** The board as its netlist draws it: outline, points, and the two that the probes go to. */
export function BoardDrawing({ points, outline, lit, label, className }: Props) {
  const drawn = drawnBoard(points, outline);
  if (!drawn) return null;
  const { view, unit } = drawn;
  const places = lit.flatMap(({ xMm, yMm, name, mark }) =>
    xMm === null || yMm === null ? [] : [{ x: xMm, y: -yMm, name, mark }],
  );
  const [a, b] = places;
  return (
    <svg
      role="img"
      aria-label={`${label}${lit.length > 0 ? `. Lit: ${lit.map(({ name }) => name).join(" and ")}` : ""}`}
      viewBox={[view.x, view.y, view.width, view.height].map(rounded).join(" ")}
      className={`grid-paper block h-auto max-h-[22rem] w-full rounded-md border border-rule bg-sheet ${className ?? ""}`}
    >
      <Board drawn={drawn} />
      {a && b && (
        <line
          x1={rounded(a.x)}
          y1={rounded(a.y)}
          x2={rounded(b.x)}
          y2={rounded(b.y)}
          className="stroke-copper"
          strokeWidth={unit * 0.5}
          strokeDasharray={`${unit * 1.6} ${unit * 1.2}`}
        />
      )}
      {places.map(({ x, y, mark }) => (
        <g key={mark} transform={`translate(${rounded(x)} ${rounded(y)})`}>
          <circle r={unit * 3.2} className="fill-copper stroke-sheet" strokeWidth={unit * 0.5} />
          <text
            textAnchor="middle"
            dy={unit * 1.5}
            fontSize={unit * 4.4}
            style={{ fontSizeAdjust: "none" }}
            className="mono fill-on-copper font-semibold"
          >
            {mark}
          </text>
        </g>
      ))}
    </svg>
  );
}

function Board({ drawn: { outline, dots, dotRadius, unit } }: { drawn: Drawn }) {
  return (
    <>
      <path d={outline} className="fill-raised stroke-edge" strokeWidth={unit * 0.5} fillRule="evenodd" />
      {/* A zero-length line with round ends is a dot: one path for thousands of them. */}
      <path d={dots} className="stroke-ink-faint" strokeWidth={dotRadius * 2} strokeLinecap="round" fill="none" />
    </>
  );
}

const rounded = (mm: number): number => Math.round(mm * 100) / 100;
