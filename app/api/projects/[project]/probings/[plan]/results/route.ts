import { defineRoute } from "@/lib/actions/define-route";
import { readProbes } from "@/lib/probing/read-probes";
import { sayProbes } from "@/lib/probing/say-probes";
import { readProbesInput, sayProbesInput } from "@/lib/probing/schema";

export const GET = defineRoute({
  name: "read-probes",
  permission: "project.see",
  input: readProbesInput,
  run: readProbes,
});

/** Plain JSON, so that results held on a device survive a new build of the application. */
export const POST = defineRoute({
  name: "say-probes",
  permission: "attempt.record",
  input: sayProbesInput,
  run: sayProbes,
});
