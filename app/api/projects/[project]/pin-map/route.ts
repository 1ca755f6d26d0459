import { defineRoute } from "@/lib/actions/define-route";
import { givePinMapFile, pinMapFileInput } from "@/lib/pin-map-file/give-pin-map-file";

export const GET = defineRoute({
  name: "give-pin-map-file",
  permission: "project.see",
  input: pinMapFileInput,
  run: givePinMapFile,
});
