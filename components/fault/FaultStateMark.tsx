import { Badge } from "@/components/ui/Badge";
import type { Tone } from "@/components/ui/tone";
import type { FaultState } from "@/db/schema/faults";
import { STATE_WORDS } from "@/lib/fault/fault-words";

const TONES: Record<FaultState, Tone> = { open: "failed", traced: "doubtful", mended: "passed", "no-fault": "plain" };

/** How a fault stands, as a word. */
export function FaultStateMark({ state }: { state: FaultState }) {
  return <Badge tone={TONES[state]}>{STATE_WORDS[state]}</Badge>;
}
