// Passwords are kept as argon2id hashes with the library's parameters (19 MiB, 2 passes), which OWASP names as a minimum.

import { hash, verify } from "@node-rs/argon2";

export function hashPassword(password: string): Promise<string> {
  return hash(password);
}

/** A hash that no password matches and that costs as much to check as a real one. */
const NOBODYS_HASH =
  "$argon2id$v=19$m=19456,t=2,p=1$bm9ib2R5IGF0IGFsbCBoZXJl$bm9ib2R5J3MgcGFzc3dvcmQgaXMgdGhpcyBvbmUhISE";

/** Takes as long for an address without an account as for one with: time must not tell who is a customer. */
export async function passwordFits(passwordHash: string | null, password: string): Promise<boolean> {
  const fits = await verify(passwordHash ?? NOBODYS_HASH, password);
  return passwordHash !== null && fits;
}
