import { z } from "zod";
import { EVENT_GROUPS } from "@/lib/event/event-group";
import type { LogQuery } from "./load-log";

const searchSchema = z.object({
  show: z.enum(EVENT_GROUPS).optional().catch(undefined),
  unit: z.string().min(1).max(60).optional().catch(undefined),
  by: z.uuid().optional().catch(undefined),
  before: z.coerce.number().int().positive().max(Number.MAX_SAFE_INTEGER).optional().catch(undefined),
});

/** The filters of the log from the address; what makes no sense there is left out. */
export function logQuery(search: Record<string, string | string[] | undefined>): LogQuery {
  const { show, unit, by, before } = searchSchema.parse(search);
  return { show, unit, by, before };
}
