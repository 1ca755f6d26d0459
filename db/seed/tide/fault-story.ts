import type { FaultState, ReworkKind, Wire } from "@/db/schema/faults";
import type { Person } from "./story";

type When = { daysAgo: number; minutes: number; by: Person };

/** What is written of a fault at one time; what is left out stays as it was. */
export type FaultTold = When & {
  state?: FaultState;
} & Partial<
    Record<"title" | "symptom" | "suspected" | "tried" | "cause" | "mend" | "lesson" | "nextRevision" | "hours", string>
  >;

/** In the order in which they are opened: the first told is the opening. `line` is the check that showed it. */
export const FAULTS: {
  serial: string;
  line?: string;
  signals: string[];
  pins: string[];
  picture?: string;
  told: [FaultTold, ...FaultTold[]];
}[] = [
  {
    serial: "SUP-01",
    line: "−12 V-forward",
    signals: ["-12V"],
    pins: ["J1 a4", "J1 b4"],
    told: [
      {
        ...{ daysAgo: 88, minutes: 90, by: "maud" },
        title: "−12 V is shorted to ground by U3",
        symptom: "12 Ω from −12 V to ground with the probes either way round, cold and unpowered.",
        suspected: "C5 the wrong way round, or a bridge under U3.",
        tried: "Lifted C5, no change. Warmed the joints of U3, no change.",
      },
      {
        ...{ daysAgo: 87, minutes: 20, by: "maud" },
        state: "mended",
        cause: "The footprint of U3 is mirrored: input and ground are swapped.",
        mend: "None on this unit: it is kept for parts. Revision B has the footprint turned.",
        lesson: "The unpowered reading in both directions found it in a minute. Never leave it out.",
        nextRevision: "Turn the footprint of U3, the −12 V regulator.",
        hours: "2",
      },
    ],
  },
  {
    serial: "SIN-01",
    line: "data-apart",
    signals: ["SINE[11:0]"],
    pins: [],
    told: [
      {
        ...{ daysAgo: 19, minutes: 10, by: "bram" },
        title: "Data lines leak when the air is damp",
        symptom: "820 kΩ between SINE4 and SINE5, 2 MΩ on a dry day.",
        suspected: "Flux under U6, which sits flat on the board.",
        tried: "Washed twice with alcohol. Good for two days each time.",
      },
      {
        ...{ daysAgo: 5, minutes: 60, by: "maud" },
        state: "traced",
        cause: "Flux under U6: the leak goes away with a hair dryer and comes back over night.",
        nextRevision: "No tracks between the pads of U6, and 0.5 mm of air under it.",
        hours: "1:30",
      },
    ],
  },
  {
    serial: "CON-01",
    line: "ph7",
    signals: ["PH7"],
    pins: ["J1 a14"],
    picture: "solder-CON",
    told: [
      {
        ...{ daysAgo: 7, minutes: 40, by: "bram" },
        title: "Pad of U6 pin 12 lifted",
        symptom: "Lamp 7 flickers when the card is bent. The pin moves under the needle.",
        suspected: "Too much heat when the whisker was cut.",
      },
      {
        ...{ daysAgo: 7, minutes: 70, by: "bram" },
        state: "traced",
        tried: "Pressed on each pin of U6 with the wooden stick while the slow clock ran.",
        cause: "The pad of pin 12 has come off the board, its track with it.",
      },
      {
        ...{ daysAgo: 4, minutes: 60, by: "bram" },
        state: "mended",
        mend: "PH7 led past the pad by W3, from U6 pin 12 to U9 pin 3.",
        lesson: "W3 first sat on pin 11. Repeat the continuity before the function: it would have shown in a minute.",
        nextRevision: "Longer pads at U6; PH7 straight to U9 pin 3.",
        hours: "3",
      },
    ],
  },
  {
    serial: "CON-02",
    line: "carry",
    signals: ["PH7", "PH8", "CARRY_N"],
    pins: ["J1 b14"],
    picture: "scope-carry",
    told: [
      {
        ...{ daysAgo: 2, minutes: 60, by: "bram" },
        title: "Bit 8 never comes on",
        symptom: "From 0000FFh the low byte turns over and nothing carries. CARRY_N stays high at the extender.",
        suspected: "CARRY_N open between U6 and J1 b14, or U6 itself.",
      },
    ],
  },
];

/** Lines of the traveler that are spared, with the reason. */
type Spared = Record<string, string>;

export const REWORKS: (When & {
  serial: string;
  kind: ReworkKind;
  what: string;
  why: string;
  wire: Wire | null;
  /** Title of the fault that it is for. */
  fault?: string;
  signals: string[];
  pins: string[];
  spared: Spared;
  before?: string;
  after?: string;
})[] = [
  {
    ...{ daysAgo: 49, minutes: 40, by: "bram", serial: "CON-01", kind: "bodge-wire" },
    what: "Enable of U4 tied to U2",
    why: "Left open on the drawing.",
    wire: { number: "W1", from: "U2-5", to: "U4-1", colour: "blue", out: false },
    ...{ signals: ["SEL_N"], pins: [] },
    spared: { polarity: "No part was moved.", values: "No part was moved." },
  },
  {
    ...{ daysAgo: 49, minutes: 55, by: "bram", serial: "CON-01", kind: "bodge-wire" },
    what: "BUSY_N led to the connector",
    why: "The track ends one pad short.",
    wire: { number: "W2", from: "J1 a8", to: "U5-2", colour: "yellow", out: false },
    ...{ signals: ["BUSY_N"], pins: [] },
    spared: { polarity: "No part was moved.", values: "No part was moved." },
  },
  {
    ...{ daysAgo: 6, minutes: 30, by: "bram", serial: "CON-01", kind: "bodge-wire" },
    what: "PH7 led past the lifted pad",
    why: "The pad of U6 pin 12 has come off the board.",
    wire: { number: "W3", from: "U6-12", to: "U9-3", colour: "white", out: false },
    fault: "Pad of U6 pin 12 lifted",
    ...{ signals: ["PH7"], pins: ["J1 a14"] },
    spared: {
      polarity: "No part was moved.",
      values: "No part was moved.",
      warm: "One wire to one input: nothing that could get warm.",
    },
    ...{ before: "board-CON", after: "solder-CON" },
  },
  {
    ...{ daysAgo: 4, minutes: 2, by: "bram", serial: "CON-01", kind: "bodge-wire" },
    what: "End of W3 moved from U6 pin 11 to pin 12",
    why: "Past the lifted pad of U6 pin 12. It first sat one pin to the left, as things look from the solder side.",
    wire: { number: "W3", from: "U6-12", to: "U9-3", colour: "white", out: false },
    fault: "Pad of U6 pin 12 lifted",
    ...{ signals: ["PH7"], pins: ["U6-11"] },
    spared: {
      polarity: "No part was moved.",
      values: "No part was moved.",
      warm: "One wire to one input: nothing that could get warm.",
    },
  },
];

/** What the supply's revision B did about what revision A taught. */
export const PUNCH = {
  code: "SUP",
  letter: "B",
  daysAgo: 79,
  minutes: 30,
  how: "Turned, and checked on paper with the part laid on it.",
};
