import clsx from "clsx";
import { limitScale, standing, type Limits, type Standing } from "./limit-scale";

export type LimitBarProps = Limits & {
  /** Width of the guard band inside each limit, in the reading's unit. */
  guard?: number | undefined;
  value?: number | undefined;
  /** Writes a figure with its unit; without it no figures are written. */
  format?: ((value: number) => string) | undefined;
  /** "row" for tables, "bench" at arm's length. */
  size?: "row" | "bench";
  className?: string;
};

const MARKS: Record<Standing, string> = { inside: "fill-passed", guard: "fill-doubtful", outside: "fill-failed" };

const WORDS: Record<Standing, string> = {
  inside: "inside the limits",
  guard: "inside the limits, in the guard band",
  outside: "outside the limits",
};

const WIDTH = 200;

/** The limits as a scale: end stops, ochre guard bands, and the reading's mark. Off the scale the mark is an arrow. */
export function LimitBar({ lower, upper, guard = 0, value, format, size = "row", className }: LimitBarProps) {
  const limits = { lower, upper };
  const scale = limitScale(limits);
  const x = (figure: number) => scale.at(figure) * WIDTH;
  const stops = [lower, upper].filter((stop) => stop !== undefined);
  const verdict = value === undefined ? undefined : standing(value, limits, guard);
  const [from, to] = [lower === undefined ? 0 : x(lower), upper === undefined ? WIDTH : x(upper)];
  return (
    <div className={clsx("min-w-24", className)}>
      <svg
        role="img"
        aria-label={words({ ...limits, value, verdict, format })}
        viewBox={`-4 0 ${WIDTH + 8} 20`}
        preserveAspectRatio="none"
        className={clsx("block w-full overflow-visible", size === "bench" ? "h-7" : "h-4.5")}
      >
        <path d={`M0 10H${WIDTH}`} className="stroke-rule-strong" strokeWidth="1.5" vectorEffect="non-scaling-stroke" />
        <path d={`M${from} 10H${to}`} className="stroke-ink-soft" strokeWidth="1.5" vectorEffect="non-scaling-stroke" />
        {guard > 0 && lower !== undefined && <Guard from={x(lower)} to={x(lower + guard)} />}
        {guard > 0 && upper !== undefined && <Guard from={x(upper - guard)} to={x(upper)} />}
        {stops.map((stop) => (
          <path
            key={stop}
            d={`M${x(stop)} 3.5V16.5`}
            className="stroke-ink"
            strokeWidth="1.5"
            vectorEffect="non-scaling-stroke"
          />
        ))}
        {value !== undefined && verdict && <Mark x={x(value)} off={scale.isOff(value)} className={MARKS[verdict]} />}
      </svg>
      {format && stops.length > 0 && <Figures stops={stops} at={scale.at} format={format} isLarge={size === "bench"} />}
    </div>
  );
}

function Guard({ from, to }: { from: number; to: number }) {
  return <rect x={from} y="7.5" width={Math.max(0, to - from)} height="5" className="fill-doubtful" />;
}

function Mark({ x, off, className }: { x: number; off: "below" | "above" | null; className: string }) {
  if (off) {
    const tip = off === "above" ? 4 : -4;
    return <path d={`M${x - tip} 2 ${x + tip} 10 ${x - tip} 18z`} className={className} />;
  }
  return (
    <rect x={x - 1.75} y="0.5" width="3.5" height="19" className={clsx(className, "stroke-sheet")} strokeWidth="1" />
  );
}

type FiguresProps = {
  stops: number[];
  at: (value: number) => number;
  format: (value: number) => string;
  isLarge: boolean;
};

function Figures({ stops, at, format, isLarge }: FiguresProps) {
  return (
    <div
      aria-hidden="true"
      className={clsx("mono relative mx-[2%] text-ink-soft", isLarge ? "h-5 text-sm" : "h-4 text-2xs")}
    >
      {stops.map((stop) => (
        <span key={stop} className="absolute -translate-x-1/2 whitespace-nowrap" style={{ left: `${at(stop) * 100}%` }}>
          {format(stop)}
        </span>
      ))}
    </div>
  );
}

type Said = Limits & { value: number | undefined; verdict: Standing | undefined; format: LimitBarProps["format"] };

function words({ lower, upper, value, verdict, format = String }: Said): string {
  const range = [
    lower === undefined ? "" : `at least ${format(lower)}`,
    upper === undefined ? "" : `at most ${format(upper)}`,
  ].filter(Boolean);
  const limits = `Limits: ${range.join(", ") || "none"}`;
  return value === undefined || !verdict ? limits : `${format(value)}, ${WORDS[verdict]}. ${limits}`;
}
