import { z } from "zod";
import { PIN_COLUMNS } from "@/lib/pin-map/pin-columns";
import type { ConnectorDraft, Drafts } from "./pin-drafts";

/** Whose drafts: another person on the same device neither sees nor overwrites them. */
export type ShelfOf = { userId: string; project: string };

const column = z.enum(PIN_COLUMNS);
const draftSchema: z.ZodType<ConnectorDraft> = z.object({
  version: z.number(),
  pins: z.record(
    z.string(),
    z.object({ typed: z.partialRecord(column, z.string()), was: z.record(column, z.string()) }),
  ),
});

const prefixOf = ({ userId, project }: ShelfOf) => `boardwake.wiring.${userId}.${project}.`;

/** Everything that was typed on this device and not saved. Written at once with each change, so that a reload loses nothing. */
export function readShelf(of: ShelfOf): Drafts {
  try {
    const prefix = prefixOf(of);
    const found = Object.keys(localStorage).filter((key) => key.startsWith(prefix));
    return Object.fromEntries(
      found.flatMap((key) => {
        const read = draftSchema.safeParse(parsed(localStorage.getItem(key)));
        return read.success ? [[key.slice(prefix.length), read.data] as const] : [];
      }),
    );
  } catch {
    return {};
  }
}

/** Keeps what differs between the two; false when the device keeps nothing (private window, storage full). */
export function putOnShelf(of: ShelfOf, before: Drafts, now: Drafts): boolean {
  try {
    const prefix = prefixOf(of);
    for (const id of new Set([...Object.keys(before), ...Object.keys(now)])) {
      const draft = now[id];
      if (draft === before[id]) continue;
      if (draft) localStorage.setItem(prefix + id, JSON.stringify(draft));
      else localStorage.removeItem(prefix + id);
    }
    return true;
  } catch {
    return false;
  }
}

function parsed(text: string | null): unknown {
  try {
    return JSON.parse(text ?? "null");
  } catch {
    return null;
  }
}
