import { type LogicPart } from "./part";

/** "74HC283" for number 283 in family HC; a number that is more than digits is the project's own name and stays. */
export const partLabel = (part: Pick<LogicPart, "number">, family: string): string =>
  /^(?!74)\d{1,4}$|^74$/.test(part.number) ? `74${family}${part.number}` : part.number;
