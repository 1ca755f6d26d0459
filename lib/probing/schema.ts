import { z } from "zod";
import { readFigure } from "@/lib/form/figure";
import { optionalLines, line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const LIMIT_CLASSES = ["1", "2", "3", "3/A", "own"] as const;
export const ROUND_SCOPES = ["all", "connector", "signals", "rails"] as const;

export const PROBING_LIMITS = { probes: 100_000, signals: 400, batch: 200, neighbourMm: 25 } as const;

const ohm = (what: string, example: string) =>
  z
    .string({ message: `Write ${what} such as ${example}.` })
    .max(40, "This is too long for a figure.")
    .transform((typed, context) => {
      const read = readFigure(typed, "Ω", { least: 0.001, most: 1e12, example });
      if (read.ok) return read.value;
      context.addIssue({ code: "custom", message: read.message });
      return z.NEVER;
    });

/** What a round probes and by which limits; figures as people type them. */
export const roundOptions = z
  .object({
    populated: z.boolean(),
    limits: z.enum(LIMIT_CLASSES, { message: "Choose a class of limits, or your own." }),
    continuityOhm: ohm("the highest resistance of joined points", "10 Ω"),
    isolationOhm: ohm("the lowest resistance of separate nets", "10 MΩ"),
    only: z.enum(ROUND_SCOPES, { message: "Say what the round is about." }),
    connector: z.string().trim().max(60, "This is too long for a connector."),
    signals: z
      .array(line(120, "A signal is empty. Take it out or write it."))
      .max(PROBING_LIMITS.signals, `At most ${PROBING_LIMITS.signals} signals fit here.`),
    vias: z.boolean(),
    unconnected: z.boolean(),
  })
  .superRefine(({ limits, continuityOhm, isolationOhm, only, connector, signals }, context) => {
    const ask = (field: string, message: string) => context.addIssue({ code: "custom", path: [field], message });
    if (limits === "own" && continuityOhm === null) ask("continuityOhm", "Write the limit, such as 10 Ω.");
    if (limits === "own" && isolationOhm === null) ask("isolationOhm", "Write the limit, such as 10 MΩ.");
    if (only === "connector" && connector === "") ask("connector", "Choose the connector.");
    if (only === "signals" && signals.length === 0) ask("signals", "Name at least one signal.");
  });
export type RoundOptions = z.output<typeof roundOptions>;
export type RoundOptionsTyped = z.input<typeof roundOptions>;

const netlistId = z.uuid({ message: "Choose the netlist." });
const planId = z.uuid({ message: "This is not the id of a round of probing." });

export const previewRoundInput = z.object({ project: z.string(), netlistId, options: roundOptions });
export type PreviewRoundInput = z.output<typeof previewRoundInput>;

export const startRoundInput = z.object({
  project: z.string(),
  writeId,
  unit: line(60, "Name the unit."),
  netlistId,
  options: roundOptions,
  checkId: z.uuid({ message: "This is not the id of a check." }).nullable(),
});
export type StartRoundInput = z.output<typeof startRoundInput>;

const result = z
  .object({
    /** Client-made, so that sending it again changes nothing. */
    id: z.uuid({ message: "The result has no id of its own." }),
    probe: z.number().int().min(0),
    beeps: z.boolean().nullable(),
    /** A resistance as it was typed; empty for a beep. */
    typed: z.string().trim().max(40, "This is too long for a resistance."),
    performedAt: z.iso
      .datetime({ offset: true, message: "Say when it was probed, as an instant with its offset." })
      .transform((text) => new Date(text)),
  })
  .refine(({ beeps, typed }) => (beeps === null) !== (typed === ""), {
    path: ["beeps"],
    message: "Say whether it beeps, or write the resistance: one of the two.",
  });
export type GivenResult = z.output<typeof result>;

export const sayProbesInput = z.object({
  project: z.string(),
  plan: planId,
  results: z.array(result).max(PROBING_LIMITS.batch, `At most ${PROBING_LIMITS.batch} results go at once.`),
  /** Results that are taken back. */
  voids: z.array(z.uuid({ message: "This is not the id of a result." })).max(PROBING_LIMITS.batch),
});
export type SayProbesInput = z.output<typeof sayProbesInput>;

export const readProbesInput = z.object({ project: z.string(), plan: planId });

export const closeRoundInput = z.object({
  project: z.string(),
  writeId,
  plan: planId,
  /** Null: the round is closed without an attempt. */
  checkId: z.uuid({ message: "Choose the check." }).nullable(),
  /** Client-made id of that attempt. */
  attemptId: z.uuid({ message: "The attempt has no id of its own." }),
  note: optionalLines(1000),
});
export type CloseRoundInput = z.output<typeof closeRoundInput>;

export const askAgainInput = z.object({ project: z.string(), writeId, plan: planId });
export type AskAgainInput = z.output<typeof askAgainInput>;
