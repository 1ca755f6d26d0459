import { describe, expect, it } from "vitest";
import { after, take, target } from "./take";

const CON = target("CON", "J1");
const HEAD = "Pin,Signal,Role,Family,Pull-up\n";
const PLAIN = `${HEAD}a8,PH4,input,HC,\na9,PH5,input,HC,\na10,FAULT_N,open-drain output,HCT,2k2\n`;

const utf16 = (text: string, isBig = false, mark = true) => {
  const units = [...((mark ? "\ufeff" : "") + text)].flatMap((letter) => {
    const code = letter.codePointAt(0) ?? 0;
    return isBig ? [code >> 8, code & 255] : [code & 255, code >> 8];
  });
  return Uint8Array.from(units);
};
const latin1 = (text: string) => Uint8Array.from([...text].map((letter) => letter.codePointAt(0) ?? 0));

describe("a file is read the same, whatever program wrote it", () => {
  const pins = ["a8 PH4 input", "a9 PH5 input", "a10 FAULT_N open-drain output"];

  it.each([
    ["RFC 4180 with CRLF", PLAIN.replaceAll("\n", "\r\n")],
    ["the line ends of an old Macintosh", PLAIN.replaceAll("\n", "\r")],
    ["semicolons", PLAIN.replaceAll(",", ";")],
    ["tabs", PLAIN.replaceAll(",", "\t")],
    ["a byte order mark", `\ufeff${PLAIN}`],
    ["blank lines between the rows", PLAIN.replaceAll("\n", "\n\n  \n")],
    ["separators after the last cell", PLAIN.replaceAll("\n", ",,,\n")],
    ["every cell in quotation marks", PLAIN.replace(/[^,\n]+/g, '"$&"')],
    ["no line end after the last row", PLAIN.trimEnd()],
    ["blanks around the cells", PLAIN.replaceAll(",", " , ")],
    ["headings of another wording", PLAIN.replace(HEAD, "Contact No.,Net name,Type,Logic family,Pull-up (Ω)\n")],
    ["columns in another order", "Role,Signal,Pin\ninput,PH4,a8\ninput,PH5,a9\nopen-drain output,FAULT_N,a10\n"],
    ["the connector before the pin", PLAIN.replace(/^a/gm, "J1.a")],
  ])("%s", (_what, text) => {
    const { plan, bad } = take(text, [CON], CON.id);
    expect(bad).toEqual([]);
    expect(after(plan)).toEqual(pins);
  });

  it.each([
    ["UTF-16 with its mark, low byte first", utf16(PLAIN), "UTF-16"],
    ["UTF-16 with its mark, high byte first", utf16(PLAIN, true), "UTF-16"],
    ["UTF-16 without a mark", utf16(PLAIN, false, false), "UTF-16"],
    ["Latin-1", latin1(PLAIN.replace("2k2", "2k2").replace("Family", "Famille é")), "Latin-1"],
  ])("%s", (_what, bytes, encoding) => {
    const taken = take(bytes, [CON], CON.id);
    expect(taken.encoding).toBe(encoding);
    expect(after(taken.plan)).toEqual(pins);
  });

  it("keeps letters beyond ASCII: µ in a Latin-1 file is µ", () => {
    const { plan } = take(latin1("Pin,Signal,Note\na8,PH4,rise 2 µs\n"), [CON], CON.id);
    expect(plan.targets[0]?.changes[0]?.after.note).toBe("rise 2 µs");
  });

  it("without headings the pins are found by their looks, and the signal beside them", () => {
    const { hasHeadings, mapping, plan } = take("1;a8;PH4\n2;a9;PH5\n", [CON], CON.id);
    expect([hasHeadings, mapping]).toEqual([false, ["", "pin", "signal"]]);
    expect(after(plan)).toEqual(["a8 PH4 passive", "a9 PH5 passive"]);
  });
});

