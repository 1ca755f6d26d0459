import { defineRoute } from "@/lib/actions/define-route";
import { keepNetlist } from "@/lib/netlist/keep-netlist";
import { keepNetlistInput, NETLIST_BODY_LIMIT } from "@/lib/netlist/schema";

/** Files are larger than what an action takes. */
export const POST = defineRoute({
  name: "keep-netlist",
  permission: "wiring.edit",
  input: keepNetlistInput,
  run: keepNetlist,
  bodyLimit: NETLIST_BODY_LIMIT,
});
