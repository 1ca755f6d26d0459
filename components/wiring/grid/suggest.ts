import { PIN_ROLES } from "@/lib/calc/interconnect";
import type { PinColumn } from "@/lib/pin-map/pin-columns";
import { readRole } from "@/lib/pin-map/pin-role";

/** What the project's tables already say, by column. */
export type Words = { signals: readonly string[]; families: readonly string[]; groups: readonly string[] };

const MOST = 9;

/** Columns that hold one of a list: Enter takes the first that matches. Elsewhere a text of one's own is as good. */
export const isChosenFrom = (column: PinColumn): boolean => column === "role" || column === "family";

/** What could be meant, the likeliest first. */
export function suggestFor(column: PinColumn, typed: string, words: Words): string[] {
  const text = typed.trim().toLowerCase();
  if (column === "role") {
    const meant = readRole(typed);
    const found = matching(PIN_ROLES, text);
    return meant ? [meant, ...found.filter((role) => role !== meant)] : found;
  }
  if (column === "family") return matching(words.families, text).slice(0, MOST);
  // Of names without end only those that go on from what was typed; all of them would be in the way.
  if (text === "") return [];
  const names = column === "signal" ? words.signals : column === "enableGroup" ? words.groups : [];
  return matching(names, text)
    .filter((name) => name.toLowerCase() !== text)
    .slice(0, MOST);
}

/** Those that begin with the text, then those that have a word in it that does. */
function matching(list: readonly string[], text: string): string[] {
  const begins = list.filter((word) => word.toLowerCase().startsWith(text));
  const inside = list.filter((word) => !begins.includes(word) && new RegExp(`[\\W_]${escaped(text)}`, "i").test(word));
  return [...begins, ...inside];
}

const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, "\\$&");
