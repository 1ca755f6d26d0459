"use server";

import { defineAction } from "@/lib/actions/define-action";
import { benchSessionInput } from "@/lib/bench-session/schema";
import { startBenchSession as start } from "@/lib/bench-session/start-bench-session";
import { stopBenchSession as stop } from "@/lib/bench-session/stop-bench-session";
import { sayBoardOrder as say } from "@/lib/order/say-board-order";
import { sayBoardOrderInput, withdrawBoardOrderInput } from "@/lib/order/schema";
import { withdrawBoardOrder as withdraw } from "@/lib/order/withdraw-board-order";

export const sayBoardOrder = defineAction({
  name: "say-board-order",
  permission: "prerequisite.edit",
  input: sayBoardOrderInput,
  run: say,
});

export const withdrawBoardOrder = defineAction({
  name: "withdraw-board-order",
  permission: "prerequisite.edit",
  input: withdrawBoardOrderInput,
  run: withdraw,
});

export const startBenchSession = defineAction({
  name: "start-bench-session",
  permission: "attempt.record",
  input: benchSessionInput,
  run: start,
});

export const stopBenchSession = defineAction({
  name: "stop-bench-session",
  permission: "attempt.record",
  input: benchSessionInput,
  run: stop,
});
