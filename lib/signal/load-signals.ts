import { database } from "@/db/client";
import { findSignals } from "@/db/queries/machine";
import { findCarriedSignals } from "@/db/queries/signals";
import type { ProjectScope } from "@/lib/access/scope";
import { SIGNAL_CLASSES, type SignalClass } from "@/lib/calc/interconnect";
import { writeFrequency } from "./write-frequency";

export type SignalLine = {
  name: string;
  class: SignalClass;
  aliases: string[];
  /** As people write it: "1 MHz"; empty when not said. */
  frequency: string;
  frequencyHz: number | null;
  note: string;
  /** 0 while nothing was said of it beyond its pins. */
  version: number;
  pins: number;
  boards: string[];
  /** Other names of the project that differ from it only in case. */
  twins: string[];
};

/** Every signal that a pin carries or that something was said of, by name. Two queries. */
export async function loadSignals(scope: ProjectScope): Promise<SignalLine[]> {
  const db = database();
  const [said, carried] = await Promise.all([findSignals(db, scope), findCarriedSignals(db, scope)]);
  const names = [...new Set([...said, ...carried].map(({ name }) => name))];
  const byCase = new Map<string, string[]>();
  for (const name of names) byCase.set(name.toLowerCase(), [...(byCase.get(name.toLowerCase()) ?? []), name]);
  return names
    .map((name): SignalLine => {
      const row = said.find((one) => one.name === name);
      const use = carried.find((one) => one.name === name);
      return {
        name,
        class: SIGNAL_CLASSES.find((one) => one === row?.class) ?? "data",
        aliases: row?.aliases ?? [],
        frequency: writeFrequency(row?.frequencyHz ?? null),
        frequencyHz: row?.frequencyHz ?? null,
        note: row?.note ?? "",
        version: row?.version ?? 0,
        pins: use?.pins ?? 0,
        boards: use?.boards ?? [],
        twins: (byCase.get(name.toLowerCase()) ?? []).filter((twin) => twin !== name),
      };
    })
    .sort((one, other) => one.name.localeCompare(other.name, "en", { numeric: true }));
}
