/**
 * An exact decimal number: coefficient × 10^exponent. Limits are worked out in it, so that 5 V ± 5 % ends at the
 * number 5.25 and not one rounding beside it.
 */
export type Decimal = { coefficient: bigint; exponent: number };

const power = (exponent: number) => 10n ** BigInt(exponent);

export const shifted = (a: Decimal, by: number): Decimal => ({ ...a, exponent: a.exponent + by });

export const magnitude = (a: Decimal): Decimal => (a.coefficient < 0n ? negated(a) : a);

export const negated = (a: Decimal): Decimal => ({ ...a, coefficient: -a.coefficient });

export function sum(a: Decimal, b: Decimal): Decimal {
  const exponent = Math.min(a.exponent, b.exponent);
  const coefficient = a.coefficient * power(a.exponent - exponent) + b.coefficient * power(b.exponent - exponent);
  return { coefficient, exponent };
}

export const product = (a: Decimal, b: Decimal): Decimal => ({
  coefficient: a.coefficient * b.coefficient,
  exponent: a.exponent + b.exponent,
});

/** The nearest double; never −0. */
export function toNumber(a: Decimal): number {
  return a.coefficient === 0n ? 0 : Number(`${a.coefficient}e${a.exponent}`);
}
