import { z } from "zod";

const HIGHEST = 10_000_000;

/** "0.45" for 45; empty while nobody knows. */
export const priceText = (cents: number | null): string => (cents === null ? "" : (cents / 100).toFixed(2));

/** Money with its currency: "12.40 EUR". Figures before the mark stand in groups of three. */
export function money(cents: number, currency: string): string {
  const [whole = "0", rest = "00"] = (Math.abs(cents) / 100).toFixed(2).split(".");
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, "\u202f");
  return `${cents < 0 ? "−" : ""}${grouped}.${rest}\u00a0${currency}`;
}

/** Price of one as people type it: "0.45", "0,45", "12"; empty: not known. Held in the smallest unit, without floats. */
export const price = z.string({ message: "This should be text." }).transform((typed, context): number | null => {
  const text = typed.trim();
  if (text === "") return null;
  const found = /^(\d{1,9})(?:[.,](\d{1,2}))?$/.exec(text);
  const say = (message: string) => {
    context.addIssue({ code: "custom", message });
    return z.NEVER;
  };
  if (!found) {
    return say(
      /^\d+[.,]\d{3,}$/.test(text)
        ? `${text} has more than two digits after the mark. Write the price of one, such as 0.45.`
        : `“${text}” is no price. Write a number without the currency, such as 0.45.`,
    );
  }
  const cents = Number(found[1]) * 100 + Number((found[2] ?? "").padEnd(2, "0"));
  return cents > HIGHEST ? say("A part that dear is a slip of the keyboard: at most 100,000.") : cents;
});
