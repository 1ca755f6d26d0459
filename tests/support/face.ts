import { findConnector, type Connector } from "@/lib/calc/connector";

/** The face of this kind; a test that names one that does not exist is wrong. */
export function face(id: string): Connector {
  const found = findConnector(id);
  if (!found) throw new Error(`There is no connector ${id}.`);
  return found;
}
