import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import type { Edit } from "../finding";
import type { IndexedPin } from "../index-design";
import type { NetPin } from "../net";
import { byName, distinct } from "../order";
import type { Survey } from "../survey";
import { listed } from "../wording";

const plain = (name: string) => name.toLowerCase();

/**
 * One net under several names: most often a pin is one place off, sometimes two boards say it differently on purpose
 * (the backplane's SELM2_N is a card's SEL_N). Names that are agreed on as aliases of one another are silent, whatever
 * the number of signals that share an alias. The edit agrees on them; moving a pin is for the builder to decide.
 * Names that differ only in capitals are caseOnly's, supplies whose volts differ are railsJoined's.
 */
export const namedDifferently: Rule = (survey) =>
  survey.nets.flatMap(({ net, power, ground, drivers, receivers }): Draft[] => {
    const isSupply = power.length > 0 || ground.length > 0;
    // An input or output on a supply is told by the rules about supplies.
    if (net.names.length < 2 || (isSupply && drivers.length + receivers.length > 0)) return [];
    const clusters = clustersOf(survey, net.names, isSupply);
    if (clusters.length < 2) return [];
    const main = net.name;
    const others = clusters.filter((cluster) => !cluster.includes(main)).map(([name = ""]) => name);
    const names = [main, ...others];
    const pins = names.flatMap((name) => onePinABoard(net.pins.filter(({ signal }) => signal === name)));
    const told = names.map((name) => `${name} on ${listed(placesOf(survey, net.pins, name), 2)}`);
    return [
      {
        rule: "named-differently",
        weight: "should",
        subject: names.join(" / "),
        title: (subject) => `One net, ${names.length === 2 ? "two" : "several"} names: ${subject}`,
        why: `${told.join(", ")}. One of the pins is misplaced, or both names mean the same.`,
        mend: `Move the pin, or agree that ${listed(others)} means ${main}.`,
        edits: others.map((alias): Edit => ({ kind: "alias", signal: main, alias })),
        pins,
      },
    ];
  });

/** Names that mean the same put together: agreed on, alike but for capitals, or supplies of the same known volts. */
function clustersOf({ areAliases, rails }: Survey, names: readonly string[], isSupply: boolean): string[][] {
  const same = (one: string, other: string) =>
    areAliases(one, other) ||
    plain(one) === plain(other) ||
    // Both volts known: railsJoined has said what there is to say.
    (isSupply && rails.voltsOf(one) !== undefined && rails.voltsOf(other) !== undefined);
  const clusters: string[][] = [];
  for (const name of names) {
    const joined = clusters.filter((cluster) => cluster.some((other) => same(name, other)));
    const rest = clusters.filter((cluster) => !joined.includes(cluster));
    clusters.splice(0, clusters.length, ...rest, [...joined.flat(), name].sort(byName));
  }
  return clusters.sort((a, b) => byName(a[0] ?? "", b[0] ?? ""));
}

function onePinABoard(pins: readonly NetPin[]): NetPin[] {
  const boards = new Set<string>();
  return pins.filter(({ board }) => !boards.has(board) && boards.add(board));
}

const placesOf = ({ place }: Survey, pins: readonly NetPin[], name: string): string[] =>
  onePinABoard(pins.filter(({ signal }) => signal === name)).map(place);

/**
 * Signals that differ only in capitals: one of them is a slip, and copper does not join what is spelt differently. The
 * spelling of most pins stays; among equals the one that is known as a signal, then the first.
 */
export const caseOnly: Rule = ({ index, signal, pinOfDesign }) => {
  const spellings = new Map<string, Map<string, IndexedPin[]>>();
  for (const { pins } of index.boards) {
    for (const pin of pins) {
      if (pin.signal === "") continue;
      const spelt = spellings.get(plain(pin.signal)) ?? new Map<string, IndexedPin[]>();
      spellings.set(plain(pin.signal), spelt);
      const same = spelt.get(pin.signal);
      if (same) same.push(pin);
      else spelt.set(pin.signal, [pin]);
    }
  }
  return [...spellings.values()].flatMap((spelt): Draft[] => {
    if (spelt.size < 2) return [];
    const [kept = "", ...wrong] = [...spelt.keys()].sort(
      (a, b) =>
        (spelt.get(b)?.length ?? 0) - (spelt.get(a)?.length ?? 0) ||
        Number(signal(b) !== undefined) - Number(signal(a) !== undefined) ||
        byName(a, b),
    );
    const pins = wrong.flatMap((name) => spelt.get(name) ?? []).map(pinOfDesign);
    return [
      {
        rule: "case-only",
        weight: "should",
        subject: distinct([kept, ...wrong]).join(" / "),
        title: (subject) => `${subject} differ only in capitals`,
        why: `${listed(wrong)} on ${listed(distinct(pins.map(({ board }) => board)))}, ${kept} elsewhere. Copper joins only what is spelt alike.`,
        mend: `Spell it ${kept}.`,
        edits: editPins(pins, { signal: kept }),
        pins,
      },
    ];
  });
};