describe("a row that cannot be taken is named with its line and the reason", () => {
  it.each([
    ["a pin that the connector does not have", "a33,PH4,input,,", "2: CON J1 has no pin a33"],
    ["a role that is none", "a8,PH4,inputt,,", "2: a8, Role: “inputt” is no role."],
    ["a pull-up that is no resistance", "a8,PH4,input,,lots", "2: a8, Pull-up: The pull-up was not understood"],
    ["a pull-up of nothing", "a8,PH4,input,,0", "2: a8, Pull-up: A pull-up is 1 Ω to 100 MΩ."],
    ["a family that nobody knows", "a8,PH4,input,XYZ,", "2: a8, Family: “XYZ” is no logic family"],
    ["a signal of two words", "a8,PH 4,input,,", "2: a8, Signal: “PH 4” has a blank in it."],
    ["more cells than columns", "a8,PH4,input,HC,2k2,and,more", "2: It has 7 cells for 5 columns."],
    ["no pin", ",PH4,input,,", "2: It names no pin."],
    [
      "a bus that is too long for its pins",
      "a8:a11,D[7:0],input,,",
      "2: D[7:0] names 8 signals, but a8:a11 are 4 pins.",
    ],
    ["a bus on one pin", "a8,D[7:0],input,,", "2: D[7:0] names 8 signals, but a8 is one pin."],
    ["a range over two rows", "a8:b11,D[3:0],input,,", "2: a8:b11 runs over two rows of the connector."],
    ["a range beyond the face", "a30:a33,D[3:0],input,,", "2: CON J1 has no pin a33"],
  ])("%s", (_what, row, sentence) => {
    const { plan, bad } = take(`${HEAD}${row}\na9,PH5,input,HC,\n`, [CON], CON.id);
    expect(bad).toHaveLength(1);
    expect(bad[0]).toContain(sentence);
    expect(after(plan)).toEqual(["a9 PH5 input"]);
  });

  it("a pin that stands twice, also in another case", () => {
    const { bad, plan } = take(`${HEAD}a8,PH4,input,,\n\nA8,PH5,input,,\n`, [CON], CON.id);
    expect(bad).toEqual(["4: a8 of CON J1 stands in line 2 already."]);
    expect(after(plan)).toEqual(["a8 PH4 input"]);
  });

  it("line numbers count blank lines and lines inside quotation marks", () => {
    const { bad } = take(`Pin,Signal,Note\n\n"a8",PH4,"two\nlines"\na99,PH5,\n`, [CON], CON.id);
    expect(bad.map((one) => one.slice(0, 2))).toEqual(["3:", "5:"]);
  });

  it("a quotation mark that never closes refuses the file, with its line", () => {
    expect(() => take('Pin,Signal\na8,PH4\na9,"PH5\na10,PH6\n', [CON], CON.id)).toThrow("opens in line 3");
  });

  it("ten thousand rows are taken, one more is not", () => {
    const rows = (count: number) => Array.from({ length: count }, (_, at) => `a${at + 1},S${at}`).join("\n");
    expect(take(`Pin,Signal\n${rows(10_000)}`, [CON], CON.id).judged.rows).toBe(10_000);
    expect(() => take(`Pin,Signal\n${rows(10_001)}`, [CON], CON.id)).toThrow("at most 10,000 are taken at once");
  });

  it("a picture is no table", () => {
    expect(() => take(Uint8Array.from([137, 80, 78, 71, 13, 10, 26, 10, 0, 0, 1, 2]), [CON])).toThrow(
      "no table of text",
    );
  });
});

describe("a file for the whole machine", () => {
  const TIM = target("TIM", "J1");
  const machine = [CON, TIM, target("TIM", "X2")];

  it.each([
    ["board and connector in two columns", "Board,Connector,Pin,Signal\nTIM,J1,a8,CLK\n"],
    ["both in one column", "Connector,Pin,Signal\nTIM.J1,a8,CLK\n"],
    ["in small letters", "Board,Connector,Pin,Signal\ntim,j1,a8,CLK\n"],
  ])("names the connector of each row: %s", (_what, text) => {
    const { plan, bad } = take(text, machine);
    expect(bad).toEqual([]);
    expect(plan.targets.map(({ target: { id } }) => id)).toEqual(["TIM.J1"]);
  });

  it("asks for the board where a reference is on several", () => {
    expect(take("Connector,Pin,Signal\nJ1,a8,CLK\n", machine).bad).toEqual([
      "2: J1 can be CON J1, TIM J1. Name the board, too.",
    ]);
    expect(take("Connector,Pin,Signal\nX2,a8,CLK\n", machine).bad).toEqual([]);
  });

  it("does not put rows of another connector onto the chosen one", () => {
    expect(take("Connector,Pin,Signal\nTIM.J1,a8,CLK\n", machine, "CON.J1").bad).toEqual([
      "2: It is for TIM.J1; only CON J1 is taken here.",
    ]);
  });
});

describe("what would change is shown before anything does", () => {
  const kept = target("CON", "J1", {
    a8: { signal: "PH4", role: "input", family: "HC" },
    a9: { signal: "PH5", role: "input", family: "HC" },
    a10: { signal: "PH6", role: "input" },
  });

  it("added, changed, cleared and as it is, pin by pin", () => {
    const { plan } = take("Pin,Signal,Role,Family\na8,PH4,input,HC\na9,PH5,input,LS\na10,,,\na11,PH7,input,HC\n", [
      kept,
    ]);
    expect([plan.added, plan.changed, plan.cleared, plan.unchanged]).toEqual([1, 1, 1, 1]);
    expect(after(plan)).toEqual(["a9 PH5 input", "a10 –", "a11 PH7 input"]);
  });

  it("a pin in the wrong case is taken and told", () => {
    const { judged, bad } = take("Pin,Signal\nA11,PH7\n", [kept]);
    expect([bad, judged.recased]).toEqual([[], [{ written: "A11", name: "a11" }]]);
  });

  it("a bus runs over its pins in its own order", () => {
    expect(after(take("Pin,Signal\na14:a17,D[3:0]\n", [kept]).plan)).toEqual([
      "a14 D3 passive",
      "a15 D2 passive",
      "a16 D1 passive",
      "a17 D0 passive",
    ]);
  });
});
