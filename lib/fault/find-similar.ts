import { database } from "@/db/client";
import { findRankedFaults } from "@/db/queries/faults";
import type { FaultState } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, type Answer } from "@/lib/actions/answer";
import { parsePin } from "@/lib/calc/connector";
import { signalKeys } from "@/lib/calc/signal-names";
import type { SimilarInput } from "./schema";

export type SimilarFault = {
  number: number;
  title: string;
  state: FaultState;
  serial: string;
  /** The most useful sentence of it: the lesson, else the cause, else the mend, else the symptom. */
  says: string;
  /** Signals and pins that both have. */
  shared: string[];
};

const MOST = 4;
/**
 * By ts_rank a shared word weighs about 0.6 in the title, 0.24 in symptom, cause and mend, 0.12 elsewhere. One in the title
 * or two in the symptom say something; a shared signal says more. Common practice, no source.
 */
const LEAST_RANK = 0.4;
const PER_NAME = 1;

/** Earlier faults of this project that share signals, pins or words, the likest first. */
export async function findSimilar(scope: ProjectScope, input: SimilarInput): Promise<Answer<SimilarFault[]>> {
  const words = [...new Set(input.words.toLowerCase().match(/[\p{L}\p{N}_]{3,}/gu) ?? [])].slice(0, 40);
  if (words.length === 0 && input.signals.length + input.pins.length === 0) return ok([]);
  const rows = await findRankedFaults(database(), scope, {
    except: input.except,
    query: words.map((word) => `"${word}"`).join(" or "),
  });
  const own = { signals: new Set(input.signals.flatMap(signalKeys)), pins: new Set(input.pins.map(pinKey)) };
  return ok(
    rows
      .map((row) => {
        const shared = [
          ...row.signals.filter((name) => signalKeys(name).some((key) => own.signals.has(key))),
          ...row.pins.filter((name) => own.pins.has(pinKey(name))),
        ];
        return { row, shared, score: row.rank + PER_NAME * shared.length };
      })
      .filter(({ shared, row }) => shared.length > 0 || row.rank >= LEAST_RANK)
      .sort((a, b) => b.score - a.score || b.row.number - a.row.number)
      .slice(0, MOST)
      .map(({ row: { number, title, state, serial, lesson, cause, mend, symptom }, shared }) => ({
        ...{ number, title, state, serial, shared },
        says: lesson || cause || mend || symptom,
      })),
  );
}

function pinKey(text: string): string {
  const pin = parsePin(text);
  return pin ? `${pin.connector ?? ""} ${pin.pin}` : text.trim().toUpperCase();
}
