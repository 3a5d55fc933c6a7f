import { describe, expect, it } from "vitest";
import { safeNext } from "./safe-next";

describe("safeNext", () => {
  it.each(["/cartons/3f9k?view=flat#ledger", "/", "/clients?page=2&q=%2F%2Fx"])("keeps %s", (next) => {
    expect(safeNext(next)).toBe(next);
  });

  it.each([
    "//evil.example", "/\\evil.example", "\\\\evil.example", "https://evil.example/", "javascript:alert(1)",
    "/\t/evil.example", "/\n/evil.example", "/.//evil.example", "evil.example", "", "/sign-in?next=/sign-in", "/sign-out", `/${"a".repeat(3000)}`,
  ])("turns %j into the Desk", (next) => {
    expect(safeNext(next)).toBe("/");
  });

  it("takes nothing for the Desk", () => {
    expect(safeNext(null)).toBe("/");
    expect(safeNext(undefined)).toBe("/");
  });
});
