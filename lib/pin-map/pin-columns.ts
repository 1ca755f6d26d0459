/** What is kept of a pin beside its name, in the order in which a table shows it. */
export const PIN_COLUMNS = ["signal", "role", "family", "loads", "enableGroup", "pullUpOhm", "note"] as const;
export type PinColumn = (typeof PIN_COLUMNS)[number];

/** Headings of tables and files. */
export const COLUMN_NAMES: Record<PinColumn, string> = {
  signal: "Signal",
  role: "Role",
  family: "Family",
  loads: "Loads",
  enableGroup: "Enable group",
  pullUpOhm: "Pull-up",
  note: "Note",
};

/** A row as it stands in the cells of a table: text, whether or not it can be read. */
export type PinTexts = Record<PinColumn, string>;

export const EMPTY_TEXTS: PinTexts = {
  signal: "",
  role: "",
  family: "",
  loads: "",
  enableGroup: "",
  pullUpOhm: "",
  note: "",
};

/** A row without a word in it is no row: the pin carries nothing. */
export const isEmptyRow = (texts: PinTexts): boolean => PIN_COLUMNS.every((column) => texts[column].trim() === "");
