import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { sayBoardOrderInput, withdrawBoardOrderInput } from "@/lib/order/schema";
import type { prerequisiteInput } from "@/lib/prerequisite/schema";

type Act<Schema extends z.ZodType> = (input: z.input<Schema>) => Promise<Reply<unknown>>;

export type BoardOrderActs = {
  say: Act<typeof sayBoardOrderInput>;
  withdraw: Act<typeof withdrawBoardOrderInput>;
};

export type WaitActs = { add: Act<typeof prerequisiteInput>; remove: Act<typeof prerequisiteInput> };
