import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { writePinMap } from "@/lib/pin-map/save-pin-map";
import type { TakePinMapsInput } from "@/lib/pin-map/schema";

type Taken = { connectors: number; pins: number };

/** Takes the rows of a file that were looked at and confirmed, onto the versions that were looked at: all or none. */
export async function takePinMaps(scope: ProjectScope, input: TakePinMapsInput): Promise<Answer<Taken>> {
  const write = { writeId: input.writeId, userId: scope.viewer.userId, action: "take-pin-maps" };
  return change(write, async (tx) => {
    const taken: Taken = { connectors: 0, pins: 0 };
    // In one order for everybody, so that two takes at once wait for each other instead of blocking each other.
    const ordered = [...input.connectors].sort((a, b) => (a.connectorId < b.connectorId ? -1 : 1));
    for (const connector of ordered) {
      const { pins } = await writePinMap(tx, scope, connector);
      taken.pins += pins;
      taken.connectors += pins > 0 ? 1 : 0;
    }
    if (taken.pins > 0) await refreshFindings(tx, scope);
    return taken;
  });
}
