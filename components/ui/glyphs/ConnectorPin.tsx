import clsx from "clsx";
import type { PinRole } from "@/lib/calc/interconnect";
import { patternId, PIN_LOOKS } from "./pin-look";

type PinProps = {
  x: number;
  y: number;
  /** Distance to the nearest pin: how much room a pin has to itself. */
  room: number;
  isLying: boolean;
  isLit: boolean;
  isMarked: boolean;
  /** Fills the pin by what it does; without one it is bare. */
  role?: PinRole | undefined;
  /** Under which the drawing defined its patterns. */
  patterns: string;
  onPoint?: (() => void) | undefined;
  onPick?: (() => void) | undefined;
};

export function ConnectorPin({ x, y, room, isLying, isLit, isMarked, role, patterns, onPoint, onPick }: PinProps) {
  const [across, along] = role === undefined ? [0.8, 0.6] : [0.84, 0.72];
  const [width, height] = isLying ? [room * along, room * across] : [room * across, room * along];
  const box = (more: number) => ({
    x: x - width / 2 - more,
    y: y - height / 2 - more,
    width: width + 2 * more,
    height: height + 2 * more,
    rx: room * 0.08 + more,
  });
  const isBare = role === undefined;
  return (
    <g onPointerEnter={onPoint} onPointerDown={onPick ?? onPoint} className={onPick && "cursor-pointer"}>
      {isMarked && <rect {...box(room * 0.12)} className="fill-copper-ground" />}
      {isBare ? (
        <rect
          {...box(isLit ? room * 0.04 : 0)}
          className={isLit ? "fill-copper stroke-copper" : "fill-sheet stroke-edge"}
          strokeWidth={room * 0.07}
        />
      ) : (
        <RolePin role={role} box={box(0)} at={{ x, y, room }} patterns={patterns} />
      )}
      {(isMarked || (isLit && !isBare)) && (
        <rect
          {...box(room * (isMarked ? 0.12 : 0.07))}
          fill="none"
          className="stroke-copper"
          strokeWidth={room * (isMarked ? 0.2 : 0.12)}
        />
      )}
      {/* The whole pitch is sensitive: a pin is small under a finger. */}
      {(onPoint ?? onPick) && (
        <rect x={x - room / 2} y={y - room / 2} width={room} height={room} fill="transparent" stroke="none" />
      )}
    </g>
  );
}

type Box = { x: number; y: number; width: number; height: number; rx: number };
type RolePinProps = { role: PinRole; box: Box; at: { x: number; y: number; room: number }; patterns: string };

function RolePin({ role, box, at, patterns }: RolePinProps) {
  const { letter, hue, isSolid, pattern } = PIN_LOOKS[role];
  return (
    <g className={hue}>
      <rect
        {...box}
        className={isSolid ? "fill-current stroke-current" : "fill-raised stroke-current"}
        strokeWidth={at.room * 0.06}
      />
      {pattern !== undefined && <rect {...box} fill={`url(#${patternId(patterns, role)})`} opacity="0.7" />}
      <text
        x={at.x}
        y={at.y + at.room * 0.22}
        textAnchor="middle"
        fontSize={at.room * 0.62}
        className={clsx("mono font-semibold", isSolid ? "fill-paper" : "fill-ink stroke-raised")}
        strokeWidth={at.room * 0.13}
        strokeLinejoin="round"
        paintOrder="stroke"
        style={{ fontSizeAdjust: "none" }}
      >
        {letter}
      </text>
    </g>
  );
}
