import { describe, expect, it } from "vitest";
import { glyphOf, groupOf, kindsOf } from "@/lib/event/event-group";
import { eventPayloads, type EventKind, type EventPayload } from "@/lib/event/schema";
import { plainSentence, sentenceOf, type SentenceContext } from "@/lib/event/sentence";

const context: SentenceContext = {
  project: "tide",
  actor: "Mira",
  unitSerial: "CON-01",
  checkId: "c1",
  checkTitle: "Rise time of CLK",
  subjectId: "s1",
};
const check = { serial: "CON-01", title: "Rise time of CLK" };
const because = { ...check, reason: "Read with the old table" };
const board = { code: "CON", name: "Constituent M2" };
const gone = { checks: 12, attempts: 30, files: 1, waits: 2 };
const file = { kind: "photo", fileName: "U3.jpg" };

/** For every kind one payload and what is said of it: the record does not compile when a kind is missing. */
const SAID: { [Kind in EventKind]: [EventPayload<Kind>, string] } = {
  "project.created": [{ name: "Tide computer" }, "Mira set up the project Tide computer."],
  "project.edited": [{ what: "its time zone" }, "Mira changed the project: its time zone."],
  "project.archived": [{ name: "Tide computer" }, "Mira archived the project Tide computer."],
  "project.restored": [{ name: "Tide computer" }, "Mira restored the project Tide computer."],
  "member.joined": [{ role: "builder" }, "Mira joined the project as builder."],
  "member.role-changed": [
    { name: "Bram", from: "builder", to: "maintainer" },
    "Mira made Bram maintainer, before builder.",
  ],
  "member.removed": [{ name: "Bram" }, "Mira removed Bram from the project."],
  "invitation.sent": [{ role: "collaborator" }, "Mira invited a collaborator."],
  "invitation.withdrawn": [{ role: "collaborator" }, "Mira withdrew the invitation of a collaborator."],
  "board.created": [board, "Mira added the board CON Constituent M2."],
  "board.edited": [board, "Mira changed the board CON Constituent M2."],
  "board.archived": [board, "Mira archived the board CON Constituent M2."],
  "board.restored": [board, "Mira restored the board CON Constituent M2."],
  "board.purged": [
    { ...board, units: 1, ...gone, waits: 0 },
    "Mira purged the board CON Constituent M2 for good: 1 unit, 12 checks, 30 attempts and 1 file went.",
  ],
  "revision.created": [{ code: "CON", letter: "B" }, "Mira added revision B of CON."],
  "revision.released": [{ code: "CON", letter: "B" }, "Mira released revision B of CON."],
  "unit.created": [{ serial: "CON-01" }, "Mira added the unit CON-01."],
  "unit.edited": [{ serial: "CON-01" }, "Mira changed the unit CON-01."],
  "unit.archived": [{ serial: "CON-01" }, "Mira archived the unit CON-01."],
  "unit.restored": [{ serial: "CON-01" }, "Mira restored the unit CON-01."],
  "unit.purged": [
    { serial: "CON-01", ...gone },
    "Mira purged the unit CON-01 for good: 12 checks, 30 attempts and 1 file went, and 2 prerequisites of other units.",
  ],
  "slot.created": [{ position: 3 }, "Mira added slot 3."],
  "slot.edited": [{ position: 3 }, "Mira changed slot 3."],
  "slot.archived": [{ position: 3 }, "Mira archived slot 3."],
  "unit.placed": [{ serial: "CON-01", position: 3 }, "Mira put CON-01 into slot 3."],
  "unit.removed": [{ serial: "CON-01", position: 3 }, "Mira took CON-01 out of slot 3."],
  "procedure.issued": [
    { code: "CON", number: 4, note: "Slow clock first" },
    "Mira issued version 4 of the procedure of CON: Slow clock first.",
  ],
  "traveler.started": [
    { serial: "CON-01", number: 4 },
    "Mira started the traveler of CON-01 from procedure version 4.",
  ],
  "traveler.moved": [
    { serial: "CON-01", from: 3, to: 4, kept: 1, changed: 2 },
    "Mira moved the traveler of CON-01 from procedure version 3 to 4: 1 check kept, 2 changed.",
  ],
  "attempt.recorded": [
    { ...check, verdict: "does-not-conform", reading: "14.8 ns", from: "untested", to: "failed", firstPass: false },
    "Mira recorded “Rise time of CLK” on CON-01: 14.8 ns, does not conform.",
  ],
  "attempt.voided": [because, "Mira voided an attempt at “Rise time of CLK” on CON-01: Read with the old table."],
  "check.reopened": [because, "Mira reopened “Rise time of CLK” on CON-01: Read with the old table."],
  "check.doubted": [because, "“Rise time of CLK” on CON-01 is in doubt: Read with the old table."],
  "concession.granted": [
    because,
    "Mira granted a concession for “Rise time of CLK” on CON-01: Read with the old table.",
  ],
  "concession.withdrawn": [
    because,
    "Mira withdrew the concession for “Rise time of CLK” on CON-01: Read with the old table.",
  ],
  "hold.lifted": [because, "Mira lifted the hold point “Rise time of CLK” for CON-01: Read with the old table."],
  "prerequisite.added": [{ check: "Clock", needs: "Reset" }, "Mira made “Clock” wait for Reset."],
  "prerequisite.removed": [{ check: "Clock", needs: "Reset" }, "Mira let “Clock” no longer wait for Reset."],
  "evidence.attached": [file, "Mira attached the photo U3.jpg to “Rise time of CLK” on CON-01."],
  "evidence.removed": [file, "Mira removed the photo U3.jpg from “Rise time of CLK” on CON-01."],
  "evidence.restored": [file, "Mira restored the photo U3.jpg of “Rise time of CLK” on CON-01."],
  "evidence.captioned": [{ ...file, caption: "Solder side" }, "Mira captioned the photo U3.jpg: Solder side."],
  "log.written": [{ title: "It rings" }, "Mira wrote “It rings”."],
  "log.edited": [{ title: "It rings" }, "Mira edited “It rings”."],
  "log.archived": [{ title: "It rings" }, "Mira archived “It rings”."],
  "log.restored": [{ title: "It rings" }, "Mira restored “It rings”."],
  "connector.added": [{ code: "CON", reference: "J2" }, "Mira added the connector CON J2."],
  "connector.edited": [{ code: "CON", reference: "J2" }, "Mira changed the connector CON J2."],
  "connector.removed": [
    { code: "CON", reference: "J2", pins: 1 },
    "Mira removed the connector CON J2 with 1 pin from the wiring.",
  ],
  "pin-map.edited": [{ code: "CON", reference: "J1", pins: 12 }, "Mira changed 12 pins of CON J1."],
  "pin-map.copied": [
    { code: "BP", reference: "J1", to: ["slot 2", "slot 3"], pins: 41 },
    "Mira copied 41 pins of BP J1 to slot 2, slot 3.",
  ],
  "finding.accepted": [
    { title: "FAULT_N has no pull-up", reason: "It sits on the front panel" },
    "Mira accepted the finding “FAULT_N has no pull-up”: It sits on the front panel.",
  ],
  "finding.acceptance-withdrawn": [
    { title: "FAULT_N has no pull-up", reason: "The panel is gone" },
    "Mira no longer accepts the finding “FAULT_N has no pull-up”: The panel is gone.",
  ],
  "signal.saved": [{ name: "CLK" }, "Mira said more of the signal CLK."],
  "signal.removed": [{ name: "CLK" }, "Mira took away what was said of the signal CLK."],
  "family.saved": [{ name: "HC, maker B" }, "Mira kept own figures of the family HC, maker B."],
  "family.removed": [{ name: "HC, maker B" }, "Mira removed the own figures of the family HC, maker B."],
  "block.created": [{ name: "full adder" }, "Mira added the block full adder."],
  "block.edited": [
    { name: "full adder", outdated: 2 },
    "Mira changed the block full adder; 2 units built before are not as it says.",
  ],
  "block.archived": [{ name: "full adder" }, "Mira archived the block full adder."],
  "block.restored": [{ name: "full adder" }, "Mira restored the block full adder."],
  "part.added": [{ number: "27C256" }, "Mira added the part 27C256."],
  "part.edited": [{ number: "27C256" }, "Mira changed the part 27C256."],
  "part.stocked": [
    { number: "74HC283", stock: 12, price: "0.45 EUR" },
    "Mira wrote down 74HC283: 12 in stock, 0.45 EUR each.",
  ],
  "part.archived": [{ number: "27C256" }, "Mira archived the part 27C256."],
  "part.restored": [{ number: "27C256" }, "Mira restored the part 27C256."],
  "plan.edited": [{ code: "SUM", what: "blocks and packing" }, "Mira changed the plan of SUM: blocks and packing."],
  "plan.spares": [{ percent: 15 }, "Mira set the spares to order to 15 %."],
  "plan.conditions": [{ what: "air at 50 °C" }, "Mira changed the conditions of the plan: air at 50 °C."],
  "rail.saved": [{ name: "+5V", isNew: true }, "Mira added the rail +5V."],
  "rail.removed": [{ name: "+5V" }, "Mira removed the rail +5V."],
  "power.line-saved": [{ code: "PAN", what: "8 × lamps" }, "Mira wrote down what PAN draws: 8 × lamps."],
  "power.line-removed": [{ code: "PAN", what: "8 × lamps" }, "Mira took a line off what PAN draws: 8 × lamps."],
  "delay.created": [{ name: "Ripple carry" }, "Mira added the delay path Ripple carry."],
  "delay.edited": [{ name: "Ripple carry" }, "Mira changed the delay path Ripple carry."],
  "delay.archived": [{ name: "Ripple carry" }, "Mira archived the delay path Ripple carry."],
  "delay.restored": [{ name: "Ripple carry" }, "Mira restored the delay path Ripple carry."],
  "fault.opened": [
    { number: 3, title: "Bit 8 never comes on", serial: "CON-01" },
    "Mira opened the fault F3 Bit 8 never comes on of CON-01.",
  ],
  "fault.edited": [
    { number: 3, title: "Bit 8 never comes on", what: "cause, hours" },
    "Mira wrote on the fault F3 Bit 8 never comes on: cause, hours.",
  ],
  "fault.stated": [
    { number: 3, title: "Bit 8 never comes on", from: "open", to: "traced" },
    "Mira called the fault F3 Bit 8 never comes on traced, before open.",
  ],
  "rework.recorded": [
    { serial: "CON-01", number: 2, what: "Bodge wire W3, U6-12 to U9-3, white", fault: 3, doubtful: 5, spared: 1 },
    "Mira recorded rework R2 of CON-01 for F3: Bodge wire W3, U6-12 to U9-3, white. It puts 5 checks in doubt; 1 check spared.",
  ],
  "netlist.kept": [{ code: "CON", letter: "A", number: 2, nets: 64 }, "Mira took netlist 2 of CON rev A with 64 nets."],
  "probing.started": [{ serial: "CON-01", probes: 1 }, "Mira started a round of probing of CON-01: 1 probe."],
  "probing.closed": [
    { serial: "CON-01", said: "1 open, 1 crossed pair" },
    "Mira closed a round of probing of CON-01: 1 open, 1 crossed pair.",
  ],
  "punch.taken": [{ code: "CON", letter: "B", items: 4 }, "Mira took 4 items into the punch list of CON rev B."],
  "punch.dealt": [
    { code: "CON", letter: "B", item: "W3", how: "PH7 routed to U9-3" },
    "Mira ticked “W3” off the punch list of CON rev B: PH7 routed to U9-3.",
  ],
  "order.said": [
    { board: "CON", other: "SUP", rule: "despite", reason: "It has its own regulator." },
    "Mira said in the order of the boards that CON may come before SUP: It has its own regulator.",
  ],
  "order.withdrawn": [
    { board: "CON", other: "TIM", rule: "needs" },
    "Mira withdrew from the order of the boards that CON waits for TIM.",
  ],
  "punch.reopened": [{ code: "CON", letter: "B", item: "W3" }, "Mira put “W3” back on the punch list of CON rev B."],
};
const KINDS = Object.entries(SAID);

