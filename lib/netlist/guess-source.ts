/** Records of a test file: job and comment lines, points, continuations, outlines, the end. */
const RECORD = /^(?:[CP](?:\s|$)|[03]\d[0789]|999)/;
const DELIMITED = /[,;\t]/;

/** What a file is, by its first lines: most of a test file's begin with the number of their record. */
export function guessSource(text: string): "ipc-d-356" | "pin-list" {
  const lines = text
    .slice(0, 20_000)
    .split(/\r\n?|\n/)
    .map((line) => line.trimEnd())
    .filter((line) => line !== "")
    .slice(0, 60);
  const records = lines.filter((line) => RECORD.test(line) && !(DELIMITED.test(line) && !/^[CP]\s/.test(line))).length;
  return lines.length > 0 && records > lines.length / 2 ? "ipc-d-356" : "pin-list";
}
