import { pinsApartMm } from "../../connector";
import type { Draft, Rule } from "../draft";
import { grouped } from "../grouped";
import type { IndexedConnector, IndexedPin } from "../index-design";
import { distinct } from "../order";
import type { Survey } from "../survey";
import { listed } from "../wording";
import { pinsInPlace, SLACK_MM, type PinInPlace } from "./placed-pins";

/** Pins count as neighbours up to the next place along or across. */
const NEXT_MM = 2.54;

/**
 * A clock on the very next pin to another clock, or to a line that switches: with no ground between them each edge of the
 * one shows on the other, and a false edge of a clock counts. One finding a clock over all boards; beside another clock
 * it weighs more. Signals of class clock are clocks. No edits: which pin goes where, the layout says.
 */
export const clockNeighbours: Rule = (survey) => {
  const found = survey.index.boards.flatMap(({ connectors }) =>
    connectors.flatMap((connector) => {
      const placed = pinsInPlace(connector);
      const clocks = placed.filter(({ pin }) => isClock(survey, pin.signal));
      if (clocks.length === 0) return [];
      return clocks.flatMap((clock) =>
        placed
          .filter(({ pin, at }) => isBeside(survey, connector, clock, { pin, at }))
          .map(({ pin }) => ({ clock: clock.pin, pin, beside: isClock(survey, pin.signal) })),
      );
    }),
  );
  const byClock = grouped(found, ({ clock, beside }) => `${clock.signal}\u0000${beside ? 1 : 0}`);
  return [...byClock.values()].flatMap((own) => told(survey, own));
};

const isClock = ({ classOf }: Survey, name: string) => classOf(name) === "clock";

function isBeside({ rails }: Survey, { face }: IndexedConnector, clock: PinInPlace, other: PinInPlace): boolean {
  const { signal, design } = other.pin;
  if (signal === "" || signal === clock.pin.signal || design.role === "power" || design.role === "ground") return false;
  if (rails.isRail(signal)) return false;
  const step = Math.max(NEXT_MM, face.pitchMm);
  return pinsApartMm(face, clock.at, other.at) <= step + SLACK_MM;
}

type Beside = { clock: IndexedPin; pin: IndexedPin; beside: boolean };

function told(survey: Survey, found: readonly Beside[]): Draft[] {
  const isPair = found.some(({ beside }) => beside);
  const clock = found[0]?.clock.signal ?? "";
  // Of two clocks beside each other, the first by name tells it.
  const own = isPair ? found.filter(({ pin }) => clock < pin.signal) : found;
  if (own.length === 0) return [];
  const others = distinct(own.map(({ pin }) => pin.signal));
  const places = distinct(own.map(({ clock: at, pin }) => `${at.name} next to ${pin.name}`));
  const boards = distinct(own.map(({ pin }) => pin.connector.board));
  return [
    {
      rule: isPair ? "clock-beside-clock" : "clock-beside-line",
      weight: isPair ? "should" : "look",
      subject: clock,
      title: (subject) => (isPair ? `${subject} runs beside ${listed(others)}` : `${subject} beside other lines`),
      why: `${listed(places)} on ${listed(boards, 6)}, with no ground between${isPair ? "" : `: ${listed(others)}`}.`,
      mend: "Put a ground pin between them, or move the quiet lines beside the clock.",
      edits: [],
      pins: own.flatMap(({ clock: at, pin }) => [survey.pinOfDesign(at), survey.pinOfDesign(pin)]),
      sameAs: clock,
    },
  ];
}
