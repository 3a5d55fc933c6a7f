import { describe, expect, it } from "vitest";
import { inMinutes, judgeTries, signInLimits } from "./rate-limit";

const now = new Date("2031-03-05T11:07:00.000Z");
const minutesAgo = (minutes: number) => new Date(now.getTime() - minutes * 60_000);
const many = (count: number, minutes: number) => Array.from({ length: count }, (_, i) => minutesAgo(minutes + i / 100));

describe("judgeTries", () => {
  it("allows up to the limit and not one more", () => {
    expect(judgeTries({ email: many(signInLimits.perEmail - 1, 3), address: [] }, now).allowed).toBe(true);
    expect(judgeTries({ email: many(signInLimits.perEmail, 3), address: [] }, now).allowed).toBe(false);
    expect(judgeTries({ email: [], address: many(signInLimits.perAddress - 1, 3) }, now).allowed).toBe(true);
    expect(judgeTries({ email: [], address: many(signInLimits.perAddress, 3) }, now).allowed).toBe(false);
  });

  it("forgets tries that have left the window", () => {
    expect(judgeTries({ email: many(50, 15), address: many(50, 15) }, now)).toEqual({ allowed: true });
  });

  it("says when the try that decides leaves the window, whichever order they come in", () => {
    const email = [2, 13, 5, 11, 3, 7, 1, 4, 6].map(minutesAgo); // nine: the second oldest decides
    const verdict = judgeTries({ email, address: [] }, now);
    expect(verdict).toEqual({ allowed: false, retryAt: new Date(minutesAgo(11).getTime() + signInLimits.windowMs) });
    if (!verdict.allowed) {
      expect(judgeTries({ email, address: [] }, verdict.retryAt).allowed).toBe(true);
      expect(judgeTries({ email, address: [] }, new Date(verdict.retryAt.getTime() - 1)).allowed).toBe(false);
    }
  });

  it("takes the longer of the two waits", () => {
    const verdict = judgeTries({ email: many(8, 9), address: many(40, 2) }, now);
    expect(verdict.allowed === false && verdict.retryAt > new Date(now.getTime() + 12 * 60_000)).toBe(true);
  });
});

describe("inMinutes", () => {
  it("rounds up and never says nought", () => {
    expect(inMinutes(new Date(now.getTime() + 61_000), now)).toBe("in 2 minutes");
    expect(inMinutes(new Date(now.getTime() + 60_000), now)).toBe("in 1 minute");
    expect(inMinutes(now, now)).toBe("in 1 minute");
  });
});
