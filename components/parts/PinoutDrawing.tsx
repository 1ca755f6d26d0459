import clsx from "clsx";
import type { LogicPart } from "@/lib/calc/logic-parts";
import { gateLetter, pinRoles, type PinRole } from "./pin-roles";

const STEP = 18;
const BODY = 92;
const SIDE = 74;
const PAD = 13;

/** The package from above, pin 1 at the notch: what each pin does, and the gates where they lie beside their pins. */
export function PinoutDrawing({ part, title }: { part: LogicPart; title: string }) {
  const roles = pinRoles(part);
  const half = part.pins / 2;
  const height = half * STEP + 12;
  const left = SIDE;
  const right = SIDE + BODY;
  const place = (pin: number) =>
    pin <= half
      ? { isLeft: true, y: 6 + (pin - 0.5) * STEP }
      : { isLeft: false, y: 6 + (part.pins - pin + 0.5) * STEP };
  return (
    <svg
      role="img"
      aria-label={`${title} from above. ${roles.map(({ pin, text }) => `${pin} ${text || "not known"}`).join(", ")}`}
      viewBox={`0 0 ${2 * SIDE + BODY} ${height}`}
      className="block w-full max-w-64"
    >
      <rect x={left} y="1" width={BODY} height={height - 2} rx="3" className="fill-raised stroke-edge" />
      <path d={`M${left + BODY / 2 - 9} 1a9 9 0 0 0 18 0`} className="fill-sheet stroke-edge" />
      {part.pinout?.map((gate, index) => {
        const spots = [...gate.inputs, ...gate.outputs].map(place);
        const isLeft = spots[0]?.isLeft ?? true;
        if (part.pinout?.length === 1 || spots.some((spot) => spot.isLeft !== isLeft)) return null;
        const ys = spots.map(({ y }) => y);
        const top = Math.min(...ys) - 6;
        const tall = Math.max(...ys) - top + 6;
        const x = isLeft ? left + 25 : right - 43;
        return (
          <g key={index}>
            <rect x={x} y={top} width="18" height={tall} rx="1.5" className="fill-copper-ground stroke-copper" />
            <text
              x={x + 9}
              y={top + tall / 2 + 4}
              textAnchor="middle"
              fontSize="11"
              className="mono fill-copper font-semibold"
            >
              {gateLetter(index)}
            </text>
          </g>
        );
      })}
      {roles.map((role) => (
        <Pin key={role.pin} role={role} {...place(role.pin)} edge={place(role.pin).isLeft ? left : right} />
      ))}
    </svg>
  );
}

const PADS: Record<PinRole["kind"], string> = {
  in: "fill-sheet stroke-ink",
  out: "fill-ink stroke-ink",
  power: "fill-failed stroke-failed",
  ground: "fill-solder stroke-solder",
  none: "fill-none stroke-rule-strong",
};

function Pin({ role, isLeft, y, edge }: { role: PinRole; isLeft: boolean; y: number; edge: number }) {
  const outward = isLeft ? -1 : 1;
  const text = { y: y + 3.5, fontSize: 10 };
  return (
    <g>
      <rect
        x={isLeft ? edge - PAD : edge}
        y={y - 3.5}
        width={PAD}
        height="7"
        className={clsx(PADS[role.kind])}
        strokeWidth="1"
      />
      <text {...text} x={edge - outward * 5} textAnchor={isLeft ? "start" : "end"} className="mono fill-ink-soft">
        {role.pin}
      </text>
      <text
        {...text}
        x={edge + outward * (PAD + 5)}
        textAnchor={isLeft ? "end" : "start"}
        className={clsx(role.kind === "none" ? "fill-ink-faint" : "fill-ink")}
      >
        {role.text}
      </text>
    </g>
  );
}
