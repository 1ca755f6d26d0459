import { endSentence } from "./words";
import type { Writers } from "./writer";

const KIND_WORDS: Record<string, string> = {
  photo: "the photo",
  "scope-picture": "the scope picture",
  "scope-data": "the scope data",
};
const fileWords = (kind: string, fileName: string) => `${KIND_WORDS[kind] ?? "the file"} ${fileName}`;

/** Pictures, captures and the log. */
export const JOURNAL: Writers<"evidence" | "log"> = {
  "evidence.attached": ({ kind, fileName }, { who, file, place }) => [
    who,
    " attached ",
    file(fileWords(kind, fileName)),
    ...place(" to "),
    ".",
  ],
  "evidence.removed": ({ kind, fileName }, { who, place }) => [
    who,
    ` removed ${fileWords(kind, fileName)}`,
    ...place(" from "),
    ".",
  ],
  "evidence.restored": ({ kind, fileName }, { who, file, place }) => [
    who,
    " restored ",
    file(fileWords(kind, fileName)),
    ...place(" of "),
    ".",
  ],
  "evidence.captioned": ({ kind, fileName, caption }, { who, file }) =>
    caption === ""
      ? [who, " took the caption off ", file(fileWords(kind, fileName)), "."]
      : [who, " captioned ", file(fileWords(kind, fileName)), `: ${endSentence(caption)}`],
  "log.written": ({ title }, { who, entry }) => [who, " wrote ", entry(title), "."],
  "log.edited": ({ title }, { who, entry }) => [who, " edited ", entry(title), "."],
  "log.archived": ({ title }, { who, entry }) => [who, " archived ", entry(title), "."],
  "log.restored": ({ title }, { who, entry }) => [who, " restored ", entry(title), "."],
};
