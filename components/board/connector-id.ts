import { isConnectorId, type ConnectorId } from "@/lib/calc/connector";

/** The chosen id of a list, or none. */
export function connectorId(chosen: string | null): ConnectorId | null {
  return chosen !== null && isConnectorId(chosen) ? chosen : null;
}
