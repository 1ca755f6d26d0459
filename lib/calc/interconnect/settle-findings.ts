import type { Draft } from "./draft";
import type { Edit, Finding, PinAt, Weight } from "./finding";
import { grouped } from "./grouped";
import type { NetPin } from "./net";
import { byName, distinct } from "./order";
import { busStem, capitalNet as capital, subjectsListed } from "./wording";

const WEIGHTS: readonly Weight[] = ["must", "should", "look"];

/**
 * Puts drafts of the same mistake together: one design in three slots makes a mistake once, on however many nets it
 * shows. The order is by weight, then title.
 */
export function settleFindings(drafts: readonly Draft[]): Finding[] {
  const sameMistake = together(
    drafts,
    (draft) => `${draft.rule}\u0000${draft.sameAs ?? designPins(onCards(draft.pins)).join(",")}`,
  );
  const merged = sameMistake.map(merge);
  const sameBus = together(merged, busOf).map(merge);
  return together(sameBus, keyOf)
    .map(merge)
    .map(finish)
    .sort(
      (a, b) =>
        WEIGHTS.indexOf(a.weight) - WEIGHTS.indexOf(b.weight) || byName(a.title, b.title) || byName(a.key, b.key),
    );
}

/** A wire that every slot has to itself differs at the backplane; the mistake is the card's. */
function onCards(pins: readonly (PinAt | NetPin)[]): readonly (PinAt | NetPin)[] {
  const cards = pins.filter((pin) => !("kind" in pin) || pin.kind === "card");
  return cards.length > 0 ? cards : pins;
}

type Merged = Draft & { subjects: string[]; boards: readonly string[] };

const keyOf = ({ rule, subjects, boards }: Merged) => `${rule}: ${subjects[0] ?? ""} (${boards.join(", ")})`;

/** Lines of one bus with the same mistake on the same boards; everything else by its own key. */
function busOf(draft: Merged): string {
  const stem = busStem(draft.subjects[0] ?? "");
  if (draft.bus === undefined || stem === undefined) return keyOf(draft);
  return [draft.rule, "bus", stem, draft.bus, ...draft.boards].join("\u0000");
}

const together = <T>(drafts: readonly T[], nameOf: (draft: T) => string): T[][] => [
  ...grouped(drafts, nameOf).values(),
];

function merge(drafts: readonly (Draft & { subjects?: string[] })[]): Merged {
  const inOrder = [...drafts].sort((a, b) => byName(a.subject, b.subject) || byName(a.why, b.why));
  const first = inOrder[0];
  if (!first) throw new Error("A mistake without a draft.");
  const pins = inOrder.flatMap((draft) => [...draft.pins]);
  return {
    ...first,
    weight: WEIGHTS.find((weight) => drafts.some((draft) => draft.weight === weight)) ?? first.weight,
    subjects: distinct(inOrder.flatMap((draft) => draft.subjects ?? [draft.subject])),
    pins,
    boards: distinct(inOrder.flatMap((draft) => [...(draft.boards ?? draft.pins.map((pin) => pin.board))])),
    // All of it is mended or nothing is offered.
    edits: inOrder.every((draft) => draft.edits.length > 0) ? uniqueEdits(inOrder.flatMap((draft) => draft.edits)) : [],
    facts: distinct(inOrder.flatMap((draft) => draft.facts ?? [])).join("; "),
  };
}

function finish(draft: Merged): Finding {
  const { rule, weight, title, why, mend, edits, facts, subjects, boards } = draft;
  const pins = uniquePins(draft.pins);
  return {
    key: keyOf(draft),
    rule,
    weight,
    title: capital(title(subjectsListed(subjects))),
    why: subjects.length > 1 ? `${why} The same on ${subjects.length - 1} more.` : why,
    mend,
    edits,
    pins: pins.map(plainPin),
    boards: [...boards],
    facts: [facts, ...designPins(pins)].filter((fact) => fact !== undefined && fact !== "").join("; "),
  };
}

function uniquePins(pins: readonly PinAt[]): PinAt[] {
  const seen = new Map(pins.map((pin) => [`${pin.placement} ${pin.connectorId} ${pin.pin}`, pin]));
  return [...seen.values()];
}

/** Without what only the net knows, because findings are stored. */
const plainPin = ({ placement, label, board, connector, connectorId, pin, signal }: PinAt): PinAt => ({
  placement,
  label,
  board,
  connector,
  connectorId,
  pin,
  signal,
});

/** "CON J1 a10 PH6 push-pull output HC": the design's pins, however many slots the design sits in. */
const designPins = (pins: readonly (PinAt | NetPin)[]): string[] => distinct(pins.map(designPin));

function designPin(pin: PinAt | NetPin): string {
  const words = [pin.board, pin.connector, pin.pin, pin.signal];
  if ("role" in pin) {
    words.push(pin.role, pin.family, pin.enableGroup);
    if (pin.loads > 0) words.push(`${pin.loads} loads`);
    if (pin.pullUpOhm !== null) words.push(`${pin.pullUpOhm} Ω`);
  }
  return words.filter((word) => word !== "").join(" ");
}

/** Two edits of one pin become one; what is said twice stays once. */
function uniqueEdits(edits: readonly Edit[]): Edit[] {
  const unique = new Map<string, Edit>();
  for (const edit of edits) {
    const key =
      edit.kind === "pin"
        ? `pin ${edit.board} ${edit.connectorId} ${edit.pin}`
        : edit.kind === "alias"
          ? `alias ${edit.signal} ${edit.alias}`
          : `spares ${edit.board}`;
    const same = unique.get(key);
    if (same?.kind === "pin" && edit.kind === "pin") unique.set(key, { ...same, set: { ...same.set, ...edit.set } });
    else if (!same) unique.set(key, edit);
  }
  return [...unique.values()];
}
