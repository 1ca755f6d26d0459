"use client";

import { useRef, useState } from "react";
import { z } from "zod";
import { reach, type Refused, type Reply } from "@/components/ui/form/reply";
import { isEmptyRow, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { KnownNames } from "@/lib/pin-map/read-cell";
import { pinTexts, readPinRow, type PinValues } from "@/lib/pin-map/read-pin-row";
import { PIN_ROLES } from "@/lib/calc/interconnect";
import { rowsToSave, type SentRow } from "../draft/pin-drafts";
import type { PinState, PinStore } from "../draft/pin-store";

type Row = PinTexts & { pin: string };
export type SavePins = (input: {
  project: string;
  writeId: string;
  connectorId: string;
  version: number;
  pins: Row[];
}) => Promise<Reply<{ version: number; pins: number }>>;

const values: z.ZodType<PinValues> = z.object({
  pin: z.string(),
  signal: z.string(),
  role: z.enum(PIN_ROLES),
  family: z.string(),
  loads: z.number(),
  enableGroup: z.string(),
  pullUpOhm: z.number().nullable(),
  note: z.string(),
});
const details = z.object({
  current: z.object({ version: z.number(), by: z.string(), at: z.string().nullable(), pins: z.array(values) }),
});

type RefusedWithDetails = Refused & { details?: unknown };

/** Saves connector by connector; what one refuses does not keep the others from being saved. */
export function useSavePins(project: string, store: PinStore, save: SavePins, known: KnownNames) {
  const [isSaving, setSaving] = useState(false);
  const [failure, setFailure] = useState<string>();
  // The id of a write stays with what it writes: an answer that was lost on its way is given again, not done again.
  const writes = useRef(new Map<string, { rows: string; writeId: string }>());

  function writeIdOf(connectorId: string, rows: readonly Row[], version: number): string {
    const text = JSON.stringify([version, rows]);
    const before = writes.current.get(connectorId);
    if (before?.rows === text) return before.writeId;
    const writeId = crypto.randomUUID();
    writes.current.set(connectorId, { rows: text, writeId });
    return writeId;
  }

  async function saveOne(state: PinState, connectorId: string, version: number): Promise<string | undefined> {
    const pins = rowsToSave(state.kept, state.drafts, connectorId);
    const writeId = writeIdOf(connectorId, pins, version);
    const reply = await reach(() => save({ project, writeId, connectorId, version, pins }));
    if (reply.ok) {
      writes.current.delete(connectorId);
      store.saved(
        connectorId,
        reply.value.version,
        pins.map((row) => sentRow(row, known)),
      );
      return undefined;
    }
    const { details: said }: RefusedWithDetails = reply.error;
    const now = details.safeParse(said).data?.current;
    if (now) {
      const rows = Object.fromEntries(now.pins.map((pin) => [pin.pin, pinTexts(pin)]));
      store.receive({ [connectorId]: { version: now.version, rows } }, { [connectorId]: { by: now.by, at: now.at } });
    }
    return reply.error.message;
  }

  /** How many pins were saved. */
  async function saveAll(connectorIds: readonly string[]): Promise<number> {
    setSaving(true);
    setFailure(undefined);
    const state = store.read();
    const failures: string[] = [];
    let saved = 0;
    for (const id of connectorIds) {
      const draft = state.drafts[id];
      if (!draft) continue;
      const sentence = await saveOne(state, id, draft.version);
      if (sentence) failures.push(sentence);
      else saved += Object.keys(draft.pins).length;
    }
    setSaving(false);
    setFailure(failures.length > 0 ? [...new Set(failures)].join(" ") : undefined);
    return saved;
  }

  return { saveAll, isSaving, failure };
}

function sentRow({ pin, ...typed }: Row, known: KnownNames): SentRow {
  const read = isEmptyRow(typed) ? undefined : readPinRow(pin, typed, known);
  return { pin, typed, stored: read?.ok ? pinTexts(read.value) : typed };
}
