import { describe, expect, it } from "vitest";
import fc from "fast-check";
import { hashPassword, passwordFits } from "@/lib/account/password";
import { passwordWeakness, PASSWORD_MAX, PASSWORD_MIN } from "@/lib/account/password-rules";

describe("a password", () => {
  it("has at least ten characters and at most two hundred, counted as people count them", () => {
    expect(passwordWeakness("k7 vdhqw x")).toBeUndefined();
    expect(passwordWeakness("k7 vdhqw")).toContain(`at least ${PASSWORD_MIN}`);
    expect(passwordWeakness("🔧🔩🪛🧲🔋💡📏📐🧪")).toContain("at least");
    expect(passwordWeakness("🔧🔩🪛🧲🔋💡📏📐🧪🔌")).toBeUndefined();
    expect(passwordWeakness("copper wire ".repeat(16) + "12345678")).toBeUndefined();
    expect(passwordWeakness("x y".repeat(67))).toContain(`at most ${PASSWORD_MAX}`);
  });

  it.each([
    "password12",
    "Password123!",
    "passw0rd2024",
    "qwertyuiop",
    "1234567890",
    "0987654321",
    "abcdefghij",
    "aaaaaaaaaa",
    "abcabcabcabc",
    "iloveyou2026",
    "letmeinnow!!",
    "Boardwake2026",
    "!!welcome!!99",
    "changeme1234",
    "12312312312",
    "zxcvbnm12345",
  ])("that everybody tries first is refused: %s", (password) => {
    expect(passwordWeakness(password)).toContain("among the first");
  });

  it.each(["ada.lovelace@example.org", "Ada.Lovelace@Example.org", "ada.lovelace1815", "adalovelace!!"])(
    "that is one's own address is refused: %s",
    (password) => {
      expect(passwordWeakness(password, "ada.lovelace@example.org")).toContain("your e-mail address");
    },
  );

  it.each([
    "correct horse battery",
    "springs-and-neaps",
    "tWo 47k resistors",
    "Päivää 2026 kaapeli",
    "solder & copper 9",
  ])("that is long and one's own is taken, without rules on its characters: %s", (password) => {
    expect(passwordWeakness(password, "ada@example.org")).toBeUndefined();
  });

  it("is looked at without crashing whatever it is", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary", maxLength: 400 }), fc.emailAddress(), (password, email) => {
        const said = passwordWeakness(password, email);
        expect(said === undefined || said.endsWith(".")).toBe(true);
      }),
    );
  });
});

describe("the kept hash", () => {
  it("is Argon2id with at least 19 MiB, and different each time", async () => {
    const [first, second] = await Promise.all([hashPassword("tWo 47k resistors"), hashPassword("tWo 47k resistors")]);
    expect(first).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(first).not.toBe(second);
  });

  it("fits its password however the keyboard composed the accents, and no other", async () => {
    const kept = await hashPassword("Päivää 2026");
    expect(await passwordFits(kept, "Päivää 2026".normalize("NFD"))).toBe(true);
    expect(await passwordFits(kept, "Paivaa 2026")).toBe(false);
  });

  it("that is missing fits nothing, and still takes the time of a real one", async () => {
    const kept = await hashPassword("tWo 47k resistors");
    await passwordFits(undefined, "warm up");
    const timed = async (hash: string | undefined) => {
      const start = performance.now();
      expect(await passwordFits(hash, "guess")).toBe(false);
      return performance.now() - start;
    };
    const known = Math.min(await timed(kept), await timed(kept), await timed(kept));
    const unknown = Math.min(await timed(undefined), await timed(undefined), await timed(undefined));
    expect(unknown).toBeGreaterThan(known / 4);
  });
});
