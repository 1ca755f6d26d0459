import { ESLint } from "eslint";
import { describe, expect, it } from "vitest";

const eslint = new ESLint();

async function rulesBroken(filePath: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(code, { filePath });
  return (result?.messages ?? []).map((message) => message.ruleId ?? "");
}

describe("the arrows of the architecture", () => {
  it.each([
    ["components/rack/Example.tsx", 'import "@/app/Providers";'],
    ["components/rack/Example.tsx", 'import "@/db/client";'],
    ["lib/board/example.ts", 'import "@/app/Providers";'],
    ["db/queries/example.ts", 'import "@/lib/access/permissions";'],
    ["lib/calc/units/example.ts", 'import "@/lib/env";'],
    ["emails/parts/Example.tsx", 'import "@/lib/env";'],
    ["app/example.ts", 'import "@/scripts/services";'],
  ])("%s may not say %s", async (file, code) => {
    expect(await rulesBroken(file, code)).toContain("import/no-restricted-paths");
  });

  it.each([
    ["lib/board/example.ts", 'import "@/components/ui/Button";'],
    ["lib/board/example.ts", 'import "./utils";'],
    ["components/rack/Example.tsx", 'import "@/lib/helpers/text";'],
  ])("%s may not say %s either", async (file, code) => {
    expect(await rulesBroken(file, code)).toContain("no-restricted-imports");
  });

  it.each([
    ["components/rack/Example.tsx", 'import { loadRack } from "@/lib/rack/load-rack"; loadRack();'],
    ["components/rack/Example.tsx", 'import { units } from "@/db/schema/boards"; console.log(units);'],
  ])("%s may take types, but not %s", async (file, code) => {
    expect(await rulesBroken(file, code)).toContain("@typescript-eslint/no-restricted-imports");
  });

  it.each([
    ["components/rack/Example.tsx", 'import "@/lib/calc/units";'],
    ["db/queries/example.ts", 'import "@/lib/env";'],
    ["lib/check-kinds/reading/Example.tsx", 'import "@/components/ui/Button";'],
    ["app/example.ts", 'import "@/lib/access/permissions";'],
  ])("%s may say %s", async (file, code) => {
    expect(await rulesBroken(file, code)).toEqual([]);
  });
});
