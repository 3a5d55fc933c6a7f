// Nothing moves unnoticed: files and figures of known briefs, letter for letter. What is right is said elsewhere, by the
// oracles; this says what has changed. After a change that is meant: npx tsx tests/golden/regenerate.ts
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { filesOf, goldenCases, pathOf } from "./golden-files";

describe.each(goldenCases)("golden case %s", (name) => {
  const files = filesOf(name);
  it.each(Object.keys(files))("%s is as it was", (file) => expect(files[file]).toBe(readFileSync(pathOf(name, file), "utf8")));
});

it("has a case for each construction", async () => {
  const { listConstructions } = await import("~/cartons/constructions/registry");
  const covered = new Set(goldenCases.map((name) => (JSON.parse(readFileSync(pathOf(name, "brief.json"), "utf8")) as { construction: string }).construction));
  expect(listConstructions().map((c) => c.id).filter((id) => !covered.has(id))).toEqual([]);
});
