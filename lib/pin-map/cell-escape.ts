/**
 * A spreadsheet takes a cell that begins with one of these for a formula (OWASP, CSV injection; with the full-width
 * forms of the signs). Signals such as +5V and -12V begin so, too, and must come back as they were.
 */
const FORMULA_LOOKING = /^'*[=+\-@\t\r\n＝＋－＠]/;
const ESCAPED = /^'+[=+\-@\t\r\n＝＋－＠]/;

/** What goes to the clipboard or into a file: a formula-looking cell gets an apostrophe before it. */
export const escapeCell = (text: string): string => (FORMULA_LOOKING.test(text) ? `'${text}` : text);

/** What came from there: our own apostrophe goes, any other stays. unescapeCell(escapeCell(text)) is always text. */
export const unescapeCell = (text: string): string => (ESCAPED.test(text) ? text.slice(1) : text);
