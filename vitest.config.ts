import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL(".", import.meta.url));
const alias = { "@": root.replace(/\/$/, "") };

/** Three projects: pure (unit, standards) needs nothing; integration and access need the services of scripts/test.ts. */
export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      { resolve: { alias }, test: { name: "unit", include: ["tests/unit/**/*.test.{ts,tsx}"] } },
      { resolve: { alias }, test: { name: "standards", include: ["tests/standards/**/*.test.ts"] } },
      {
        resolve: { alias },
        test: {
          name: "integration",
          include: ["tests/integration/**/*.test.ts", "tests/access/**/*.test.ts"],
          fileParallelism: false,
          server: { deps: { inline: ["next-auth"] } },
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
