import { shortQuantity } from "../units";
import { type BoardPower } from "./budget";

/** What a bench supply shall show at first power, and where it shall stop, A. */
export type CurrentWindow = {
  rail: string;
  volts: number;
  lowerA: number;
  expectedA: number;
  upperA: number;
  /** To set on the bench supply. */
  limitA: number;
  /** How the figures come about, for the sheet. */
  rule: string;
};

const LOWER_SHARE = 0.5;
const LIMIT_FACTOR = 1.25;
/** Steps in which bench supplies are set, from smaller currents to larger. */
const STEPS = [
  { upToA: 0.1, stepA: 0.005 },
  { upToA: 1, stepA: 0.01 },
  { upToA: Infinity, stepA: 0.05 },
] as const;
const LEAST_LIMIT_A = 0.01;

/**
 * The expected current of a unit for its first power, for each rail that comes to it from outside:
 * - lower: half of what surely flows without a clock (bipolar parts, LEDs that are always lit); less means that something
 *   gets no supply. For CMOS boards that is 0, and says nothing;
 * - expected: the typical current; without its clock a CMOS board takes less;
 * - upper: the worst current; more means a short or a part the wrong way round;
 * - limit of the bench supply: 1.25 × the worst, rounded up to what one can set.
 * Common practice, no source. Leaves out the inrush into the capacitors, which the limit only slows.
 */
export function currentWindows({ rails }: Pick<BoardPower, "rails">): CurrentWindow[] {
  return rails
    .filter((rail) => !rail.madeHere)
    .map(({ rail, volts, taken, atRestA }) => {
      const [lowerA, limitA] = [LOWER_SHARE * atRestA, settable(taken.worst * LIMIT_FACTOR)];
      return { rail, volts, lowerA, expectedA: taken.typical, upperA: taken.worst, limitA, rule: ruleOf(limitA) };
    });
}

const ruleOf = (limitA: number): string =>
  `From half of what flows without a clock to the worst case; supply limit ${shortQuantity(limitA, "A")}, 1.25 times the worst case rounded up. Common practice, no source.`;

/** The next figure up that a bench supply can be set to. */
function settable(amps: number): number {
  const { stepA } = STEPS.find(({ upToA }) => amps <= upToA) ?? STEPS[2];
  // Twelve digits: 0.125 / 0.005 is 25 and not 25.000000000000004.
  const steps = Math.ceil(Number((amps / stepA).toPrecision(12)));
  return Math.max(LEAST_LIMIT_A, Number((steps * stepA).toFixed(3)));
}
