/** Codes of expected errors; each maps to one HTTP status. */
export const STATUS = {
  invalid: 400,
  "signed-out": 401,
  forbidden: 403,
  "not-found": 404,
  conflict: 409,
  blocked: 409,
  gone: 410,
  "too-large": 413,
  "wrong-type": 415,
  "too-many": 429,
  failed: 500,
  unavailable: 503,
} as const;

export type ErrorCode = keyof typeof STATUS;

/** An expected error: a code for programs and a sentence for people that says what happened and what to do. */
export type Refusal = {
  code: ErrorCode;
  message: string;
  /** Sentence by field path, e.g. { "limits": "…" }. */
  fields?: Record<string, string>;
  /** What a client needs to go on, e.g. the current version after a conflict. */
  details?: Record<string, unknown>;
};

export type Answer<T> = { ok: true; value: T } | { ok: false; error: Refusal };

export const ok = <T>(value: T): Answer<T> => ({ ok: true, value });

export function refuse(
  code: ErrorCode,
  message: string,
  more: Omit<Refusal, "code" | "message"> = {},
): { ok: false; error: Refusal } {
  return { ok: false, error: { code, message, ...more } };
}

/** Thrown inside a transaction to roll it back and still give the expected answer; caught by define…. */
export class RefusalError extends Error {
  override name = "RefusalError";
  constructor(readonly refusal: Refusal) {
    super(refusal.message);
  }
}

/** Rolls the running transaction back with an expected error. */
export function reject(code: ErrorCode, message: string, more: Omit<Refusal, "code" | "message"> = {}): never {
  throw new RefusalError({ code, message, ...more });
}
