"use server";

import { defineAction } from "@/lib/actions/define-action";
import { takePinMapsInput } from "@/lib/pin-map/schema";
import { takePinMaps as take } from "@/lib/pin-map-file/take-pin-maps";

export const takePinMaps = defineAction({
  name: "take-pin-maps",
  permission: "wiring.edit",
  input: takePinMapsInput,
  run: take,
});
