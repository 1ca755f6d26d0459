import type { Coverage, Stage } from "@/db/schema/procedures";

/** One check of a procedure as pages get it. */
export type CheckRow = {
  key: string;
  position: number;
  stage: Stage;
  title: string;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: string;
  spec: unknown;
  covers: Coverage;
  needs: string[];
};

/** By stage first, then as they were put: a procedure never goes back a stage. */
export function inStageOrder<Row extends { stage: Stage }>(rows: readonly Row[], order: readonly Stage[]): Row[] {
  return order.flatMap((stage) => rows.filter((row) => row.stage === stage));
}
