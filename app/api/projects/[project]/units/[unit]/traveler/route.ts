import { z } from "zod";
import { ok, refuse } from "@/lib/actions/answer";
import { defineRoute } from "@/lib/actions/define-route";
import { loadTraveler } from "@/lib/traveler/load-traveler";
import { NO_SUCH_UNIT } from "@/lib/traveler/start-unit-traveler";

/** The traveler as JSON, for the bench and for whoever looks on. */
export const GET = defineRoute({
  name: "read-traveler",
  permission: "project.see",
  input: z.object({ project: z.string(), unit: z.string() }),
  run: async (scope, input) => {
    const loaded = await loadTraveler(scope, input.unit);
    if (loaded.kind === "missing") return refuse("not-found", NO_SUCH_UNIT);
    if (loaded.kind === "none") return refuse("not-found", `${input.unit} has no traveler yet.`);
    return ok(loaded.traveler);
  },
});
