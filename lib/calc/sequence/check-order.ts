/** A circle is refused: its members in order, each waiting for the next, the last for the first. */
export type Circle = { ok: false; circle: string[]; message: string };

export type Ordered<T> = { ok: true; value: T } | Circle;

export type OpenCheck = {
  checkId: string;
  /** Nothing that it waits for is open: it can be done now. */
  free: boolean;
  /** What it waits for directly and that does not hold. */
  waitsFor: string[];
  /** Open checks that can be done as soon as it holds, and no sooner. */
  frees: string[];
  /** How many open checks come after it, directly or through others. */
  holdsBack: number;
  /** From its beginning to the end of the longest chain behind it, s. */
  tailS: number;
  /** Why it comes where it comes, in words. */
  reason: string;
};

export type CriticalPath = {
  /** The longest chain of open checks by expected time, the first one first. */
  steps: { checkId: string; expectedS: number; startS: number }[];
  totalS: number;
  /** Some paces are not known and a general one stands in. */
  isGuess: boolean;
  sentence: string;
};

export type CheckOrder = {
  /** What does not hold yet, in an order that breaks no prerequisite and no hold. */
  open: OpenCheck[];
  /** Ids of the free ones, the one that lets go most first. */
  now: string[];
  critical: CriticalPath | null;
};

export type ScheduleRequest = {
  builders: 1 | 2;
  /** Time there is, s. */
  seconds: number;
};

export type ScheduledCheck = {
  checkId: string;
  builder: 1 | 2;
  startS: number;
  endS: number;
  reason: string;
};

export type Schedule = {
  lines: ScheduledCheck[];
  /** Until the last one is done, s. */
  usedS: number;
  /** Open checks that the time does not reach. */
  left: number;
  isGuess: boolean;
  sentence: string;
};
