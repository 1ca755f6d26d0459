import { z } from "zod";
import { SIGNAL_CLASSES } from "@/lib/calc/interconnect";
import { parseQuantity } from "@/lib/calc/units";
import { optionalLine } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { READERS } from "@/lib/pin-map/read-cell";

const MOST_ALIASES = 20;

/** One word, as the pins carry it: CLK, PH6, +5V, D[7], /CS, CARRY_N. */
export const signalName = z
  .string({ message: "Name the signal." })
  .trim()
  .min(1, "Name the signal.")
  .superRefine((name, context) => {
    const read = READERS.signal(name);
    if (!read.ok) context.addIssue(read.sentence);
  });

const aliases = z.string().transform((text, context): string[] => {
  const names = [...new Set(text.split(/[\s,;]+/).filter((name) => name !== ""))];
  for (const name of names) {
    const read = signalName.safeParse(name);
    for (const issue of read.error?.issues ?? []) context.addIssue(`${name}: ${issue.message}`);
  }
  if (names.length > MOST_ALIASES) context.addIssue(`At most ${MOST_ALIASES} other names.`);
  return names;
});

const frequency = z.string().transform((text, context): number | null => {
  if (text.trim() === "") return null;
  const read = parseQuantity(text, "Hz");
  if (!read.ok) {
    context.addIssue(read.message);
    return null;
  }
  const hertz = read.value.value;
  if (hertz > 0 && Number.isFinite(hertz)) return hertz;
  context.addIssue("How often it changes level and back: above 0 Hz. Leave it empty when you do not know.");
  return null;
});

/** What is known of a signal beyond its pins; `version` is 0 while nothing was said of it yet. */
export const saveSignalInput = z
  .object({
    project: z.string(),
    writeId,
    name: signalName,
    version: z.int().min(0),
    class: z.enum(SIGNAL_CLASSES, { message: "Choose what it carries." }),
    aliases,
    frequency,
    note: optionalLine(200),
  })
  .superRefine(({ name, aliases: others }, context) => {
    const same = others.find((alias) => alias.toLowerCase() === name.toLowerCase());
    if (same === undefined) return;
    const message =
      same === name
        ? `${name} is its name already. Put other names here.`
        : `${same} differs from ${name} only in case. Mend the pins that say ${same} instead.`;
    context.addIssue({ code: "custom", path: ["aliases"], message });
  });
export type SaveSignalInput = z.output<typeof saveSignalInput>;

export const removeSignalInput = z.object({ project: z.string(), writeId, name: signalName, version: z.int() });
export type RemoveSignalInput = z.output<typeof removeSignalInput>;
