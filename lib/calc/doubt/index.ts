export { doubtfulAfter, type DoubtContext } from "./doubtful-after";
export { type DoubtAfter, type DoubtLine, type DoubtReason, type RepeatWork } from "./doubt-line";
export { repeatWork } from "./repeat-work";
export {
  REWORK_KINDS,
  type BoardMap,
  type CoveringCheck,
  type Covers,
  type DoubtChoices,
  type Rework,
  type ReworkKind,
  type Touched,
} from "./rework";
