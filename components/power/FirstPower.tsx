"use client";

import Link from "next/link";
import { OfferToCheck } from "@/components/offer/OfferToCheck";
import type { OfferAct } from "@/components/offer/offer-acts";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { CurrentWindow } from "@/lib/calc/power";
import type { OfferPlace } from "@/lib/offer/schema";
import { checkForRail, firstPowerOffer, otherLimit } from "@/lib/power/first-power";
import { amps } from "./figures";

type Props = {
  project: string;
  windows: readonly CurrentWindow[];
  place: OfferPlace;
  canEdit: boolean;
  offer: OfferAct;
  /** Where the budget stands that it comes from; left away beside it. */
  budgetHref?: string;
};

/** What a unit should draw when it is switched on for the first time, offered to its power-on checks. */
export function FirstPower({ project, windows, place, canEdit, offer, budgetHref }: Props) {
  return (
    <Panel
      title="For the power-on checks"
      note={`one unit of ${place.board} on the bench`}
      actions={
        budgetHref && (
          <ButtonLink href={budgetHref} size="sm">
            See its budget
          </ButtonLink>
        )
      }
    >
      <div className="flex flex-col gap-5">
        {windows.map((window) => (
          <RailOffer
            key={window.rail}
            {...{ project, window, place, canEdit, rails: windows.map(({ rail }) => rail) }}
            act={offer}
          />
        ))}
        <p className="text-sm text-ink-soft">
          From half of what flows without a clock up to the worst case; the supply&rsquo;s limit is 1.25 times the
          worst, rounded up to what one can set. Common practice, no source. The inrush into the capacitors is left out.
        </p>
        <Notice kind="caution">
          <p>
            A supply without a current limit is not good enough for a first power. The figures are a plan, not a proof:
            stop at smoke, smell or heat, whatever the meter says.{" "}
            <Link href="/safety" className="link">
              Safety
            </Link>
          </p>
        </Notice>
      </div>
    </Panel>
  );
}

type RailOfferProps = Omit<Props, "windows" | "offer" | "budgetHref"> & {
  window: CurrentWindow;
  /** Names of all rails that come to the board, the one of its logic first. */
  rails: readonly string[];
  act: OfferAct;
};

function RailOffer({ window, rails, ...given }: RailOfferProps) {
  const { rail, lowerA, expectedA, upperA } = window;
  const { limits, expected, caution, fresh } = firstPowerOffer(window);
  return (
    <section
      aria-label={`First power from ${rail}`}
      className="flex flex-col gap-3 [&+section]:border-t [&+section]:border-rule [&+section]:pt-5"
    >
      <p className="text-[0.9375rem]">
        <span className="mono font-semibold">{rail}</span>: {amps(expectedA)} expected,{" "}
        {lowerA > 0 ? `at least ${amps(lowerA)}, ` : ""}at most {amps(upperA)}.
      </p>
      <OfferToCheck
        {...given}
        fields={[
          { field: "limits", name: "Limits", text: limits },
          { field: "expected", name: "Expected", text: expected },
        ]}
        caution={caution}
        fresh={fresh}
        prefer={checkForRail(given.place.checks, rail, rails)}
        remark={(target) => otherLimit(target, window)}
      />
    </section>
  );
}
