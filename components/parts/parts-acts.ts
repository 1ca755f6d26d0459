import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { saveBoardPlanInput, saveBomInput, tieSparesInput } from "@/lib/board-plan/schema";
import type { changeDelayPathInput, saveDelayPathInput } from "@/lib/delay-path/schema";
import type { saveSparesInput } from "@/lib/parts-list/schema";
import type { changePartInput, savePartInput, stockPartInput } from "@/lib/part/schema";
import type { changeBlockInput, saveBlockInput } from "@/lib/block/schema";

type Act<Schema extends z.ZodType, Value> = (input: z.input<Schema>) => Promise<Reply<Value>>;

/** What the pages of Parts can do; the pages hand in their server actions. */
export type BlockActs = {
  save: Act<typeof saveBlockInput, { id: string; version: number; outdated: string[]; tiesReopened: string[] }>;
  archive: Act<typeof changeBlockInput, { name: string }>;
  restore: Act<typeof changeBlockInput, { name: string }>;
};

export type PartActs = {
  save: Act<typeof savePartInput, { number: string; version: number }>;
  archive: Act<typeof changePartInput, { number: string }>;
  restore: Act<typeof changePartInput, { number: string }>;
};

export type BoardPlanActs = {
  save: Act<typeof saveBoardPlanInput, { version: number; tiesReopened: boolean }>;
  saveBom: Act<typeof saveBomInput, { version: number }>;
  tie: Act<typeof tieSparesInput, { version: number }>;
};

export type StockAct = Act<typeof stockPartInput, { stock: number; price: string; version: number }>;
export type SparesAct = Act<typeof saveSparesInput, { version: number }>;

export type DelayActs = {
  save: Act<typeof saveDelayPathInput, { id: string; version: number }>;
  archive: Act<typeof changeDelayPathInput, { name: string }>;
  restore: Act<typeof changeDelayPathInput, { name: string }>;
};
