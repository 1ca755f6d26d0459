import { BIPOLAR_FAMILIES } from "./bipolar-families";
import { CMOS_FAMILIES } from "./cmos-families";
import type { Family } from "./family";
import { FURTHER_CMOS_FAMILIES } from "./further-cmos-families";

/** The generic families: worst case over temperature, each with its source; a project's own stand before them. */
export const FAMILIES: Family[] = [...CMOS_FAMILIES, ...FURTHER_CMOS_FAMILIES, ...BIPOLAR_FAMILIES];

/** "HC", " hc ", "74HC" and "74hc" name one family. */
const plainName = (name: string) =>
  name
    .trim()
    .toUpperCase()
    .replace(/^74(?=[A-Z])/, "");

/** The first family of this name; a project's own figures come first in the list, so they go before the generic ones. */
export function findFamily(families: readonly Family[], name: string): Family | undefined {
  const wanted = plainName(name);
  return wanted === "" ? undefined : families.find((family) => plainName(family.name) === wanted);
}
