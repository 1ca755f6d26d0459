import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import type { NetPin } from "../net";
import { distinct } from "../order";
import { listed, verb, volts } from "../wording";

const named = (pins: readonly NetPin[], name: string) => pins.filter((pin) => pin.signal === name);

/**
 * Two supplies, or a supply and ground, on one net: a short circuit as soon as power comes on. Two grounds under two
 * names are a look: they are joined somewhere in every machine, and best at one point.
 * Names whose volts nobody knows are namedDifferently's. No edits: which of the pins is wrong, only the builder knows.
 */
export const railsJoined: Rule = (survey) =>
  survey.nets.flatMap((study): Draft[] => {
    const { rails, areAliases } = survey;
    const pins = [...study.power, ...study.ground].filter((pin) => pin.signal !== "");
    const names = distinct(pins.map(({ signal }) => signal));
    const clash = names.flatMap((one, at) =>
      names
        .slice(at + 1)
        .filter((other) => !areAliases(one, other))
        .flatMap((other) => {
          const [a, b] = [rails.voltsOf(one), rails.voltsOf(other)];
          if (a === undefined || b === undefined) return [];
          const bothGround = rails.isGround(one) && rails.isGround(other);
          const weight = bothGround ? ("look" as const) : a !== b ? ("must" as const) : ("should" as const);
          return [{ one, other, weight, a, b, bothGround }];
        }),
    );
    const [worst] = ["must", "should", "look"].flatMap((weight) => clash.filter((one) => one.weight === weight));
    if (!worst) return [];
    const { one, other, weight, a, b, bothGround } = worst;
    const involved = [...named(pins, one).slice(0, 3), ...named(pins, other).slice(0, 3)];
    const told = `${survey.place(first(pins, one))} is ${one}, ${survey.place(first(pins, other))} is ${other}, and they are one net.`;
    return [
      {
        rule: "rails-joined",
        weight,
        subject: `${one} and ${other}`,
        title: (subject) => `${subject} are joined`,
        why: bothGround
          ? `${told} Where grounds meet decides whose current disturbs whom.`
          : weight === "must"
            ? `${told} ${volts(a)} against ${volts(b)} is a short circuit at the first power-on.`
            : `${told} Two supplies in parallel fight over the current.`,
        mend: bothGround ? "Accept it if this is the one point where they meet." : "Move one of them to another pin.",
        edits: [],
        pins: involved,
      },
    ];
  });

function first(pins: readonly NetPin[], name: string): NetPin {
  const pin = pins.find(({ signal }) => signal === name);
  if (!pin) throw new Error("A name without a pin.");
  return pin;
}

/**
 * One name that is a supply on one board and ground on another: one of the roles is a slip, and every rule that goes by
 * roles is wrong until it is mended. The name's own class or the roles of most of its pins say which.
 */
export const railRole: Rule = (survey) =>
  survey.nets.flatMap((study): Draft[] => {
    const both = distinct(study.power.map(({ signal }) => signal)).filter(
      (name) => name !== "" && study.ground.some(({ signal }) => signal === name),
    );
    return both.map((name) => {
      const role = survey.rails.isGround(name) ? "ground" : "power";
      const wrong = named(role === "ground" ? study.power : study.ground, name);
      return {
        rule: "rail-role",
        weight: "should",
        subject: name,
        title: (subject) => `${subject} is a supply on one pin and ground on another`,
        why: `${listed(wrong.map(survey.place))} ${verb(wrong.length, "says", "say")} otherwise than the rest.`,
        mend: `Give ${wrong.length === 1 ? "this pin" : "these pins"} the role ${role}.`,
        edits: editPins(wrong, { role }),
        pins: wrong,
        sameAs: name,
      };
    });
  });

/**
 * A supply pin whose signal no rail has: its current, its volts and its contacts are not looked at. No edits: a rail's
 * volts are not in the pin map. Silent while the machine has no rails at all.
 */
export const unknownRail: Rule = ({ index, rails, pinOfDesign, areAliases }) => {
  const known = index.machine.rails.map(({ name }) => name);
  if (known.length === 0) return [];
  return index.boards.flatMap(({ pins }) =>
    pins
      .filter(({ design, signal }) => {
        const isListed = rails.isListed(signal) || known.some((name) => areAliases(name, signal));
        return design.role === "power" && !isListed && !rails.isGround(signal);
      })
      .map((pin): Draft => {
        const nameless = pin.signal === "";
        return {
          rule: "unknown-rail",
          weight: "should",
          subject: nameless ? `${pin.connector.board} ${pin.connector.reference}` : pin.signal,
          title: (subject) =>
            nameless ? `Supply pins of ${subject} carry no rail` : `${subject} is no rail of this machine`,
          why: "Its volts, its current and its contacts are not looked at.",
          mend: nameless
            ? "Name the rail."
            : `List ${pin.signal} among the rails, or name the pin as the rail is named.`,
          edits: [],
          pins: [pinOfDesign(pin)],
          sameAs: nameless ? `${pin.connector.board} ${pin.connector.id}` : pin.signal,
        };
      }),
  );
};
