import { z } from "zod";
import { capture } from "./capture/kind";
import type { CheckKind } from "./kind";
import { photo } from "./photo/kind";
import { reading } from "./reading/kind";
import { statement } from "./statement/kind";
import { table } from "./table/kind";

/** The one list of kinds, in the order in which the procedure editor offers them. */
export const CHECK_KINDS = [statement, reading, table, photo, capture] as const;

export type CheckKindName = (typeof CHECK_KINDS)[number]["name"];

/** For schemas that name a kind. */
export const checkKindName = z.enum(
  CHECK_KINDS.map((kind) => kind.name),
  { message: "There is no such kind of check." },
);

/** The kind of that name; a stored name that is not in the list is a defect and throws. */
export function checkKind(name: string): CheckKind<CheckKindName> {
  const found = CHECK_KINDS.find((kind) => kind.name === name);
  if (!found) throw new Error(`There is no check kind ${JSON.stringify(name)}.`);
  return found;
}
