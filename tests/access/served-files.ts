import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { root } from "./exported-actions";

const under = (name: RegExp) =>
  readdirSync(join(root, "app"), { recursive: true, encoding: "utf8" })
    .map((file) => `app/${file}`)
    .filter((file) => name.test(file))
    .sort();

export const pageFiles = () => under(/\/page\.tsx?$/);

/** "METHOD file" for every method that a route handler answers. */
export function routeMethods(): string[] {
  return under(/\/route\.tsx?$/).flatMap((file) => {
    const source = readFileSync(join(root, file), "utf8");
    const direct = [...source.matchAll(/export (?:const|(?:async )?function) ([A-Z]+)\b/g)].map(([, name]) => name);
    const listed = [...source.matchAll(/export (?:const )?\{([^}]*)\}/g)]
      .flatMap(([, names]) => (names ?? "").split(","))
      .map((name) =>
        name
          .split(/\bas\b|:/)
          .at(-1)
          ?.trim(),
      );
    return [...direct, ...listed].filter((name) => /^[A-Z]+$/.test(name ?? "")).map((name) => `${name} ${file}`);
  });
}
