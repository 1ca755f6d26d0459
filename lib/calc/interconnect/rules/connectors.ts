import { canMate } from "../../connector";
import type { Draft, Rule } from "../draft";
import type { IndexedConnector } from "../index-design";
import { byName, distinct } from "../order";
import { counted, listed, pinCount } from "../wording";

/** Two connectors that are said to meet and whose bodies do not fit. No edits: types are not in the pin map. */
export const cannotMate: Rule = ({ index }) =>
  index.meetings.flatMap(({ from, to }): Draft[] => {
    if (canMate(from.connector.face, to.connector.face)) return [];
    const ends = [from, to].map(({ placed, connector }) => ({
      where: `${placed.placement.label} ${connector.reference}`,
      design: `${connector.board} ${connector.reference}`,
      label: connector.face.label,
    }));
    const [one, other] = ends;
    if (!one || !other) return [];
    return [
      {
        rule: "cannot-mate",
        weight: "must",
        subject: distinct(ends.map(({ design }) => design)).join(" and "),
        title: (subject) => `${subject} cannot be put together`,
        why: `${one.where} is ${one.label}; ${other.where} is ${other.label}.`,
        mend: "Give both the same connector, or put them elsewhere.",
        edits: [],
        pins: [],
        boards: [from.connector.board, to.connector.board],
        facts: distinct(ends.map(({ label }) => label)).join(" / "),
        sameAs: distinct(ends.map(({ design }) => design)).join("\u0000"),
      },
    ];
  });

const onConnectors =
  (
    told: (
      connector: IndexedConnector,
      name: string,
    ) => Omit<Draft, "sameAs" | "subject" | "weight" | "edits"> | undefined,
  ): Rule =>
  ({ index }) =>
    index.boards.flatMap(({ connectors }) =>
      connectors.flatMap((connector): Draft[] => {
        const subject = `${connector.board} ${connector.reference}`;
        const draft = told(connector, subject);
        return draft
          ? [{ ...draft, weight: "must", subject, edits: [], sameAs: `${connector.board} ${connector.id}` }]
          : [];
      }),
    );

/** Pins that the connector's face does not have: they meet nothing. No edits: which pin was meant, the builder knows. */
export const unknownPins: Rule = onConnectors((connector) => {
  const wrong = distinct(connector.pins.filter(({ isOnFace }) => !isOnFace).map(({ name }) => name));
  if (wrong.length === 0) return undefined;
  return {
    rule: "unknown-pins",
    title: (subject) => `${subject} has no pin ${listed(wrong)}`,
    why: `${connector.face.label} has ${pinCount(connector.face.pins.length)}, ${connector.face.pins[0]?.name ?? ""} to ${connector.face.pins.at(-1)?.name ?? ""}.`,
    mend: "Move what they carry to pins that exist.",
    pins: [],
    boards: [connector.board],
    facts: wrong.join(", "),
  };
});

/** One pin listed twice: it is one piece of copper and joins both signals. No edits: which line is right is not known. */
export const pinsTwice: Rule = onConnectors((connector) => {
  const twice = [...connector.byName.values()].filter((pins) => pins.length > 1);
  if (twice.length === 0) return undefined;
  const told = twice.map((pins) => {
    const names = listed(distinct(pins.map(({ signal, name }) => signal || `nothing on ${name}`)));
    return `${pins[0]?.name ?? ""}: ${names}`;
  });
  return {
    rule: "pins-twice",
    title: (subject) => `${subject} lists ${pinCount(twice.length)} more than once`,
    why: `${listed(told)}. One pin is one piece of copper.`,
    mend: "Keep one line of each.",
    pins: [],
    boards: [connector.board],
    facts: told.join("; "),
  };
});

/**
 * Two boards that claim one slot, or one connector that meets two others: only one of them can be there. A cable has two
 * ends. No edits: who sits where is not in the pin map.
 */
export const claimedTwice: Rule = ({ index }) => {
  const met = new Map<string, { where: string; others: string[]; boards: string[] }>();
  for (const { from, to } of index.meetings) {
    for (const [end, other] of [
      [from, to],
      [to, from],
    ] as const) {
      const where = `${end.placed.placement.label} ${end.connector.reference}`;
      const key = `${end.placed.placement.id}\u0000${end.connector.id}`;
      const known = met.get(key) ?? { where, others: [], boards: [end.connector.board] };
      known.others.push(other.placed.placement.label);
      known.boards.push(other.connector.board);
      met.set(key, known);
    }
  }
  const slots = new Map<number, { where: string; others: string[]; boards: string[] }>();
  for (const { placement } of index.placed) {
    if (placement.slot === null) continue;
    const known = slots.get(placement.slot) ?? { where: `Slot ${placement.slot}`, others: [], boards: [] };
    known.others.push(placement.label);
    known.boards.push(placement.board);
    slots.set(placement.slot, known);
  }
  const claims = [...slots.values(), ...met.values()].filter(({ others }) => others.length > 1);
  return claims
    .sort((a, b) => byName(a.where, b.where))
    .map(({ where, others, boards }): Draft => ({
      rule: "claimed-twice",
      weight: "must",
      subject: where,
      title: (subject) => `${subject} is claimed ${others.length === 2 ? "twice" : `${counted(others.length)} times`}`,
      why: `${listed([...others].sort(byName))} cannot be there at once.`,
      mend: "Keep one of them there.",
      edits: [],
      pins: [],
      boards: distinct(boards),
      facts: [...others].sort(byName).join(", "),
      sameAs: where,
    }));
};

/** References that lead nowhere, from a plan that is not whole yet or was put together by a program. */
export const looseEnds: Rule = ({ index }) =>
  index.loose.map(({ board, what }): Draft => ({
    rule: "loose-end",
    weight: "look",
    subject: what,
    title: (subject) => subject,
    why: "What it carries is not looked at.",
    mend: "Name a board and a connector that exist.",
    edits: [],
    pins: [],
    boards: board === "" ? [] : [board],
    sameAs: what,
  }));
