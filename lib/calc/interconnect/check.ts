import { joinNets, type Crossing } from "./assemble-nets";
import { findTurned } from "./find-turned";
import type { Finding } from "./finding";
import { indexMachine } from "./index-machine";
import type { Machine } from "./machine";
import type { Net } from "./net";
import { RULES } from "./rules";
import { mirrored } from "./rules/mirrored";
import { settleFindings } from "./settle-findings";
import { signalBook } from "./signal-book";
import { surveyMachine } from "./survey";
import { turnedPins } from "./turns";

export type MachineCheck = { nets: Net[]; findings: Finding[] };

/**
 * The nets of the assembled machine as they are listed, and everything the rules find. Near-linear in the number of pins;
 * the answer does not depend on the order of boards, placements, matings or pins. A machine that is not whole, or that
 * names what it does not have, gets the findings that can be made; nothing throws.
 *
 * Where a connector is listed mirrored that is one finding, and the rules look at the nets as if it were turned round.
 */
export function checkMachine(machine: Machine): MachineCheck {
  const index = indexMachine(machine);
  const nets = joinNets(index);
  const turned = findTurned(index, signalBook(machine));
  const survey = surveyMachine(index, turned.length === 0 ? nets : joinNets(index, crossings(turned)));
  const drafts = [...mirrored(survey, turned), ...RULES.flatMap((rule) => rule(survey))];
  return { nets, findings: settleFindings(drafts) };
}

export const checkRules = (machine: Machine): Finding[] => checkMachine(machine).findings;

function crossings(turned: ReturnType<typeof findTurned>): Crossing {
  const turns = new Map(turned.map(({ meeting, turn }) => [meeting, turn]));
  return (meeting) => {
    const turn = turns.get(meeting);
    if (!turn) return undefined;
    const met = turnedPins(meeting.from.connector.face, meeting.to.connector.face, turn);
    return (pin) => met.get(pin) ?? "";
  };
}
