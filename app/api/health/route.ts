import { z } from "zod";
import { defineRoute } from "@/lib/actions/define-route";
import { recentHealth } from "@/lib/health/recent-health";

export const dynamic = "force-dynamic";

/** 200 while people can work, 503 when they cannot; a missing worker is said but takes no app out of service. */
export const GET = defineRoute({
  name: "health",
  permission: "public",
  input: z.object({}),
  run: async () => {
    const health = await recentHealth();
    return Response.json(health, {
      status: health.status === "down" ? 503 : 200,
      headers: { "cache-control": "no-store" },
    });
  },
});
