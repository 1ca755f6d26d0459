import { formatQuantity } from "../units";
import { acceptanceZone } from "./acceptance";
import { atMost } from "./compare";
import { type Judgement, type Measured, type Verdict } from "./judgement";

/**
 * Judges an overload: the value lies beyond what the range holds. It conforms to limits that are open on that side
 * (OL meets `> 1 MΩ`) and to no others. Where the range in use is known and ends short of the limit, the overload
 * proves only what the range holds: under the guarded rule the verdict is then "guard-band", under the simple rule it
 * conforms as read; both say so and call the instrument too coarse. No U and no probabilities.
 */
export function judgeOverload({ reading, limits, accuracy, rule }: Measured): Judgement {
  const high = reading.value > 0;
  const crossed = high ? limits.upper : limits.lower;
  const met = high ? limits.lower : limits.upper;
  const limit = crossed ?? met ?? 0;
  const { range } = accuracy ?? {};
  const reach = range === undefined ? undefined : high ? range : -range;
  const proven = reach === undefined || (high ? atMost(limit, reach) : atMost(reach, limit));

  const said = (value: number) => formatQuantity({ value, unit: reading.unit });
  const beyond = high ? "above" : "below";
  const ends = reach === undefined ? "" : `The range in use ends at ${said(reach)}`;
  const sentences: string[] = [];
  if (crossed !== undefined) {
    sentences.push(
      `The instrument shows an overload, so the value lies ${beyond} what it can read; ${said(crossed)} is the limit.`,
    );
    if (!proven) sentences.push(`${ends}, short of the limit: repeat on a larger range.`);
  } else if (proven) {
    sentences.push(`The instrument shows an overload, so the value lies ${beyond} ${said(limit)}.`);
  } else {
    sentences.push(
      `${ends}, so an overload does not show that the value lies ${beyond} ${said(limit)}: repeat with a larger range.`,
    );
  }
  const accepted: Verdict = proven || rule === "simple" ? "conforms" : "guard-band";
  return {
    verdict: crossed !== undefined ? "does-not-conform" : accepted,
    rule,
    guardBand: 0,
    acceptance: acceptanceZone(limits, 0),
    tooCoarse: !proven,
    sentences,
  };
}
