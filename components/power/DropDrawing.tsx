import clsx from "clsx";
import type { SlotDrop } from "@/lib/calc/power";
import type { PowerView, RailView } from "@/lib/power/power-view";
import { percent, quantity, volts } from "./figures";

type Props = { rail: RailView; drops: readonly SlotDrop[]; slots: PowerView["slots"] };

/** Of the height, above the rail at its source and below the deepest card. */
const TOP = 0.14;
const BOTTOM = 0.2;
/** While the tolerance allows no more than so many times what is lost, its end is drawn; else it is only told. */
const NEAR = 2.5;

/** The slots side by side; how far the rail has sunk at each, against what its tolerance allows. */
export function DropDrawing({ rail, drops, slots }: Props) {
  const allowed = (Math.abs(rail.volts) * rail.tolerancePercent) / 100;
  const lost = Math.max(...drops.map(({ dropV }) => dropV)) || 1e-3;
  const isNear = allowed <= lost * NEAR;
  const deepest = isNear ? Math.max(lost, allowed) : lost;
  const y = (drop: number) => TOP + (drop / deepest) * (1 - TOP - BOTTOM);
  const x = (index: number) => (index + 0.5) / slots.length;
  const points = slots.flatMap(({ position }, index): Point[] => {
    const drop = drops.find(({ slot }) => slot === position);
    if (drop) return [{ x: x(index), y: y(drop.dropV), drop }];
    return position === rail.sourceSlot ? [{ x: x(index), y: y(0), drop: null }] : [];
  });
  return (
    <div className="relative overflow-x-auto" tabIndex={0} role="group" aria-label={`${rail.name} along the slots`}>
      <div className="min-w-max">
        <div className="grid-paper relative h-24 border border-rule print:[print-color-adjust:exact]">
          <Level at={y(0)} text={quantity(rail.volts, "V")} className="border-ink-soft" />
          {isNear && (
            <Level at={y(allowed)} text={`${volts(allowed)} may be lost`} className="border-dashed border-failed" />
          )}
          <svg
            aria-hidden="true"
            viewBox="0 0 100 100"
            preserveAspectRatio="none"
            className="absolute inset-0 size-full text-copper"
          >
            <polyline
              points={points.map((point) => `${point.x * 100},${point.y * 100}`).join(" ")}
              fill="none"
              stroke="currentColor"
              strokeWidth="1.5"
              vectorEffect="non-scaling-stroke"
            />
          </svg>
          {points.map(({ drop, ...at }) => (
            <span
              key={at.x}
              className={clsx(
                "absolute size-2.5 -translate-x-1/2 -translate-y-1/2 border-2",
                drop === null && "border-copper bg-sheet",
                drop?.verdict === "fits" && "border-sheet bg-copper",
                drop?.verdict === "too low" && "border-sheet bg-failed",
              )}
              style={{ left: percent(at.x), top: percent(at.y) }}
            />
          ))}
        </div>
        <p aria-hidden="true" className="pt-1.5 text-2xs text-ink-soft">
          mV lost at each slot
        </p>
        <ol className="flex border-x border-transparent pt-0.5">
          {slots.map(({ position, label }) => (
            <Slot
              key={position}
              {...{ position, label, drop: drops.find(({ slot }) => slot === position) }}
              isSource={position === rail.sourceSlot}
            />
          ))}
        </ol>
      </div>
    </div>
  );
}

type Point = { x: number; y: number; drop: SlotDrop | null };
type LevelProps = { at: number; text: string; className: string };

const Level = ({ at, text, className }: LevelProps) => (
  <>
    <span className={clsx("absolute inset-x-0 border-t", className)} style={{ top: percent(at) }} />
    <span
      className="mono absolute left-1.5 bg-sheet px-1 text-2xs leading-none text-ink-soft"
      style={{ top: percent(at + 0.04) }}
    >
      {text}
    </span>
  </>
);

/** Two digits, with nothing below a hundredth: 4.2, 0.81, 120. */
const milli = (value: number) => String(Number((value * 1e3).toPrecision(value < 0.1 ? 2 : 3)));

type SlotProps = { position: number; label: string; drop: SlotDrop | undefined; isSource: boolean };

const Slot = ({ position, label, drop, isSource }: SlotProps) => (
  <li className="flex min-w-10 flex-1 flex-col items-center text-center" title={label}>
    <span className={clsx("mono text-2xs", drop?.verdict === "too low" && "font-semibold text-failed")}>
      {drop ? milli(drop.dropV) : isSource ? "fed" : "–"}
      {drop && <span className="sr-only"> millivolts lost at</span>}
    </span>
    <span className="text-2xs text-ink-soft">
      <span className="sr-only sm:not-sr-only">slot </span>
      {position}
      <span className="sr-only">, {label}</span>
    </span>
  </li>
);
