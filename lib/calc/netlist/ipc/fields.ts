const BLANK = 32;
const PLUS = 43;
const MINUS = 45;

/** Digits in the columns from … to (from 0, `to` left out), filled with zeros or blanks. Undefined: blank. NaN: no figure. */
export function digitsAt(line: string, from: number, to: number): number | undefined {
  const end = Math.min(to, line.length);
  let value = 0;
  let isBegun = false;
  let isEnded = false;
  for (let at = from; at < end; at += 1) {
    const code = line.charCodeAt(at);
    if (code === BLANK) {
      isEnded = isBegun;
      continue;
    }
    const digit = code - 48;
    if (isEnded || digit < 0 || digit > 9) return Number.NaN;
    value = value * 10 + digit;
    isBegun = true;
  }
  return isBegun ? value : undefined;
}

/** The same with a sign in the first column; it may be blank, or stand right before the digits instead. */
export function signedDigitsAt(line: string, from: number, to: number): number | undefined {
  const first = line.charCodeAt(from);
  let sign = from;
  if (first === BLANK) {
    while (sign < to - 1 && line.charCodeAt(sign) === BLANK) sign += 1;
  }
  const code = line.charCodeAt(sign);
  if (code === MINUS) return negative(digitsAt(line, sign + 1, to));
  if (code === PLUS) return required(digitsAt(line, sign + 1, to));
  return first === BLANK || Number.isNaN(first) ? digitsAt(line, from, to) : Number.NaN;
}

const required = (value: number | undefined) => value ?? Number.NaN;

/** Without a negative zero, which would not survive being written down. */
const negative = (value: number | undefined) => (value === 0 ? 0 : -required(value));
