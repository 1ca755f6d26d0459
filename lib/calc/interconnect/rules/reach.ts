import type { Draft, Rule } from "../draft";
import { clearPins } from "../edit-pins";
import { pinKey } from "../look-up-net";
import type { NetPin } from "../net";
import { pinsOf } from "../study-net";
import { listed, netName, verb } from "../wording";

/**
 * Inputs that nothing drives: they take any level that their neighbours couple into them, and a CMOS input in the middle
 * draws current through both its transistors. Practice of the trade, stated in every CMOS data sheet.
 * Silent where a driver may stand beyond a connector that meets nothing known, and on supplies (an input tied there).
 * No edits: which board should drive the net, only its builder knows.
 */
export const noDriver: Rule = ({ signalNets, place }) =>
  signalNets.flatMap((study): Draft[] => {
    const { net, drivers, receivers, pullUps, mayBeDrivenFromOutside } = study;
    if (drivers.length > 0 || receivers.length === 0 || mayBeDrivenFromOutside) return [];
    const pins = pinsOf(receivers);
    const places = listed(pins.map(place));
    const held = pullUps.length > 0;
    return [
      {
        rule: "no-driver",
        weight: held ? "look" : "must",
        subject: netName(net),
        title: (subject) => `Nothing drives ${subject}`,
        why: held
          ? `Only a pull-up holds ${places} high; no board ever pulls it low.`
          : `${places} ${verb(pins.length, "listens", "listen")}, and no board drives. The level floats.`,
        mend: "Give the pin to the board that should drive it, or tie the input.",
        edits: [],
        pins,
        facts: held ? "pull-up" : "floats",
        bus: held ? "pull-up" : "",
      },
    ];
  });

/**
 * A signal that leaves a card and arrives nowhere: a wrong pin, or a line that the backplane leaves out. Only looked at
 * when several cards are put together, and not where the net may go on beyond a connector that meets nothing known.
 * Inputs alone are noDriver's. The edit takes the pin off the connector; the other way to mend it is on another board.
 */
export const oneSlotOnly: Rule = ({ signalNets, index, place, placementsOf }) => {
  const cards = new Set(
    index.meetings.flatMap(({ from, to }) =>
      [from, to].filter(({ placed }) => placed.board.design.kind === "card").map(({ placed }) => placed.placement.id),
    ),
  );
  if (cards.size < 2) return [];
  const lonely = signalNets.flatMap((study) => {
    const { net, drivers, active, mayBeHeardOutside } = study;
    const onCards = net.pins.filter((pin) => pin.kind === "card" && pin.role !== "no connection");
    const isAlone = new Set(onCards.map(({ placement }) => placement)).size === 1;
    if (!isAlone || active.size !== 1 || drivers.length === 0 || mayBeHeardOutside) return [];
    const pins = onCards.filter((pin) => pin.isMated);
    return pins.length === 0 ? [] : [{ net, pins }];
  });
  const lonelyPins = new Set(lonely.flatMap(({ pins }) => pins.map(pinKey)));
  const placementsAt = (code: string) => {
    const design = index.byCode.get(code);
    return design ? placementsOf(design) : [];
  };
  /** Whether the design's pin is as lonely in every other slot: only then may the design lose it. */
  const everywhere = ({ board, connectorId, pin }: NetPin) =>
    placementsAt(board).every(({ placement }) => lonelyPins.has(pinKey({ placement: placement.id, connectorId, pin })));
  return lonely.map(({ net, pins }): Draft => {
    const canGo = pins.every(everywhere);
    return {
      rule: "one-slot-only",
      weight: "look",
      subject: netName(net),
      title: (subject) => `${subject} reaches one slot only`,
      why: `${listed(pins.map(place))} ${verb(pins.length, "drives", "drive")} it; no other board has it on a pin.`,
      mend: `Give it to the board that should listen${canGo ? ", or take it off the connector" : ""}.`,
      edits: canGo ? clearPins(pins) : [],
      pins,
      bus: "",
    };
  });
};
