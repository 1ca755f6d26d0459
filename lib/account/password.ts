import { hash, verify } from "@node-rs/argon2";

/** As OWASP's password storage guidance has it for Argon2id (the library's default): 19 MiB, two passes, one lane. */
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize("NFKC"), PARAMETERS);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password fits. Without a hash (unknown address, account without a password) the same work is done
 * against a decoy, so that the time of the answer says nothing about the address.
 */
export async function passwordFits(passwordHash: string | null | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword(crypto.randomUUID());
  const fits = await verify(passwordHash ?? (await decoy), password.normalize("NFKC"));
  return Boolean(passwordHash) && fits;
}
