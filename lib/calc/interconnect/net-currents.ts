import { loading, netLoad, type Family, type Group, type Loading } from "../levels";
import { inParallelOhm } from "../pull-up";
import { grouped } from "./grouped";
import { remember } from "./remember";
import { copperOf, type NetStudy, type Party } from "./study-net";
import type { Survey } from "./survey";

export type FamilyOf = (name: string) => Family | undefined;

/** Inputs or outputs by family; those whose family nobody knows are left out. */
function groupsOf(parties: readonly Party[], family: FamilyOf, countOf: (party: Party) => number): Group[] {
  const groups = new Map<string, { family: Family; count: number }>();
  for (const party of parties) {
    const found = family(party.family);
    if (!found) continue;
    const same = groups.get(found.name);
    if (same) same.count += countOf(party);
    else groups.set(found.name, { family: found, count: countOf(party) });
  }
  return [...groups.values()];
}

export const inputsOf = (parties: readonly Party[], family: FamilyOf) =>
  groupsOf(parties, family, ({ loads }) => loads);
export const outputsOf = (parties: readonly Party[], family: FamilyOf) => groupsOf(parties, family, () => 1);

/** Resistance of all pull-ups together, Ω, to four digits, as resistors are no better; null without one. */
export function pullUpOhm({ pullUps }: NetStudy): number | null {
  const ohm = inParallelOhm(pullUps.flatMap((pin) => pin.pullUpOhm ?? []));
  return ohm === null ? null : Number(ohm.toPrecision(4));
}

/**
 * What each driver has to give and take on this net, in the order of study.drivers; undefined where its family is
 * unknown or figures cannot be used. A driver's own copper does not load it. Linear in the parties.
 */
export function driverLoadings(survey: Survey, study: NetStudy): (Loading | undefined)[] {
  const { family, index } = survey;
  const ohm = pullUpOhm(study);
  const pullUp = ohm === null ? null : { ohm, supplyVolts: index.machine.conditions.logicVolts };
  const [inputs, outputs] = [inputsOf(study.receivers, family), outputsOf(study.drivers, family)];
  const receiversOf = grouped(study.receivers, copperOf);
  const driversOf = grouped(study.drivers, copperOf);
  return study.drivers.map((driver) => {
    const driving = family(driver.family);
    if (!driving) return undefined;
    const copper = copperOf(driver);
    const burden = {
      inputs: without(inputs, inputsOf(receiversOf.get(copper) ?? [], family)),
      offOutputs: without(outputs, outputsOf(driversOf.get(copper) ?? [], family)),
      pullUp,
    };
    const key = [driving.name, named(burden.inputs), named(burden.offOutputs), ohm ?? ""].join("\u0000");
    return rememberLoading(survey, key, () => {
      const answer = loading(driving, burden);
      return answer.ok ? answer.value : undefined;
    });
  });
}

const rememberLoading = remember<Survey, Loading | undefined>();

const named = (groups: readonly Group[]): string =>
  groups.map(({ family, count }) => `${family.name}:${count}`).join(",");

const without = (groups: readonly Group[], less: readonly Group[]): Group[] =>
  groups.map(({ family, count }) => ({
    family,
    count: count - (less.find((one) => one.family === family)?.count ?? 0),
  }));

/** Capacitance of the net, pF; undefined when figures cannot be used. */
export function capacitancePf({ family, index }: Survey, { net, drivers, receivers }: NetStudy): number | undefined {
  const answer = netLoad({
    inputs: inputsOf(receivers, family),
    // All but the one that drives.
    offOutputs: outputsOf(drivers.slice(1), family),
    connectorPins: net.pins.length,
    pinPf: index.machine.conditions.pinCapacitancePf,
    furtherPf: 0,
  });
  return answer.ok ? answer.value.totalPf : undefined;
}
