import type { Draft, Rule } from "../draft";
import { clearPins, editPins } from "../edit-pins";
import { distinct } from "../order";
import { pinsOf } from "../study-net";
import { listed, netName, verb } from "../wording";

/**
 * A supply or ground pin on a net that outputs drive: the output works against the supply. An input on a supply is right
 * when it is tied there on purpose (a slot's address), and worth a look when its own board calls it something else.
 */
export const powerOnSignal: Rule = (survey) =>
  survey.nets.flatMap((study): Draft[] => {
    const { net, drivers, receivers } = study;
    const supply = [...study.power, ...study.ground];
    if (supply.length === 0) return [];
    const { rails, place } = survey;
    if (drivers.length > 0) {
      const outputs = pinsOf(drivers);
      const shown = [...outputs, ...supply.slice(0, 6)];
      const common = { rule: "power-on-signal", weight: "must", pins: shown } as const;
      const against = `${listed(outputs.map(place), 2)} ${verb(outputs.length, "drives", "drive")} against ${listed(supply.map(place), 2)}`;
      // Where the supply pin's own name is a rail, the output is misplaced; else the role of the supply pin is a slip.
      const rail = supply.find(({ signal }) => rails.isRail(signal));
      return rail
        ? [
            {
              ...common,
              subject: rail.signal,
              title: (subject) => `An output drives ${subject}`,
              why: `${against}, which ${verb(supply.length, "is", "are")} ${rail.signal}.`,
              mend: "Take the output off this pin.",
              edits: clearPins(outputs),
            },
          ]
        : [
            {
              ...common,
              subject: netName(net),
              title: (subject) => `A supply pin sits on ${subject}`,
              why: `${against}, which ${verb(supply.length, "has", "have")} the role ${supply[0]?.role ?? "power"}.`,
              mend: "Give the pin its true role.",
              edits: editPins(supply, { role: "passive" }),
            },
          ];
    }
    const strangers = pinsOf(receivers).filter((pin) => pin.signal !== "" && !rails.isRail(pin.signal));
    if (strangers.length === 0) return [];
    return [
      {
        rule: "input-on-supply",
        weight: "look",
        subject: listed(distinct(strangers.map(({ signal }) => signal)), 2),
        title: (subject) => `${subject} is tied to ${netName(net)}`,
        why: `${listed(strangers.map(place), 3)} ${verb(strangers.length, "listens", "listen")} to ${netName(net)} all the time.`,
        mend: "Accept it if the input is tied on purpose; else move it to its signal's pin.",
        // Only the builder knows whether it is tied on purpose.
        edits: [],
        pins: strangers,
      },
    ];
  });
