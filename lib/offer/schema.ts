import { z } from "zod";
import { line, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { checkFields } from "@/lib/procedure/schema";

const existing = z.object({
  is: z.literal("existing"),
  key: z.uuid(),
  /** Fields of the kind's own form that change; the others stay: { limits: "120 … 340 mA" }. */
  typed: z.record(z.string().max(40), z.string().max(500, "At most 500 characters fit here.")),
  /** Stands in place of the check's own; left away, that stays. */
  instruction: optionalLines(4000).optional(),
});

const added = z.object({ is: z.literal("new"), check: checkFields });

/** A line of the caution that belongs to the offer: it takes the place of the one that begins the same. */
const cautionLine = z.object({ begins: line(80, "Say how the line begins."), text: line(300, "Say what to mind.") });
export type CautionLine = z.output<typeof cautionLine>;

export const offerToCheckInput = z.object({
  project: z.string(),
  writeId,
  /** Code of the board. */
  board: z.string(),
  /** Version of the draft that was looked at; null when there was none. */
  draftVersion: z.int().nullable(),
  /** Without a draft: number of the issued procedure that was looked at; null when there was none either. */
  issuedNumber: z.int().nullable(),
  target: z.discriminatedUnion("is", [existing, added]),
  caution: cautionLine.nullable(),
});
export type OfferToCheckInput = z.output<typeof offerToCheckInput>;

/** A check that may take an offer, as it stands in the draft or in the newest issued version. */
export type OfferTarget = {
  key: string;
  title: string;
  /** What the kind's form would hold, as far as it is text. */
  typed: Record<string, string>;
  instruction: string;
  caution: string;
};

export type OfferPlace = {
  board: string;
  name: string;
  draftVersion: number | null;
  issuedNumber: number | null;
  checks: OfferTarget[];
};

export type OfferTaken = { key: string; version: number; begun: boolean };
