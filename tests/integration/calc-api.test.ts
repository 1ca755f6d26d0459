import { randomUUID } from "node:crypto";
import { describe, expect, test, vi } from "vitest";
import { GET, POST } from "@/app/api/v1/calc/[calculation]/route";
import { CALCULATIONS } from "@/lib/calc-api/list";
import { limit, LIMITS } from "@/lib/http/rate-limit";
import { PEER_HEADER } from "@/lib/http/peer-header";
import { peerNetwork } from "@/lib/http/peer-network";
import { useDatabase } from "../support/database";

// Bench scripts bring no cookie.
vi.mock("@/lib/auth/current-viewer", () => ({ currentViewer: async () => undefined }));

useDatabase();

const address = (name: string) => `https://boardwake.example/api/v1/calc/${name}`;
const at = (calculation: string) => ({ params: Promise.resolve({ calculation }) });
/** A connection of its own, so that tests do not use up each other's limit. */
const somebody = () => `2001:db8:${randomUUID().slice(0, 4)}:${randomUUID().slice(0, 4)}::1`;

async function post(name: string, body: BodyInit, headers: Record<string, string> = {}) {
  const request = new Request(address(name), {
    method: "POST",
    body,
    headers: { "content-type": "application/json", [PEER_HEADER]: somebody(), ...headers },
  });
  const answer = await POST(request, at(name));
  return { answer, json: await answer.json() };
}
const send = (name: string, input: unknown, headers?: Record<string, string>) =>
  post(name, JSON.stringify(input), headers);

const READING = { reading: 4.98, limits: { lower: 4.75, upper: 5.25 } };

describe("a calculation without state", () => {
  test.each(CALCULATIONS.map((calculation) => [calculation.name, calculation] as const))(
    "%s answers the example that it shows",
    async (name) => {
      const card = await (await GET(new Request(address(name)), at(name))).json();
      const { answer, json } = await send(name, card.example);
      expect(answer.status).toBe(200);
      expect(answer.headers.get("content-type")).toContain("application/json");
      expect(json).toMatchObject({ calculation: name, result: expect.any(Object), source: card.source });
    },
  );

  test("needs nobody to be signed in, may be asked from anywhere, and is kept by no cache", async () => {
    const { answer } = await send("conformity", READING, {
      origin: "https://bench.example",
      "sec-fetch-site": "cross-site",
    });
    expect(answer.status).toBe(200);
    expect(answer.headers.get("cache-control")).toBe("no-store");
  });

  test("says the same as the bench: 4.98 V within 4.75 … 5.25 V conforms", async () => {
    const { json } = await send("conformity", READING);
    expect(json.result).toMatchObject({
      verdict: "conforms",
      sentences: [expect.stringContaining("fits"), expect.any(String)],
    });
  });
});

