import { inputStress, margins, type Family, type Margins } from "../levels";
import { pullUpLine, pullUpOhm } from "./net-currents";
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
 * does the other's does too. Pairs of a family that nobody knows are left out.
 */
export function levelPairs(survey: Survey, study: NetStudy): LevelPair[] {
  const pairs = new Map<string, LevelPair>();
  const pulled = isPulledHigh(survey, study);
  for (const driver of study.drivers) {
    const driving = survey.family(driver.family);
    if (!driving) continue;
    for (const receiver of study.receivers) {
      const receiving = survey.family(receiver.family);
      if (!receiving || isSameCopper(driver, receiver)) continue;
      const highByPullUp =
        driver.role === "open-drain output" || (pulled(receiving) && driving.technology === "bipolar");
      const key = `${driving.name}\u0000${receiving.name}\u0000${highByPullUp ? 1 : 0}`;
      if (pairs.has(key)) continue;
      pairs.set(key, { driver, receiver, driving, receiving, margins: margins(driving, receiving), highByPullUp });
    }
  }
  return [...pairs.values()];
}

/** Whether the net's resistors lift it to the receiver's level against leakage and input currents. */
function isPulledHigh(survey: Survey, study: NetStudy): (receiving: Family) => boolean {
  const ohm = pullUpOhm(study);
  const line = ohm === null ? undefined : pullUpLine(survey, study);
  if (ohm === null || !line) return () => false;
  const rest = survey.index.machine.conditions.logicVolts - ohm * (line.leakageA + line.inputsHighA);
  return ({ vihMin }) => rest >= vihMin;
}

export const isStressed = ({ driving, receiving, driver }: LevelPair): boolean =>
  driver.role !== "open-drain output" && inputStress(driving, receiving).over;
