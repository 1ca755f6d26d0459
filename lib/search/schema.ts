import { z } from "zod";

export const searchInput = z.object({
  project: z.string(),
  q: z.string({ message: "Say what to look for." }).trim().max(200, "At most 200 characters fit here.").default(""),
});
export type SearchInput = z.output<typeof searchInput>;

export const HIT_KINDS = ["board", "unit", "check", "signal", "fault", "log"] as const;

export const searchHit = z.object({
  kind: z.enum(HIT_KINDS),
  /** Unique in one answer. */
  id: z.string(),
  title: z.string(),
  /** Where it belongs: "CON-02 · Function". */
  detail: z.string(),
  /** State of a check, for its glyph. */
  state: z.enum(["waiting", "untested", "passed", "failed", "reopened", "doubtful", "conceded"]).nullable(),
  href: z.string(),
});
export type SearchHit = z.output<typeof searchHit>;

export const searchAnswer = z.object({ q: z.string(), hits: z.array(searchHit), cut: z.boolean() });
export type SearchAnswer = z.output<typeof searchAnswer>;
