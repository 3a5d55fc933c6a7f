// Signing in by e-mail and password, through remix-auth's form strategy. It keeps no session: sessions.server.ts does.
import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { db } from "~/db/client.server";
import { findTries, forgetTriesOf, forgetTry, recordTry } from "~/db/queries/sign-in-attempts.server";
import { findCredentials } from "~/db/queries/users.server";
import { signInSchema } from "~/forms/auth";
import { parseForm, type FieldErrors } from "~/forms/parse-form";
import { verifyPassword } from "./passwords.server";
import { inMinutes, judgeTries, signInLimits } from "./rate-limit";

/** Why somebody was not let in, as sentences by field. */
export class SignInRefused extends Error {
  override readonly name = "SignInRefused";
  constructor(readonly errors: FieldErrors, readonly status: 400 | 429) {
    super("sign-in refused");
  }
}

const WRONG = "E-mail and password do not go together. Type both again.";

/** Resolves with the person's id. Throws SignInRefused. */
async function signIn(form: FormData, address: string): Promise<string> {
  const parsed = parseForm(form, signInSchema);
  if (!parsed.ok) throw new SignInRefused(parsed.errors, 400);
  const { email, password } = parsed.value;
  const now = new Date();
  const id = await recordTry(db, { email, address }, now);
  const verdict = judgeTries(await findTries(db, { email, address }, new Date(now.getTime() - signInLimits.windowMs), id), now);
  if (!verdict.allowed) {
    // A try that is not judged does not make the wait longer.
    await forgetTry(db, id);
    throw new SignInRefused({ "": [`Too many tries. Sign in again ${inMinutes(verdict.retryAt, now)}.`] }, 429);
  }
  const found = await findCredentials(db, email);
  if (!(await verifyPassword(found?.passwordHash ?? null, password)) || !found) throw new SignInRefused({ "": [WRONG] }, 400);
  await forgetTriesOf(db, email);
  return found.id;
}

/** For one request, because the strategy is not told the caller's address. */
export function authenticatorFor(address: string): Authenticator<string> {
  return new Authenticator<string>().use(new FormStrategy(({ form }) => signIn(form as unknown as FormData, address)), "form");
}
