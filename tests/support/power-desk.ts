import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { savePowerLine } from "@/lib/power/save-power-line";
import { savePowerLineInput } from "@/lib/power/schema";
import { saveRail } from "@/lib/rail/save-rail";
import { saveRailInput } from "@/lib/rail/schema";
import { typedRail } from "@/lib/rail/typed-rail";

const write = ({ slug }: ProjectScope) => ({ project: slug, writeId: randomUUID() });

/** Adds a rail, or changes one, as its form does; without more it is +5V with 3 A. */
export const keepRail = (scope: ProjectScope, typed: object = {}) =>
  saveRail(
    scope,
    saveRailInput.parse({
      ...{ ...write(scope), rail: "", version: 0, ...typedRail() },
      ...{ name: "+5V", volts: "5 V", capacityA: "3 A" },
      ...typed,
    }),
  );

export const LAMPS = {
  ...{ kind: "led", label: "Phase lamps", rail: "+5V", count: "8", forwardVolts: "2 V", ohm: "500" },
  ...{ litTypical: "50 %", litWorst: "100 %" },
};

export const wholeBoard = (typicalA: string, worstA: string, rail = "+5V") => ({
  kind: "whole",
  label: "measured",
  ...{ rail, typicalA, worstA },
});

type Given = { board: string; typed: object; line?: string; seen?: unknown };

/** Adds what a board draws, or changes a line, as the form does. */
export const keepLine = (scope: ProjectScope, { board, typed, line = "", seen = null }: Given) =>
  savePowerLine(scope, savePowerLineInput.parse({ ...write(scope), board, line, seen, typed }));
