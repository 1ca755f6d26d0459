import { writeDate } from "@/components/ui/DateTime";
import { checkKind } from "@/lib/check-kinds/list";
import type { QrCode } from "@/lib/traveler/qr-codes";
import type { CheckView } from "@/lib/traveler/traveler-view";

type Props = { check: CheckView; code: QrCode | undefined; zone: string; rule: "simple" | "guarded" };

/** One check on paper: box, number, what to do and to expect, room to write, code. Never cut in half by a page. */
export function SheetRow({ check, code, zone, rule }: Props) {
  const kind = checkKind(check.kind);
  const last = check.attempts.find((attempt) => !attempt.voided);
  const holds = check.state === "passed" || check.state === "conceded";
  const isTable = check.kind === "table";
  return (
    <tr data-sheet-row className="break-inside-avoid border-b border-[#999] align-top">
      <td className="w-8 py-2">
        <Box isTicked={holds} />
        <span className="mono mt-1 block text-center text-xs">{check.number}</span>
      </td>
      <td className="px-3 py-2" colSpan={isTable ? 3 : 1}>
        {check.holdPoint && (
          <p className="mb-1 inline-block border-2 border-[#000] px-1.5 text-xs font-bold">
            HOLD POINT: nothing after it before it holds
          </p>
        )}
        <p className="font-semibold">{check.title}</p>
        {check.instruction && <p className="text-sm whitespace-pre-line">{check.instruction}</p>}
        {check.caution && <p className="mt-1 border-l-4 border-[#000] pl-2 text-sm font-semibold">{check.caution}</p>}
        {check.covers.pins.length > 0 && <p className="mono mt-0.5 text-xs">{check.covers.pins.join("  ")}</p>}
        {isTable && (
          <div className="mt-2">
            <kind.RecordView spec={check.spec} record={last?.record} readings={last?.readings ?? []} rule={rule} />
          </div>
        )}
        {check.state === "reopened" || check.state === "doubtful" || check.state === "conceded" ? (
          <p className="mt-1 text-sm italic">{check.stateReason}</p>
        ) : null}
      </td>
      {!isTable && (
        <>
          <td className="w-[32mm] py-2 pr-3 text-sm">
            <span className="mono">{check.expectation}</span>
          </td>
          <td className="w-[38mm] py-2 pr-3 text-sm">
            {last ? (
              <>
                <span className="mono font-semibold">{last.summary}</span>
                <br />
                <span className="text-xs">
                  {last.by.name}, {writeDate(last.performedAt, zone, "short")}
                  {!holds && `, ${check.state}`}
                </span>
                {!holds && <Blank />}
              </>
            ) : (
              <Blank />
            )}
          </td>
        </>
      )}
      <td className="w-[16mm] py-2">
        {code && (
          <svg
            role="img"
            aria-label={`Code to check ${check.number} at the bench`}
            viewBox={`-1 -1 ${code.size + 2} ${code.size + 2}`}
            className="size-[15mm]"
          >
            <path d={code.path} fill="#000" />
          </svg>
        )}
      </td>
    </tr>
  );
}

function Box({ isTicked }: { isTicked: boolean }) {
  return (
    <svg
      role="img"
      aria-label={isTicked ? "holds" : "open"}
      viewBox="0 0 16 16"
      className="mx-auto block size-[6mm]"
      fill="none"
      stroke="#000"
      strokeWidth="1.25"
    >
      <path d="M1.500 1.500h13v13h-13z" />
      {isTicked && <path d="M4 8.500 7 11.500 12.500 4.500" strokeWidth="2" />}
    </svg>
  );
}

/** A line to write a reading on. */
const Blank = () => <span className="mt-1 block h-[8mm] border-b border-[#000]" />;
