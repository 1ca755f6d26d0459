import type { Reply } from "@/components/ui/form/reply";
import type { z } from "zod";
import type { editFaultInput, openFaultInput, similarInput } from "@/lib/fault/schema";
import type { SimilarFault } from "@/lib/fault/find-similar";

export type FaultActs = {
  open: (input: z.input<typeof openFaultInput>) => Promise<Reply<{ number: number }>>;
  edit: (input: z.input<typeof editFaultInput>) => Promise<Reply<{ number: number; version: number }>>;
  similar: (input: z.input<typeof similarInput>) => Promise<Reply<SimilarFault[]>>;
};
