/** Thrown for what cannot be judged at all; `about` says which part is at fault, the message is for people. */
export class JudgementError extends Error {
  override name = "JudgementError";
  constructor(
    readonly about: "reading" | "limits" | "accuracy" | "unit",
    message: string,
  ) {
    super(message);
  }
}
