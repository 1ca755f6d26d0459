import type { Edit, PinAt, Weight } from "./finding";
import type { Survey } from "./survey";

/** What a rule says before equal mistakes are put together. */
export type Draft = {
  rule: string;
  weight: Weight;
  /** What it is about: the net's name, or board and connector. */
  subject: string;
  /** The title from the subject, or from several where one mistake shows on several nets. */
  title: (subject: string) => string;
  why: string;
  mend: string;
  edits: Edit[];
  pins: readonly PinAt[];
  /** Codes; those of the pins when left away. */
  boards?: readonly string[];
  /** Figures that the finding rests upon besides its pins. */
  facts?: string;
  /** Drafts of one rule with the same word here are one mistake; left away: those at the same pins of the same designs. */
  sameAs?: string;
  /** Given where the lines of a bus may be told together: those with the same word and the same boards are. */
  bus?: string;
};

/** One rule of the check, or a close family of them: pure, and linear in what it looks at. */
export type Rule = (survey: Survey) => Draft[];
