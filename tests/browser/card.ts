import type { Role } from "@/db/schema/projects";
import { makeBoard, makeProject, makeUnit, type CheckGiven } from "../support/project";

/** One check of every kind, the first a hold point. */
export const ONE_OF_EACH: CheckGiven[] = [
  { title: "Look over the solder joints", stage: "inspection", holdPoint: true, instruction: "Tilt it to the light." },
  {
    title: "Photograph the solder side",
    stage: "inspection",
    kind: "photo",
    typed: { expects: "whole board, sharp", minimum: "1" },
  },
  { title: "Supply rail under load", stage: "power-on", limits: "4.75 … 5.25 V" },
  {
    title: "Rails at both ends",
    stage: "power-on",
    kind: "table",
    typed: {
      columns: ["near", "far"],
      rows: [{ label: "+5 V", unit: "V", limits: "4.75 … 5.25 V", cells: ["", ""] }],
    },
  },
  { title: "Clock at the buffer", stage: "function", kind: "capture", typed: { expects: "CLK at U3 pin 9" } },
];

/** A project with one person a role, and one card whose traveler has the given checks. */
export async function makeCard(checks: readonly CheckGiven[] = ONE_OF_EACH, serial = "TIM-01") {
  const project = await makeProject<Role>({ roles: ["maintainer", "builder", "collaborator"] });
  const board = await makeBoard(project, "TIM", checks);
  const unit = await makeUnit(project.scopes.maintainer, board, serial);
  const at = (path: string) => `/projects/${project.slug}${path}`;
  return { ...project, board, unit, bench: at(`/bench/${serial}`), traveler: at(`/units/${serial}`), at };
}
