import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { root } from "./run-typescript";

/** Next.js writes its build folder into files of the project: for a throw-away build they are put back. */
export async function keepingFiles<T>(names: string[], work: () => Promise<T>): Promise<T> {
  const kept = names.map((name) => join(root, name)).filter((file) => existsSync(file));
  const before = kept.map((file) => ({ file, content: readFileSync(file) }));
  try {
    return await work();
  } finally {
    for (const { file, content } of before) {
      if (!existsSync(file) || !readFileSync(file).equals(content)) writeFileSync(file, content);
    }
  }
}
