import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { keepNetlistInput } from "@/lib/netlist/schema";

export type KeptNetlist = { id: string; number: number };

/** Files are larger than what an action takes, so they go over a route of their own. */
export async function postNetlist(input: z.input<typeof keepNetlistInput>): Promise<Reply<KeptNetlist>> {
  const response = await fetch(`/api/projects/${encodeURIComponent(input.project)}/netlists`, {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify(input),
  });
  const body: unknown = await response.json();
  if (response.ok && isKept(body)) return { ok: true, value: body };
  const sentence = typeof body === "object" && body !== null && "detail" in body ? String(body.detail) : "";
  return { ok: false, error: { code: String(response.status), message: sentence || "The netlist was not kept." } };
}

const isKept = (body: unknown): body is KeptNetlist =>
  typeof body === "object" && body !== null && "id" in body && "number" in body;
