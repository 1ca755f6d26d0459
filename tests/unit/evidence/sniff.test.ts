import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sniff } from "@/lib/storage/sniff";
import { html, pdf, plainPng, scopeText, svg } from "@/tests/support/hostile-files";

async function look(bytes: Uint8Array, name: string) {
  const answer = await sniff(bytes, name);
  return answer.ok ? answer.value : answer.error.message;
}
const text = (content: string) => Buffer.from(content);
const csv = { what: "data", type: "text/csv" };
const utf16 = (content: string) => Buffer.from(`\ufeff${content}`, "utf16le");

describe("scope data", () => {
  it("is known by its rows of numbers, after any preamble", async () => {
    expect(await look(scopeText(100), "CLK.csv")).toEqual(csv);
    expect(await look(scopeText(100, "\t"), "CLK.txt")).toEqual({ what: "data", type: "text/tab-separated-values" });
    expect(await look(scopeText(60_000), "long.csv")).toEqual(csv);
  });

  it("may have decimal commas, quotes, empty fields, no header, old line ends", async () => {
    expect(await look(text("0,001;3,30\n0,002;3,29\n0,003;0,01\n"), "a.csv")).toEqual(csv);
    expect(await look(text('"0.1","4.9"\n"0.2","4.8"\n'), "a.csv")).toEqual(csv);
    expect(await look(text("t,a,b\r1,2,\r2,3,\r3,4,\r"), "a.csv")).toEqual(csv);
    expect(await look(text("-1.2E-09,.5\n+3.0e-9,1.\n"), "a")).toEqual(csv);
  });

  it("may be UTF-16 or Latin-1, as scopes write it", async () => {
    expect(await look(utf16("Zeit;CH1\r\n0;4,9\r\n1;4,8\r\n2;4,7\r\n"), "a.csv")).toEqual(csv);
    expect(await look(Buffer.from("t \u00b5s,CH1\n0,4.9\n1,4.8\n2,4.7\n", "latin1"), "a.csv")).toEqual(csv);
  });

  it("is not prose, a list, a program or JSON", async () => {
    for (const content of [
      "Dear all, the clock rings.\nAlso, the reset is slow.\n",
      "U1\nU2\nU3\n",
      "1\n2\n3\n",
      '{"a": [1, 2],\n "b": 3}\n',
      "#!/bin/sh\nrm -rf, /\necho 1, 2\n",
      "1,2\n",
    ]) {
      expect(await look(text(content), "a.csv")).toMatch(/is text, but not a table/);
    }
  });
});

describe("what is no evidence", () => {
  it("is named for what it is", async () => {
    expect(await look(Buffer.alloc(0), "a.png")).toMatch(/empty \(0 bytes\)/);
    expect(await look(html, "a.csv")).toMatch(/web page/);
    expect(await look(text("\ufeff  <HTML><body>1,2\n3,4\n5,6"), "a.csv")).toMatch(/web page/);
    expect(await look(svg, "a.png")).toMatch(/SVG/);
    expect(await look(text('<?xml version="1.0"?><svg/>'), "a.svg")).toMatch(/SVG/);
    expect(await look(pdf, "a.pdf")).toMatch(/PDF/);
    expect(await look(Buffer.from("PK\u0003\u0004".padEnd(64, "\0"), "latin1"), "a.zip")).toMatch(/ZIP archive/);
    expect(await look(Buffer.from("BM".padEnd(64, "\0"), "latin1"), "a.bmp")).toMatch(/BMP/);
    expect(await look(Buffer.from([0, 1, 2, 3, 0, 0]), "a.bin")).toMatch(/neither a picture nor a table/);
  });

  it("is found out when its name lies", async () => {
    expect(await look(scopeText(10), "a.jpg")).toMatch(/named like a picture but contains text/);
    expect(await look(await plainPng(), "a.csv")).toMatch(/named like a table of text but contains a picture/);
    expect(await look(await plainPng(), "a.jpg")).toEqual({ what: "picture", type: "image/png" });
  });

  it("never makes the look crash", async () => {
    await fc.assert(
      fc.asyncProperty(fc.uint8Array({ maxLength: 600 }), fc.string(), async (bytes, name) => {
        await sniff(bytes, name);
      }),
    );
  });
});
