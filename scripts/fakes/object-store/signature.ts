import { createHmac } from "node:crypto";
import { equalTexts } from "../http/equal-texts";
import { Refusal } from "../http/refusal";

const marker = "signature=";

export function sign(text: string, apiKey: string): string {
  return `hmac-sha256=${createHmac("sha256", apiKey).update(text).digest("hex")}`;
}

export function isSigned(url: URL): boolean {
  return url.searchParams.has("signature");
}

/** The signature covers the whole address before it; `expires` is in milliseconds. Anything wrong is a 403. */
export function checkSignature(url: URL, apiKey: string): void {
  const at = url.href.search(/[?&]signature=/);
  const signed = at < 0 ? "" : url.href.slice(0, at);
  const given = at < 0 ? "" : decodeURIComponent(url.href.slice(at + 1 + marker.length));
  if (!equalTexts(given, sign(signed, apiKey)))
    throw new Refusal(403, "forbidden", "The signature is missing or wrong.");
  const expires = Number(url.searchParams.get("expires"));
  if (!(expires > Date.now())) throw new Refusal(403, "forbidden", "The link has expired.");
}

/** A link to read a file, as the SDK itself makes it. */
export function signedAddress(address: string, apiKey: string, seconds: number): string {
  const url = new URL(address);
  url.searchParams.append("expires", String(Date.now() + seconds * 1000));
  url.searchParams.append("signature", sign(url.toString(), apiKey));
  return url.href;
}
