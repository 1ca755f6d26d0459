import { checkMachine, type Machine, type MachineCheck } from "@/lib/calc/interconnect";
import type { ChangedPins } from "./check-messages";

/** The rule check over the machine as it would be with what was typed. */
export function checkChanged(machine: Machine, changed: ChangedPins): MachineCheck {
  const boards = machine.boards.map((board) => ({
    ...board,
    connectors: board.connectors.map((connector) => {
      const pins = changed[connector.id];
      return pins ? { ...connector, pins } : connector;
    }),
  }));
  return checkMachine({ ...machine, boards });
}
