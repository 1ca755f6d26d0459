import { FAMILIES, findFamily, type Family } from "@/lib/calc/levels";
import { familyFigures } from "./schema";

/**
 * The project's own values and the built-in table behind them. An own family of a known name, however it is spelt
 * (HC, 74HC), stands for the built-in one.
 */
export function familiesOf(own: readonly { name: string; figures: unknown }[]): Family[] {
  const kept = own.map(({ name, figures }): Family => ({ name, ...familyFigures.parse(figures) }));
  return [...kept, ...FAMILIES.filter((family) => findFamily(kept, family.name) === undefined)];
}
