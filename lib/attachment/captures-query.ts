import { z } from "zod";
import type { CapturesQuery } from "./load-captures";
import { ATTACHMENT_KINDS } from "./schema";

const searchSchema = z.object({
  kind: z.enum(ATTACHMENT_KINDS).catch("scope-picture"),
  unit: z.string().min(1).max(60).optional().catch(undefined),
  page: z.coerce.number().int().min(1).max(100_000).catch(1),
});

/** What the captures page shows, from the address; what makes no sense there is left out. */
export function capturesQuery(search: Record<string, string | string[] | undefined>): CapturesQuery {
  const { kind, unit, page } = searchSchema.parse(search);
  return { kind, unit, page };
}
