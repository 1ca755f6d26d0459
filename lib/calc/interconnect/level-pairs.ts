import { inputStress, margins, type Family, type Margins } from "../levels";
import { grouped } from "./grouped";
import { pullUpOhm } from "./net-currents";
import { pullUpLine } from "./pull-up-line";
import { remember } from "./remember";
import { isSameCopper, type NetStudy, type Party } from "./study-net";
import type { Survey } from "./survey";

/** One driver into one receiver of a net, the first of their families in order. */
export type LevelPair = {
  driver: Party;
  receiver: Party;
  driving: Family;
  receiving: Family;
  margins: Margins;
  /** Whether a pull-up or an open-drain net makes the high level, so that the driver's own does not count. */
  highByPullUp: boolean;
};

/**
 * Every pair of families that meets on the net, both at the machine's logic supply, on one rail: what one card's supply
 * does the other's does too. Pairs of a family that nobody knows are left out. Linear in the parties: of each family two
 * pieces of copper are enough to see whether one drives another.
 */
export function levelPairs(survey: Survey, study: NetStudy): LevelPair[] {
  const drivers = firstTwo(
    study.drivers,
    ({ family, role }) => `${family}\u0000${role === "open-drain output" ? 1 : 0}`,
  );
  const receivers = firstTwo(study.receivers, ({ family }) => family);
  const pulled = isPulledHigh(survey, study);
  const pairs = new Map<string, LevelPair>();
  for (const some of drivers) {
    for (const others of receivers) {
      const met = some.flatMap((driver) =>
        others.filter((receiver) => !isSameCopper(driver, receiver)).map((receiver) => ({ driver, receiver })),
      )[0];
      const [driving, receiving] = [survey.family(met?.driver.family ?? ""), survey.family(met?.receiver.family ?? "")];
      if (!met || !driving || !receiving) continue;
      const isOpen = met.driver.role === "open-drain output";
      const highByPullUp = isOpen || (driving.technology === "bipolar" && pulled(receiving));
      const key = `${driving.name}\u0000${receiving.name}\u0000${highByPullUp ? 1 : 0}`;
      if (!pairs.has(key)) {
        pairs.set(key, { ...met, driving, receiving, margins: pairMargins(survey, driving, receiving), highByPullUp });
      }
    }
  }
  return [...pairs.values()];
}

const rememberMargins = remember<Survey, Margins>();

export const pairMargins = (survey: Survey, driving: Family, receiving: Family): Margins =>
  rememberMargins(survey, `${driving.name}\u0000${receiving.name}`, () => margins(driving, receiving));

/** Of each kind the first party and the next that is other copper. */
const firstTwo = (parties: readonly Party[], kindOf: (party: Party) => string): Party[][] =>
  [...grouped(parties, kindOf).values()].map((same) => {
    const [first] = same;
    const other = first && same.find((party) => !isSameCopper(first, party));
    return [first, other].filter((party) => party !== undefined);
  });

/** Whether the net's resistors lift it to the receiver's level against leakage and input currents. */
function isPulledHigh(survey: Survey, study: NetStudy): (receiving: Family) => boolean {
  const ohm = pullUpOhm(study);
  const line = ohm === null ? undefined : pullUpLine(survey, study);
  if (ohm === null || !line) return () => false;
  const rest = survey.index.machine.conditions.logicVolts - ohm * (line.leakageA + line.inputsHighA);
  return ({ vihMin }) => rest >= vihMin;
}

const rememberStress = remember<Survey, boolean>();

export const isStressed = (survey: Survey, { driving, receiving, driver }: LevelPair): boolean =>
  driver.role !== "open-drain output" &&
  rememberStress(survey, `${driving.name}\u0000${receiving.name}`, () => inputStress(driving, receiving).over);
