import { z } from "zod";

const text = z.string();
const reason = z.object({ reason: text });
const check = z.object({ serial: text, title: text });
const change = z.object({ what: text });
/** What a purge took; waits are the prerequisites of other units that went with it. */
const gone = { checks: z.number(), attempts: z.number(), files: z.number(), waits: z.number() };

/**
 * The kinds of event and what each carries: enough to write its sentence without another query.
 * Names that may change (people) are looked up; wording at the time (serials, titles) is kept.
 */
export const eventPayloads = {
  "project.created": z.object({ name: text }),
  "project.edited": change,
  "project.archived": z.object({ name: text }),
  "project.restored": z.object({ name: text }),
  "member.joined": z.object({ role: text }),
  "member.role-changed": z.object({ name: text, from: text, to: text }),
  "member.removed": z.object({ name: text }),
  "invitation.sent": z.object({ role: text }),
  "invitation.withdrawn": z.object({ role: text }),
  "board.created": z.object({ code: text, name: text }),
  "board.edited": z.object({ code: text, name: text }),
  "board.archived": z.object({ code: text, name: text }),
  "board.restored": z.object({ code: text, name: text }),
  "board.purged": z.object({ code: text, name: text, units: z.number(), ...gone }),
  "revision.created": z.object({ code: text, letter: text }),
  "revision.released": z.object({ code: text, letter: text }),
  "unit.created": z.object({ serial: text }),
  "unit.edited": z.object({ serial: text }),
  "unit.archived": z.object({ serial: text }),
  "unit.restored": z.object({ serial: text }),
  "unit.purged": z.object({ serial: text, ...gone }),
  "slot.created": z.object({ position: z.number() }),
  "slot.edited": z.object({ position: z.number() }),
  "slot.archived": z.object({ position: z.number() }),
  "unit.placed": z.object({ serial: text, position: z.number() }),
  "unit.removed": z.object({ serial: text, position: z.number() }),
  "procedure.issued": z.object({ code: text, number: z.number(), note: text }),
  "traveler.started": z.object({ serial: text, number: z.number() }),
  "traveler.moved": z.object({ serial: text, from: z.number(), to: z.number(), kept: z.number(), changed: z.number() }),
  "attempt.recorded": check.extend({
    verdict: z.enum(["conforms", "guard-band", "does-not-conform"]),
    reading: text,
    from: text,
    to: text,
    firstPass: z.boolean(),
  }),
  "attempt.voided": check.merge(reason),
  "check.reopened": check.merge(reason),
  "check.doubted": check.merge(reason),
  "concession.granted": check.merge(reason),
  "concession.withdrawn": check.merge(reason),
  "hold.lifted": check.merge(reason),
  "prerequisite.added": z.object({ check: text, needs: text }),
  "prerequisite.removed": z.object({ check: text, needs: text }),
  /** needs: board waits for other; despite: it may come before other, whatever the machine says. */
  "order.said": z.object({ board: text, other: text, rule: z.enum(["needs", "despite"]) }).merge(reason),
  "order.withdrawn": z.object({ board: text, other: text, rule: z.enum(["needs", "despite"]) }),
  "evidence.attached": z.object({ kind: text, fileName: text }),
  "evidence.removed": z.object({ kind: text, fileName: text }),
  "evidence.restored": z.object({ kind: text, fileName: text }),
  "evidence.captioned": z.object({ kind: text, fileName: text, caption: text }),
  "log.written": z.object({ title: text }),
  "log.edited": z.object({ title: text }),
  "log.archived": z.object({ title: text }),
  "log.restored": z.object({ title: text }),
  "connector.added": z.object({ code: text, reference: text }),
  "connector.edited": z.object({ code: text, reference: text }),
  "connector.removed": z.object({ code: text, reference: text, pins: z.number() }),
  "pin-map.edited": z.object({ code: text, reference: text, pins: z.number() }),
  /** to: where the pins went, in words. */
  "pin-map.copied": z.object({ code: text, reference: text, to: z.array(text), pins: z.number() }),
  "finding.accepted": z.object({ title: text }).merge(reason),
  "finding.acceptance-withdrawn": z.object({ title: text }).merge(reason),
  "signal.saved": z.object({ name: text }),
  "signal.removed": z.object({ name: text }),
  "family.saved": z.object({ name: text }),
  "family.removed": z.object({ name: text }),
  "block.created": z.object({ name: text }),
  /** outdated: units built before, which the block no longer describes. */
  "block.edited": z.object({ name: text, outdated: z.number() }),
  "block.archived": z.object({ name: text }),
  "block.restored": z.object({ name: text }),
  "part.added": z.object({ number: text }),
  "part.edited": z.object({ number: text }),
  "part.stocked": z.object({ number: text, stock: z.number(), price: text }),
  "part.archived": z.object({ number: text }),
  "part.restored": z.object({ number: text }),
  "plan.edited": z.object({ code: text, what: text }),
  "plan.spares": z.object({ percent: z.number() }),
  "plan.conditions": z.object({ what: text }),
  "rail.saved": z.object({ name: text, isNew: z.boolean() }),
  "rail.removed": z.object({ name: text }),
  "power.line-saved": z.object({ code: text, what: text }),
  "power.line-removed": z.object({ code: text, what: text }),
  "delay.created": z.object({ name: text }),
  "delay.edited": z.object({ name: text }),
  "delay.archived": z.object({ name: text }),
  "delay.restored": z.object({ name: text }),
  "fault.opened": z.object({ number: z.number(), title: text, serial: text }),
  /** what: the parts of the record that were written, in words. */
  "fault.edited": z.object({ number: z.number(), title: text, what: text }),
  "fault.stated": z.object({ number: z.number(), title: text, from: text, to: text }),
  /** what: "bodge wire W3, U6-12 to U9-3"; doubtful: checks that it put in doubt. */
  "rework.recorded": z.object({
    serial: text,
    number: z.number(),
    what: text,
    fault: z.number().nullable(),
    doubtful: z.number(),
    spared: z.number(),
  }),
  "netlist.kept": z.object({ code: text, letter: text, number: z.number(), nets: z.number() }),
  "probing.started": z.object({ serial: text, probes: z.number() }),
  /** said: what the round came to, in words. */
  "probing.closed": z.object({ serial: text, said: text }),
  "punch.taken": z.object({ code: text, letter: text, items: z.number() }),
  "punch.dealt": z.object({ code: text, letter: text, item: text, how: text }),
  "punch.reopened": z.object({ code: text, letter: text, item: text }),
} as const satisfies Record<string, z.ZodType>;

export type EventKind = keyof typeof eventPayloads;
export type EventPayload<Kind extends EventKind> = z.infer<(typeof eventPayloads)[Kind]>;
