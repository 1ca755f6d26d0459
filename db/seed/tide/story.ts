/** Who did what on which evening. Everything not said here passes with a reading that the expectation makes likely. */
export type Person = "maud" | "bram";

export type Deed =
  | {
      do: "record";
      line: string;
      typed?: string;
      fails?: true;
      note?: string;
      voided?: string;
      photo?: string;
    }
  | { do: "reopen"; line: string; reason: string }
  | { do: "concede"; line: string; reason: string };

export type Evening = { daysAgo: number; by: Person; serial: string; deeds: Deed[] };

const all = (...lines: string[]): Deed[] => lines.map((line) => ({ do: "record", line }));
const INSPECTION = all("joints", "polarity", "values", "solder-side");

export const STORY: Evening[] = [
  { daysAgo: 95, by: "bram", serial: "BPL-01", deeds: all("connectors", "joints") },
  { daysAgo: 93, by: "bram", serial: "BPL-01", deeds: all("ground", "rails", "signals", "neighbours") },
  { daysAgo: 90, by: "maud", serial: "SUP-01", deeds: INSPECTION },
  {
    daysAgo: 88,
    by: "maud",
    serial: "SUP-01",
    deeds: [
      ...all("ground", "+5 V-forward", "+5 V-reverse", "+12 V-forward", "+12 V-reverse"),
      {
        do: "record",
        line: "−12 V-forward",
        typed: "12 Ω",
        note: "U3 gets its pins mirrored: input and ground are swapped.",
      },
      { do: "record", line: "−12 V-forward", typed: "11.8 Ω", note: "Lifted C5, no change. It is the footprint." },
    ],
  },
  { daysAgo: 76, by: "bram", serial: "SUP-02", deeds: INSPECTION },
  {
    daysAgo: 75,
    by: "bram",
    serial: "SUP-02",
    deeds: all(
      "ground",
      "+5 V-forward",
      "+5 V-reverse",
      "+12 V-forward",
      "+12 V-reverse",
      "−12 V-forward",
      "−12 V-reverse",
    ),
  },
  { daysAgo: 72, by: "maud", serial: "SUP-02", deeds: all("inlet", "first-power", "rails") },
  {
    daysAgo: 70,
    by: "maud",
    serial: "SUP-02",
    deeds: [
      { do: "record", line: "ripple", typed: "64 mV", note: "Long ground lead. Again with the spring." },
      { do: "record", line: "ripple", typed: "14 mV" },
      ...all("warm", "ripple-picture", "monitor", "fold"),
    ],
  },
  { daysAgo: 69, by: "bram", serial: "BPL-01", deeds: all("power") },
  { daysAgo: 67, by: "bram", serial: "TIM-01", deeds: INSPECTION },
  {
    daysAgo: 66,
    by: "bram",
    serial: "TIM-01",
    deeds: all("ground", "+5 V-forward", "+5 V-reverse", "clock-lines", "phases-apart"),
  },
  { daysAgo: 63, by: "bram", serial: "TIM-01", deeds: all("first-power", "rail", "duty", "oscillator", "phases") },
  {
    daysAgo: 60,
    by: "bram",
    serial: "TIM-01",
    deeds: [
      { do: "record", line: "rise", typed: "15.6 ns", voided: "Probe stood on ×1." },
      { do: "record", line: "rise", typed: "7.4 ns" },
      ...all("divider", "reset", "slow-clock"),
    ],
  },
  { daysAgo: 55, by: "maud", serial: "TIM-01", deeds: all("with-supply") },
  { daysAgo: 50, by: "bram", serial: "CON-01", deeds: INSPECTION },
  {
    daysAgo: 48,
    by: "bram",
    serial: "CON-01",
    deeds: all("joints", "solder-side", "ground", "+5 V-forward", "+5 V-reverse", "ph7"),
  },
  {
    daysAgo: 46,
    by: "bram",
    serial: "CON-01",
    deeds: [
      { do: "record", line: "carry-apart", typed: "0.4 Ω", note: "Solder whisker under U6 between pins 12 and 13." },
      { do: "record", line: "carry-apart", typed: "OL", note: "Whisker cut with the scalpel." },
      ...all("inc-lines"),
    ],
  },
  { daysAgo: 43, by: "maud", serial: "CON-01", deeds: all("first-power", "rail", "warm", "noise") },
  { daysAgo: 39, by: "bram", serial: "CON-02", deeds: INSPECTION },
  { daysAgo: 36, by: "bram", serial: "CON-01", deeds: all("reset", "rise", "low-count", "carry") },
  {
    daysAgo: 34,
    by: "bram",
    serial: "CON-02",
    deeds: all("ground", "+5 V-forward", "+5 V-reverse", "ph7", "carry-apart", "inc-lines"),
  },
  { daysAgo: 29, by: "maud", serial: "CON-01", deeds: all("carry-trace", "setup", "full-rate", "with-timebase") },
  { daysAgo: 28, by: "bram", serial: "SIN-01", deeds: INSPECTION },
  { daysAgo: 26, by: "bram", serial: "PAN-01", deeds: INSPECTION },
  {
    daysAgo: 25,
    by: "bram",
    serial: "PAN-01",
    deeds: all("ground", "+5 V-forward", "+5 V-reverse", "switches", "lamps-lines", "ribbon"),
  },
  { daysAgo: 23, by: "maud", serial: "CON-02", deeds: all("first-power", "rail", "warm", "noise") },
  {
    daysAgo: 20,
    by: "bram",
    serial: "SIN-01",
    deeds: [
      ...all("ground", "+5 V-forward", "+5 V-reverse", "sockets"),
      { do: "record", line: "data-apart", typed: "820 kΩ", note: "Washed twice, comes back when it is damp." },
      ...all("address"),
    ],
  },
  { daysAgo: 18, by: "maud", serial: "BPL-01", deeds: all("far-rail", "terminators") },
  { daysAgo: 15, by: "bram", serial: "SUM-01", deeds: INSPECTION },
  { daysAgo: 13, by: "bram", serial: "PAN-01", deeds: all("first-power", "all-lamps", "lamp-current", "lamps") },
  {
    daysAgo: 11,
    by: "bram",
    serial: "CON-02",
    deeds: [
      { do: "record", line: "reset" },
      { do: "record", line: "rise", typed: "11.9 ns", note: "The edge rings a little. 100 MHz scope." },
    ],
  },
  { daysAgo: 9, by: "bram", serial: "SUM-01", deeds: all("ground", "+5 V-forward") },
  // This week. What was reworked stands in fault-story.ts.
  {
    daysAgo: 5,
    by: "bram",
    serial: "CON-01",
    deeds: [{ do: "record", line: "low-count", fails: true, note: "Lamp 7 goes on at 64 instead of 128." }],
  },
  {
    daysAgo: 5,
    by: "maud",
    serial: "SIN-01",
    deeds: [
      {
        do: "concede",
        line: "data-apart",
        reason: "All twelve lines are outputs of two parts that never float. Clean under U6 with the next rework.",
      },
    ],
  },
  {
    daysAgo: 4,
    by: "bram",
    serial: "CON-01",
    deeds: [
      ...all("joints", "solder-side", "ph7"),
      { do: "record", line: "carry-apart", typed: "OL" },
      { do: "record", line: "low-count", note: "W3 was on pin 11. Moved to pin 12." },
    ],
  },
  { daysAgo: 4, by: "bram", serial: "SIN-01", deeds: all("first-power") },
  {
    daysAgo: 3,
    by: "maud",
    serial: "CON-01",
    deeds: [
      { do: "reopen", line: "with-timebase", reason: "Passed before W3. Step it again with all 24 lamps in view." },
    ],
  },
  { daysAgo: 3, by: "bram", serial: "BPL-01", deeds: all("drop", "guides", "labels") },
  { daysAgo: 2, by: "bram", serial: "CON-02", deeds: all("low-count") },
  {
    daysAgo: 2,
    by: "bram",
    serial: "CON-02",
    deeds: [
      { do: "record", line: "carry", fails: true, note: "Bit 8 never comes on. CARRY_N stays high at the extender." },
    ],
  },
  { daysAgo: 1, by: "bram", serial: "SUM-01", deeds: all("+5 V-reverse", "in-pairs") },
];

