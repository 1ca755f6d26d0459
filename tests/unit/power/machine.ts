import { machinePower, type MachinePowerInput, type MachineRail, type PoweredPlacement } from "@/lib/calc/power";

export const FIVE: MachineRail = { name: "+5V", volts: 5, tolerancePercent: 5, capacityA: 5, sourcePlacement: null };
export const LINE = { rail: "+5V", supplyOhm: 0.01, groundOhm: 0.01, contactOhm: 0, sourceSlot: 0 };

export const card = (slot: number, worstA: number, change: Partial<PoweredPlacement> = {}): PoweredPlacement => ({
  id: `card-${slot}`,
  label: `Slot ${slot}`,
  board: "CARD",
  slot,
  draws: [{ rail: "+5V", typicalA: worstA / 2, worstA }],
  heatW: { typical: 2.5 * worstA, worst: 5 * worstA },
  contacts: { rails: [{ rail: "+5V", count: 2 }], ground: 4 },
  ...change,
});
export const machine = (change: Partial<MachinePowerInput>): MachinePowerInput => ({
  rails: [FIVE],
  placements: [],
  ambientC: 40,
  backplane: [],
  ...change,
});
export function powerOf(change: Partial<MachinePowerInput>) {
  const result = machinePower(machine(change));
  if (!result.ok) throw new Error(`${result.field}: ${result.message}`);
  return result.value;
}
