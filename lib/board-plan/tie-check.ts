import type { SpareGate } from "@/lib/calc/packing";

/** Kept under this name, so that the same check is found and changed when other gates are left over. */
export const TIE_CHECK_TITLE = "Spare gates are tied";
/** What fits into an instruction, less the sentence that says that there is more. */
const MOST = 3800;

/** The inspection check that lists the ties, as the procedure editor's form would hold it. */
export function tieCheck(board: string, spares: readonly SpareGate[]) {
  return {
    stage: "inspection" as const,
    title: TIE_CHECK_TITLE,
    instruction: tieInstruction(board, spares),
    caution: "",
    reference: "Common practice, no source",
    holdPoint: false,
    kind: "statement" as const,
    typed: { expects: `${spares.length === 1 ? "the tie" : `all ${spares.length} ties`} as listed, outputs open` },
    covers: { signals: [], pins: [], rails: [], blocks: [] },
    needs: [],
  };
}

function tieInstruction(board: string, spares: readonly SpareGate[]): string {
  const lines = ["Look for the ties of the spare gates:"];
  for (const [index, { sentence }] of spares.entries()) {
    if (lines.join("\n").length + sentence.length > MOST) {
      lines.push(`… and ${spares.length - index} more, listed in the plan of ${board}.`);
      break;
    }
    lines.push(sentence);
  }
  return lines.join("\n");
}
