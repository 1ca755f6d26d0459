import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { dealPunchInput, reopenPunchInput, takePunchInput } from "@/lib/punch/schema";

export type PunchActs = {
  take: (input: z.input<typeof takePunchInput>) => Promise<Reply<{ items: number }>>;
  deal: (input: z.input<typeof dealPunchInput>) => Promise<Reply<{ id: string; version: number }>>;
  reopen: (input: z.input<typeof reopenPunchInput>) => Promise<Reply<{ id: string; version: number }>>;
};
