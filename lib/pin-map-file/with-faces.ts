import { faceOf } from "@/lib/calc/connector";
import type { TakeTarget } from "./resolve-target";
import type { TakeSource } from "./load-take-sources";

/** The same connectors with their faces, drawn from their types. */
export const withFaces = (sources: readonly TakeSource[]): TakeTarget[] =>
  sources.flatMap(({ type, grid, ...rest }) => {
    const face = faceOf({ type, grid });
    return face ? [{ ...rest, face }] : [];
  });
