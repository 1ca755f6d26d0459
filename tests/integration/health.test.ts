import { describe, expect, it, vi } from "vitest";
import packageFile from "@/package.json";
import { checkHealth } from "@/lib/health/check-health";
import * as store from "@/lib/storage/object-store";
import { useDatabase } from "../support/database";
import { until } from "../support/digest";
import { startWorkerProcess } from "../support/worker";

useDatabase();

describe("how everything is", () => {
  it("says that mail waits while no worker runs, and that all is well once one does", { timeout: 60_000 }, async () => {
    const before = await checkHealth();
    expect(before).toMatchObject({
      status: "degraded",
      version: packageFile.version,
      database: { status: "up" },
      queue: { status: "no-worker" },
      objectStore: { status: "up" },
    });
    const worker = startWorkerProcess();
    const health = await until(checkHealth, ({ status }) => status === "up");
    expect(health.queue.status).toBe("up");
    worker.process.kill("SIGTERM");
    await worker.ended;
  });

  it("does not wait for an object store that hangs", async () => {
    const hanging = vi.spyOn(store, "listObjects").mockReturnValue(new Promise(() => undefined));
    const health = await checkHealth(50);
    hanging.mockRestore();
    expect(health).toMatchObject({ status: "down", objectStore: { status: "down" } });
  });

  it("tells no address, no key and no reason to strangers", async () => {
    const said = JSON.stringify(await checkHealth());
    for (const secret of [
      "postgres:",
      "localhost",
      "127.0.0.1",
      process.env.RESEND_API_KEY ?? "",
      process.env.AUTH_SECRET ?? "",
    ])
      expect(said).not.toContain(secret);
  });
});
