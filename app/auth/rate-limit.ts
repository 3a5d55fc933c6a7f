// When a sign-in has to wait. Pure: the tries come in, the verdict goes out.

export const signInLimits = {
  windowMs: 15 * 60_000,
  /** Failed tries in the window after which the next must wait. */
  perEmail: 8,
  perAddress: 40,
} as const;

export type Verdict = { readonly allowed: true } | { readonly allowed: false; readonly retryAt: Date };

/** `email`, `address`: moments of earlier failed tries with the same e-mail, and from the same network address. */
export function judgeTries(tries: { readonly email: readonly Date[]; readonly address: readonly Date[] }, now: Date): Verdict {
  const waits = [waitFor(tries.email, signInLimits.perEmail, now), waitFor(tries.address, signInLimits.perAddress, now)];
  const last = Math.max(...waits);
  return last <= now.getTime() ? { allowed: true } : { allowed: false, retryAt: new Date(last) };
}

/** The moment at which fewer than `limit` tries are left in the window. */
function waitFor(tries: readonly Date[], limit: number, now: Date): number {
  const recent = tries.map((at) => at.getTime()).filter((at) => at > now.getTime() - signInLimits.windowMs).sort((a, b) => a - b);
  const decisive = recent[recent.length - limit];
  return decisive === undefined ? now.getTime() : decisive + signInLimits.windowMs;
}

/** "in 1 minute", "in 12 minutes": rounded up, so that it is true when the time has come. */
export function inMinutes(retryAt: Date, now: Date): string {
  const minutes = Math.max(1, Math.ceil((retryAt.getTime() - now.getTime()) / 60_000));
  return minutes === 1 ? "in 1 minute" : `in ${minutes} minutes`;
}
