import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { addConnectorInput, editConnectorInput, removeConnectorInput } from "@/lib/connector/schema";
import type { copyPinMapInput } from "@/lib/pin-map/schema";

type Act<Schema extends z.ZodType, Value> = (input: z.input<Schema>) => Promise<Reply<Value>>;

export type ConnectorActs = {
  add: Act<typeof addConnectorInput, { id: string; name: string }>;
  edit: Act<typeof editConnectorInput, { name: string; version: number }>;
  remove: Act<typeof removeConnectorInput, { pins: number }>;
  copy: Act<typeof copyPinMapInput, { slots: number; pins: number }>;
};
