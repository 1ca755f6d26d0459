import type { Draft, Rule } from "../draft";
import { grouped } from "../grouped";
import { byName } from "../order";
import { pinCount } from "../wording";

/** Families that the table does not have: their levels, loads and edges are not looked at. No edits: figures are. */
export const unknownFamilies: Rule = ({ index, family, pinOfDesign }) => {
  const pins = index.boards.flatMap((board) => board.pins);
  const names = new Set(pins.map(({ design }) => design.family));
  const isUnknown = new Set([...names].filter((name) => name.trim() !== "" && !family(name.trim())));
  const unknown = grouped(
    pins.filter(({ design }) => isUnknown.has(design.family)),
    ({ design }) => design.family.trim(),
  );
  return [...unknown]
    .sort(([a], [b]) => byName(a, b))
    .map(([name, own]): Draft => ({
      rule: "unknown-family",
      weight: "look",
      subject: name,
      title: (subject) => `The family ${subject} is not in the table`,
      why: `Levels and loads of ${pinCount(own.length)} are not looked at.`,
      mend: "Enter its data sheet's figures, or correct the name.",
      edits: [],
      pins: own.map(pinOfDesign),
      sameAs: name,
    }));
};
