/** Each hue with its text, its ground and its bar; a test holds every pair to WCAG 2.2 AA. */
export const TONES = {
  plain: {
    text: "text-ink-soft",
    ground: "bg-raised",
    bar: "border-l-rule-strong",
    badge: "border-rule-strong bg-raised text-ink-soft",
  },
  copper: {
    text: "text-copper",
    ground: "bg-copper-ground",
    bar: "border-l-copper",
    badge: "border-copper/40 bg-copper-ground text-copper",
  },
  passed: {
    text: "text-passed",
    ground: "bg-passed-ground",
    bar: "border-l-passed",
    badge: "border-passed/40 bg-passed-ground text-passed",
  },
  failed: {
    text: "text-failed",
    ground: "bg-failed-ground",
    bar: "border-l-failed",
    badge: "border-failed/40 bg-failed-ground text-failed",
  },
  reopened: {
    text: "text-reopened",
    ground: "bg-reopened-ground",
    bar: "border-l-reopened",
    badge: "border-reopened/40 bg-reopened-ground text-reopened",
  },
  doubtful: {
    text: "text-doubtful",
    ground: "bg-doubtful-ground",
    bar: "border-l-doubtful",
    badge: "border-doubtful/40 bg-doubtful-ground text-doubtful",
  },
  waiting: {
    text: "text-waiting",
    ground: "bg-waiting-ground",
    bar: "border-l-waiting",
    badge: "border-waiting/40 bg-waiting-ground text-waiting",
  },
  untested: {
    text: "text-untested",
    ground: "bg-untested-ground",
    bar: "border-l-untested",
    badge: "border-untested/40 bg-untested-ground text-untested",
  },
  conceded: {
    text: "text-conceded",
    ground: "bg-conceded-ground",
    bar: "border-l-conceded",
    badge: "border-conceded/40 bg-conceded-ground text-conceded",
  },
} as const;

export type Tone = keyof typeof TONES;
