import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { NetFacts } from "@/lib/calc/interconnect";
import { OFFERED_SERIES, type PullUpWindow } from "@/lib/calc/pull-up";
import { Basis } from "./Basis";
import { Figure } from "./Figure";
import { PullUpScale } from "./PullUpScale";
import { threeDigits } from "./three-digits";

type Props = { facts: NetFacts; frequencyHz: number | null };

/** The window for the resistor of an open-drain net, what is in it, and what stands there. */
export function NetPullUp({ facts: { window, pullUp, pullUps }, frequencyHz }: Props) {
  if (!window && pullUps.length === 0) return null;
  const isWrong = pullUp?.judgement ? pullUp.judgement.verdict !== "fits" : false;
  const rateHz = pullUp?.highestRateHz ?? null;
  const isTooSlow = rateHz !== null && frequencyHz !== null && rateHz < frequencyHz;
  return (
    <Panel
      title="Pull-up"
      note={pullUps.map(({ place, ohm }) => `${threeDigits(ohm, "Ω")} on ${place}`).join(", ") || "none yet"}
    >
      {pullUp && (
        <div className="mb-4 grid grid-cols-2 gap-x-5 gap-y-3 sm:grid-cols-4">
          <Figure
            label={pullUps.length > 1 ? "Together" : "Resistance"}
            value={threeDigits(pullUp.ohm, "Ω")}
            isWrong={isWrong}
          />
          {pullUp.riseS !== null && <Figure label="Rise, 10–90 %" value={threeDigits(pullUp.riseS, "s")} />}
          {rateHz !== null && <Figure label="Highest rate" value={threeDigits(rateHz, "Hz")} isWrong={isTooSlow} />}
          <Figure label="Current at low" value={threeDigits(pullUp.lowCurrentA, "A")} />
          <Figure label="In the resistor" value={threeDigits(pullUp.lowPowerW, "W")} />
        </div>
      )}
      {window?.verdict === "fits" && (
        <PullUpScale
          minOhm={window.minOhm}
          maxOhm={window.maxOhm}
          ohm={pullUp?.ohm ?? null}
          recommendedOhm={window.recommended.ohm}
          values={window.values.E12.length > 0 ? window.values.E12 : window.values.E96}
        />
      )}
      <p className="max-w-prose text-[0.9375rem]">{pullUp?.judgement?.sentence ?? window?.sentence}</p>
      {pullUp?.judgement && window && <p className="mt-1 max-w-prose text-sm text-ink-soft">{window.sentence}</p>}
      {isTooSlow && (
        <Notice kind="caution" className="mt-3">
          It changes more often than this resistor lets the line rise. Take a smaller one, or a driver that pushes.
        </Notice>
      )}
      {window?.verdict === "fits" && <Values window={window} />}
      <Basis
        follows="Rmin and Rmax of the data sheets of open-collector gates and of UM10204, 7.1; values of IEC 60063."
        leavesOut="several outputs that pull at once, and resistors that are on no pin map."
      />
    </Panel>
  );
}

/** How many of a series are written out before they become a range. */
const MOST = 12;

function Values({ window }: { window: Extract<PullUpWindow, { verdict: "fits" }> }) {
  return (
    <dl className="mt-3 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 text-sm">
      {OFFERED_SERIES.map((series) => {
        const values = window.values[series];
        const [first, last] = [values[0], values.at(-1)];
        if (first === undefined || last === undefined) return null;
        return (
          <div key={series} className="contents">
            <dt className="mono text-ink-soft">{series}</dt>
            <dd className="mono text-xs leading-5">
              {values.length <= MOST
                ? values.map((ohm) => threeDigits(ohm, "Ω")).join(", ")
                : `${values.length} values, ${threeDigits(first, "Ω")} to ${threeDigits(last, "Ω")}`}
            </dd>
          </div>
        );
      })}
    </dl>
  );
}
