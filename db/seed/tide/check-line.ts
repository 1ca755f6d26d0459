import type { Stage } from "@/db/schema/procedures";

/** One check of a demo procedure as it would be typed in the editor; turned into rows by write-structure.ts. */
export type CheckLine = {
  /** Name within the procedure, for `needs` and for the history. */
  id: string;
  stage: Stage;
  title: string;
  instruction: string;
  caution?: string;
  reference?: string;
  hold?: true;
  needs?: string[];
  signals?: string[];
  pins?: string[];
  rails?: string[];
  expect:
    | { kind: "statement" }
    | { kind: "photo"; subject: string }
    | { kind: "capture" }
    | { kind: "reading"; quantity: string; limits: string; expected?: string }
    | { kind: "table"; rows: { label: string; limits: string; expected?: string }[]; columns: string[] };
};

export const LENS = "IPC-A-610, in outline";
export const FIRST_POWER =
  "First power: set the current limit before the output goes on, keep a hand on the switch, and switch off at any smell or a part too hot to touch. Follow your local electrical rules.";
export const ESD = "CMOS parts: wear the wrist strap and work on the mat before the board leaves its bag.";
