import type { Coverage, Stage } from "@/db/schema/procedures";
import type { CheckKindName } from "@/lib/check-kinds/list";

type Row = { label: string; unit: string; limits: string; cells: string[] };

/** What each kind's form holds, as a person would type it; read through the kind's own schema when it is taken over. */
type TypedOf = {
  statement: { expects: string };
  reading: { unit: string; limits: string; expected: string };
  table: { columns: string[]; rows: Row[] };
  photo: { expects: string; minimum: string };
  capture: { expects: string };
};

type KindAndTyped = { [Kind in CheckKindName]: { kind: Kind; typed: TypedOf[Kind] } }[CheckKindName];

export type StarterCheck = KindAndTyped & {
  /** Name inside the starter, for `needs`. */
  id: string;
  stage: Stage;
  title: string;
  instruction: string;
  caution?: string;
  reference?: string;
  holdPoint?: boolean;
  covers?: Partial<Coverage>;
  needs?: string[];
};

export type Starter = {
  id: string;
  name: string;
  /** When to take it, in one sentence. */
  description: string;
  checks: StarterCheck[];
};

/** A row of a table whose cells all have the limits of the row. */
export const row = (label: string, unit: string, limits: string): Row => ({ label, unit, limits, cells: [] });
