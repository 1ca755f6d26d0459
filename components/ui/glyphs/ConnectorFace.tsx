import clsx from "clsx";
import { ConnectorPin } from "./ConnectorPin";

export type ConnectorFaceProps = {
  /** Row letters as the standard names them, e.g. ["a", "c"]; letters that are left out keep their room. */
  rows: readonly string[];
  positions: number;
  /** Where pins are not named by row letter and position: the name at a row, counted from 0, and a position. */
  pinName?: (row: number, position: number) => string;
  /** Pins to light, by name: "a4". */
  lit: ReadonlySet<string>;
  /** One pin that stands out among the lit ones. */
  marked?: string;
  /** Told of the lit pin under the pointer; undefined beside it. */
  onPin?: (pin: string | undefined) => void;
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
  const {
    rows,
    positions,
    lit,
    marked,
    onPin,
    side = "card",
    orientation = "lying",
    label = "Connector",
    className,
  } = props;
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
  // Pins that only count have no row letter: each row says its first pin, and there is no axis of positions.
  const isNumbered = props.pinName !== undefined && !rows.every((row) => row.length === 1);
  const nameOf = props.pinName ?? ((row: number, position: number) => `${rows[row] ?? ""}${position}`);
  const names = rows
    .flatMap((_, row) => range(positions).map((position) => nameOf(row, position)))
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
              {isNumbered ? nameOf(index, 1) : row}
            </text>
            {range(positions).map((position) => {
              const pin = nameOf(index, position);
              const isLit = lit.has(pin);
              return (
                <ConnectorPin
                  key={pin}
                  {...place(index, position)}
                  room={PITCH}
                  isLit={isLit}
                  isMarked={marked === pin}
                  isLying={isLying}
                  {...(onPin && isLit ? { onPoint: () => onPin(pin) } : {})}
                />
              );
            })}
          </g>
        );
      })}
      {range(positions)
        .filter(() => !isNumbered)
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

const range = (count: number) => Array.from({ length: count }, (_, index) => index + 1);

/** Rows a and c of a three-row connector stand two pitches apart; names that are no single letters stand one apart. */
function rowOffsets(rows: readonly string[]): number[] {
  const first = rows[0]?.charCodeAt(0) ?? 0;
  const areLetters = rows.every((row) => /^[a-z]$/i.test(row));
  return rows.map((row, index) => (areLetters ? row.charCodeAt(0) - first : index));
}
