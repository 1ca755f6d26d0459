import { FAMILIES, type Family } from "@/lib/calc/levels";
import { familyFigures } from "./schema";

/** The built-in table with the project's own values over it: an own family of a known name replaces that one. */
export function familiesOf(own: readonly { name: string; figures: unknown }[]): Family[] {
  const kept = own.map(({ name, figures }): Family => ({ name, ...familyFigures.parse(figures) }));
  return [...FAMILIES.filter((family) => !kept.some((one) => one.name === family.name)), ...kept];
}
