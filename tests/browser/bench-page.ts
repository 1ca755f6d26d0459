import type { Page } from "@playwright/test";

/** Hydrated: until then a key or a touch reaches nobody. */
export async function awake(page: Page): Promise<void> {
  await page.waitForFunction(() => {
    const button = document.querySelector("main button, section button, header button, main a");
    return button !== null && Object.keys(button).some((key) => key.startsWith("__reactProps"));
  });
}

/** What a builder sees and touches at the bench. */
export function benchOn(page: Page) {
  const record = page.getByRole("region", { name: "Record" });
  const button = (name: string) => record.getByRole("button", { name, exact: true });
  return {
    record,
    title: (name: string) => page.getByRole("heading", { level: 2, name }),
    conforms: button("Conforms"),
    doesNotConform: button("Does not conform"),
    recordButton: button("Record"),
    reading: record.getByRole("textbox", { name: "Reading" }),
    pad: record.getByRole("group", { name: "Numeric pad" }),
    held: page.getByRole("button", { name: /^Held on this device/ }),
    async goTo(address: string) {
      await page.goto(address);
      await awake(page);
    },
    async press(keys: readonly string[]) {
      const pad = record.getByRole("group", { name: "Numeric pad" });
      for (const key of keys) await pad.getByRole("button", { name: key, exact: true }).click();
    },
    async choose(name: "Take a photo" | "Add a capture", file: { name: string; mimeType: string; buffer: Buffer }) {
      const [chooser] = await Promise.all([page.waitForEvent("filechooser"), button(name).click()]);
      await chooser.setFiles(file);
    },
  };
}
