import clsx from "clsx";

export type ConnectorFaceProps = {
  /** Row letters as the standard names them, e.g. ["a", "c"]; letters that are left out keep their room. */
  rows: readonly string[];
  positions: number;
  /** Pins to light, by name: "a4". */
  lit: ReadonlySet<string>;
  /** From the solder side everything is mirrored. */
  side?: "card" | "solder";
  /** "lying" for a phone (positions from left to right), "standing" for a sheet beside a table. */
  orientation?: "lying" | "standing";
  /** Names the drawing; the lit pins are added to it. */
  label?: string;
  className?: string;
};

const PITCH = 10;
const EDGE = 7;
const TEXT = 17;

/** The mating face to scale: one pitch between positions and between neighbouring row letters. */
export function ConnectorFace(props: ConnectorFaceProps) {
  const { rows, positions, lit, side = "card", orientation = "lying", label = "Connector", className } = props;
  const offsets = rowOffsets(rows);
  const across = Math.max(...offsets, 0);
  const isLying = orientation === "lying";
  const place = (row: number, position: number) => {
    const along = (position - 1) * PITCH;
    const aside = (offsets[row] ?? 0) * PITCH;
    const seen = side === "solder";
    return isLying
      ? { x: seen ? (positions - 1) * PITCH - along : along, y: aside }
      : { x: seen ? across * PITCH - aside : aside, y: along };
  };
  const length = (positions - 1) * PITCH + 2 * EDGE;
  const breadth = across * PITCH + 2 * EDGE;
  const [width, height] = isLying ? [length, breadth] : [breadth, length];
  const names = rows
    .flatMap((row) => range(positions).map((position) => `${row}${position}`))
    .filter((pin) => lit.has(pin));
  return (
    <svg
      role="img"
      aria-label={`${label}, seen from the ${side} side. ${names.length > 0 ? `Lit: ${names.join(", ")}` : "No pin is lit"}`}
      viewBox={`${-EDGE - TEXT} ${-EDGE - TEXT} ${width + 2 * TEXT} ${height + 2 * TEXT}`}
      className={clsx("block max-w-full", className)}
      style={isLying ? { width: `${(width + 2 * TEXT) * 1.5}px` } : undefined}
    >
      <rect
        x={-EDGE}
        y={-EDGE}
        width={width}
        height={height}
        rx="2"
        className="fill-raised stroke-edge"
        strokeWidth="1"
      />
      {rows.map((row, index) => {
        const first = place(index, 1);
        return (
          <g key={row}>
            <text
              {...(isLying
                ? { x: side === "solder" ? width - EDGE + 6 : -EDGE - 6, y: first.y + 3.5 }
                : { x: first.x, y: -EDGE - 4 })}
              textAnchor="middle"
              className="mono fill-ink-soft text-[9px]"
            >
              {row}
            </text>
            {range(positions).map((position) => (
              <Pin key={position} {...place(index, position)} isLit={lit.has(`${row}${position}`)} isLying={isLying} />
            ))}
          </g>
        );
      })}
      {range(positions)
        .filter((position) => position === 1 || position === positions || position % 8 === 0)
        .map((position) => {
          const { x, y } = place(0, position);
          return (
            <text
              key={position}
              {...(isLying ? { x, y: height - EDGE + 10.5 } : { x: -EDGE - 3, y: y + 3.5 })}
              textAnchor={isLying ? "middle" : "end"}
              className="mono fill-ink-soft text-[9px]"
            >
              {position}
            </text>
          );
        })}
    </svg>
  );
}

function Pin({ x, y, isLit, isLying }: { x: number; y: number; isLit: boolean; isLying: boolean }) {
  const [width, height] = isLying ? [5, 7] : [7, 5];
  if (!isLit) {
    return (
      <rect
        x={x - width / 2}
        y={y - height / 2}
        width={width}
        height={height}
        rx="0.75"
        className="fill-sheet stroke-edge"
        strokeWidth="0.75"
      />
    );
  }
  return (
    <g className="fill-copper stroke-copper">
      <rect x={x - width / 2 - 0.5} y={y - height / 2 - 0.5} width={width + 1} height={height + 1} rx="1" />
      <rect
        x={x - width / 2 - 2}
        y={y - height / 2 - 2}
        width={width + 4}
        height={height + 4}
        rx="2"
        fill="none"
        strokeWidth="0.75"
      />
    </g>
  );
}

const range = (count: number) => Array.from({ length: count }, (_, index) => index + 1);

/** Rows a and c of a three-row connector stand two pitches apart; names that are no single letters stand one apart. */
function rowOffsets(rows: readonly string[]): number[] {
  const first = rows[0]?.charCodeAt(0) ?? 0;
  const areLetters = rows.every((row) => /^[a-z]$/i.test(row));
  return rows.map((row, index) => (areLetters ? row.charCodeAt(0) - first : index));
}