export const LOG: { daysAgo: number; by: Person; serial?: string; title: string; body: string; pictures: string[] }[] =
  [
    {
      daysAgo: 92,
      by: "maud",
      serial: "BPL-01",
      title: "The backplane stands",
      body: "Eight connectors, 512 joints, two evenings. Row a is to the left in **every** slot; we marked it on the wood before we forget.\n\nNothing is shorted, the 5 V bar measures 40 mΩ from end to end.",
      pictures: ["backplane"],
    },
    {
      daysAgo: 86,
      by: "maud",
      serial: "SUP-01",
      title: "Why there is a revision B of the supply",
      body: "The −12 V regulator sits on a mirrored footprint. Resistance to ground was 12 Ω, so it never got power. Lesson: the unpowered reading in **both** directions found it in a minute.\n\n- regulator turned in revision B\n- sense lead now from the connector\n- TP7 for the current monitor",
      pictures: ["board-SUP"],
    },
    {
      daysAgo: 59,
      by: "bram",
      serial: "TIM-01",
      title: "First clock in the rack",
      body: "3.6864 MHz on the dot. The 15 ns rise time was the probe on ×1; with ×10 it is 7.4 ns.",
      pictures: ["scope-clock"],
    },
    {
      daysAgo: 28,
      by: "maud",
      serial: "CON-01",
      title: "M2 turns",
      body: "The first constituent counts all 24 bits at full rate. One turn of the phase takes 12.42 hours of tide, 18.6 ms of ours.",
      pictures: ["board-CON"],
    },
    {
      daysAgo: 12,
      by: "bram",
      serial: "PAN-01",
      title: "Lamps",
      body: "Thirty-two lamps, 238 mA with all of them on. Readable from the kettle.",
      pictures: ["panel"],
    },
    {
      daysAgo: 4,
      by: "bram",
      serial: "CON-01",
      title: "W3 was on the wrong pin",
      body: "Lamp 7 came on at 64. The white wire ended on U6 pin **11** instead of 12, one pin to the left, as things look from the solder side.\n\nMoved, measured, counted again, good. What depends on the count is in doubt until it is repeated.",
      pictures: ["solder-CON", "scope-carry"],
    },
    {
      daysAgo: 1,
      by: "maud",
      title: "What is left before the first tide",
      body: "1. Carry into bit 8 on the S2 card\n2. Repeat what W3 put in doubt on M2\n3. Memories into the sine table\n4. Summing card through continuity\n\nThe pen driver waits in its bag. **Keep the pen unplugged** until the first power is behind us.",
      pictures: ["board-OUT"],
    },
  ];
