import { checkOf } from "./bench";
import { makeBoard, makeProject, makeUnit } from "./project";

export type Workshop = Awaited<ReturnType<typeof openWorkshop>>;

/** A project of its own for one test file, with one person a role, one unit and one check on its traveler. */
export async function openWorkshop() {
  const project = await makeProject({ roles: ["maintainer", "builder", "collaborator"] });
  const board = await makeBoard(project, "CON", [{ title: "Rise time of CLK" }]);
  const unit = await makeUnit(project.scopes.maintainer, board, "CON-01");
  const check = await checkOf(unit, "Rise time of CLK");
  const { id: projectId, slug, scopes, viewers } = project;
  return { projectId, slug, scopes, ...viewers, board, unit, check };
}
