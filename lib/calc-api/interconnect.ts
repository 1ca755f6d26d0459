import { checkMachine } from "@/lib/calc/interconnect";
import { defineCalculation, type Outcome } from "./define-calculation";
import { machineInput, MOST_CONNECTORS, MOST_PINS } from "./interconnect-input";
import { readMachineInput } from "./read-machine-input";

const bus = (pin: string, signal: string) => ({ pin, signal, role: "passive" as const });
const POWER = [
  { pin: "a1", signal: "GND", role: "ground" as const },
  { pin: "a2", signal: "+5V", role: "power" as const },
];

export const interconnect = defineCalculation({
  name: "interconnect",
  about: "The nets of boards that are plugged together, and everything that an electrical rule check finds in them.",
  source:
    "Rules of the trade, each with its reason in the finding; levels and loading by the makers' figures, pull-ups and contacts as in the calculations of those names. Pin names: IEC 60603-2 (DIN 41612).",
  leavesOut: "What lies behind the pins of a board, timing, the length of lines, acceptances that people gave.",
  most: `${MOST_CONNECTORS} connectors as they stand in the machine, ${MOST_PINS} pins each.`,
  input: machineInput,
  example: {
    boards: [
      {
        code: "BPL",
        kind: "backplane",
        connectors: [
          { reference: "X1", type: "din41612-b64", pins: [...POWER, bus("a10", "PH6")] },
          { reference: "X2", type: "din41612-b64", pins: [...POWER, bus("a10", "PH6")] },
        ],
      },
      {
        code: "CON",
        connectors: [
          {
            reference: "J1",
            type: "din41612-b64",
            pins: [...POWER, { pin: "a10", signal: "PH6", role: "push-pull output", family: "HC" }],
          },
        ],
      },
    ],
    placements: [
      { id: "backplane", board: "BPL" },
      { id: "CON-01", board: "CON", slot: 1 },
      { id: "CON-02", board: "CON", slot: 2 },
    ],
    matings: [
      { from: { placement: "backplane", connector: "X1" }, to: { placement: "CON-01", connector: "J1" } },
      { from: { placement: "backplane", connector: "X2" }, to: { placement: "CON-02", connector: "J1" } },
    ],
    rails: [{ name: "+5V", volts: 5 }],
  },
  run: (given): Outcome => {
    const read = readMachineInput(given);
    if (!read.ok) return read;
    const { nets, findings } = checkMachine(read.machine);
    const listed = nets.map(({ id, name, names, pins }) => ({
      ...{ id, name, names },
      pins: pins.map(({ placement, connector, pin, signal, role }) => ({ placement, connector, pin, signal, role })),
    }));
    return { ok: true, result: { findings, nets: listed } };
  },
});
