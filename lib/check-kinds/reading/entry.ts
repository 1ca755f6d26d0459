import type { Entry } from "./schema";

export function isEntry(value: unknown): value is Entry {
  return typeof value === "object" && value !== null && "typed" in value && typeof value.typed === "string";
}
