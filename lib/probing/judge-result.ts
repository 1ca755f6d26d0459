import type { RoundProbe } from "./round-view";

type Said = { beeps: boolean | null; ohm: number | null };
type Limits = { joinedOhm: number; apartOhm: number };

/** Whether a result is what the netlist says. A beep stands for joined, silence for apart. */
export function isAsExpected({ expect }: Pick<RoundProbe, "expect">, { beeps, ohm }: Said, limits: Limits): boolean {
  if (expect === "joined") return beeps ?? (ohm !== null && ohm <= limits.joinedOhm);
  return beeps === null ? ohm !== null && ohm >= limits.apartOhm : !beeps;
}
