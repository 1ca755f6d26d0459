import type { BoardLine, DigestItem, DigestList, DigestMailProps, Mark } from "./parts/digest-mail-props";

const WORDS: Record<Mark, string> = {
  failed: "fails",
  reopened: "reopened",
  doubtful: "in doubt",
  conceded: "conceded",
  passed: "passes now",
  free: "free to do",
};

/** The digest as plain text: written for reading, not what is left of a page when its markup is taken away. */
export function digestText(props: DigestMailProps): string {
  const { projectName, period, summary, standing, outlook, projectLink, logLink, isQuiet } = props;
  const { boards, failed, decided, passed, entries, also, open, next, wiring } = props;
  const head = [projectName, period, "", summary, standing, ...(outlook === "" ? [] : [outlook])];
  const first = { items: next.items.slice(0, 1), more: 0 };
  const body = isQuiet
    ? section("Next on the bench", items(first, projectLink))
    : [
        `The rack: ${projectLink}`,
        ...section("Where the boards stand", boards.flatMap(boardText)),
        ...section("Did not conform this week", items(failed, logLink)),
        ...section("Reopened, conceded, in doubt", items(decided, logLink)),
        ...section("Passed this week", [...passed.lines.flatMap(passedText), ...more(passed.more, logLink)]),
        ...section("New in the log", [...entries.lines.flatMap(entryText), ...more(entries.more, logLink)]),
        ...section("Also", [
          ...also.sentences.flatMap(({ text, link }) => [text, `  ${link}`]),
          ...more(also.more, logLink),
        ]),
        ...section("Open failures", items(open, projectLink)),
        ...section("In the wiring", wiring ? wiringText(wiring) : []),
        ...section("Next on the bench", items(next, projectLink)),
      ];
  return [...head, ...body, ...footer(props)].join("\n");
}

const section = (title: string, lines: string[]) =>
  lines.length === 0 ? [] : ["", title, "-".repeat(title.length), ...lines];

const more = (count: number, link: string) => (count === 0 ? [] : [`and ${count} more: ${link}`]);

const items = (list: DigestList, link: string) => [...list.items.flatMap(itemText), ...more(list.more, link)];

const itemText = ({ serial, title, mark, detail, link }: DigestItem) => [
  `${serial}  ${title}: ${WORDS[mark]}.`,
  `  ${detail}`,
  `  ${link}`,
];

/** "1 Timebase TIM-A1: 34 of 40 hold. Inspection 6 of 6, continuity 4 of 5 …" */
function boardText({ slot, name, serial, holding, total, stages, link }: BoardLine): string[] {
  const place = slot === null ? "" : `${slot} `;
  if (total === 0) return [`${place}${name} ${serial}: no traveler yet.`, `  ${link}`];
  const words = stages
    .filter((stage) => stage.total > 0)
    .map((stage, index) => {
      const named = index === 0 ? stage.name : stage.name.toLowerCase();
      const fails = stage.failing > 0 ? ` (${stage.failing} ${stage.failing === 1 ? "fails" : "fail"})` : "";
      return `${named} ${stage.holding} of ${stage.total}${fails}`;
    });
  return [`${place}${name} ${serial}: ${holding} of ${total} hold.`, `  ${words.join(", ")}.`, `  ${link}`];
}

const passedText = ({ serial, counts, checks, more: rest, link }: DigestMailProps["passed"]["lines"][number]) => [
  `${serial}: ${counts}.`,
  ...checks.map((check) => `  ${check.title}\n  ${check.link}`),
  rest > 0 ? `  ${rest} more: ${link}` : `  ${link}`,
];

const entryText = ({ title, by, excerpt, pictures, link }: DigestMailProps["entries"]["lines"][number]) => [
  `${title} (${by})`,
  ...(excerpt === "" ? [] : [`  ${excerpt}`]),
  ...pictures.map((picture) => `  [Picture: ${picture.caption}]`),
  `  ${link}`,
];

const wiringText = ({ sentence, fresh, more: rest, link }: NonNullable<DigestMailProps["wiring"]>) => [
  sentence,
  ...fresh.map((title) => `  New: ${title}`),
  ...(rest === 0 ? [] : [`  and ${rest} more`]),
  `  ${link}`,
];

const footer = ({ projectName, settingsLink, unsubscribeLink }: DigestMailProps) => [
  "",
  `You get this once a week because you follow ${projectName}.`,
  `Another day or hour: ${settingsLink}`,
  `No more of these: ${unsubscribeLink}`,
];
