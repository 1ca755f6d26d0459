import { randomUUID } from "node:crypto";
import { savePowerLine } from "@/lib/power/save-power-line";
import { savePowerLineInput } from "@/lib/power/schema";
import { saveRail } from "@/lib/rail/save-rail";
import { saveRailInput } from "@/lib/rail/schema";
import { must } from "../../support/bench";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const permission = "wiring.edit";

const rail = {
  rail: "",
  version: 0,
  name: "+12V",
  volts: "12 V",
  tolerancePercent: "5 %",
  capacityA: "1 A",
  source: "inlet",
  segmentMm: "",
  widthMm: "",
  thicknessUm: "",
};
const line = {
  board: "TIM",
  line: "",
  seen: null,
  typed: { kind: "whole", label: "", rail: "+5V", typicalA: "80 mA", worstA: "0.12 A" },
};

const write = ({ slug }: Machine) => ({ project: slug, writeId: randomUUID() });

export const powerRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/wiring/power/actions.ts": {
    saveConditions: {
      permission,
      input: () => ({
        version: 0,
        ambientC: "50 °C",
        logicVolts: "5 V",
        logicRail: "+5V",
        pinCapacitancePf: "5 pF",
        sparesPercent: "10 %",
        currency: "EUR",
      }),
    },
    saveRail: { permission, input: () => rail },
    removeRail: {
      permission,
      input: async (machine) => {
        const input = saveRailInput.parse({ ...write(machine), ...rail });
        const { id, version } = await must(saveRail(machine.scopes.builder, input));
        return { rail: id, version };
      },
    },
    savePowerLine: { permission, input: () => line },
    removePowerLine: {
      permission,
      input: async (machine) => {
        const input = savePowerLineInput.parse({ ...write(machine), ...line });
        const saved = await must(savePowerLine(machine.scopes.builder, input));
        return { board: "TIM", line: saved.line, seen: saved.item };
      },
    },
  },
};
