import type { Draft, Rule } from "../draft";
import type { PinAt } from "../finding";
import { byName } from "../order";
import { pinCount } from "../wording";

/** Families that the table does not have: their levels, loads and edges are not looked at. No edits: figures are. */
export const unknownFamilies: Rule = ({ index, family, pinOfDesign }) => {
  const unknown = new Map<string, PinAt[]>();
  for (const { pins } of index.boards) {
    for (const pin of pins) {
      const name = pin.design.family.trim();
      if (name === "" || family(name)) continue;
      const same = unknown.get(name);
      if (same) same.push(pinOfDesign(pin));
      else unknown.set(name, [pinOfDesign(pin)]);
    }
  }
  return [...unknown]
    .sort(([a], [b]) => byName(a, b))
    .map(([name, pins]): Draft => ({
      rule: "unknown-family",
      weight: "look",
      subject: name,
      title: (subject) => `The family ${subject} is not in the table`,
      why: `Levels and loads of ${pinCount(pins.length)} are not looked at.`,
      mend: "Enter its data sheet's figures, or correct the name.",
      edits: [],
      pins,
      sameAs: name,
    }));
};
