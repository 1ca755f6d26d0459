import { database } from "@/db/client";
import { findConditions } from "@/db/queries/machine";
import { findParts } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import type { LogicPart } from "@/lib/calc/logic-parts";
import { logicShape } from "./own-logic";
import { priceText } from "./price";
import { typeLogic } from "./type-logic";
import type { TypedLogic } from "./typed-logic";

export type PartLine = {
  id: string;
  number: string;
  description: string;
  stock: number;
  price: string;
  note: string;
  version: number;
  archived: boolean;
  logic: LogicPart | null;
  /** The same as a form shows it. */
  typedLogic: TypedLogic | null;
};
export type PartsView = { parts: PartLine[]; currency: string };

export async function loadParts(scope: ProjectScope): Promise<PartsView> {
  const db = database();
  const [rows, { currency }] = await Promise.all([findParts(db, scope), findConditions(db, scope)]);
  const parts = rows.map(
    ({ id, number, description, stock, priceCents, note, version, archivedAt, logic }): PartLine => {
      const read = logic === null ? null : logicShape.parse(logic);
      return {
        ...{ id, number, description, stock, note, version },
        price: priceText(priceCents),
        archived: archivedAt !== null,
        logic: read,
        typedLogic: read && typeLogic(read),
      };
    },
  );
  return { parts, currency };
}
