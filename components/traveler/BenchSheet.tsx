import { STAGES, stageName } from "@/lib/procedure/stages";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { writeDate } from "@/components/ui/DateTime";
import type { QrCode } from "@/lib/traveler/qr-codes";
import type { TravelerView } from "@/lib/traveler/traveler-view";
import { PrintButton } from "./PrintButton";
import { SheetRow } from "./SheetRow";

type Props = {
  project: string;
  traveler: TravelerView;
  zone: string;
  rule: "simple" | "guarded";
  back: string;
  codes: Record<string, QrCode>;
  printedAt: string;
};

/** The traveler on paper: tick boxes, limits, room for readings, cautions, hold points; what is recorded is filled in. */
export function BenchSheet({ project, traveler, zone, rule, back, codes, printedAt }: Props) {
  const { unit, board, revision, slot, procedure } = traveler;
  return (
    <main id="content" tabIndex={-1} className="mx-auto max-w-[210mm] px-4 pt-6 pb-28 print:max-w-none print:p-0">
      <div className="mb-4 flex flex-wrap items-center justify-between gap-3 print:hidden">
        <p className="text-ink-soft">As it prints on A4. The codes lead back to the check at the bench.</p>
        <div className="flex gap-2">
          <ButtonLink href={back}>Back to the unit</ButtonLink>
          <PrintButton />
        </div>
      </div>
      {/* Paper is white and ink is black, whatever the theme of the screen. */}
      <div
        className="relative overflow-x-auto border border-[#bbb] bg-[#fff] p-4 sm:p-[12mm] print:overflow-visible text-[#000] [--copper:#000] [--edge:#444] [--failed:#000] [--ink-faint:#333] [--ink-soft:#333] [--ink:#000] [--passed:#000] [--raised:#fff] [--rule-strong:#777] [--rule:#bbb] [--sheet:#fff] print:border-0 print:p-0"
        data-bench-sheet
        role="region"
        aria-label="The sheet"
        tabIndex={0}
      >
        <table className="w-full min-w-[42rem] border-collapse print:min-w-0">
          <thead>
            <tr>
              <td colSpan={5} className="border-b-2 border-[#000] pb-2">
                <div className="flex items-end justify-between gap-4">
                  <div>
                    <h1 className="text-2xl">{unit.serial}</h1>
                    <p className="text-sm">
                      {board.name}, rev {revision.letter}
                      {slot && `, slot ${slot.position}`}. Procedure version {procedure.number}.
                    </p>
                  </div>
                  <p className="text-right text-xs">
                    {project}
                    <br />
                    printed {writeDate(printedAt, zone)}
                  </p>
                </div>
              </td>
            </tr>
          </thead>
          {STAGES.map(({ id: stage }) => {
            const own = traveler.checks.filter((check) => check.stage === stage);
            if (own.length === 0) return null;
            return (
              <tbody key={stage}>
                <tr>
                  <th colSpan={5} scope="rowgroup" className="font-head break-after-avoid pt-4 pb-1 text-left text-lg">
                    {stageName(stage)}
                  </th>
                </tr>
                {own.map((check) => (
                  <SheetRow key={check.id} check={check} code={codes[check.id]} zone={zone} rule={rule} />
                ))}
              </tbody>
            );
          })}
        </table>
        <p className="mt-6 flex gap-8 text-sm">
          <span className="flex-1 border-b border-[#000] pb-6">Carried out by</span>
          <span className="flex-1 border-b border-[#000] pb-6">Date</span>
          <span className="flex-1 border-b border-[#000] pb-6">Instruments</span>
        </p>
      </div>
    </main>
  );
}
