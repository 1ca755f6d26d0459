import { PASSWORD_MIN } from "@/lib/account/password-rules";

export const PASSWORD_ADVICE = `At least ${PASSWORD_MIN} characters. A few unrelated words are easy to keep in mind and hard to guess.`;
