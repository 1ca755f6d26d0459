import { describe, expect, it } from "vitest";
import { contentSecurityPolicy, plainSecurityHeaders } from "@/lib/http/security-headers";

const built = { nonce: "abc", isDevelopment: false, isHttps: true, ingestUrl: undefined };
const directive = (policy: string, name: string) => policy.split("; ").find((one) => one.startsWith(`${name} `));

describe("the content security policy", () => {
  it("runs scripts by nonce only, and evaluates text only in development", () => {
    expect(directive(contentSecurityPolicy(built), "script-src")).toBe(
      "script-src 'self' 'nonce-abc' 'strict-dynamic'",
    );
    expect(directive(contentSecurityPolicy({ ...built, isDevelopment: true }), "script-src")).toContain(
      "'unsafe-eval'",
    );
  });

  it("lets a page be framed by nobody and send forms to nobody else", () => {
    const policy = contentSecurityPolicy(built);
    for (const rule of ["frame-ancestors 'none'", "form-action 'self'", "base-uri 'self'", "object-src 'none'"]) {
      expect(policy.split("; ")).toContain(rule);
    }
  });

  it("lets files go to the object store, or to the stand-in that is named", () => {
    expect(directive(contentSecurityPolicy(built), "connect-src")).toBe(
      "connect-src 'self' https://*.ingest.uploadthing.com",
    );
    const local = contentSecurityPolicy({ ...built, ingestUrl: "http://localhost:4311/some/path" });
    expect(directive(local, "connect-src")).toBe("connect-src 'self' http://localhost:4311");
  });
});

describe("the other headers", () => {
  it("promise https only where there is https", () => {
    expect(plainSecurityHeaders(true)).toHaveProperty("strict-transport-security");
    expect(plainSecurityHeaders(false)).not.toHaveProperty("strict-transport-security");
    expect(plainSecurityHeaders(false)).toMatchObject({ "x-content-type-options": "nosniff" });
  });
});
