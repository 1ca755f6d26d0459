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

/** Signals that must fit only when turned, and the share of all that must: below it is chance, or another mistake. */
const LEAST_GAIN = 3;
const LEAST_SHARE = 0.8;

/** Looks at every meeting whose two lists differ on several pins; linear in pins. */
export const findTurned = ({ meetings }: MachineIndex, book: SignalBook): Turned[] =>
  meetings.flatMap((meeting) => {
    const { from, to } = meeting;
    const direct = compare(from.connector, to.connector, book, (pin) => pin);
    if (direct.differ < LEAST_GAIN) return [];
    const found = TURNS.flatMap((turn): Turned[] => {
      const turned = turnedPins(from.connector.face, to.connector.face, turn);
      const { same, differ } = compare(from.connector, to.connector, book, (pin) => turned.get(pin));
      const isBetter = same - direct.same >= LEAST_GAIN && same >= LEAST_SHARE * (same + differ);
      return isBetter ? [{ meeting, turn, asListed: direct.same, whenTurned: same, compared: same + differ }] : [];
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
  for (const { name, signal } of from.pins) {
    if (signal === "") continue;
    const met = meets(name.toLowerCase());
    const other = met === undefined ? undefined : to.byName.get(met)?.[0]?.signal;
    if (other === undefined || other === "") continue;
    if (areAliases(signal, other)) same += 1;
    else differ += 1;
  }
  return { same, differ };
}
