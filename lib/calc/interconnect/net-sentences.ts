import type { NetFacts } from "./net-facts";
import { counted, farads, listed, ohms, volts } from "./wording";

type Facts = Omit<NetFacts, "sentences" | "inShort">;

/** What the figures of a net say, a sentence each, and the one thing to know of it in a few words. */
export function netSentences(facts: Facts): Pick<NetFacts, "sentences" | "inShort"> {
  const { fanOut, edge, pullUp, window } = facts;
  const sentences = [
    whoDrives(facts),
    margin(facts),
    fanOut?.sentence,
    load(facts),
    edge?.sentence,
    pullUp?.judgement?.sentence ?? window?.sentence,
    notJudged(facts),
  ];
  return { sentences: sentences.filter((sentence) => sentence !== undefined), inShort: inShort(facts) };
}

function whoDrives({ drivers, loads }: Facts): string | undefined {
  if (drivers.length + loads.length === 0) return undefined;
  const names = listed(drivers.map(({ place }) => place));
  const heard = loads.length === 0 ? "no load" : `${loads.length} load${loads.length === 1 ? "" : "s"}`;
  return drivers.length === 0 ? `Nothing drives it; it has ${heard}.` : `Driven from ${names}, with ${heard}.`;
}

function margin({ high, low }: Facts): string | undefined {
  if (!low) return undefined;
  const pair = ({ driving, receiving }: NonNullable<Facts["low"]>) => `${driving} into ${receiving}`;
  const told = [
    high ? `${volts(high.volts)} at high (${pair(high)})` : "",
    `${volts(low.volts)} at low (${pair(low)})`,
  ].filter(Boolean);
  return `Worst margins: ${told.join(", ")}.`;
}

const load = ({ capacitancePf, drivers }: Facts): string | undefined =>
  capacitancePf === null || drivers.length === 0 ? undefined : `The driver charges about ${farads(capacitancePf)}.`;

function notJudged({ unknownFamilies }: Facts): string | undefined {
  const named = unknownFamilies.filter((family) => family !== "");
  const nameless = unknownFamilies.length > named.length;
  if (named.length > 0) return `Not looked at: ${listed(named)} ${named.length === 1 ? "is" : "are"} not in the table.`;
  return nameless ? "Not looked at: pins that name no family." : undefined;
}

function inShort({ drivers, loads, high, low, fanOut, pullUps, pullUp, window }: Facts): NetFacts["inShort"] {
  const wrong = (text: string) => ({ text, isWrong: true });
  const right = (text: string) => ({ text, isWrong: false });
  const pushing = drivers.filter(({ role }) => role === "push-pull output").length;
  if (pushing > 1) return wrong(`${counted(pushing)} drivers`);
  if (pushing === 1 && drivers.length > 1) return wrong("mixed outputs");
  if (drivers.length === 0) {
    return loads.length > 0 && pullUps.length === 0
      ? wrong("no driver")
      : right(loads.length > 0 ? "pull-up only" : "");
  }
  if (high && high.volts < 0) return wrong(`high level too low by ${volts(-high.volts)}`);
  if (low && low.volts < 0) return wrong(`low level too high by ${volts(-low.volts)}`);
  if (fanOut && !fanOut.holds) return wrong(shareOf(fanOut));
  if (window) {
    if (pullUps.length === 0) return wrong("no pull-up");
    const range =
      window.verdict === "fits"
        ? `, window ${ohms(window.minOhm)} – ${window.maxOhm === null ? "" : ohms(window.maxOhm)}`
        : "";
    const has = pullUp ? `pull-up ${ohms(pullUp.ohm)}` : "pull-up";
    return { text: `${has}${range}`, isWrong: pullUp?.judgement ? pullUp.judgement.verdict !== "fits" : false };
  }
  if (!fanOut) return right("");
  return right(shareOf(fanOut));
}

/** "0.9 of 4 mA": of the level that is nearer to its limit. */
function shareOf({ high, low }: NonNullable<Facts["fanOut"]>): string {
  const level = high.usedA / high.availableA > low.usedA / low.availableA ? high : low;
  const [unit, scale] = level.availableA >= 1e-3 ? ["mA", 1e3] : ["µA", 1e6];
  const figure = (amperes: number) => String(Number((amperes * scale).toPrecision(2)));
  return `${figure(level.usedA)} of ${figure(level.availableA)}\u202f${unit}`;
}
