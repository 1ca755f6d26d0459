import { Link } from "@react-email/components";
import type { BoardLine } from "./digest-mail-props";
import { More, Serial } from "./DigestItems";
import { FIGURE_FONT, light } from "./palette";

/** More boards than a mail should show stand on the rack. */
export const MOST_BOARDS = 12;

/** The machine as the rack has it: a card a row, its five stages as counts, in words for who reads it aloud. */
export function DigestBoards({ boards, link }: { boards: readonly BoardLine[]; link: string }) {
  return (
    <>
      {boards.slice(0, MOST_BOARDS).map((board) => (
        <BoardCard key={board.serial} board={board} />
      ))}
      <More count={Math.max(0, boards.length - MOST_BOARDS)} link={link} />
    </>
  );
}

function BoardCard({ board }: { board: BoardLine }) {
  const { slot, name, serial, link, holding, total, stages } = board;
  return (
    <table
      className="bw-raised"
      width="100%"
      cellPadding={0}
      cellSpacing={0}
      style={{ backgroundColor: light.raised, border: `1px solid ${light.rule}`, marginBottom: 8, borderRadius: 4 }}
    >
      <tbody>
        <tr>
          <td colSpan={3} className="bw-ink" style={{ color: light.ink, fontSize: 15, padding: "8px 4px 4px 10px" }}>
            {slot === null ? null : <Serial>{slot}&ensp;</Serial>}
            <Link href={link} style={{ color: light.ink, fontWeight: 700 }}>
              {name}
            </Link>{" "}
            <Serial>{serial}</Serial>
          </td>
          <td
            colSpan={2}
            align="right"
            className="bw-soft"
            style={{ color: light.inkSoft, fontSize: 13, padding: "8px 10px 4px 4px" }}
          >
            {total === 0 ? "no traveler yet" : holding === total ? `all ${total} hold` : `${holding} of ${total} hold`}
          </td>
        </tr>
        {total === 0 ? null : (
          <tr style={{ verticalAlign: "top" }}>
            {stages.map((stage) => (
              <StageCell key={stage.name} stage={stage} />
            ))}
          </tr>
        )}
      </tbody>
    </table>
  );
}

/** The bar under the figure says the same again: done, begun, not begun; red when something fails. */
function StageCell({ stage }: { stage: BoardLine["stages"][number] }) {
  const { short, holding, total, failing } = stage;
  const isDone = total > 0 && holding === total;
  const [state, bar] =
    failing > 0
      ? ["bw-failed bw-bar-failed", light.failed]
      : isDone
        ? ["bw-passed bw-bar-passed", light.passed]
        : holding > 0
          ? ["bw-soft bw-bar-copper", light.copper]
          : ["bw-soft bw-rule", light.rule];
  const colour = failing > 0 ? light.failed : isDone ? light.passed : light.inkSoft;
  return (
    <td
      width="20%"
      align="center"
      className={state}
      style={{
        borderBottom: `3px solid ${bar}`,
        color: colour,
        fontSize: 11,
        lineHeight: "16px",
        padding: "2px 0 6px",
        whiteSpace: "nowrap",
      }}
    >
      {short}
      <br />
      <span style={{ fontFamily: FIGURE_FONT, fontSize: 13, fontWeight: isDone || failing > 0 ? 700 : 400 }}>
        {total === 0 ? "–" : `${holding}/${total}`}
      </span>
      {failing > 0 ? (
        <>
          <br />
          {failing} {failing === 1 ? "fails" : "fail"}
        </>
      ) : null}
    </td>
  );
}
