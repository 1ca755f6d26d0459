/** Browsers may send files straight to the object store: its address by default, or the one of a stand-in. */
function storeOrigin(ingestUrl: string | undefined): string {
  return ingestUrl ? new URL(ingestUrl).origin : "https://*.ingest.uploadthing.com";
}

type Setting = { nonce: string; isDevelopment: boolean; isHttps: boolean; ingestUrl: string | undefined };

/** Scripts run only with this answer's nonce, or when such a script loads them; nothing of ours is shown in frames. */
export function contentSecurityPolicy({ nonce, isDevelopment, ingestUrl, isHttps }: Setting): string {
  const directives = [
    "default-src 'self'",
    // The development server's error overlay evaluates text; the built application never does.
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ""}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "media-src 'self' blob:",
    `connect-src 'self' ${storeOrigin(ingestUrl)}${isDevelopment ? " ws:" : ""}`,
    "worker-src 'self'",
    "manifest-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
    ...(isHttps ? ["upgrade-insecure-requests"] : []),
  ];
  return directives.join("; ");
}

/** Everything but the content security policy, for pages and answers of the API alike. */
export function plainSecurityHeaders(isHttps: boolean): Record<string, string> {
  return {
    "x-content-type-options": "nosniff",
    "referrer-policy": "strict-origin-when-cross-origin",
    // The camera takes photos of boards; nothing else is asked for.
    "permissions-policy": "camera=(self), microphone=(), geolocation=(), payment=(), usb=(), browsing-topics=()",
    "cross-origin-opener-policy": "same-origin",
    ...(isHttps ? { "strict-transport-security": "max-age=31536000; includeSubDomains" } : {}),
  };
}
