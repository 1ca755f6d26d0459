import { DrizzleQueryError } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { loggableError } from "@/lib/http/loggable-error";

describe("an error in the log", () => {
  it("of a query keeps the query and the reason, and none of its values", () => {
    const reason = Object.assign(new Error("read ECONNRESET"), { code: "ECONNRESET", password: "hunter2" });
    const failed = new DrizzleQueryError("update users set password_hash = $1", ["$argon2id$secret\nand more"], reason);
    const kept = loggableError(failed);
    expect(JSON.stringify(kept)).not.toMatch(/argon2id|and more|hunter2/);
    expect(kept.message).toContain("update users set password_hash = $1");
    expect(kept.cause).toMatchObject({ code: "ECONNRESET", message: "read ECONNRESET" });
    expect(kept.stack).toContain("loggable-error.test.ts");
  });

  it("that is none is still told, and a ring of causes ends", () => {
    expect(loggableError("out of paper")).toEqual({ type: "string", message: "out of paper" });
    const ring = new Error("ring");
    ring.cause = ring;
    expect(JSON.stringify(loggableError(ring)).length).toBeLessThan(20_000);
  });
});
