import { Notice } from "@/components/ui/Notice";
import type { RoundPoint, RoundProbe, RoundView } from "@/lib/probing/round-view";
import { isGood, saidWords } from "../said-words";
import { PairFace } from "./PairFace";
import type { Probing } from "./use-probing";

type Props = { round: RoundView; probing: Probing };

/** The pair in the largest type that fits: what one reads from the other end of the bench. */
export function PairBody({ round, probing }: Props) {
  const { current, probe, standing, last, results } = probing;
  const [a, b] = [probe && round.points[probe.a], probe && round.points[probe.b]];
  if (!probe || !a || !b) return null;
  return (
    <main className="flex min-h-0 flex-1 flex-col gap-4 overflow-y-auto overscroll-contain px-4 pt-4 pb-6">
      <LastAnswer {...{ round, probing }} number={last} />
      <section aria-label={`Probe ${current + 1}`} aria-live="polite">
        <p className="text-ink-soft">
          Probe <span className="mono">{current + 1}</span> of {round.probes.length} · {KINDS[probe.kind]}
        </p>
        <h2 className="mt-1 leading-[1.05] font-semibold tracking-tight">
          <Point point={a} />
          <span className="block py-1 text-xl font-normal text-ink-soft sm:text-2xl">
            <span aria-hidden="true">↕</span> {expectation(probe)}
          </span>
          <Point point={b} />
        </h2>
        <Nets a={a} b={b} probe={probe} />
      </section>
      {standing && (
        <Notice kind={isGood(probe, standing, round.limits) ? "passed" : "failed"} role="none">
          Answered: {saidWords(standing)}
          {standing.by && `, by ${standing.by}`}. Answer again to correct it; the old answer is kept as void.
        </Notice>
      )}
      {results.refused && (
        <Notice
          kind="error"
          actions={
            <button type="button" onClick={results.discard} className="min-h-11 rounded px-2 font-semibold underline">
              Drop what is on this device
            </button>
          }
        >
          {results.refused}
        </Notice>
      )}
      <PairFace {...{ round, a, b }} />
    </main>
  );
}

const KINDS: Record<RoundProbe["kind"], string> = {
  continuity: "continuity",
  isolation: "isolation",
  "follow-up": "to tell one fault from another",
};

const expectation = ({ expect }: RoundProbe) => (expect === "joined" ? "should beep" : "should stay silent");

const Point = ({ point: { name } }: { point: RoundPoint }) => (
  <span className="mono block text-[clamp(2.5rem,min(13vw,11vh),6rem)] break-words">{name}</span>
);

function Nets({ a, b, probe }: { a: RoundPoint; b: RoundPoint; probe: RoundProbe }) {
  const named = (net: string) => (net === "" ? "no net" : net);
  return (
    <p className="mt-2 text-lg">
      <span className="mono font-semibold">{named(a.net)}</span>
      {probe.expect === "apart" && (
        <>
          {" "}
          <span className="text-ink-soft">apart from</span> <span className="mono font-semibold">{named(b.net)}</span>
        </>
      )}
    </p>
  );
}

/** What was just said, so that nobody has to look back. */
function LastAnswer({ round, probing: { results }, number }: Props & { number: number | undefined }) {
  const said = number === undefined ? undefined : results.said.get(number);
  const probe = number === undefined ? undefined : round.probes[number];
  if (number === undefined || !said || !probe) return <p className="text-sm text-ink-soft">{round.limits.words}</p>;
  const good = isGood(probe, said, round.limits);
  return (
    <p className={`text-sm ${good ? "text-passed" : "font-semibold text-failed"}`} role="status">
      <span className="mono">
        {round.points[probe.a]?.name} / {round.points[probe.b]?.name}
      </span>
      : {saidWords(said)}, {good ? "as expected" : "not as expected"}
    </p>
  );
}
