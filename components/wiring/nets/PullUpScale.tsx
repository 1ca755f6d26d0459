import { threeDigits } from "./three-digits";

type Props = {
  minOhm: number;
  maxOhm: number | null;
  /** What stands there now. */
  ohm: number | null;
  recommendedOhm: number;
  /** Marked as ticks. */
  values: readonly number[];
};

const ohms = (value: number) => threeDigits(value, "Ω");

/** The window on a scale by ratio, with the values that can be bought, the one to take, and the one that is there. */
export function PullUpScale({ minOhm, maxOhm, ohm, recommendedOhm, values }: Props) {
  const top = maxOhm ?? minOhm * 10;
  const room = Math.log10(top / minOhm) * 0.18 + 0.08;
  const low = Math.min(Math.log10(minOhm) - room, ohm === null ? Infinity : Math.log10(ohm) - 0.05);
  const high = Math.max(Math.log10(top) + room, ohm === null ? -Infinity : Math.log10(ohm) + 0.05);
  const at = (value: number) => ((Math.log10(value) - low) / (high - low)) * 100;
  const isInside = ohm !== null && ohm >= minOhm && (maxOhm === null || ohm <= maxOhm);
  const words = `Window from ${threeDigits(minOhm, "Ω", "up")} ${maxOhm === null ? "upwards" : `to ${threeDigits(maxOhm, "Ω", "down")}`}, best ${ohms(recommendedOhm)}${ohm === null ? "" : `, there now ${ohms(ohm)}`}`;
  return (
    <figure className="mb-3">
      <svg role="img" aria-label={words} width="100%" height="34" className="overflow-visible">
        <line x1="0" x2="100%" y1="22" y2="22" stroke="var(--rule-strong)" />
        <rect
          x={`${at(minOhm)}%`}
          y="16"
          width={`${(maxOhm === null ? 100 : at(top)) - at(minOhm)}%`}
          height="12"
          fill="var(--passed-ground)"
          stroke="var(--passed)"
        />
        {values.map((value) => (
          <line key={value} x1={`${at(value)}%`} x2={`${at(value)}%`} y1="18" y2="26" stroke="var(--passed)" />
        ))}
        <svg x={`${at(recommendedOhm)}%`} y="0" overflow="visible">
          <path d="M-5 4H5L0 13z" fill="var(--copper)" />
        </svg>
        {ohm !== null && (
          <svg x={`${at(ohm)}%`} y="12" overflow="visible">
            <path d="M-2 0h4v20h-4z" fill={isInside ? "var(--ink)" : "var(--failed)"} />
          </svg>
        )}
      </svg>
      <figcaption className="mono relative h-5 text-2xs text-ink-soft">
        <span className="absolute -translate-x-1/2" style={{ left: `${at(minOhm)}%` }}>
          {threeDigits(minOhm, "Ω", "up")}
        </span>
        {maxOhm !== null && (
          <span className="absolute -translate-x-1/2" style={{ left: `${at(maxOhm)}%` }}>
            {threeDigits(maxOhm, "Ω", "down")}
          </span>
        )}
        <span className="absolute -translate-x-1/2 text-copper" style={{ left: `${at(recommendedOhm)}%` }}>
          {ohms(recommendedOhm)}
        </span>
      </figcaption>
    </figure>
  );
}
