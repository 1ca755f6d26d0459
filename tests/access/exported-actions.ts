import { readdirSync, readFileSync } from "node:fs";
import { join, resolve } from "node:path";

export const root = resolve(import.meta.dirname, "../..");

/** Every file of the program whose exports a browser can call. */
export function actionFiles(): string[] {
  return ["app", "components", "lib"]
    .flatMap((folder) =>
      readdirSync(join(root, folder), { recursive: true, encoding: "utf8" }).map((name) => `${folder}/${name}`),
    )
    .filter((name) => /\.tsx?$/.test(name))
    .filter((name) => /^["']use server["']/m.test(readFileSync(join(root, name), "utf8")))
    .sort();
}
