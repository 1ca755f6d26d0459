import type { IndexedConnector } from "./index-design";
import type { MachineIndex, Meeting } from "./index-machine";
import type { SignalBook } from "./signal-book";
import { turnedPins, TURNS, type Turn } from "./turns";

/** A meeting whose two pin maps fit when one of them is turned. */
export type Turned = {
  meeting: Meeting;
  turn: Turn;
  /** Pins that carry the same signal as listed, and when turned. */
  asListed: number;
  whenTurned: number;
  compared: number;
};

/** Signals that must fit only when turned; fewer are chance, or pins that were exchanged. */
const LEAST_GAIN = 3;
/** Share of the pins that meet which must fit when turned, and of all that carry something. */
const LEAST_SHARE = 0.8;
const LEAST_COVER = 0.5;

const named = ({ pins }: IndexedConnector): number => pins.filter(({ signal }) => signal !== "").length;

/** Looks at every meeting whose two lists do not fit as they are; linear in pins. */
export const findTurned = ({ meetings }: MachineIndex, book: SignalBook): Turned[] =>
  meetings.flatMap((meeting) => {
    const [from, to] = [meeting.from.connector, meeting.to.connector];
    const most = Math.min(named(from), named(to));
    const asListed = compare(from, to, book, (pin) => pin).same;
    if (most - asListed < LEAST_GAIN) return [];
    const found = TURNS.flatMap((turn): Turned[] => {
      const turned = turnedPins(from.face, to.face, turn);
      const { same, differ } = compare(from, to, book, (pin) => turned.get(pin));
      const fits = same >= LEAST_SHARE * (same + differ) && same >= LEAST_COVER * most;
      return fits && same - asListed >= LEAST_GAIN
        ? [{ meeting, turn, asListed, whenTurned: same, compared: same + differ }]
        : [];
    });
    const [best] = found.sort((a, b) => b.whenTurned - a.whenTurned);
    return best ? [best] : [];
  });

function compare(
  from: IndexedConnector,
  to: IndexedConnector,
  { areAliases }: SignalBook,
  meets: (pin: string) => string | undefined,
): { same: number; differ: number } {
  let same = 0;
  let differ = 0;
  for (const { key, signal } of from.pins) {
    if (signal === "") continue;
    const met = meets(key);
    const other = met === undefined ? undefined : to.byName.get(met)?.[0]?.signal;
    if (other === undefined || other === "") continue;
    if (areAliases(signal, other)) same += 1;
    else differ += 1;
  }
  return { same, differ };
}
