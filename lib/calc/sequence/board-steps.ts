import { byName } from "../check-graph";
import { says } from "./board-links";
import type { Apart, BoardLink, BoardStep } from "./board-order";
import { joined, listNets } from "./list-nets";
import { nextBoard } from "./next-board";

type Units = BoardStep["units"];

/** One step after the other, with what is proven by then. */
export function boardSteps(
  unproven: readonly string[],
  proven: readonly string[],
  links: readonly BoardLink[],
  unitsOf: (board: string) => Units,
): BoardStep[] {
  const [left, done] = [[...unproven], new Set(proven)];
  const steps: BoardStep[] = [];
  for (let board = nextBoard(left, links); board !== undefined; board = nextBoard(left, links)) {
    steps.push(step(board, left, done, links, unitsOf(board)));
    left.splice(left.indexOf(board), 1);
    done.add(board);
  }
  return steps;
}

const isElectric = ({ kind }: BoardLink) => kind === "supplies" || kind === "drives";

function step(
  board: string,
  left: readonly string[],
  done: ReadonlySet<string>,
  links: readonly BoardLink[],
  units: Units,
): BoardStep {
  const into = links.filter(({ to }) => to === board);
  const ready = into.filter(({ from }) => done.has(from));
  const held = apart(
    into.filter((link) => isElectric(link) && left.includes(link.from)),
    "from",
    (boards, nets) => `${boards} is not proven by then: on the extender the bench gives ${nets} instead.`,
  );
  const open = apart(
    links.filter((link) => isElectric(link) && link.from === board && done.has(link.to)),
    "to",
    (boards, nets) => `${boards} is proven by then: the extender leaves ${nets} open until ${board} is.`,
  );
  const waiting = new Set(links.flatMap(({ from, to }) => (from === board && left.includes(to) ? [to] : [])));
  const after = [...new Set(ready.map(({ from }) => from))].sort(byName);
  const words = links.filter(({ kind, from, to }) => kind === "said" && from === board && left.includes(to));
  const reason = [why(ready, words, held), whatFollows([...waiting]), partly(units)].join(" ").trim();
  return { board, units, after, held, open, reason };
}

function apart(
  links: readonly BoardLink[],
  end: "from" | "to",
  say: (boards: string, nets: string) => string,
): Apart | null {
  if (links.length === 0) return null;
  const boards = [...new Set(links.map((link) => link[end]))].sort(byName);
  const nets = [...new Set(links.flatMap((link) => link.nets))].sort(byName);
  const sentence = say(joined(boards), listNets(nets));
  return { boards, nets, sentence: boards.length > 1 ? sentence.replace(" is ", " are ") : sentence };
}

function why(ready: readonly BoardLink[], words: readonly BoardLink[], held: Apart | null): string {
  const sentences = ready.length > 0 ? [`${joined(ready.map(says))}.`] : [];
  if (held && words.length > 0) sentences.push(...words.map(({ sentence }) => sentence));
  else if (held) sentences.push("In a circle of boards that drive each other the fewest lines run into it.");
  return sentences.length > 0 ? sentences.join(" ") : "No other board drives or supplies it.";
}

function whatFollows(boards: readonly string[]): string {
  if (boards.length === 0) return "Nothing comes after it.";
  return `${joined([...boards].sort(byName))} ${boards.length === 1 ? "comes" : "come"} after it.`;
}

/** "CON-01 is proven already, CON-02 is not." */
function partly(units: Units): string {
  if (units.length === 0) return "It stands nowhere in the machine yet.";
  const proven = units.filter((unit) => unit.proven).map(({ label }) => label);
  const others = units.filter((unit) => !unit.proven).map(({ label }) => label);
  if (proven.length === 0 || others.length === 0) return "";
  const are = (labels: string[]) => (labels.length === 1 ? "is" : "are");
  return `${joined(proven)} ${are(proven)} proven already, ${joined(others)} ${are(others)} not.`;
}
