import { randomBytes } from "node:crypto";

/** Crockford's base 32: no I, L, O or U, so an id read aloud or off paper is not misread. */
const letters = "0123456789abcdefghjkmnpqrstvwxyz";

/** An id that cannot be guessed from another: 16 letters, 80 random bits. */
export function newId(): string {
  let id = "";
  for (const byte of randomBytes(16)) id += letters[byte % 32];
  return id;
}
