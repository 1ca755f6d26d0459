/** An answer that is not a success, in the shape both SDKs read: a status, a name and a sentence. */
export class Refusal extends Error {
  override name = "Refusal";

  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly headers: Record<string, string> = {},
  ) {
    super(message);
  }

  body() {
    return { statusCode: this.status, name: this.code, message: this.message, error: this.message };
  }
}
