import { defineRoute } from "@/lib/actions/define-route";
import { givePartsList } from "@/lib/parts-list/give-parts-list";
import { partsListInput } from "@/lib/parts-list/schema";

export const GET = defineRoute({
  name: "give-parts-list",
  permission: "project.see",
  input: partsListInput,
  run: givePartsList,
});
