import type { Answer } from "@/lib/actions/answer";

/** The story only does what the product allows; a refusal is a mistake in the story and stops the seed. */
export function granted<Value>(answer: Answer<Value>): Value {
  if (!answer.ok)
    throw new Error(
      `the demo's story was refused: ${answer.error.message} ${JSON.stringify(answer.error.fields ?? {})}`,
    );
  return answer.value;
}