describe("what happened", () => {
  it.each(KINDS)("%s is one sentence", (kind, [payload, sentence]) => {
    expect(plainSentence(sentenceOf(kind, payload, context))).toBe(sentence);
  });

  it("is told of every kind there is", () => {
    expect(Object.keys(SAID).sort()).toEqual(Object.keys(eventPayloads).sort());
    for (const kind of Object.keys(eventPayloads)) expect(groupOf(kind), kind).toBeDefined();
  });

  it("links to the check, the unit, the board, the entry and the file", () => {
    const links = (kind: EventKind) =>
      sentenceOf(kind, SAID[kind][0], context).flatMap((part) => (part.href ? [part.href] : []));
    expect(links("attempt.recorded")).toEqual([
      "/projects/tide/units/CON-01?check=c1#check-c1",
      "/projects/tide/units/CON-01",
    ]);
    expect(links("procedure.issued")).toEqual(["/projects/tide/boards/CON/procedure/4"]);
    expect(links("log.written")).toEqual(["/projects/tide/log/s1"]);
    expect(links("evidence.attached")[0]).toBe("/api/projects/tide/files/s1");
    expect(links("member.joined")).toEqual(["/projects/tide/people"]);
  });

  it("is still told when the unit is gone or the payload is of an older form", () => {
    const gone = { ...context, unitSerial: null, checkId: null, checkTitle: null };
    expect(sentenceOf("unit.archived", { serial: "OLD-1" }, gone).every((part) => part.href === undefined)).toBe(true);
    expect(plainSentence(sentenceOf("evidence.attached", file, gone))).toBe("Mira attached the photo U3.jpg.");
    expect(plainSentence(sentenceOf("attempt.recorded", { was: "other" }, context))).toBe("Mira changed something.");
    expect(plainSentence(sentenceOf("moon.landed", {}, context))).toBe("Mira changed something.");
  });

  it("ends with one full stop, whatever the reason ends with", () => {
    const said = (reason: string) => plainSentence(sentenceOf("check.reopened", { ...check, reason }, context));
    expect(said("Again!")).toMatch(/: Again!$/);
    expect(said("")).toMatch(/ on CON-01\.$/);
  });

  it("is grouped and marked by what it means for a check", () => {
    expect(kindsOf("reopenings")).toEqual(
      expect.arrayContaining(["check.reopened", "check.doubted", "concession.granted", "hold.lifted"]),
    );
    expect(kindsOf("failures")).toEqual(["attempt.recorded"]);
    expect(glyphOf("attempt.recorded", SAID["attempt.recorded"][0])).toBe("failed");
    expect(glyphOf("attempt.recorded", { ...SAID["attempt.recorded"][0], verdict: "guard-band" })).toBe("passed");
    expect(glyphOf("check.doubted", {})).toBe("doubtful");
    expect(glyphOf("log.written", {})).toBeUndefined();
  });
});
