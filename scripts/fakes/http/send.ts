import type { ServerResponse } from "node:http";

export function sendJson(
  response: ServerResponse,
  status: number,
  body: unknown,
  headers: Record<string, string> = {},
): void {
  const bytes = Buffer.from(JSON.stringify(body));
  response.writeHead(status, { ...headers, "content-type": "application/json", "content-length": bytes.length });
  response.end(bytes);
}

export function sendEmpty(response: ServerResponse, status: number, headers: Record<string, string> = {}): void {
  response.writeHead(status, { ...headers, "content-length": "0" });
  response.end();
}
