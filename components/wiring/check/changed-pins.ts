import { EMPTY_TEXTS, isEmptyRow, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { KnownNames } from "@/lib/pin-map/read-cell";
import { readPinRow } from "@/lib/pin-map/read-pin-row";
import { shownTexts, type Drafts, type KeptMap } from "../draft/pin-drafts";
import type { ChangedPins } from "./check-messages";

type State = { kept: KeptMap; drafts: Drafts };

/**
 * Pins of the connectors that stand otherwise than the page was loaded with: typed into, or saved since. A cell that
 * cannot be read counts as it is kept.
 */
export function changedPins(loaded: KeptMap, { kept, drafts }: State, known: KnownNames): ChangedPins {
  const isNewer = (id: string) => (kept[id]?.version ?? 0) > (loaded[id]?.version ?? 0);
  return Object.fromEntries(
    Object.keys(kept)
      .filter((id) => drafts[id] !== undefined || isNewer(id))
      .map((id) => {
        const names = new Set([...Object.keys(kept[id]?.rows ?? {}), ...Object.keys(drafts[id]?.pins ?? {})]);
        const rows = [...names].map((pin) => {
          const texts = shownTexts(kept, drafts, id, pin);
          return isEmptyRow(texts) ? [] : readable(pin, texts, kept[id]?.rows[pin] ?? EMPTY_TEXTS, known);
        });
        return [id, rows.flat()] as const;
      }),
  );
}

function readable(pin: string, texts: PinTexts, instead: PinTexts, known: KnownNames) {
  const read = readPinRow(pin, texts, known);
  if (read.ok) return [read.value];
  const patched = { ...texts };
  for (const { column } of read.problems) patched[column] = instead[column];
  const again = readPinRow(pin, patched, known);
  return again.ok ? [again.value] : [];
}
