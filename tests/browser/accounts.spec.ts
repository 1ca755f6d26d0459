import { freshAddress, makeAccount, PASSWORD } from "./account";
import { expect, test } from "./journey";
import { linkIn, mailTo } from "./mailbox";

const NEW_PASSWORD = "another wire bridge 4";

test("Somebody signs up, confirms the address from the mail, and has no project yet @desk", async ({ page }) => {
  const email = freshAddress("ada");
  await page.goto("/sign-up");
  await page.getByLabel("Name").fill("Ada Brine");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password", { exact: true }).fill("short");
  await page.getByRole("button", { name: "Sign up", exact: true }).click();
  await expect(page.getByText(/at least \d+ characters/i).first()).toBeVisible();
  await expect(page.getByLabel("E-mail address")).toHaveValue(email);
  await page.getByLabel("Password", { exact: true }).fill(PASSWORD);
  await page.getByRole("button", { name: "Sign up", exact: true }).click();
  await expect(page).toHaveURL(/check-email/);

  await page.goto(linkIn(await mailTo(email), "/confirm/"));
  await page.getByLabel("Password", { exact: true }).fill(PASSWORD);
  await page.getByRole("button", { name: "Confirm and sign in" }).click();
  await expect(page).toHaveURL(/\/projects$/);
});

test("A wrong password is told plainly and the address stays in the form @desk", async ({ page }) => {
  const { email } = await makeAccount();
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password", { exact: true }).fill("not the password at all");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page.getByRole("alert").filter({ hasText: /password/i })).toBeVisible();
  await expect(page.getByLabel("E-mail address")).toHaveValue(email);
});

test("A link by e-mail signs in once @desk", async ({ page, browser }) => {
  const { email } = await makeAccount();
  await page.goto("/sign-in?next=%2Fsettings");
  await page.getByRole("tab", { name: "With a link by e-mail" }).click();
  await page.getByLabel("E-mail address").fill(email);
  await page.getByRole("button", { name: "Send the link" }).click();
  await expect(page).toHaveURL(/check-email/);
  const link = linkIn(await mailTo(email), "/sign-in/link");
  await page.goto(link);
  await page
    .getByRole("link", { name: /sign in/i })
    .or(page.getByRole("button", { name: /sign in/i }))
    .first()
    .click();
  await expect(page).toHaveURL(/\/settings$/);

  const elsewhere = await (await browser.newContext()).newPage();
  await elsewhere.goto(link);
  await elsewhere
    .getByRole("link", { name: /sign in/i })
    .or(elsewhere.getByRole("button", { name: /sign in/i }))
    .first()
    .click();
  await expect(elsewhere).toHaveURL(/sign-in/);
  await elsewhere.context().close();
});

test("A forgotten password is set anew from the mail, and only the new one opens @desk", async ({ page }) => {
  const { email } = await makeAccount();
  await page.goto("/forgot");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByRole("button", { name: "Send the link" }).click();
  await expect(page).toHaveURL(/check-email/);
  await page.goto(linkIn(await mailTo(email), "/reset/"));
  await page.getByLabel("New password", { exact: true }).fill(NEW_PASSWORD);
  await page.getByRole("button", { name: "Set the password and sign in" }).click();
  await expect(page).toHaveURL(/\/projects$/);
});

test("Changing the password ends every other session at once, and keeps this one @desk", async ({ pageOf }) => {
  const account = await makeAccount();
  const [here, there] = [await pageOf(account), await pageOf(account)];
  await there.goto("/settings");
  await expect(there.getByRole("heading", { level: 1 })).toBeVisible();
  await here.goto("/settings/password");
  await here.getByLabel("Present password", { exact: true }).fill(PASSWORD);
  await here.getByLabel("New password", { exact: true }).fill(NEW_PASSWORD);
  await here.getByRole("button", { name: "Change the password" }).click();
  await expect(here.getByText(/One other session has ended/)).toBeVisible();
  await there.goto("/settings");
  await expect(there).toHaveURL(/\/sign-in\?next=%2Fsettings$/);
  await here.goto("/settings");
  await expect(here).toHaveURL(/\/settings$/);
});
