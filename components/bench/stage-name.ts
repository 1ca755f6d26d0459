import type { Stage } from "@/db/schema/procedures";

export const STAGES: readonly Stage[] = ["inspection", "continuity", "power-on", "function", "integration"];

const NAMES: Record<Stage, string> = {
  inspection: "Inspection",
  continuity: "Continuity",
  "power-on": "Power-on",
  function: "Function",
  integration: "Integration",
};

export const stageName = (stage: Stage): string => NAMES[stage];
