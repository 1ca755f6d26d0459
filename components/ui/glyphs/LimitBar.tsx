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

const WORDS: Record<Standing, string> = {
  inside: "inside the limits",
  guard: "inside the limits, in the guard band",
  outside: "outside the limits",
};

const MARKS: Record<Standing, string> = { inside: "bg-passed", guard: "bg-doubtful", outside: "bg-failed" };

const percent = (share: number) => `${(share * 100).toFixed(3)}%`;

/** The limits as a scale: end stops, ochre guard bands, and the reading's mark. Off the scale the mark is an arrow. */
export function LimitBar({ lower, upper, guard = 0, value, format, size = "row", className }: LimitBarProps) {
  const limits = { lower, upper };
  const { at, isOff } = limitScale(limits);
  const stops = [lower, upper].filter((stop) => stop !== undefined);
  const verdict = value === undefined ? undefined : standing(value, limits, guard);
  const isLarge = size === "bench";
  return (
    <div className={clsx("min-w-24", className)}>
      <div
        role="img"
        aria-label={words({ ...limits, value, verdict, format })}
        className={clsx("relative mx-1 print:[print-color-adjust:exact]", isLarge ? "h-8" : "h-4.5")}
      >
        <Run from={0} to={1} className="h-px bg-rule-strong" />
        <Run
          from={lower === undefined ? 0 : at(lower)}
          to={upper === undefined ? 1 : at(upper)}
          className={clsx("bg-ink-soft", isLarge ? "h-[3px]" : "h-[2px]")}
        />
        {guard > 0 && lower !== undefined && <Guard from={at(lower)} to={at(lower + guard)} isLarge={isLarge} />}
        {guard > 0 && upper !== undefined && <Guard from={at(upper - guard)} to={at(upper)} isLarge={isLarge} />}
        {stops.map((stop) => (
          <span
            key={stop}
            className={clsx("absolute top-1/2 w-0.5 -translate-x-1/2 -translate-y-1/2 bg-ink", isLarge ? "h-5" : "h-3")}
            style={{ left: percent(at(stop)) }}
          />
        ))}
        {value !== undefined && verdict && (
          <Mark at={at(value)} off={isOff(value)} verdict={verdict} isLarge={isLarge} />
        )}
      </div>
      {format && stops.length > 0 && <Figures stops={stops} at={at} format={format} isLarge={isLarge} />}
    </div>
  );
}

function Run({ from, to, className }: { from: number; to: number; className: string }) {
  return (
    <span
      className={clsx("absolute top-1/2 -translate-y-1/2", className)}
      style={{ left: percent(from), width: percent(to - from) }}
    />
  );
}

const Guard = ({ from, to, isLarge }: { from: number; to: number; isLarge: boolean }) => (
  <Run from={from} to={to} className={clsx("bg-doubtful", isLarge ? "h-2.5" : "h-[5px]")} />
);

type MarkProps = { at: number; off: "below" | "above" | null; verdict: Standing; isLarge: boolean };

function Mark({ at, off, verdict, isLarge }: MarkProps) {
  const shape = off
    ? clsx(
        "aspect-[3/4]",
        isLarge ? "h-5" : "h-3",
        off === "above" ? "[clip-path:polygon(0_0,100%_50%,0_100%)]" : "[clip-path:polygon(100%_0,0_50%,100%_100%)]",
      )
    : clsx("ring-2 ring-sheet", isLarge ? "h-full w-[5px]" : "h-full w-[3px]");
  return (
    <span
      className={clsx("absolute top-1/2 -translate-x-1/2 -translate-y-1/2", shape, MARKS[verdict])}
      style={{ left: percent(at) }}
    />
  );
}

type FiguresProps = Required<Pick<LimitBarProps, "format">> & {
  stops: number[];
  at: (value: number) => number;
  isLarge: boolean;
};

function Figures({ stops, at, format, isLarge }: FiguresProps) {
  return (
    <div
      aria-hidden="true"
      className={clsx("mono relative mx-1 text-ink-soft", isLarge ? "h-5 text-sm" : "h-4 text-2xs")}
    >
      {stops.map((stop) => (
        <span key={stop} className="absolute -translate-x-1/2 whitespace-nowrap" style={{ left: percent(at(stop)) }}>
          {format?.(stop)}
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
