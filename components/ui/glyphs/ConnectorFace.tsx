import clsx from "clsx";
import { useId } from "react";
import { viewFace, type Connector, type Orientation, type Side } from "@/lib/calc/connector";
import type { PinRole } from "@/lib/calc/interconnect";
import { ConnectorPin } from "./ConnectorPin";
import { axisOf, roomOf } from "./face-axis";
import { PinPatterns } from "./pin-look";

export type ConnectorFaceProps = {
  face: Connector;
  /** From the solder side everything is mirrored. */
  side?: Side;
  /** "lying" for a phone (positions from left to right), "standing" for a sheet beside a table. */
  orientation?: Orientation;
  /** Pins to light, by name: "a4". */
  lit: ReadonlySet<string>;
  /** One pin that stands out among the lit ones. */
  marked?: string | undefined;
  /** With it pins are filled by what they do; a pin without a role is bare. */
  roles?: Readonly<Record<string, PinRole>>;
  /** Told of the pin under the pointer: of lit ones only, unless the pins have roles. */
  onPin?: (pin: string | undefined) => void;
  /** Told of the pin that was pressed. */
  onPick?: (pin: string) => void;
  /** Names the drawing; the lit pins are added to it. */
  label?: string;
  className?: string;
};

/** Room for letters and figures beside the body, and how large a millimetre is drawn at most. */
const MARGIN = 2.1;
const PX_PER_MM = { lying: 5.9, standing: 6.2 };

/** A connector's face to scale, as its standard has it: body, rows, positions. */
export function ConnectorFace(props: ConnectorFaceProps) {
  const { face, side = "card", orientation = "lying", lit, marked, roles, onPin, onPick, className } = props;
  const id = useId();
  const { widthMm, heightMm, pins } = viewFace(face, side, orientation);
  const room = roomOf(face);
  const margin = room * MARGIN;
  const isLying = orientation === "lying";
  const names = pins.filter(({ name }) => lit.has(name)).map(({ name }) => name);
  const used = [...new Set(Object.values(roles ?? {}))];
  const said = names.length > 0 ? `Lit: ${names.join(", ")}` : "No pin is lit";
  return (
    <svg
      role="img"
      aria-label={`${props.label ?? "Connector"}, seen from the ${side} side. ${said}`}
      viewBox={[-margin, -margin, widthMm + 2 * margin, heightMm + 2 * margin].map(rounded).join(" ")}
      className={clsx("block h-auto max-w-full", className)}
      style={{ width: `${Math.round((widthMm + 2 * margin) * PX_PER_MM[orientation])}px` }}
      onPointerLeave={() => onPin?.(undefined)}
    >
      {roles && <PinPatterns id={id} unit={room} roles={used} />}
      <rect
        width={rounded(widthMm)}
        height={rounded(heightMm)}
        rx={room * 0.4}
        className="fill-raised stroke-edge"
        strokeWidth={room * 0.09}
      />
      {axisOf(face, { pins, widthMm, heightMm, isLying }).map(({ text, x, y, anchor }) => (
        <text
          key={`${text} ${x} ${y}`}
          x={rounded(x)}
          y={rounded(y)}
          textAnchor={anchor}
          fontSize={rounded(room * 0.82)}
          style={{ fontSizeAdjust: "none" }}
          className="mono fill-ink-soft"
        >
          {text}
        </text>
      ))}
      {pins.map(({ name, xMm, yMm }) => {
        const isTold = onPin && (roles !== undefined || lit.has(name));
        return (
          <ConnectorPin
            key={name}
            x={rounded(xMm)}
            y={rounded(yMm)}
            room={room}
            isLying={isLying}
            isLit={lit.has(name)}
            isMarked={marked === name}
            role={roles?.[name]}
            patterns={id}
            onPoint={isTold ? () => onPin(name) : undefined}
            onPick={onPick ? () => onPick(name) : undefined}
          />
        );
      })}
    </svg>
  );
}

/** Hundredths of a millimetre are finer than any screen; more digits only make the page heavier. */
const rounded = (mm: number): number => Math.round(mm * 100) / 100;
