import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type {
  deleteCheckInput,
  discardDraftInput,
  issueProcedureInput,
  reorderChecksInput,
  saveCheckInput,
  startDraftInput,
} from "@/lib/procedure/schema";

type Act<Schema extends z.ZodType, Value> = (input: z.input<Schema>) => Promise<Reply<Value>>;

export type ProcedureActs = {
  start: Act<typeof startDraftInput, { version: number }>;
  save: Act<typeof saveCheckInput, { version: number; key: string }>;
  remove: Act<typeof deleteCheckInput, { version: number; neededBy: string[] }>;
  reorder: Act<typeof reorderChecksInput, { version: number }>;
  discard: Act<typeof discardDraftInput, null>;
  issue: Act<typeof issueProcedureInput, { number: number; started: number }>;
  move: (input: {
    project: string;
    writeId: string;
    unit: string;
    from: number;
    to: number;
  }) => Promise<Reply<unknown>>;
};

export type StarterChoice = {
  id: z.input<typeof startDraftInput>["from"];
  name: string;
  description: string;
  checks: number;
};