describe("a problem document (RFC 9457)", () => {
  const problem = { "content-type": "application/problem+json" };
  const expectProblem = (answer: Response, status: number) => {
    expect(answer.status).toBe(status);
    expect(answer.headers.get("content-type")).toBe(problem["content-type"]);
  };

  test("names each field by its path", async () => {
    const input = { reading: "4.98", limits: { lower: 4.75, colour: 1 }, rule: "strict" };
    const { answer, json } = await send("conformity", input);
    expectProblem(answer, 400);
    expect(json.errors).toEqual({
      reading: "Give a number without quotes, in the unit that the name ends with; “4.98” is text.",
      "limits.colour": "There is no such field here.",
      rule: "One of simple, guarded.",
    });
    expect(json).toMatchObject({ status: 400, type: expect.any(String), title: expect.any(String) });
  });

  test.each(["NaN", "Infinity", "-Infinity", "1e999"])("refuses the text “%s” as a figure", async (text) => {
    const { answer, json } = await send("conformity", { ...READING, reading: text });
    expectProblem(answer, 400);
    expect(Object.keys(json.errors)).toEqual(["reading"]);
  });

  test("refuses 1e999, which reads as infinity", async () => {
    const { answer, json } = await post("conformity", '{"reading":1e999,"limits":{"lower":1}}');
    expectProblem(answer, 400);
    expect(Object.keys(json.errors)).toEqual(["reading"]);
  });

  test("refuses NaN, which is no JSON", async () => {
    const { answer, json } = await post("conformity", '{"reading":NaN,"limits":{"lower":1}}');
    expectProblem(answer, 400);
    expect(json.detail).toContain("not JSON");
  });

  test.each([
    ["levels", { driver: "HC", receivers: [{ family: "HC", count: -1 }] }, "receivers.0.count"],
    ["packing", { board: { loose: [{ gateFunction: "nand2", count: -1 }] } }, "board.loose.0.count"],
    ["delay", { steps: [{ name: "A", typicalS: -1e-9 }] }, "steps.0.typicalS"],
    [
      "pull-up",
      { supply: { minVolts: -5, maxVolts: 5 }, line: { highVolts: 3, lowVolts: 0.4, sinkA: 1 } },
      "supply.minVolts",
    ],
    ["power", { rails: [{ name: "+5V", volts: 5, tolerancePercent: -5 }], board: {} }, "rails.0.tolerancePercent"],
    ["interconnect", { boards: [], conditions: { logicVolts: -5 } }, "conditions.logicVolts"],
  ])("%s refuses what must not be negative", async (name, input, path) => {
    const { answer, json } = await send(name, input);
    expectProblem(answer, 400);
    expect(Object.keys(json.errors)).toContain(path);
  });

  test("lists the calculations that there are, for one that there is not", async () => {
    const { answer, json } = await send("perpetuum-mobile", {});
    expectProblem(answer, 404);
    expect(json.details.calculations).toEqual(expect.arrayContaining(["levels", "pull-up", "interconnect"]));
    expectProblem(await GET(new Request(address("x")), at("x")), 404);
  });

  test.each(["[]", '"text"', "42", "[{}]"])("answers %s as a body: one object is wanted", async (body) => {
    const { answer, json } = await post("conformity", body);
    expectProblem(answer, 400);
    expect(json.detail).toContain("one JSON object");
  });

  test("answers a form with the wrong type", async () => {
    const { answer } = await post("conformity", "reading=4.98", {
      "content-type": "application/x-www-form-urlencoded",
    });
    expectProblem(answer, 415);
  });

  test("answers a body beyond its limit without reading it to the end", async () => {
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull: (stream) => {
        sent += 1_000_000;
        stream.enqueue(new Uint8Array(1_000_000).fill(32));
      },
    });
    const request = new Request(address("interconnect"), {
      ...{ method: "POST", body: endless, duplex: "half" },
      headers: { "content-type": "application/json", [PEER_HEADER]: somebody() },
    });
    expectProblem(await POST(request, at("interconnect")), 413);
    expect(sent).toBeLessThan(12_000_000);
  });
});

test(
  "a machine of 200 connectors with 200 pins each is checked; one more connector is not",
  { timeout: 60_000 },
  async () => {
    const pins = Array.from({ length: 200 }, (_, index) => ({
      pin: `a${index + 1}`,
      signal: `S${index}`,
      role: "passive",
    }));
    const grid = { rows: ["a"], positions: 200, pitchMm: 2.54 };
    const machine = (slots: number) => {
      const connectors = Array.from({ length: slots }, (_, index) => ({
        reference: `X${index}`,
        type: "grid",
        grid,
        pins,
      }));
      const cards = Array.from({ length: 100 }, (_, index) => ({ id: `C${index}`, board: "CON", slot: index }));
      return {
        boards: [
          { code: "BPL", kind: "backplane", connectors },
          { code: "CON", connectors: [{ reference: "J1", type: "grid", grid, pins }] },
        ],
        placements: [{ id: "BPL", board: "BPL" }, ...cards],
        matings: cards.map(({ id }, index) => ({
          from: { placement: "BPL", connector: `X${index}` },
          to: { placement: id, connector: "J1" },
        })),
      };
    };
    const { answer, json } = await send("interconnect", machine(100));
    expect(answer.status).toBe(200);
    expect(json.result.nets).toHaveLength(200);
    const more = await send("interconnect", machine(101));
    expect(more.json.errors.placements).toContain("201 connectors");
  },
);

