import type { Family } from "@/lib/calc/levels";
import { threeDigits } from "./three-digits";

type Props = { driver: Family; receiver: Family; level: "high" | "low"; supplyVolts: number };

const volts = (value: number) => threeDigits(value, "V");
const HEIGHT = 46;

/**
 * What the output gives above what the input takes, on one scale from 0 V to the supply: solid where the output's level
 * may lie, hatched where the input takes it as that level, and the margin between the two edges.
 */
export function LevelLadder({ driver, receiver, level, supplyVolts }: Props) {
  const top = Math.max(supplyVolts, driver.volts, receiver.volts);
  const at = (value: number) => Math.min(Math.max(value / top, 0), 1) * 100;
  const isHigh = level === "high";
  const [given, taken] = isHigh ? [driver.vohMin, receiver.vihMin] : [driver.volMax, receiver.vilMax];
  const [from, to] = [at(Math.min(given, taken)), at(Math.max(given, taken))];
  const fits = isHigh ? given >= taken : taken >= given;
  const band = (edge: number) =>
    isHigh ? { x: `${at(edge)}%`, width: `${100 - at(edge)}%` } : { x: "0%", width: `${at(edge)}%` };
  const hatch = `hatch-${driver.name}-${receiver.name}-${level}`.replace(/\W+/g, "-");
  return (
    <figure className="mt-2">
      <svg
        role="img"
        aria-label={`Output ${isHigh ? "from" : "up to"} ${volts(given)}, input ${isHigh ? "from" : "up to"} ${volts(taken)}, on a scale to ${volts(top)}`}
        width="100%"
        height={HEIGHT}
        className="overflow-visible"
      >
        <defs>
          <pattern id={hatch} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
            <path d="M0 0v5" stroke="var(--solder)" strokeWidth="2.5" />
          </pattern>
        </defs>
        <rect x="0" y="0" width="100%" height="14" fill="none" stroke="var(--rule-strong)" />
        <rect {...band(given)} y="0" height="14" fill="var(--ink-soft)" stroke="var(--rule-strong)" />
        <rect x="0" y="32" width="100%" height="14" fill="none" stroke="var(--rule-strong)" />
        <rect {...band(taken)} y="32" height="14" fill={`url(#${hatch})`} stroke="var(--rule-strong)" />
        <rect
          x={`${from}%`}
          y="17"
          width={`${Math.max(to - from, 0.4)}%`}
          height="12"
          fill={fits ? "var(--passed)" : "var(--failed)"}
          opacity={fits ? 0.85 : 1}
        />
        <line x1={`${at(given)}%`} x2={`${at(given)}%`} y1="0" y2="29" stroke="var(--ink)" strokeWidth="1.5" />
        <line x1={`${at(taken)}%`} x2={`${at(taken)}%`} y1="17" y2={HEIGHT} stroke="var(--ink)" strokeWidth="1.5" />
      </svg>
      <figcaption className="mono mt-1 flex justify-between text-2xs text-ink-soft">
        <span>0 V</span>
        <span className="font-text">
          <span className="text-ink-soft">■</span> output {isHigh ? "gives" : "leaves"},{" "}
          <span aria-hidden="true">▨</span> input takes, <span className={fits ? "text-passed" : "text-failed"}>■</span>{" "}
          {fits ? "margin" : "missing"}
        </span>
        <span>{volts(top)}</span>
      </figcaption>
    </figure>
  );
}
