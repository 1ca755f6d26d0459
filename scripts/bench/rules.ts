import { checkMachine, type Machine } from "@/lib/calc/interconnect";
import { largeMachine } from "./large-machine";
import { summarise } from "./measure";
import { milliseconds, times, type Row } from "./row";

const CARDS = 40;
const GROWTH = 10;
const MOST = 12;
const WARM_UP = 2;
const ROUNDS = 12;

/** The rule check over 40 cards of 96 pins and over ten times as many, in turns: the cost must grow with the pins. */
export function benchRules(): Row[] {
  const [small, large] = [new Stopwatch(CARDS), new Stopwatch(CARDS * GROWTH)];
  for (let round = -WARM_UP; round < ROUNDS; round += 1) {
    for (let again = 0; again < GROWTH; again += 1) small.run(round >= 0);
    large.run(round >= 0);
  }
  const growth = large.median() / small.median();
  return [
    {
      work: `rule check, ${CARDS * GROWTH} × 96 pins against ${CARDS} × 96`,
      ours: milliseconds(large.median()),
      floor: milliseconds(small.median()),
      ratio: times(growth),
      toReach: `${MOST} × for ten times the pins`,
      reached: growth <= MOST,
    },
  ];
}

class Stopwatch {
  private readonly machine: Machine;
  private readonly spent: number[] = [];

  constructor(cards: number) {
    this.machine = largeMachine(cards);
  }

  run(counts: boolean): void {
    const start = performance.now();
    checkMachine(this.machine);
    if (counts) this.spent.push(performance.now() - start);
  }

  median = (): number => summarise(this.spent).median;
}
