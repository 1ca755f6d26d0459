import type { TypedRange } from "@/lib/instrument/range-schema";
import type { SaveInstrumentTyped } from "@/lib/instrument/schema";
import type { Reply } from "@/components/ui/form/reply";
import type { StatedRange } from "./worked-example";

export type InstrumentLine = {
  id: string;
  name: string;
  kind: "meter" | "scope" | "supply" | "other";
  calibrationNote: string;
  ranges: readonly StatedRange[];
  typedRanges: readonly TypedRange[];
  isArchived: boolean;
};

export type Save = (input: SaveInstrumentTyped) => Promise<Reply<{ id: string }>>;
export type Change = (input: { writeId: string; instrument: string }) => Promise<Reply<null>>;

export const KIND_WORDS: Record<InstrumentLine["kind"], string> = {
  meter: "Meter",
  scope: "Scope",
  supply: "Supply",
  other: "Other",
};
