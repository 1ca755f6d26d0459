import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { openFault } from "@/lib/fault/open-fault";
import { openFaultInput } from "@/lib/fault/schema";

/** A fault as the form sends it, with everything that may stay empty left empty. */
export const FAULT_FORM = {
  title: "Bit 8 never comes on",
  symptom: "",
  suspected: "",
  tried: "",
  cause: "",
  mend: "",
  lesson: "",
  nextRevision: "",
  hours: "",
  signals: ["PH8"],
  pins: [],
  state: "open",
};

/** Opens a fault on CON-01 unless another unit is given. */
export function fault(scope: ProjectScope, given: Partial<Record<keyof typeof FAULT_FORM, unknown>> & Ties = {}) {
  const ties = { unit: "CON-01", checkId: null, attemptId: null, probePlanId: null };
  const form = { project: scope.slug, writeId: randomUUID(), ...FAULT_FORM, ...ties, ...given };
  return openFault(scope, openFaultInput.parse(form));
}

type Ties = { unit?: string; checkId?: string; attemptId?: string; writeId?: string };
