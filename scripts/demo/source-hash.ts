import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { root } from "../run-typescript";

/** What a build is made from. Generated files and what only scripts and tests use are left out. */
const folders = ["app", "components", "db", "emails", "lib", "public"];
const topFiles = /^(package-lock\.json|tsconfig\.json|[\w.-]+\.(?:ts|mjs|js))$/;
const generated = new Set(["next-env.d.ts", "public/sw.js", "eslint.config.mjs", "drizzle.config.ts"]);
const notBuilt = /^db\/(migrations|seed)\/|^(vitest|playwright)\.config/;

function filesBelow(path: string): string[] {
  if (!existsSync(join(root, path))) return [];
  if (!statSync(join(root, path)).isDirectory()) return [path];
  return readdirSync(join(root, path)).flatMap((name) => filesBelow(`${path}/${name}`));
}

/** Changes exactly when a file that the build reads changes. */
export function sourceHash(): string {
  const top = readdirSync(root).filter((name) => topFiles.test(name));
  const files = [...top, ...folders.flatMap(filesBelow)]
    .filter((file) => !generated.has(file) && !notBuilt.test(file))
    .sort();
  const hash = createHash("sha256");
  for (const file of files)
    hash
      .update(`${file}\0`)
      .update(readFileSync(join(root, file)))
      .update("\0");
  return hash.digest("hex");
}
