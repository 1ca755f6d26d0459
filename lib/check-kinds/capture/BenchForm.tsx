import { StatedForm } from "@/components/bench/StatedForm";
import type { BenchFormProps } from "../kind";
import type { StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

/** The two buttons are the frame's. Here stands only what was stated and cannot be recorded yet. */
export function BenchForm({ draft, judged }: BenchFormProps<Spec, StatedEntry>) {
  return <StatedForm conforms={draft.conforms} judged={judged} />;
}
