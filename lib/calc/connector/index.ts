export { GRID_MM, pinAt, type Connector, type ConnectorPin, type ConnectorRow } from "./connector";
export { CONNECTOR_IDS, connectorChoices, findConnector, isConnectorId, type ConnectorId } from "./list";
export { findPin, parsePin, type PinReference } from "./parse-pin";
