import type { BoardLink, BoardRisk, BoardStep } from "@/lib/calc/sequence";
import type { PlacedBox, PlacedLine } from "./lay-out-graph";

export type SaidLine = {
  id: string;
  /** "CON waits for TIM" */
  words: string;
  reason: string;
  by: string;
  at: string;
};

export type BoardBox = PlacedBox & {
  name: string;
  /** Its number in the order; null: it is proven. */
  number: number | null;
  isNext: boolean;
};

export type BoardArrow = PlacedLine & { kind: BoardLink["kind"]; sentence: string };

export type BoardOrderView = {
  boards: { id: string; code: string; name: string }[];
  steps: BoardStep[];
  proven: string[];
  risks: BoardRisk[];
  remarks: string[];
  said: SaidLine[];
  drawing: { width: number; height: number; boxes: BoardBox[]; arrows: BoardArrow[] };
  /** Only when what is said goes round in a circle, which a board that was restored can do. */
  circle: string | null;
};
