import { describe, expect, it } from "vitest";
import { digestText } from "@/emails/digest-text";
import { digestSubject } from "@/emails/DigestMail";
import type { DigestItem, DigestList, DigestMailProps, Mark } from "@/emails/parts/digest-mail-props";
import { plainExcerpt } from "@/lib/digest/plain-excerpt";
import { renderDigest } from "@/lib/digest/render-digest";

const HOME = "https://boardwake.example/projects/tide-computer";
const LONG = "A title as long as a title may be, which is two hundred characters. ".repeat(3).slice(0, 200);
const marks: Mark[] = ["failed", "reopened", "doubtful", "conceded", "passed", "free"];

const checkAddress = (serial: string, check: number) => {
  const id = `00000000-0000-4000-8000-${String(check).padStart(12, "0")}`;
  return `${HOME}/units/${serial}?check=${id}#check-${id}`;
};
const item = (index: number): DigestItem => ({
  mark: marks[index % marks.length] ?? "free",
  serial: `TIM-0${index}`,
  title: LONG,
  link: checkAddress(`TIM-0${index}`, index),
  detail: `“${"Why it is so. ".repeat(18)}” Bram, Sun 29 Nov.`,
});
const list = (count: number, from = 0): DigestList => ({
  items: Array.from({ length: count }, (_, index) => item(from + index)),
  more: 31,
});

/** As much as the lists let into one mail. */
const fullest: DigestMailProps = {
  projectName: "Tide computer",
  projectLink: `${HOME}/rack`,
  logLink: `${HOME}/log`,
  period: "Mon 23 Nov to Mon 30 Nov",
  headline: "8 checks passed",
  summary: "8 checks passed: 7 for the first time, 1 on repeat.",
  standing: "118 of 180 checks hold.",
  outlook: "When will it run? About 9 evenings left: 50 % by Sat 16 Jan 2027, 85 % by Tue 2 Feb 2027.",
  wiring: {
    sentence: "9 findings are open in the wiring: 6 must be mended, 2 should be, 1 is worth a look. 5 are new.",
    link: `${HOME}/wiring/findings`,
    fresh: [LONG, LONG + " again", LONG + " and again", LONG + " once more"],
    more: 1,
  },
  isQuiet: false,
  boards: Array.from({ length: 40 }, (_, index) => ({
    serial: `CON-${index}`,
    name: "Constituent",
    slot: index,
    link: `${HOME}/units/CON-${index}`,
    holding: 2,
    total: 20,
    stages: ["Inspection", "Continuity", "Power-on", "Function", "Integration"].map((name) => ({
      name,
      short: name,
      holding: index % 4,
      total: 4,
      failing: index % 2,
    })),
  })),
  passed: {
    lines: Array.from({ length: 8 }, (_, index) => ({
      serial: `SIN-${index}`,
      link: `${HOME}/units/SIN-${index}`,
      counts: "9 for the first time",
      checks: [1, 2, 3, 4].map((check) => ({ title: LONG, link: checkAddress(`SIN-${index}`, check) })),
      more: 5,
    })),
    more: 4,
  },
  failed: list(7),
  decided: list(7, 10),
  entries: {
    lines: [1, 2, 3, 4].map((entry) => ({
      title: LONG,
      link: `${HOME}/log/${entry}`,
      by: "Bram, Sun 29 Nov",
      excerpt: "Lamp 7 came on at 64. ".repeat(12),
      pictures: [{ contentId: `picture-${entry}`, caption: "The wire W3", width: 360, height: 240 }],
    })),
    more: 3,
  },
  also: { sentences: [{ text: "Maud put OUT-01 into slot 8.", link: `${HOME}/boards` }], more: 2 },
  open: list(7, 20),
  next: list(5, 30),
  settingsLink: "https://boardwake.example/settings/digest",
  unsubscribeLink: "https://boardwake.example/unsubscribe/1/token",
};

const htmlOf = async (props: DigestMailProps) => (await renderDigest(props)).html;
const html = () => htmlOf(fullest);

describe("the weekly e-mail", () => {
  it("stays under the size at which readers cut it off, however much happened", async () => {
    expect(Buffer.byteLength(await html())).toBeLessThan(100_000);
  });

  it("uses nothing that mail readers throw away or stumble over", async () => {
    const page = await html();
    for (const construct of [
      /<script/i,
      /<link\b/i,
      /<form/i,
      /<svg/i,
      /display:\s*(flex|grid)/i,
      /position:/i,
      /var\(--/,
    ])
      expect(page).not.toMatch(construct);
    expect(page).not.toMatch(/src="(?!cid:)/);
    for (const [tag] of page.matchAll(/<img[^>]*>/g)) {
      expect(tag).toMatch(/alt="[^"]+"/);
      expect(tag).toMatch(/width="\d+"/);
    }
    expect(page).toContain('lang="en"');
  });

  it("has every link of the page in its text as well", async () => {
    const text = digestText(fullest);
    const links = [...(await html()).matchAll(/href="([^"]+)"/g)].map(([, link = ""]) => link.replaceAll("&amp;", "&"));
    expect(links.length).toBeGreaterThan(60);
    for (const link of links) expect(text).toContain(link);
  });

  it("says every state in words, not by colour alone", async () => {
    const page = await html();
    for (const word of ["Fails", "Reopened", "In doubt", "Conceded", "Passes now", "Free to do"])
      expect(page).toContain(`>${word}<`);
  });

  it("is one short line in a quiet week", async () => {
    const quiet = {
      ...fullest,
      isQuiet: true,
      headline: "a quiet week",
      summary: "Nothing happened on the bench this week.",
    };
    expect(digestSubject(quiet)).toBe("Tide computer: a quiet week");
    expect(digestText(quiet).split("\n").length).toBeLessThan(18);
    expect(await htmlOf(quiet)).not.toContain("Where the boards stand");
  });

  it("lets nobody write markup through a title", async () => {
    const sly = { ...fullest, projectName: "<img src=x onerror=alert(1)>" };
    expect(await htmlOf(sly)).not.toContain("<img src=x");
  });
});

describe("the beginning of a log entry in the mail", () => {
  it.each([
    ["**Lamp 7** came on at `64`.", "Lamp 7 came on at 64."],
    [
      "Left:\n\n- the carry\n- the sine table\n\nThen first power.",
      "Left: the carry; the sine table. Then first power.",
    ],
    ["![W3](file.png)\n# Wrong pin\n\nSee [the check](https://x.example).", "Wrong pin. See the check."],
  ])("%j reads as plain words", (markdown, words) => {
    expect(plainExcerpt(markdown)).toBe(words);
  });

  it("ends between two words", () => {
    expect(plainExcerpt("clock ".repeat(100), 40)).toBe("clock clock clock clock clock clock…");
  });
});
