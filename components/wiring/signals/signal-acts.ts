import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { SignalClass } from "@/lib/calc/interconnect";
import type { removeSignalInput, saveSignalInput } from "@/lib/signal/schema";

export type SaveSignal = (input: z.input<typeof saveSignalInput>) => Promise<Reply<{ version: number }>>;
export type RemoveSignal = (input: z.input<typeof removeSignalInput>) => Promise<Reply<{ name: string }>>;

/** What the form begins with: what is said of a signal, or nothing yet. */
export type SignalSaid = {
  name: string;
  class: SignalClass;
  aliases: readonly string[];
  frequency: string;
  note: string;
  version: number;
};

export const CLASS_OPTIONS: { id: SignalClass; label: string; description: string }[] = [
  { id: "data", label: "Data", description: "A line that switches and is read when it has settled." },
  { id: "control", label: "Control", description: "Select, enable, reset: levels that choose." },
  { id: "clock", label: "Clock", description: "Its edges count. It wants ground beside it." },
  { id: "analogue", label: "Analogue", description: "A voltage that means a value; no logic levels." },
  { id: "power", label: "Power", description: "A supply." },
  { id: "ground", label: "Ground", description: "The return of all others." },
];
