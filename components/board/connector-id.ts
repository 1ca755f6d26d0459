import { isConnectorId, type ConnectorId } from "@/lib/calc/connector";

/** The chosen id of a list, a face of one's own, or none. */
export function connectorId(chosen: string | null): ConnectorId | "grid" | null {
  return chosen !== null && (chosen === "grid" || isConnectorId(chosen)) ? chosen : null;
}
