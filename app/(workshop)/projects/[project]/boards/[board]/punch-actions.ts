"use server";

import { defineAction } from "@/lib/actions/define-action";
import { dealPunch as deal, reopenPunch as reopen } from "@/lib/punch/deal-punch";
import { dealPunchInput, reopenPunchInput, takePunchInput } from "@/lib/punch/schema";
import { takePunch as take } from "@/lib/punch/take-punch";

export const takePunch = defineAction({
  name: "take-punch",
  permission: "board.edit",
  input: takePunchInput,
  run: take,
});

export const dealPunch = defineAction({
  name: "deal-punch",
  permission: "board.edit",
  input: dealPunchInput,
  run: deal,
});

export const reopenPunch = defineAction({
  name: "reopen-punch",
  permission: "board.edit",
  input: reopenPunchInput,
  run: reopen,
});
