import { describe, expect, it } from "vitest";
import { columnsOf, guessPinColumns } from "@/lib/netlist/guess-pin-columns";
import { guessSource } from "@/lib/netlist/guess-source";
import { splitTable } from "@/lib/pin-map-file/split-table";

const guessed = (text: string) => {
  const split = splitTable(text);
  if (!split.ok) throw new Error(split.sentence);
  return guessPinColumns(split.table);
};

describe("What a netlist's file is", () => {
  it("a file of records is told from a list of pins by its first lines", () => {
    const record = "317GND              U1    -7    D0315PA00X+012500Y+010000X0630Y0000";
    expect(guessSource(`C  Comment\r\nP  JOB x\r\n${record}\r\n999\r\n`)).toBe("ipc-d-356");
    expect(guessSource("net,part,pin\nGND,U1,7\n")).toBe("pin-list");
    expect(guessSource("317;U1;7\n327;U1;8\n")).toBe("pin-list");
    expect(guessSource("")).toBe("pin-list");
  });

  it("headings name the columns in any order; without them net, part and pin are taken in theirs", () => {
    const named = guessed("Pin;RefDes;Net name\n7;U1;GND");
    expect(named).toEqual({ hasHeadings: true, mapping: ["pin", "part", "net"] });
    expect(columnsOf(named.mapping)).toEqual({ net: 2, part: 1, pin: 0, x: null, y: null });
    expect(guessed("GND,U1,7\nGND,U2,7")).toEqual({ hasHeadings: false, mapping: ["net", "part", "pin"] });
    expect(guessed("GND,U1-7\nGND,U2-7").mapping).toEqual(["net", "pin"]);
  });

  it("says nothing while the net or the pin has no column", () => {
    expect(columnsOf(["net", "part"])).toBeUndefined();
  });
});
