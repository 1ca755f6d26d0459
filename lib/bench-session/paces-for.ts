import type { Paces } from "@/lib/calc/forecast";

/** One's own pace, and where there is none yet that of everybody at this project's bench. */
export const pacesFor = (own: Paces, everybody: Paces): Paces => ({
  inspection: own.inspection ?? everybody.inspection,
  continuity: own.continuity ?? everybody.continuity,
  "power-on": own["power-on"] ?? everybody["power-on"],
  function: own.function ?? everybody.function,
  integration: own.integration ?? everybody.integration,
});
