export { canMate, GRID_MM, type Connector, type ConnectorPin, type ConnectorRow } from "./connector";
export { gridProblems, type ConnectorGrid } from "./grid";
export { CONNECTOR_IDS, connectorChoices, faceOf, findConnector, isConnectorId, type ConnectorId } from "./list";
export { findPin, parsePin, pinNamed, type PinReference } from "./parse-pin";
export { pinsApartMm, viewFace, type FaceView, type Orientation, type PinInView, type Side } from "./view-face";
