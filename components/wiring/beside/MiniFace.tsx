import { memo } from "react";
import { viewFace, type Connector, type Side } from "@/lib/calc/connector";

type Props = { face: Connector; lit: readonly string[]; side: Side };

const PX_PER_MM = 1.4;

/** A connector's face at a glance: where the net is. Its words stand beside it. */
export const MiniFace = memo(function MiniFace({ face, lit, side }: Props) {
  const { widthMm, heightMm, pins } = viewFace(face, side, "lying");
  const isLit = new Set(lit);
  const dots = pins
    .filter(({ name }) => !isLit.has(name))
    .map(({ xMm, yMm }) => `M${tenth(xMm - 0.6)} ${tenth(yMm - 0.6)}h1.2v1.2h-1.2z`);
  return (
    <svg
      aria-hidden="true"
      viewBox={`-0.5 -0.5 ${tenth(widthMm + 1)} ${tenth(heightMm + 1)}`}
      width={Math.round((widthMm + 1) * PX_PER_MM)}
      className="block h-auto max-w-full"
    >
      <rect
        width={tenth(widthMm)}
        height={tenth(heightMm)}
        rx="1"
        strokeWidth={isLit.size > 0 ? 0.9 : 0.6}
        className={isLit.size > 0 ? "fill-raised stroke-copper" : "fill-sheet stroke-rule-strong"}
      />
      <path d={dots.join("")} className="fill-rule-strong" />
      {pins
        .filter(({ name }) => isLit.has(name))
        .map(({ name, xMm, yMm }) => (
          <rect
            key={name}
            x={tenth(xMm - 1.25)}
            y={tenth(yMm - 1.25)}
            width="2.5"
            height="2.5"
            rx="0.4"
            className="fill-copper"
          />
        ))}
    </svg>
  );
});

const tenth = (mm: number): number => Math.round(mm * 10) / 10;
