import "server-only";
import { hash, verify } from "@node-rs/argon2";

/** argon2id (the library's default) with the memory and time cost of OWASP's password storage advice (from memory). */
const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, OPTIONS);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password fits. Without a stored hash (no such person) it checks against a decoy and answers false, so that an
 * unknown address takes as long as a wrong password.
 */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword(crypto.randomUUID());
  const fits = await verify(stored ?? (await decoy), password);
  return stored !== null && fits;
}
