import clsx from "clsx";
import type { PlacedPackage, SpareGate } from "@/lib/calc/packing";

const PIN = 11;
const HEIGHT = 36;
const PAD = 6;

type Props = { one: PlacedPackage; pins: number; spares: readonly SpareGate[] };

/** A package lying, pin 1 at the lower left beside the notch. Filled gates are used; a spare one is an open cell. */
export function PackageDrawing({ one, pins, spares }: Props) {
  const half = Math.ceil(pins / 2);
  const width = Math.max(half * PIN, one.gates.length * 14) + 8;
  const open = new Set(spares.flatMap(({ tieLow, tieHigh, leaveOpen }) => [...tieLow, ...tieHigh, ...leaveOpen]));
  const cell = (width - 14) / one.gates.length;
  const pinX = (pin: number) => 4 + ((width - 8) / half) * ((pin <= half ? pin : pins - pin + 1) - 0.5);
  return (
    <svg
      aria-hidden="true"
      viewBox={`0 0 ${width} ${HEIGHT + 2 * PAD}`}
      width={width}
      height={HEIGHT + 2 * PAD}
      className="block max-w-full"
    >
      {Array.from({ length: pins }, (_, index) => {
        const pin = index + 1;
        return (
          <rect
            key={pin}
            x={pinX(pin) - 2}
            y={pin <= half ? HEIGHT + PAD : 0}
            width="4"
            height={PAD}
            className={open.has(pin) ? "fill-copper" : "fill-solder-light"}
          />
        );
      })}
      <rect x="0.75" y={PAD} width={width - 1.5} height={HEIGHT} rx="2" className="fill-raised stroke-edge" />
      <path d={`M0.75 ${PAD + HEIGHT / 2 - 4}a4 4 0 0 1 0 8`} className="fill-sheet stroke-edge" />
      {one.gates.map(({ gate, usedBy }, index) => {
        const x = 9 + index * cell;
        return (
          <g key={gate}>
            <rect
              x={x}
              y={PAD + 5}
              width={cell - 2}
              height={HEIGHT - 10}
              rx="1"
              strokeWidth="1.25"
              strokeDasharray={usedBy === null ? "2.5 2" : undefined}
              className={usedBy === null ? "fill-none stroke-copper" : "fill-solder-light stroke-none"}
            />
            <text
              x={x + (cell - 2) / 2}
              y={PAD + HEIGHT / 2 + 3.5}
              textAnchor="middle"
              fontSize="11"
              className={clsx("mono font-semibold", usedBy === null ? "fill-copper" : "fill-ink")}
            >
              {gate}
            </text>
          </g>
        );
      })}
    </svg>
  );
}
