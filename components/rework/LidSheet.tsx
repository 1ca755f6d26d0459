import { PrintButton } from "@/components/traveler/PrintButton";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { writeDate } from "@/components/ui/DateTime";
import type { ReworksView } from "@/lib/rework/load-reworks";
import { nameRework } from "@/lib/rework/rework-words";
import type { QrCode } from "@/lib/traveler/qr-codes";
import { WireDrawing } from "./WireDrawing";
import { wiresOf, WireTable } from "./WireTable";

type Props = {
  project: string;
  zone: string;
  view: ReworksView;
  back: string;
  code: QrCode | undefined;
  printedAt: string;
};

/** The sheet for the lid of the box: every wire by its number, from where to where, and what else was changed. */
export function LidSheet({ project, zone, view, back, code, printedAt }: Props) {
  const wires = wiresOf(view.reworks);
  const rest = view.reworks.filter(({ wire }) => !wire);
  return (
    <main id="content" tabIndex={-1} className="mx-auto max-w-[210mm] px-4 pt-6 pb-28 print:max-w-none print:p-0">
      <div className="mb-4 flex flex-wrap items-center justify-between gap-3 print:hidden">
        <p className="text-ink-soft">As it prints on A4, for the lid of the box. The code leads back to the list.</p>
        <div className="flex gap-2">
          <ButtonLink href={back}>Back to the list</ButtonLink>
          <PrintButton />
        </div>
      </div>
      {/* Paper is white and ink is black, whatever the theme of the screen. */}
      <div
        className="overflow-x-auto border border-[#bbb] bg-[#fff] p-4 text-[#000] [--copper:#000] [--dot:#ccc] [--edge:#444] [--ink-faint:#333] [--ink-soft:#333] [--ink:#000] [--raised:#fff] [--rule-strong:#777] [--rule:#bbb] [--sheet:#fff] sm:p-[12mm] print:overflow-visible print:border-0 print:p-0"
        data-lid-sheet
        role="region"
        aria-label="The sheet"
        tabIndex={0}
      >
        <header className="flex items-start justify-between gap-4 border-b-2 border-[#000] pb-3">
          <div>
            <h1 className="text-3xl">{view.unit.serial}</h1>
            <p>
              {view.board.name}, rev {view.revision}
            </p>
            <p className="mt-1 text-xs">
              {project}, printed {writeDate(printedAt, zone)}
            </p>
          </div>
          {code && <Code code={code} />}
        </header>
        <h2 className="mt-5 mb-2 text-xl">Bodge wires</h2>
        {wires.length === 0 ? <p>None.</p> : <WireTable wires={wires} />}
        <div className="mt-4">
          <WireDrawing connectors={view.connectors} wires={wires.map(({ wire }) => wire)} />
        </div>
        {rest.length > 0 && (
          <>
            <h2 className="mt-6 mb-2 text-xl">Other reworks</h2>
            <ul className="grid gap-1.5 text-[0.9375rem]">
              {rest.map((rework) => (
                <li key={rework.id} className="break-inside-avoid">
                  <span className="font-semibold">{nameRework(rework)}</span>,{" "}
                  {writeDate(rework.performedAt, zone, "day")}: {rework.what}
                </li>
              ))}
            </ul>
          </>
        )}
      </div>
    </main>
  );
}

function Code({ code }: { code: QrCode }) {
  return (
    <svg
      viewBox={`0 0 ${code.size} ${code.size}`}
      className="size-[22mm] shrink-0"
      role="img"
      aria-label="Code to the list"
    >
      <path d={code.path} fill="#000" />
    </svg>
  );
}
