import type { Phrases, SentencePart } from "./phrases";
import type { EventKind, EventPayload } from "./schema";

type Writer<Kind extends EventKind> = (payload: EventPayload<Kind>, says: Phrases) => (string | SentencePart)[];

const KIND_WORDS: Record<string, string> = {
  photo: "the photo",
  "scope-picture": "the scope picture",
  "scope-data": "the scope data",
};
const fileWords = (kind: string, fileName: string) => `${KIND_WORDS[kind] ?? "the file"} ${fileName}`;
const because = (reason: string) => (reason === "" ? "." : `: ${endSentence(reason)}`);
const endSentence = (text: string) => (/[.!?…]$/.test(text) ? text : `${text}.`);

const VERDICTS = {
  conforms: "conforms",
  "guard-band": "conforms, inside the guard band",
  "does-not-conform": "does not conform",
} as const;

/** One sentence a kind of event, in the past tense, with the person first. A new kind does not compile without one. */
export const WRITERS: { [Kind in EventKind]: Writer<Kind> } = {
  "project.created": ({ name }, { who }) => [who, ` set up the project ${name}.`],
  "project.edited": ({ what }, { who, project }) => [
    who,
    " changed ",
    project("the project"),
    what === "" ? "." : `: ${endSentence(what)}`,
  ],
  "project.archived": ({ name }, { who }) => [who, ` archived the project ${name}.`],
  "project.restored": ({ name }, { who }) => [who, ` restored the project ${name}.`],
  "member.joined": ({ role }, { who, people }) => [who, " joined ", people("the project"), ` as ${role}.`],
  "member.role-changed": ({ name, from, to }, { who, people }) => [
    who,
    " made ",
    people(name),
    ` ${to}, before ${from}.`,
  ],
  "member.removed": ({ name }, { who, people }) =>
    name === who
      ? [who, " left ", people("the project"), "."]
      : [who, ` removed ${name} from `, people("the project"), "."],
  "invitation.sent": ({ role }, { who, people }) => [who, " invited ", people(`a ${role}`), "."],
  "invitation.withdrawn": ({ role }, { who, people }) => [
    who,
    " withdrew ",
    people(`the invitation of a ${role}`),
    ".",
  ],
  "board.created": ({ code, name }, { who, board }) => [who, " added the board ", board(code, name), "."],
  "board.edited": ({ code, name }, { who, board }) => [who, " changed the board ", board(code, name), "."],
  "board.archived": ({ code, name }, { who, board }) => [who, " archived the board ", board(code, name), "."],
  "board.restored": ({ code, name }, { who, board }) => [who, " restored the board ", board(code, name), "."],
  "board.purged": ({ code, name, units, ...gone }, { who }) => [
    who,
    ` purged the board ${code} ${name} for good: ${count(units, "unit")}, ${whatWent(gone)}.`,
  ],
  "revision.created": ({ code, letter }, { who, board }) => [who, ` added revision ${letter} of `, board(code), "."],
  "revision.released": ({ code, letter }, { who, board }) => [
    who,
    ` released revision ${letter} of `,
    board(code),
    ".",
  ],
  "unit.created": ({ serial }, { who, unit }) => [who, " added the unit ", unit(serial), "."],
  "unit.edited": ({ serial }, { who, unit }) => [who, " changed the unit ", unit(serial), "."],
  "unit.archived": ({ serial }, { who, unit }) => [who, " archived the unit ", unit(serial), "."],
  "unit.restored": ({ serial }, { who, unit }) => [who, " restored the unit ", unit(serial), "."],
  "unit.purged": ({ serial, ...gone }, { who }) => [who, ` purged the unit ${serial} for good: ${whatWent(gone)}.`],
  "slot.created": ({ position }, { who, slots }) => [who, " added ", slots(`slot ${position}`), "."],
  "slot.edited": ({ position }, { who, slots }) => [who, " changed ", slots(`slot ${position}`), "."],
  "slot.archived": ({ position }, { who, slots }) => [who, " archived ", slots(`slot ${position}`), "."],
  "unit.placed": ({ serial, position }, { who, unit, slots }) => [
    who,
    " put ",
    unit(serial),
    " into ",
    slots(`slot ${position}`),
    ".",
  ],
  "unit.removed": ({ serial, position }, { who, unit, slots }) => [
    who,
    " took ",
    unit(serial),
    " out of ",
    slots(`slot ${position}`),
    ".",
  ],
  "procedure.issued": ({ code, number, note }, { who, procedure }) => [
    who,
    " issued ",
    procedure(code, number),
    because(note),
  ],
  "traveler.started": ({ serial, number }, { who, unit }) => [
    who,
    " started the traveler of ",
    unit(serial),
    ` from procedure version ${number}.`,
  ],
  "traveler.moved": ({ serial, from, to, kept, changed }, { who, unit }) => [
    who,
    " moved the traveler of ",
    unit(serial),
    ` from procedure version ${from} to ${to}: ${count(kept, "check")} kept, ${changed} changed.`,
  ],
  "attempt.recorded": ({ serial, title, verdict, reading }, { who, check, unit }) => {
    const words = VERDICTS[verdict];
    const result = reading === "" || reading === words ? words : `${reading}, ${words}`;
    return [who, " recorded ", check(title), " on ", unit(serial), `: ${endSentence(result)}`];
  },
  "attempt.voided": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " voided an attempt at ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "check.reopened": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " reopened ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "check.doubted": ({ serial, title, reason }, { check, unit }) => [
    check(title),
    " on ",
    unit(serial),
    " is in doubt",
    because(reason),
  ],
  "concession.granted": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " granted a concession for ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "concession.withdrawn": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " withdrew the concession for ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "hold.lifted": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " lifted the hold point ",
    check(title),
    " for ",
    unit(serial),
    because(reason),
  ],
  "prerequisite.added": ({ check: title, needs }, { who, check }) => [
    who,
    " made ",
    check(title),
    ` wait for ${needs}.`,
  ],
  "prerequisite.removed": ({ check: title, needs }, { who, check }) => [
    who,
    " let ",
    check(title),
    ` no longer wait for ${needs}.`,
  ],
  "order.said": ({ board, other, rule, reason }, { who, order }) => [
    who,
    " said in the ",
    order("order of the boards"),
    rule === "needs" ? ` that ${board} waits for ${other}` : ` that ${board} may come before ${other}`,
    reason === "" ? "." : `: ${endSentence(reason)}`,
  ],
  "order.withdrawn": ({ board, other, rule }, { who, order }) => [
    who,
    " withdrew from the ",
    order("order of the boards"),
    rule === "needs" ? ` that ${board} waits for ${other}.` : ` that ${board} may come before ${other}.`,
  ],
  "evidence.attached": ({ kind, fileName }, { who, file, place }) => [
    who,
    " attached ",
    file(fileWords(kind, fileName)),
    ...place(" to "),
    ".",
  ],
  "evidence.removed": ({ kind, fileName }, { who, place }) => [
    who,
    ` removed ${fileWords(kind, fileName)}`,
    ...place(" from "),
    ".",
  ],
  "evidence.restored": ({ kind, fileName }, { who, file, place }) => [
    who,
    " restored ",
    file(fileWords(kind, fileName)),
    ...place(" of "),
    ".",
  ],
  "evidence.captioned": ({ kind, fileName, caption }, { who, file }) =>
    caption === ""
      ? [who, " took the caption off ", file(fileWords(kind, fileName)), "."]
      : [who, " captioned ", file(fileWords(kind, fileName)), `: ${endSentence(caption)}`],
  "log.written": ({ title }, { who, entry }) => [who, " wrote ", entry(title), "."],
  "log.edited": ({ title }, { who, entry }) => [who, " edited ", entry(title), "."],
  "log.archived": ({ title }, { who, entry }) => [who, " archived ", entry(title), "."],
  "log.restored": ({ title }, { who, entry }) => [who, " restored ", entry(title), "."],
  "connector.added": ({ code, reference }, { who, pinMap }) => [
    who,
    " added the connector ",
    pinMap(code, reference),
    ".",
  ],
  "connector.edited": ({ code, reference }, { who, pinMap }) => [
    who,
    " changed the connector ",
    pinMap(code, reference),
    ".",
  ],
  "connector.removed": ({ code, reference, pins }, { who, wiring }) => [
    who,
    ` removed the connector ${code} ${reference} with ${count(pins, "pin")} from `,
    wiring("the wiring"),
    ".",
  ],
  "pin-map.edited": ({ code, reference, pins }, { who, pinMap }) => [
    who,
    ` changed ${count(pins, "pin")} of `,
    pinMap(code, reference),
    ".",
  ],
  "pin-map.copied": ({ code, reference, to, pins }, { who, pinMap }) => [
    who,
    ` copied ${count(pins, "pin")} of `,
    pinMap(code, reference),
    ` to ${to.join(", ")}.`,
  ],
  "finding.accepted": ({ title, reason }, { who, wiring }) => [
    who,
    " accepted the finding ",
    wiring(`“${title}”`, "/findings"),
    because(reason),
  ],
  "finding.acceptance-withdrawn": ({ title, reason }, { who, wiring }) => [
    who,
    " no longer accepts the finding ",
    wiring(`“${title}”`, "/findings"),
    because(reason),
  ],
  "signal.saved": ({ name }, { who, wiring }) => [who, " said more of the signal ", wiring(name, "/signals"), "."],
  "signal.removed": ({ name }, { who, wiring }) => [
    who,
    " took away what was said of the signal ",
    wiring(name, "/signals"),
    ".",
  ],
  "family.saved": ({ name }, { who, wiring }) => [
    who,
    " kept own figures of the family ",
    wiring(name, "/families"),
    ".",
  ],
  "family.removed": ({ name }, { who, wiring }) => [
    who,
    " removed the own figures of the family ",
    wiring(name, "/families"),
    ".",
  ],
  "block.created": ({ name }, { who, block }) => [who, " added the block ", block(name), "."],
  "block.edited": ({ name, outdated }, { who, block }) => [
    who,
    " changed the block ",
    block(name),
    outdated === 0 ? "." : `; ${count(outdated, "unit")} built before ${outdated === 1 ? "is" : "are"} not as it says.`,
  ],
  "block.archived": ({ name }, { who, block }) => [who, " archived the block ", block(name), "."],
  "block.restored": ({ name }, { who, block }) => [who, " restored the block ", block(name), "."],
  "part.added": ({ number }, { who, parts }) => [who, " added the part ", parts(number, "/logic"), "."],
  "part.edited": ({ number }, { who, parts }) => [who, " changed the part ", parts(number, "/logic"), "."],
  "part.stocked": ({ number, stock, price }, { who, parts }) => [
    who,
    " wrote down ",
    parts(number),
    `: ${stock} in stock, ${price === "" ? "no price" : `${price} each`}.`,
  ],
  "part.archived": ({ number }, { who, parts }) => [who, " archived the part ", parts(number, "/logic"), "."],
  "part.restored": ({ number }, { who, parts }) => [who, " restored the part ", parts(number, "/logic"), "."],
  "plan.edited": ({ code, what }, { who, parts }) => [
    who,
    " changed the ",
    parts(`plan of ${code}`, `/boards/${encodeURIComponent(code)}`),
    `: ${endSentence(what)}`,
  ],
  "plan.spares": ({ percent }, { who, parts }) => [who, " set the ", parts("spares to order"), ` to ${percent} %.`],
  "plan.conditions": ({ what }, { who, wiring }) => [
    who,
    " changed the ",
    wiring("conditions of the plan", "/power"),
    `: ${endSentence(what)}`,
  ],
  "rail.saved": ({ name, isNew }, { who, wiring }) => [
    who,
    isNew ? " added the rail " : " changed the rail ",
    wiring(name, "/power"),
    ".",
  ],
  "rail.removed": ({ name }, { who, wiring }) => [who, " removed the rail ", wiring(name, "/power"), "."],
  "power.line-saved": ({ code, what }, { who, wiring }) => [
    who,
    " wrote down what ",
    wiring(code, `/power?board=${encodeURIComponent(code)}`),
    ` draws: ${endSentence(what)}`,
  ],
  "power.line-removed": ({ code, what }, { who, wiring }) => [
    who,
    " took a line off what ",
    wiring(code, `/power?board=${encodeURIComponent(code)}`),
    ` draws: ${endSentence(what)}`,
  ],
  "delay.created": ({ name }, { who, parts }) => [who, " added the delay path ", parts(name, "/delay"), "."],
  "delay.edited": ({ name }, { who, parts }) => [who, " changed the delay path ", parts(name, "/delay"), "."],
  "delay.archived": ({ name }, { who, parts }) => [who, " archived the delay path ", parts(name, "/delay"), "."],
  "delay.restored": ({ name }, { who, parts }) => [who, " restored the delay path ", parts(name, "/delay"), "."],
  "fault.opened": ({ number, title, serial }, { who, fault, unit }) => [
    who,
    " opened the fault ",
    fault(number, title),
    " of ",
    unit(serial),
    ".",
  ],
  "fault.edited": ({ number, title, what }, { who, fault }) => [
    who,
    " wrote on the fault ",
    fault(number, title),
    `: ${endSentence(what)}`,
  ],
  "fault.stated": ({ number, title, from, to }, { who, fault }) => [
    who,
    " called the fault ",
    fault(number, title),
    ` ${to}, before ${from}.`,
  ],
  "rework.recorded": ({ serial, number, what, fault, doubtful, spared }, { who, rework, unit }) => [
    who,
    " recorded ",
    rework(number),
    " of ",
    unit(serial),
    `${fault === null ? "" : ` for F${fault}`}: ${what}. `,
    doubtful === 0 ? "It puts no further check in doubt" : `It puts ${count(doubtful, "check")} in doubt`,
    spared === 0 ? "." : `; ${count(spared, "check")} spared.`,
  ],
  "netlist.kept": ({ code, letter, number, nets }, { who, netlists }) => [
    who,
    " took ",
    netlists(`netlist ${number} of ${code} rev ${letter}`, code),
    ` with ${count(nets, "net")}.`,
  ],
  "probing.started": ({ serial, probes }, { who, unit, probing }) => [
    who,
    " started ",
    probing("a round of probing"),
    " of ",
    unit(serial),
    `: ${count(probes, "probe")}.`,
  ],
  "probing.closed": ({ serial, said }, { who, unit, probing }) => [
    who,
    " closed ",
    probing("a round of probing"),
    " of ",
    unit(serial),
    `: ${endSentence(said)}`,
  ],
  "punch.taken": ({ code, letter, items }, { who, punchList }) => [
    who,
    ` took ${count(items, "item")} into the `,
    punchList(code, letter),
    ".",
  ],
  "punch.dealt": ({ code, letter, item, how }, { who, punchList }) => [
    who,
    ` ticked “${item}” off the `,
    punchList(code, letter),
    `: ${endSentence(how)}`,
  ],
  "punch.reopened": ({ code, letter, item }, { who, punchList }) => [
    who,
    ` put “${item}” back on the `,
    punchList(code, letter),
    ".",
  ],
};

type Gone = { checks: number; attempts: number; files: number; waits: number };

function whatWent({ checks, attempts, files, waits }: Gone): string {
  const own = `${count(checks, "check")}, ${count(attempts, "attempt")} and ${count(files, "file")} went`;
  return waits === 0 ? own : `${own}, and ${count(waits, "prerequisite")} of other units`;
}

const count = (n: number, word: string) => `${n} ${word}${n === 1 ? "" : "s"}`;
