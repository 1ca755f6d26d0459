import { findConnector } from "@/lib/calc/connector";

/** Room for the longest connector: 32 positions. */
const LONGEST = 32;
const STEP = 2;

/**
 * The card's edge connector from its real rows and positions, drawn to one scale for all cards: a 64-pin type C shows
 * the empty row between its two, a short header is short. "across" lays it along a standing card's foot.
 */
export function EdgeConnector({
  type,
  across = false,
  isEmpty = false,
}: {
  type: string | null;
  across?: boolean;
  isEmpty?: boolean;
}) {
  const connector = findConnector(type);
  const positions = connector?.positions ?? LONGEST;
  const columns = connector?.bodyRows ?? 2;
  const length = positions * STEP + 6;
  const width = 22;
  const column = (offset: number) => width / 2 + (offset - (columns - 1) / 2) * 6;
  const body = isEmpty
    ? { fill: "none", stroke: "var(--rule-strong)", strokeDasharray: "2 2" }
    : { fill: "var(--solder-light)", stroke: "none" };
  return (
    <svg
      aria-hidden="true"
      viewBox={across ? `0 0 ${length} ${width}` : `0 0 ${width} ${length}`}
      width={across ? length : width}
      height={across ? width : length}
      className="max-h-full max-w-full shrink-0"
    >
      <g transform={across ? `matrix(0 1 1 0 0 0)` : undefined}>
        <rect x="0.5" y="0.5" width={width - 1} height={length - 1} rx="1.5" {...body} />
        {connector && !isEmpty && (
          <path
            d={connector.rows.map((row) => `M${column(Math.round(row.offsetMm / 2.54))} 3.5V${length - 3.5}`).join("")}
            stroke="var(--copper)"
            strokeWidth="3"
            strokeDasharray="1.2 0.8"
          />
        )}
      </g>
    </svg>
  );
}