test("one connection gets so many calculations and no more, and others still theirs", async () => {
  const peer = somebody();
  const { points } = LIMITS.calculations;
  await Promise.all(Array.from({ length: points }, () => limit("calculations", peerNetwork(peer))));
  const worn = await send("conformity", READING, { [PEER_HEADER]: peer });
  expect(worn.answer.status).toBe(429);
  expect(Number(worn.answer.headers.get("retry-after"))).toBeGreaterThan(0);
  expect((await send("conformity", READING)).answer.status).toBe(200);
});

describe("the order and the forecast", () => {
  const check = { unit: "SUM-01", stage: "function" };

  test("name the members of a circle, and a prerequisite that is not there by its path", async () => {
    const round = [
      { ...check, id: "a", title: "Adds", needs: ["b"] },
      { ...check, id: "b", title: "Carries", needs: ["a"] },
    ];
    const circle = await send("sequence", { checks: round });
    expect(circle.answer.status).toBe(400);
    expect(JSON.stringify(circle.json)).toMatch(/Adds.*Carries/);
    const stray = await send("sequence", { checks: [{ ...check, id: "a", needs: ["c"] }] });
    expect(JSON.stringify(stray.json)).toContain("There is no check c.");
  });

  test("plan two builders side by side and say what is free", async () => {
    const checks = [
      { id: "a", unit: "SUM-01", stage: "function", holdPoint: true },
      { id: "b", unit: "SUM-01", stage: "function" },
      { id: "c", unit: "TIM-01", stage: "function" },
    ];
    const { json } = await send("sequence", {
      checks,
      paces: { function: 600 },
      evening: { builders: 2, seconds: 1200 },
    });
    expect(json.result.now).toEqual(["a", "c"]);
    expect(json.result.plan).toMatchObject({ usedS: 1200, left: 0 });
  });

  test("give the same dates for the same seed, and none without three weeks", async () => {
    const { example } = await (await GET(new Request(address("forecast")), at("forecast"))).json();
    const [first, again] = [await send("forecast", example), await send("forecast", example)];
    expect(first.json.result.kind).toBe("forecast");
    expect(again.json.result).toEqual(first.json.result);
    const early = await send("forecast", { ...example, nowMs: example.events[0].atMs + 86_400_000 });
    expect(early.json.result.kind).toBe("not enough history");
  });
});

describe("the probe plan", () => {
  const net = (name: string, ...pins: string[]) => ({ name, points: pins.map((pin) => ({ part: "U1", pin })) });

  test("probes n points of a net with n − 1 pairs, and finds the one that does not beep", async () => {
    const nets = [net("CLK", "1", "2", "3"), net("GND", "7", "8")];
    const plan = (await send("continuity", { nets })).json.result;
    expect(plan.counts).toMatchObject({ nets: 2, points: 5, continuity: 3 });
    expect(plan.report).toBeNull();
    const results = plan.probes.map(({ id, kind }: { id: number; kind: string }) => ({
      probe: id,
      beeps: kind === "continuity" && id !== 0,
    }));
    const { report } = (await send("continuity", { nets, results })).json.result;
    expect(report.findings).toMatchObject([{ kind: "open", nets: [plan.probes[0].from.net] }]);
  });

  test("names what cannot be planned by its path", async () => {
    const refused = async (input: object) => JSON.stringify((await send("continuity", input)).json);
    expect(await refused({ nets: [net("CLK", "1", "1")] })).toContain("nets.0.points.1");
    expect(await refused({})).toContain("Give at least one net");
    expect(await refused({ ipcD356: "nothing of the kind" })).toContain("No net could be read");
    const heap = Array.from({ length: 400 }, (_, index) => {
      return { name: `N${index}`, points: [{ part: "U1", pin: `${index}`, xMm: 0, yMm: 0 }] };
    });
    expect(await refused({ nets: heap })).toContain("Are the places in millimetres?");
    const results = [{ probe: 99, beeps: true }];
    expect(await refused({ nets: [net("CLK", "1", "2")], results })).toContain("There is no probe 99");
  });
});
