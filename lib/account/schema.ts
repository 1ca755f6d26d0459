import { z } from "zod";
import { line } from "@/lib/form/text";
import { timeZone } from "@/lib/form/time-zone";
import { writeId } from "@/lib/form/write-id";
import { PASSWORD_MAX, passwordWeakness } from "./password-rules";
import { safeNext } from "./safe-next";

/** An address as it is kept: compatibility forms folded, trimmed, lower case. */
export const normalEmail = (typed: string) => typed.normalize("NFKC").trim().toLowerCase();

export const email = z
  .string({ message: "Type the e-mail address." })
  .max(254, "At most 254 characters fit here.")
  .transform(normalEmail)
  .pipe(z.email("This is not an e-mail address. It should look like name@example.org."));

/** A password that is only compared: any text, but no more of it than could be one. */
export const givenPassword = z
  .string({ message: "Type the password." })
  .min(1, "Type the password.")
  .max(1000, "This is longer than any password here.");

const chosenPassword = z
  .string({ message: "Choose a password." })
  .max(PASSWORD_MAX * 4, `Use at most ${PASSWORD_MAX} characters.`);

const newPassword = chosenPassword.superRefine((value, context) => {
  const weakness = passwordWeakness(value);
  if (weakness) context.addIssue({ code: "custom", message: weakness });
});

export const personName = line(120, "Type the name that others on the project know you by.");
const token = z
  .string({ message: "The link is not complete." })
  .min(20, "The link is not complete.")
  .max(200, "The link is not complete.");
export const next = z.string().max(500).optional().transform(safeNext);

export const signInInput = z.object({ email, password: givenPassword, next });

export const linkInput = z.object({ email, next });
export type LinkInput = z.output<typeof linkInput>;

export const signUpInput = z
  .object({ writeId, name: personName, email, password: chosenPassword, timeZone })
  .superRefine((value, context) => {
    const weakness = passwordWeakness(value.password, value.email);
    if (weakness) context.addIssue({ code: "custom", path: ["password"], message: weakness });
  });
export type SignUpInput = z.output<typeof signUpInput>;
export type SignUpTyped = z.input<typeof signUpInput>;

export const forgotInput = z.object({ email });
export type ForgotInput = z.output<typeof forgotInput>;

export const resetInput = z.object({ writeId, token, password: newPassword });
export type ResetInput = z.output<typeof resetInput>;
export type ResetTyped = z.input<typeof resetInput>;

export const confirmInput = z.object({ token, password: givenPassword });
export type ConfirmInput = z.output<typeof confirmInput>;

const theme = z.enum(["system", "light", "dark"], { message: "Choose how Boardwake looks." });

export const setThemeInput = z.object({ writeId, theme });
export type SetThemeInput = z.output<typeof setThemeInput>;

export const profileInput = z.object({
  writeId,
  name: personName,
  timeZone,
  theme,
  speakAloud: z.boolean(),
  mailOnReopen: z.boolean(),
});
export type ProfileInput = z.output<typeof profileInput>;
export type ProfileTyped = z.input<typeof profileInput>;

export const changePasswordInput = z.object({
  writeId,
  current: z.string().max(1000, "This is longer than any password here."),
  password: newPassword,
});
export type ChangePasswordInput = z.output<typeof changePasswordInput>;
export type ChangePasswordTyped = z.input<typeof changePasswordInput>;

export const endSessionInput = z.object({
  session: z.string({ message: "Name the session." }).max(100, "There is no such session."),
});
export const nothingInput = z.object({});
