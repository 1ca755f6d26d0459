import type { PersonView } from "./traveler-view";

export function personView(id: string | null, name: string | null): PersonView {
  return { id, name: name ?? "Somebody who left" };
}
