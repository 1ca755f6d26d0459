import type { CurrentWindow } from "@/lib/calc/power";
import { formatLimits, formatQuantity, parseQuantity, type Unit } from "@/lib/calc/units";

/** With a plain space, as people type it into a form. */
const write = (value: number, unit: Unit) => formatQuantity({ value, unit }).replace("\u202f", " ");
const amps = (value: number) => write(value, "A");

/** Two digits are all that a budget means: 0.1334 A is written 140 mA above and 130 mA below. */
function twoDigits(value: number, round: (value: number) => number): number {
  if (value === 0) return 0;
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 1);
  // Twelve digits: 0.14 / 0.01 is 14 and not 14.000000000000002.
  return Number((round(Number((value / step).toPrecision(12))) * step).toPrecision(12));
}

/** What the expected current of a rail would make of a power-on check: limits, expectation, caution; or a check of its own. */
export function firstPowerOffer({ rail, volts, lowerA, expectedA, upperA, limitA }: CurrentWindow) {
  const lower = twoDigits(lowerA, Math.floor);
  const upper = twoDigits(upperA, Math.ceil);
  const limits = formatLimits({ unit: "A", ...(lower > 0 ? { lower } : {}), upper }).replaceAll("\u202f", " ");
  const expected = amps(twoDigits(expectedA, Math.round));
  const begins = `Set the bench supply's limit for ${rail}`;
  return {
    limits,
    expected,
    caution: { begins, text: `${begins} to ${amps(limitA)} before its output goes on.` },
    fresh: {
      stage: "power-on" as const,
      title: `Current from ${rail} at first power`,
      instruction: `Set ${write(volts, "V")} and the limit with the outputs shorted, then connect the board. Turn the voltage up slowly and watch the current; stop when it rises faster than the voltage. Note it after ten seconds at full voltage.`,
      caution: "",
      reference: "Current budget of the board; limits by common practice, no source",
      holdPoint: false,
      kind: "reading" as const,
      typed: { unit: "A", limits, expected },
      covers: { signals: [], pins: [], rails: [rail], blocks: [] },
      needs: [],
    },
  };
}

type Told = { title: string; instruction: string };

const names = ({ title, instruction }: Told, rail: string): boolean =>
  `${title} ${instruction}`.replaceAll(/\s/g, "").includes(rail.replaceAll(/\s/g, ""));

/**
 * Key of the check that is most likely about a rail's current: one that names it; for the first of the board's rails
 * else one that names none of the others. Null: none.
 */
export function checkForRail(
  checks: readonly (Told & { key: string })[],
  rail: string,
  rails: readonly string[],
): string | null {
  const named = checks.find((check) => names(check, rail));
  if (named || rail !== rails[0]) return named?.key ?? null;
  const others = rails.filter((other) => other !== rail);
  return checks.find((check) => !others.some((other) => names(check, other)))?.key ?? null;
}

/** A check whose own words name another limit of the supply: to be mended by hand. */
export function otherLimit({ title, instruction }: Told, { limitA }: CurrentWindow): string | undefined {
  const [, typed] = /limit(?:\s+of|\s+at|,)?\s+(\d+(?:[.,]\d+)?\s*m?A)\b/i.exec(`${title}\n${instruction}`) ?? [];
  if (typed === undefined) return undefined;
  const read = parseQuantity(typed, "A");
  if (!read.ok || Math.abs(read.value.value - limitA) < 1e-6) return undefined;
  return `Its own words name a limit of ${typed}. Mend them in the draft, too.`;
}
