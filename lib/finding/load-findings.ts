import { z } from "zod";
import { database } from "@/db/client";
import { findFindings, hasAnyPin } from "@/db/queries/findings";
import type { ProjectScope } from "@/lib/access/scope";
import type { PinAt, Weight } from "@/lib/calc/interconnect";

/** A finding as the machine's findings show it. */
export type FindingView = {
  key: string;
  rule: string;
  weight: Weight;
  title: string;
  why: string;
  mend: string;
  pins: PinAt[];
  boards: string[];
  facts: string;
  foundAt: string;
  /** Who let it stay as it is, when and why; null while it is open. */
  accepted: { by: string; at: string; reason: string } | null;
};

/** What refreshFindings stored: a Finding of lib/calc/interconnect. */
const stored = z.object({
  title: z.string(),
  why: z.string(),
  mend: z.string(),
  weight: z.enum(["must", "should", "look"]),
  boards: z.array(z.string()),
  pins: z.array(
    z.object({
      placement: z.string(),
      label: z.string(),
      board: z.string(),
      connector: z.string(),
      connectorId: z.string(),
      pin: z.string(),
      signal: z.string(),
    }),
  ),
});

/** Every finding of the last run of the rule check, the weightiest first, and whether there was anything to check. */
export async function loadFindings(scope: ProjectScope): Promise<{ findings: FindingView[]; hasPins: boolean }> {
  const db = database();
  const [rows, hasPins] = await Promise.all([findFindings(db, scope), hasAnyPin(db, scope)]);
  const findings = rows.map((row) => ({
    ...stored.parse(row.finding),
    key: row.key,
    rule: row.rule,
    facts: row.facts,
    foundAt: row.foundAt.toISOString(),
    accepted:
      row.state === "accepted" && row.acceptedAt
        ? { by: row.acceptedBy ?? "Somebody", at: row.acceptedAt.toISOString(), reason: row.reason }
        : null,
  }));
  return { findings, hasPins };
}
