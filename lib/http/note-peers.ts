import { subscribe } from "node:diagnostics_channel";
import { IncomingMessage } from "node:http";
import { PEER_HEADER } from "./peer-header";

/**
 * Writes the address of the connection into every request before anything reads it, over whatever a client sent under
 * that name. The framework itself only fills in x-forwarded-for, and only when the client has not made one up.
 */
export function notePeers(): void {
  subscribe("http.server.request.start", (message) => {
    const request =
      typeof message === "object" && message !== null && "request" in message ? message.request : undefined;
    if (request instanceof IncomingMessage) request.headers[PEER_HEADER] = request.socket.remoteAddress ?? "unknown";
  });
}
