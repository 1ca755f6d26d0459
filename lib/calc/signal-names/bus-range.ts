const BUS = /^(.*?)\[(\d{1,4}):(\d{1,4})\](.*)$/;
const MOST = 1000;

/**
 * The signals that a bus range names, in the order in which it names them: D[7:0] is D7 … D0, A[0:2]_N is A0_N, A1_N,
 * A2_N. Undefined when the text is none: D[7] is a plain name.
 */
export function busNames(text: string): string[] | undefined {
  const [, before, first, last, after] = BUS.exec(text.trim()) ?? [];
  if (before === undefined || first === undefined || last === undefined || after === undefined) return undefined;
  const [from, to] = [Number(first), Number(last)];
  const count = Math.abs(to - from) + 1;
  if (count > MOST || before + after === "") return undefined;
  const step = to < from ? -1 : 1;
  return Array.from({ length: count }, (_, at) => `${before}${from + at * step}${after}`);
}
