import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { DoubtPreview } from "@/lib/rework/doubt-view";
import type { previewReworkInput, recordReworkInput } from "@/lib/rework/schema";

export type ReworkActs = {
  preview: (input: z.input<typeof previewReworkInput>) => Promise<Reply<DoubtPreview>>;
  record: (
    input: z.input<typeof recordReworkInput>,
  ) => Promise<Reply<{ id: string; number: number; doubtful: number }>>;
};
