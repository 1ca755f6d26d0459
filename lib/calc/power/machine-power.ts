import { computed, fault, needsCount, needsNotNegative, needsPositive, type Computed, type Fault } from "../computed";
import { backplaneDrop } from "./backplane-drop";
import { contactLoads } from "./contact-loads";
import { type Spread } from "./item";
import { type MachinePower, type MachinePowerInput, type SlotDrop } from "./machine-budget";
import { supplyMargin } from "./supply-margin";

/**
 * Power of the assembled machine: sums and margins of the rails, current per contact, drop along the backplane, heat.
 * Faults name the row: "placements/2", "rails/0", "backplane", "ambientC".
 */
export function machinePower(input: MachinePowerInput): Computed<MachinePower> {
  const bad = checkMachine(input);
  if (bad) return bad;
  const contacts = contactLoads(input);
  if (!contacts.ok) return contacts;
  const drops: SlotDrop[] = [];
  for (const line of input.backplane) {
    const along = backplaneDrop(input, line);
    if (!along.ok) return along;
    drops.push(...along.value);
  }
  const heat = input.placements.flatMap(({ id, label, heatW }) =>
    heatW ? [{ placement: id, label, watts: heatW }] : [],
  );
  const total = (which: keyof Spread) => heat.reduce((sum, { watts }) => sum + watts[which], 0);
  return computed({
    margins: input.rails.map((rail) => supplyMargin(rail, input.placements)),
    contacts: contacts.value,
    drops,
    heat,
    heatTotalW: { typical: total("typical"), worst: total("worst") },
  });
}

function checkMachine({ rails, placements }: MachinePowerInput): Fault | undefined {
  for (const [index, { name, volts, capacityA, tolerancePercent }] of rails.entries()) {
    const row = `rails/${index}`;
    const bad =
      (Number.isFinite(volts) && volts !== 0 ? undefined : fault(row, `${name} has no voltage.`)) ??
      needsNotNegative(row, `tolerance of ${name}`, tolerancePercent) ??
      (capacityA === null ? undefined : needsPositive(row, `current that the supply of ${name} gives`, capacityA));
    if (bad) return bad;
  }
  const names = new Set(rails.map((rail) => rail.name));
  for (const [index, { label, draws, contacts }] of placements.entries()) {
    const row = `placements/${index}`;
    for (const { rail, typicalA, worstA } of draws) {
      const bad =
        (names.has(rail) ? undefined : fault(row, `${label}: there is no rail ${rail} in this machine.`)) ??
        needsNotNegative(row, `typical current of ${label} from ${rail}`, typicalA) ??
        needsNotNegative(row, `worst current of ${label} from ${rail}`, worstA);
      if (bad) return bad;
    }
    for (const count of contacts ? [contacts.ground, ...contacts.rails.map((one) => one.count)] : []) {
      const bad = needsCount(row, `number of contacts of ${label}`, count);
      if (bad) return bad;
    }
  }
  return undefined;
}
