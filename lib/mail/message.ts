/** One mail to one person. */
export type Message = {
  to: string;
  subject: string;
  html: string;
  text: string;
  /** Extra headers such as List-Unsubscribe. */
  headers?: Record<string, string>;
  /** Pictures that the HTML names as cid:<contentId>. */
  inline?: { contentId: string; fileName: string; mediaType: string; content: Buffer }[];
};

/**
 * retry: the service may take it later (it was away, overloaded or too slow).
 * bounced: the address itself was refused; nothing more should be sent to it.
 */
export type Sent = { ok: true; id: string } | { ok: false; retry: boolean; bounced: boolean; message: string };

export type SendOptions = {
  /** The same key never sends twice, however often it is tried. */
  idempotencyKey: string;
  timeoutMs: number;
};
