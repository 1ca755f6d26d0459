/** Each family of rules in a sentence, what it follows, and what it does not see. */
export type RuleFamily = { name: string; looksAt: string; follows: string; leavesOut: string };

const PRACTICE = "Practice of the trade.";

export const RULE_FAMILIES: readonly RuleFamily[] = [
  {
    name: "Drivers",
    looksAt:
      "Two push-pull outputs on a net, outputs of different kinds together, three-state outputs without one exclusive enable group.",
    follows: `${PRACTICE} Short-circuit currents stand in every data sheet.`,
    leavesOut: "Whether the decoder behind a group really turns on one output at a time, and how long two overlap.",
  },
  {
    name: "Reach",
    looksAt: "Inputs that nothing drives, signals that reach one slot only, spare CMOS inputs that nobody tied.",
    follows: `${PRACTICE} CMOS data sheets ask for a level at every input.`,
    leavesOut: "What stands beyond a plug or a switch whose pins are not listed.",
  },
  {
    name: "Names and places",
    looksAt:
      "One net under several names, names that differ only in case, a connector listed the wrong way round (row a for c, pin n for 33 − n).",
    follows: "Pin names of IEC 60603-2; the rest is practice, no source.",
    leavesOut: "A whole bus that is shifted on every board alike: it is consistent, though wrong.",
  },
  {
    name: "Supplies",
    looksAt:
      "Rails joined, a supply on a signal net, ground missing, current per power contact, a rail that no pin brings.",
    follows: "Contact ratings and their derating by temperature as in DIN 41612 data sheets.",
    leavesOut: "Inrush, fuses, and how unequally the contacts of one rail share.",
  },
  {
    name: "Levels and loading",
    looksAt: "Noise margins high and low of every driver and receiver, voltages that inputs do not bear, DC fan-out.",
    follows: "JESD7-A and the makers' data sheets, worst case over temperature, at one supply for all cards.",
    leavesOut: "Ringing, crosstalk, and ground that differs between cards.",
  },
  {
    name: "Pull-ups",
    looksAt: "Open-drain nets without a pull-up, with several, or with one outside its window.",
    follows: "The formula of the data sheets of open-collector gates and of the I²C-bus specification (UM10204, 7.1).",
    leavesOut: "Resistors that are on no pin map, such as those inside a part.",
  },
  {
    name: "Edges and clocks",
    looksAt: "Fast edges without a ground pin nearby, clocks beside each other or beside a line that switches.",
    follows: "Common practice, no source.",
    leavesOut: "The layout of the boards: only the pins of the connectors are seen.",
  },
];
