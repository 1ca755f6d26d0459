import { database } from "@/db/client";
import { findStandingChecks } from "@/db/queries/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { byName } from "@/lib/calc/check-graph";
import { standingFromRow } from "@/lib/check/standing-from-row";
import { layOutGraph } from "./lay-out-graph";
import type { CheckBox, CheckName, WaitLine, WaitsView } from "./waits-view";

const BOX = { width: 196, height: 54 };

/** Which check waits for which, over all units: what people said, without what hold points do by themselves. */
export async function loadWaits(scope: ProjectScope): Promise<WaitsView> {
  const checks = (await findStandingChecks(database(), scope.projectId)).map(standingFromRow);
  const named = new Map(
    checks.map(({ id, serial, title, stage, state }): [string, CheckName] => [
      id,
      { checkId: id, serial, title, stage, state },
    ]),
  );
  const waits = checks
    .flatMap((check) =>
      check.needs.flatMap((id): WaitLine[] => {
        const [own, needs] = [named.get(check.id), named.get(id)];
        return own && needs ? [{ check: own, needs }] : [];
      }),
    )
    .sort((a, b) => byName(a.check.serial, b.check.serial) || byName(a.check.title, b.check.title));
  const drawn = [...new Set(waits.flatMap(({ check, needs }) => [check.checkId, needs.checkId]))];
  const { boxes, ...drawing } = layOutGraph(
    drawn.map((id) => ({ id, ...BOX })),
    waits.map(({ check, needs }) => ({ from: needs.checkId, to: check.checkId })),
  );
  return {
    waits,
    checks: [...named.values()].sort((a, b) => byName(a.serial, b.serial)),
    holdPoints: checks.filter(({ holdPoint, lifted }) => holdPoint && !lifted).length,
    drawing: {
      ...drawing,
      boxes: boxes.flatMap((box): CheckBox[] => {
        const name = named.get(box.id);
        return name ? [{ ...box, ...name }] : [];
      }),
    },
  };
}
