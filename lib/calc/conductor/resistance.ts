import { computed, fault, needsNotNegative, needsPositive, type Computed, type Fault } from "../computed";

/** Of copper at 20 °C, Ω m, and its temperature coefficient there, 1/K. */
const RESISTIVITY = 1.72e-8;
const PER_KELVIN = 0.00393;
/** Where the straight line is good enough for a board; far below it would go through zero. */
const COLDEST_C = -55;
const HOTTEST_C = 260;

export type Copper = { copperUm: number; celsius: number };

export type Conductor = Copper & { lengthMm: number; widthMm: number };

/**
 * Resistance of a square of copper foil, Ω: ρ/d · (1 + α · (T − 20 °C)), ρ = 1.72e-8 Ω m, α = 0.00393 / K.
 * Source: ρ read in a page on the rule "0.5 mΩ a square"; electrolytic copper without plating.
 */
export function sheetOhm({ copperUm, celsius }: Copper): Computed<number> {
  const bad = needsPositive("copperUm", "thickness of the copper", copperUm) ?? badTemperature(celsius);
  return bad ?? computed((RESISTIVITY / (copperUm * 1e-6)) * (1 + PER_KELVIN * (celsius - 20)));
}

/** Resistance of a straight conductor: its squares, length / width, times the sheet resistance, Ω. */
export function conductorOhm(conductor: Conductor): Computed<number> {
  const bad =
    needsPositive("lengthMm", "length of the conductor", conductor.lengthMm) ??
    needsPositive("widthMm", "width of the conductor", conductor.widthMm);
  if (bad) return bad;
  const sheet = sheetOhm(conductor);
  return sheet.ok ? computed((sheet.value * conductor.lengthMm) / conductor.widthMm) : sheet;
}

export type ConductorDrop = { ohm: number; dropVolts: number; heatW: number };

/** Drop and heat of a conductor that carries a steady current from one end to the other. */
export function conductorDrop(conductor: Conductor & { currentA: number }): Computed<ConductorDrop> {
  const { currentA } = conductor;
  const bad = needsNotNegative("currentA", "current", currentA);
  if (bad) return bad;
  const ohm = conductorOhm(conductor);
  if (!ohm.ok) return ohm;
  return computed({ ohm: ohm.value, dropVolts: currentA * ohm.value, heatW: currentA ** 2 * ohm.value });
}

function badTemperature(celsius: number): Fault | undefined {
  if (!Number.isFinite(celsius)) return fault("celsius", "The temperature is no number.");
  if (celsius >= COLDEST_C && celsius <= HOTTEST_C) return undefined;
  return fault("celsius", `The temperature lies outside −${-COLDEST_C} to ${HOTTEST_C} °C, where the formula holds.`);
}
