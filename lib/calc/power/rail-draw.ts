import { type DrawLine, type RailDraw } from "./budget";
import { type RailSupply, type Spread, type TypedDraw } from "./item";

const NOTHING: Spread = { typical: 0, worst: 0 };

const plus = (a: Spread, b: Spread): Spread => ({ typical: a.typical + b.typical, worst: a.worst + b.worst });

const sumOfDraws = (draws: readonly TypedDraw[], rail: string): Spread | null => {
  const mine = draws.filter((draw) => draw.rail === rail);
  if (mine.length === 0) return null;
  return mine.reduce((sum, { typicalA, worstA }) => plus(sum, { typical: typicalA, worst: worstA }), NOTHING);
};

/** All that is taken from one rail. */
export function railDraw(
  { name, volts }: RailSupply,
  all: readonly DrawLine[],
  { typed: typedDraws, elsewhere }: { typed: readonly TypedDraw[]; elsewhere: readonly TypedDraw[] },
  madeHere: boolean,
): RailDraw {
  const lines = all.filter((line) => line.rail === name);
  const computed = lines.reduce((sum, line) => plus(sum, line.amps), NOTHING);
  const typed = sumOfDraws(typedDraws, name);
  const passedOn = sumOfDraws(elsewhere, name) ?? NOTHING;
  const atRestA = lines.reduce((sum, line) => sum + line.atRestA, 0);
  return {
    rail: name,
    volts,
    madeHere,
    lines,
    computed,
    typed,
    passedOn,
    taken: plus(typed ?? computed, passedOn),
    source: typed ? "typed" : "computed",
    atRestA: atRestA * shareOfComputed(typed, computed),
  };
}

/** Typed-in figures say nothing of what flows at rest: as much of them as of the computed ones, or nothing. */
function shareOfComputed(typed: Spread | null, computed: Spread): number {
  if (!typed) return 1;
  return computed.typical > 0 ? typed.typical / computed.typical : 0;
}

/** What comes in from outside and is not passed on, W. */
export function heatOf(rails: readonly RailDraw[]): Spread {
  const watts = (which: keyof Spread) =>
    rails.reduce((sum, { volts, madeHere, taken, passedOn }) => {
      const comesIn = madeHere ? 0 : taken[which];
      return sum + Math.abs(volts) * (comesIn - passedOn[which]);
    }, 0);
  return { typical: Math.max(0, watts("typical")), worst: Math.max(0, watts("worst")) };
}
