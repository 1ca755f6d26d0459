import { familyAt, findFamily } from "../levels";
import { lineOf, pullUpWindow, type Line, type PullUpWindow } from "../pull-up";
import type { Machine } from "./machine";
import { capacitancePf, inputsOf, outputsOf, type FamilyOf } from "./net-currents";
import type { NetStudy } from "./study-net";
import type { Survey } from "./survey";

/** Share of the period that a rise may take where the signal's frequency is known; common practice, no source. */
const RISE_OF_PERIOD = 0.25;

/**
 * The open-drain line that the net is, with every family at the lowest supply; undefined when no output's family is
 * known. The rise time counts only where somebody has said how often the signal changes.
 */
export function pullUpLine(survey: Survey, study: NetStudy): Line | undefined {
  const { machine } = survey.index;
  const supply = logicSupply(machine);
  const lowest: FamilyOf = (name) => {
    const found = findFamily(machine.families, name);
    const moved = found && familyAt(found, supply.minVolts);
    return moved?.ok ? moved.value : survey.family(name);
  };
  const outputs = outputsOf(study.drivers, lowest);
  if (outputs.length === 0) return undefined;
  const pf = capacitancePf(survey, study) ?? 0;
  const frequencyHz = survey.signal(study.net.name)?.frequencyHz ?? null;
  const line = lineOf(outputs, inputsOf(study.receivers, lowest), {
    supply,
    capacitancePf: pf,
    definition: "10–90 %",
    riseLimitS: frequencyHz !== null && frequencyHz > 0 && pf > 0 ? RISE_OF_PERIOD / frequencyHz : null,
    tolerancePercent: 0,
    marginVolts: 0,
  });
  return line.ok ? line.value : undefined;
}

export function netPullUpWindow(survey: Survey, study: NetStudy): PullUpWindow | undefined {
  const line = pullUpLine(survey, study);
  const answer = line && pullUpWindow(line);
  return answer?.ok ? answer.value : undefined;
}

function logicSupply({ rails, conditions }: Machine) {
  const tolerance = (rails.find(({ name }) => name === conditions.logicRail)?.tolerancePercent ?? 0) / 100;
  const { logicVolts } = conditions;
  return { minVolts: logicVolts * (1 - tolerance), maxVolts: logicVolts * (1 + tolerance) };
}
