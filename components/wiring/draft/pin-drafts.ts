import { EMPTY_TEXTS, isEmptyRow, PIN_COLUMNS, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { CellChange } from "../grid/table-text";

/** What is kept of a connector on the server, as texts by pin. */
export type KeptRows = { version: number; rows: Readonly<Record<string, PinTexts>> };
export type KeptMap = Readonly<Record<string, KeptRows>>;

/** What was typed and not saved: texts that differ, with the row as it was when the first of them was typed. */
export type PinDraft = { typed: Partial<PinTexts>; was: PinTexts };
/** Of one connector, with the version that it was typed against. */
export type ConnectorDraft = { version: number; pins: Readonly<Record<string, PinDraft>> };
export type Drafts = Readonly<Record<string, ConnectorDraft>>;

export const keptTexts = (kept: KeptMap, connectorId: string, pin: string): PinTexts =>
  kept[connectorId]?.rows[pin] ?? EMPTY_TEXTS;

export const shownTexts = (kept: KeptMap, drafts: Drafts, connectorId: string, pin: string): PinTexts => {
  const own = keptTexts(kept, connectorId, pin);
  const draft = drafts[connectorId]?.pins[pin];
  return draft ? { ...own, ...draft.typed } : own;
};

/** Lays the changes over the drafts; a cell that is as the server has it is no change any more. */
export function applyChanges(drafts: Drafts, kept: KeptMap, changes: readonly CellChange[]): Drafts {
  const touched = new Map<string, Record<string, PinDraft>>();
  for (const { connectorId, pin, column, after } of changes) {
    const pins = touched.get(connectorId) ?? { ...drafts[connectorId]?.pins };
    touched.set(connectorId, pins);
    const row = keptTexts(kept, connectorId, pin);
    const { [column]: _before, ...typed } = pins[pin]?.typed ?? {};
    const next = row[column] === after ? typed : { ...typed, [column]: after };
    if (Object.keys(next).length === 0) delete pins[pin];
    else pins[pin] = { typed: next, was: pins[pin]?.was ?? row };
  }
  const result: Record<string, ConnectorDraft> = { ...drafts };
  for (const [connectorId, pins] of touched) {
    const version = drafts[connectorId]?.version ?? kept[connectorId]?.version ?? 0;
    if (Object.keys(pins).length === 0) delete result[connectorId];
    else result[connectorId] = { version, pins };
  }
  return result;
}

export const withoutDraft = (drafts: Drafts, connectorId: string): Drafts =>
  Object.fromEntries(Object.entries(drafts).filter(([id]) => id !== connectorId));

/** What was typed, laid over what the server has now; what is the same there is no change any more. */
export function rebased(draft: ConnectorDraft, now: KeptRows): ConnectorDraft | undefined {
  const pins = Object.entries(draft.pins).flatMap(([pin, { typed }]) => {
    const row = now.rows[pin] ?? EMPTY_TEXTS;
    const differing = PIN_COLUMNS.filter((column) => typed[column] !== undefined && typed[column] !== row[column]);
    if (differing.length === 0) return [];
    return [
      [pin, { typed: Object.fromEntries(differing.map((column) => [column, typed[column]])), was: row }] as const,
    ];
  });
  return pins.length === 0 ? undefined : { version: now.version, pins: Object.fromEntries(pins) };
}

/** Pins with a change, over all connectors. */
export const changedPins = (drafts: Drafts): number =>
  Object.values(drafts).reduce((sum, { pins }) => sum + Object.keys(pins).length, 0);

/** What a save of one connector sends: whole rows, also those that were emptied. */
export const rowsToSave = (kept: KeptMap, drafts: Drafts, connectorId: string): (PinTexts & { pin: string })[] =>
  Object.keys(drafts[connectorId]?.pins ?? {}).map((pin) => ({ pin, ...shownTexts(kept, drafts, connectorId, pin) }));

/** A row as it was sent, and the texts that stand for it once the server has read it (an empty role is implied). */
export type SentRow = { pin: string; typed: PinTexts; stored: PinTexts };

/** After a save the server has what was sent. */
export function afterSave(kept: KeptMap, connectorId: string, version: number, sent: readonly SentRow[]): KeptMap {
  const rows = { ...kept[connectorId]?.rows };
  for (const { pin, stored } of sent) {
    if (isEmptyRow(stored)) delete rows[pin];
    else rows[pin] = stored;
  }
  return { ...kept, [connectorId]: { version, rows } };
}

/** What was typed while a save was on its way: cells whose text is another one than was sent. */
export function typedSince(draft: ConnectorDraft, sent: readonly SentRow[]): ConnectorDraft {
  const pins = Object.entries(draft.pins).map(([pin, { typed, was }]) => {
    const row = sent.find((one) => one.pin === pin)?.typed;
    const later = PIN_COLUMNS.filter((column) => typed[column] !== undefined && typed[column] !== row?.[column]);
    return [pin, { typed: Object.fromEntries(later.map((column) => [column, typed[column]])), was }] as const;
  });
  return { ...draft, pins: Object.fromEntries(pins) };
}
