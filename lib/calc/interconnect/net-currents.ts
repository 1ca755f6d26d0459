import { familyAt, findFamily, loading, netLoad, type Family, type Group, type Loading } from "../levels";
import { inParallelOhm, lineOf, pullUpWindow, type Line, type PullUpWindow } from "../pull-up";
import { grouped } from "./grouped";
import type { Machine } from "./machine";
import { copperOf, type NetStudy, type Party } from "./study-net";
import type { Survey } from "./survey";

type FamilyOf = (name: string) => Family | undefined;

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

const inputsOf = (parties: readonly Party[], family: FamilyOf) => groupsOf(parties, family, ({ loads }) => loads);
const outputsOf = (parties: readonly Party[], family: FamilyOf) => groupsOf(parties, family, () => 1);

/** Resistance of all pull-ups together, Ω, to four digits, as resistors are no better; null without one. */
export function pullUpOhm({ pullUps }: NetStudy): number | null {
  const ohm = inParallelOhm(pullUps.flatMap((pin) => pin.pullUpOhm ?? []));
  return ohm === null ? null : Number(ohm.toPrecision(4));
}

/**
 * What each driver has to give and take on this net, in the order of study.drivers; undefined where its family is
 * unknown or figures cannot be used. A driver's own copper does not load it. Linear in the parties.
 */
export function driverLoadings({ family, index }: Survey, study: NetStudy): (Loading | undefined)[] {
  const ohm = pullUpOhm(study);
  const pullUp = ohm === null ? null : { ohm, supplyVolts: index.machine.conditions.logicVolts };
  const [inputs, outputs] = [inputsOf(study.receivers, family), outputsOf(study.drivers, family)];
  const receiversOf = grouped(study.receivers, copperOf);
  const driversOf = grouped(study.drivers, copperOf);
  const known = new Map<string, Loading | undefined>();
  return study.drivers.map((driver) => {
    const driving = family(driver.family);
    if (!driving) return undefined;
    const copper = copperOf(driver);
    const burden = {
      inputs: without(inputs, inputsOf(receiversOf.get(copper) ?? [], family)),
      offOutputs: without(outputs, outputsOf(driversOf.get(copper) ?? [], family)),
      pullUp,
    };
    const counts = [burden.inputs, burden.offOutputs].map((groups) => groups.map(({ count }) => count).join());
    const key = [driving.name, ...counts].join("\u0000");
    if (!known.has(key)) {
      const answer = loading(driving, burden);
      known.set(key, answer.ok ? answer.value : undefined);
    }
    return known.get(key);
  });
}

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

/** Share of the period that a rise may take where the signal's frequency is known; common practice, no source. */
const RISE_OF_PERIOD = 0.25;

/**
 * The open-drain line that the net is, with every family at the lowest supply; undefined when no output's family is
 * known. The rise time counts only where somebody has said how often the signal changes.
 */
export function pullUpLine(survey: Survey, study: NetStudy): Line | undefined {
  const { machine } = survey.index;
  const supply = logicSupply(machine);
  const lowest: FamilyOf = (name) => {
    const found = findFamily(machine.families, name);
    const moved = found && familyAt(found, supply.minVolts);
    return moved?.ok ? moved.value : survey.family(name);
  };
  const outputs = outputsOf(study.drivers, lowest);
  if (outputs.length === 0) return undefined;
  const pf = capacitancePf(survey, study) ?? 0;
  const frequencyHz = survey.signal(study.net.name)?.frequencyHz ?? null;
  const line = lineOf(outputs, inputsOf(study.receivers, lowest), {
    supply,
    capacitancePf: pf,
    definition: "10–90 %",
    riseLimitS: frequencyHz !== null && frequencyHz > 0 && pf > 0 ? RISE_OF_PERIOD / frequencyHz : null,
    tolerancePercent: 0,
    marginVolts: 0,
  });
  return line.ok ? line.value : undefined;
}

export function netPullUpWindow(survey: Survey, study: NetStudy): PullUpWindow | undefined {
  const line = pullUpLine(survey, study);
  const answer = line && pullUpWindow(line);
  return answer?.ok ? answer.value : undefined;
}

function logicSupply({ rails, conditions }: Machine) {
  const tolerance = (rails.find(({ name }) => name === conditions.logicRail)?.tolerancePercent ?? 0) / 100;
  const { logicVolts } = conditions;
  return { minVolts: logicVolts * (1 - tolerance), maxVolts: logicVolts * (1 + tolerance) };
}
