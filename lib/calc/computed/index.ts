/** What a calculation answers: a value, or which field it could not use and why, in a sentence for people. */
export type Computed<T> = { ok: true; value: T } | Fault;

export type Fault = { ok: false; field: string; message: string };

export const computed = <T>(value: T): Computed<T> => ({ ok: true, value });

export const fault = (field: string, message: string): Fault => ({ ok: false, field, message });

/** "The width must be more than 0." `words` is the field's name within a sentence: "width of the conductor". */
export function needsPositive(field: string, words: string, value: number): Fault | undefined {
  return notANumber(field, words, value) ?? (value > 0 ? undefined : fault(field, `The ${words} must be more than 0.`));
}

export function needsNotNegative(field: string, words: string, value: number): Fault | undefined {
  return (
    notANumber(field, words, value) ?? (value >= 0 ? undefined : fault(field, `The ${words} must not be below 0.`))
  );
}

/** For counts: a whole number, 0 or more. */
export function needsCount(field: string, words: string, value: number): Fault | undefined {
  const below = needsNotNegative(field, words, value);
  return below ?? (Number.isSafeInteger(value) ? undefined : fault(field, `The ${words} must be a whole number.`));
}

function notANumber(field: string, words: string, value: number): Fault | undefined {
  return Number.isFinite(value) ? undefined : fault(field, `The ${words} is no number.`);
}
