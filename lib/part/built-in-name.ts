import { LOGIC_PARTS, partLabel } from "@/lib/calc/logic-parts";

/** "Quad 2-input NAND" for 74HC00, whatever the family; undefined for what the built-in table does not have. */
export function builtInName(number: string): string | undefined {
  const family = /^74([A-Z]*)\d/.exec(number)?.[1];
  return family === undefined ? undefined : LOGIC_PARTS.find((part) => partLabel(part, family) === number)?.name;
}
