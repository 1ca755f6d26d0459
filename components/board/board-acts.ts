import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type {
  changeBoardInput,
  createBoardInput,
  createRevisionInput,
  editBoardInput,
  purgeBoardInput,
  releaseRevisionInput,
} from "@/lib/board/schema";
import type { changeSlotInput, createSlotInput, editSlotInput, placeUnitInput } from "@/lib/slot/schema";
import type { changeUnitInput, createUnitInput, editUnitInput, purgeUnitInput } from "@/lib/unit/schema";

type Act<Schema extends z.ZodType, Value> = (input: z.input<Schema>) => Promise<Reply<Value>>;

/** What the pages of boards can do; the pages hand in their server actions. */
export type BoardActs = {
  create: Act<typeof createBoardInput, { code: string }>;
  edit: Act<typeof editBoardInput, { code: string; version: number }>;
  archive: Act<typeof changeBoardInput, { units: number }>;
  restore: Act<typeof changeBoardInput, { units: number }>;
  purge: Act<typeof purgeBoardInput, { code: string }>;
};

export type RevisionActs = {
  create: Act<typeof createRevisionInput, { letter: string }>;
  release: Act<typeof releaseRevisionInput, { letter: string }>;
};

export type SlotActs = {
  create: Act<typeof createSlotInput, { position: number }>;
  edit: Act<typeof editSlotInput, { version: number }>;
  archive: Act<typeof changeSlotInput, { position: number }>;
  restore: Act<typeof changeSlotInput, { position: number }>;
  place: Act<typeof placeUnitInput, { serial: string; position: number }>;
  remove: Act<typeof changeUnitInput, { serial: string; position: number }>;
};

export type UnitActs = {
  create: Act<typeof createUnitInput, { serial: string }>;
  edit: Act<typeof editUnitInput, { serial: string; version: number }>;
  archive: Act<typeof changeUnitInput, { serial: string }>;
  restore: Act<typeof changeUnitInput, { serial: string }>;
  purge: Act<typeof purgeUnitInput, { serial: string }>;
};
