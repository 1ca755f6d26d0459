import { formatQuantity } from "@/lib/calc/units";
import type { Packing } from "@/lib/calc/packing";

export type BoardPart = { part: string; description: string; count: number; designators: string };
type BomLine = { partNumber: string; description: string; count: number; designators: string };

/** Everything one unit of a board is made of: packages, their capacitors, then the other parts in their order. */
export function boardParts(packing: Packing | null, bom: readonly BomLine[]): BoardPart[] {
  const others = bom.map(({ partNumber, ...line }) => ({ part: partNumber, ...line }));
  if (!packing) return others;
  const byPart = new Map<string, BoardPart>();
  for (const { part, partName, count } of packing.lines) {
    const before = byPart.get(part);
    const designators = packing.packages.filter((one) => one.part === part).map(({ designator }) => designator);
    byPart.set(part, {
      part,
      description: partName,
      count: count + (before?.count ?? 0),
      designators: designators.join(", "),
    });
  }
  const { packageCapacitors, packageFarad, bulkCapacitors, bulkFarad } = packing.decoupling;
  const capacitors = [
    {
      part: capacitor(packageFarad),
      description: "Decoupling, one a package",
      count: packageCapacitors,
      designators: "",
    },
    { part: capacitor(bulkFarad), description: "Bulk, on the rail", count: bulkCapacitors, designators: "" },
  ];
  return [...byPart.values(), ...capacitors.filter(({ count }) => count > 0), ...others];
}

/** The name under which a capacitor is ordered, and its stock kept: "Capacitor 100 nF". */
const capacitor = (farad: number) => `Capacitor ${formatQuantity({ value: farad, unit: "F" }).replace("\u202f", " ")}`;
