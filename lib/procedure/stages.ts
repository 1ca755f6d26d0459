import type { Stage } from "@/db/schema/procedures";

/** In the order of the work. `short` stands above a strip of glyphs, where room is scarce. */
export const STAGES: readonly { id: Stage; name: string; short: string; about: string }[] = [
  { id: "inspection", name: "Inspection", short: "Inspect", about: "By eye, before a meter touches it." },
  { id: "continuity", name: "Continuity", short: "Continuity", about: "Unpowered, with the ohmmeter." },
  { id: "power-on", name: "Power-on", short: "Power-on", about: "First power behind a current limit, then the rails." },
  { id: "function", name: "Function", short: "Function", about: "On its own: clock, reset, what it is for." },
  { id: "integration", name: "Integration", short: "Together", about: "In its slot, with proven neighbours." },
];

export function stageName(stage: Stage): string {
  return STAGES.find((entry) => entry.id === stage)?.name ?? stage;
}
