import { checkOf, must, send } from "./bench";
import { makeBoard, makeProject, makeUnit } from "./project";

const CHECKS = [
  { title: "No bridges under the lens", stage: "inspection" as const },
  { title: "5 V rail to ground", limits: "200 Ω … 2 kΩ", stage: "continuity" as const, holdPoint: true },
  { title: "5 V rail, no load", limits: "4.75 … 5.25 V" },
];

/** A supply card with a look, a hold point and a rail, and the people who may record on it. */
export async function supplyBench(options: Parameters<typeof makeProject>[0] = {}) {
  const project = await makeProject(options);
  const board = await makeBoard(project, "PSU", CHECKS);
  const unit = await makeUnit(project.scopes.maintainer, board, "PSU-01");
  return { project, board, unit, builder: project.scopes.builder, maintainer: project.scopes.maintainer };
}

/** The rail, once the hold point before it has passed. */
export async function pastTheHold(given: Awaited<ReturnType<typeof supplyBench>>) {
  await must(send(given.builder, (await checkOf(given.unit, "5 V rail to ground")).id, { record: { typed: "1k2" } }));
  return checkOf(given.unit, "5 V rail, no load");
}
