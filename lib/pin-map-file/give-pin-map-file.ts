import { z } from "zod";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, type Answer } from "@/lib/actions/answer";
import { composeFile } from "./compose-file";
import { nameOf } from "./resolve-target";
import { loadTakeSources } from "./load-take-sources";
import { withFaces } from "./with-faces";

export const pinMapFileInput = z.object({
  project: z.string(),
  /** Left away: every connector of the machine. */
  connector: z.uuid({ message: "Name the connector by its id." }).optional(),
});
type PinMapFileInput = z.output<typeof pinMapFileInput>;

/** One pin map, or all of them, as a CSV file that the same project takes back unchanged. */
export async function givePinMapFile(scope: ProjectScope, input: PinMapFileInput): Promise<Answer<never> | Response> {
  const { sources } = await loadTakeSources(scope);
  const wanted = sources.filter(({ id }) => input.connector === undefined || id === input.connector);
  const [first] = wanted;
  if (input.connector !== undefined && !first) {
    return refuse("not-found", "There is no such connector in this project.");
  }
  const what = input.connector !== undefined && first ? nameOf(first).replace(" ", "-") : "pin-maps";
  const name = `${scope.slug}-${what}.csv`.replace(/[^\w.-]+/g, "_");
  return new Response(composeFile(withFaces(wanted)), {
    headers: {
      "content-type": "text/csv; charset=utf-8; header=present",
      "content-disposition": `attachment; filename="${name}"`,
      "cache-control": "no-store",
      "x-content-type-options": "nosniff",
    },
  });
}
