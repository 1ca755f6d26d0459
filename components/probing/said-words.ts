import { readTyped } from "./bench/read-typed";
import type { RoundProbe, RoundView, SaidResult } from "@/lib/probing/round-view";
import { isAsExpected } from "@/lib/probing/judge-result";

type Said = Pick<SaidResult, "beeps" | "ohm" | "typed">;

/** A result that has not arrived yet was typed here and is read here. */
const settled = ({ beeps, ohm, typed }: Said): { beeps: boolean | null; ohm: number | null } => {
  if (ohm !== null || beeps !== null || typed === "") return { beeps, ohm };
  const read = readTyped(typed);
  return read.ok ? read : { beeps, ohm };
};

export const isGood = (probe: RoundProbe, said: Said, limits: RoundView["limits"]): boolean =>
  isAsExpected(probe, settled(said), limits);

export function saidWords(said: Said): string {
  if (said.typed !== "") return /[Ωa-z]/i.test(said.typed) ? said.typed : `${said.typed}\u2009Ω`;
  return said.beeps === true ? "beeps" : "silent";
}
