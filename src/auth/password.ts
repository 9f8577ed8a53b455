import "server-only";
import { hash, verify } from "@node-rs/argon2";

/** OWASP's floor for argon2id; the work runs on a thread of its own, off the event loop. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** One form for an é that one keyboard sends whole and another in two parts (NIST SP 800-63B-4, 3.1.1.2). */
const asTyped = (password: string) => password.normalize("NFC");

export function hashPassword(password: string): Promise<string> {
  return hash(asTyped(password), cost);
}

export function passwordMatches(storedHash: string, password: string): Promise<boolean> {
  return verify(storedHash, asTyped(password));
}

let decoy: Promise<string> | undefined;

/** Spends the time of a real check where there is no hash, so that an unknown account looks like a wrong password. */
export async function spendTheSameTime(password: string): Promise<void> {
  decoy ??= hashPassword("no account has this password");
  await passwordMatches(await decoy, password);
}
