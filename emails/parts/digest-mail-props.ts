/** What a glyph would say on a screen; here it is always a word. */
export type Mark = "failed" | "reopened" | "doubtful" | "conceded" | "passed" | "free";

/** One check or thing that is spoken of. */
export type DigestItem = {
  mark: Mark;
  /** Stands before the title: the unit's serial. */
  serial: string;
  title: string;
  link: string;
  /** Sentences under it. */
  detail: string;
};

/** As many as a mail should have, and how many more there are. */
export type DigestList = { items: DigestItem[]; more: number };

export type PassedLine = {
  serial: string;
  link: string;
  /** "6 for the first time, 2 on repeat" */
  counts: string;
  checks: { title: string; link: string }[];
  more: number;
};

export type BoardLine = {
  serial: string;
  name: string;
  slot: number | null;
  link: string;
  holding: number;
  total: number;
  stages: { name: string; short: string; holding: number; total: number; failing: number }[];
};

export type DigestPicture = { contentId: string; caption: string; width: number; height: number };

export type EntryLine = {
  title: string;
  link: string;
  by: string;
  excerpt: string;
  pictures: DigestPicture[];
};

/** Open findings of the rule check over the whole machine. */
export type FindingsLine = {
  /** "3 findings are open in the wiring: 2 must be mended, 1 should be. 1 is new." */
  sentence: string;
  link: string;
  /** Titles of what is new since the last mail. */
  fresh: string[];
  more: number;
};

export type DigestMailProps = {
  projectName: string;
  projectLink: string;
  logLink: string;
  /** "Sun 22 Feb to Sun 1 Mar" */
  period: string;
  /** The week in a few words, for the subject. */
  headline: string;
  /** What the week was, in a sentence or two. */
  summary: string;
  /** How the machine stands, in a sentence. */
  standing: string;
  /** When the rest will hold, in a sentence; empty while there is nothing to say. */
  outlook: string;
  /** Nothing happened: only the summary and what is next are said. */
  isQuiet: boolean;
  boards: BoardLine[];
  passed: { lines: PassedLine[]; more: number };
  failed: DigestList;
  decided: DigestList;
  entries: { lines: EntryLine[]; more: number };
  also: { sentences: { text: string; link: string }[]; more: number };
  open: DigestList;
  next: DigestList;
  /** Null when nothing is open. */
  wiring: FindingsLine | null;
  settingsLink: string;
  /** A page with a button; the mail reader's own button uses the header. */
  unsubscribeLink: string;
};
