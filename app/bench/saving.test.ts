import { describe, expect, it } from "vitest";
import { problemFor } from "~/copy/errors";
import type { Brief } from "~/cartons/types";
import type { SavedCarton } from "~/forms/save-answer";
import { differences, saveStateOf, type SavingFacts } from "./saving";

const brief: Brief = { construction: "tray", size: { L: 113, W: 71, D: 29 }, basis: "inside", room: 1, board: "e-flute", options: {}, typed: {} };
const saved: SavedCarton = { brief, rowVersion: 3, name: "Tray", note: "", clientId: null, clientName: null, updatedAt: "2031-03-05T11:07:00.000Z", updatedBy: "Orla" };
const changed = { ...brief, size: { ...brief.size, W: 67 } };
const facts = (more: Partial<SavingFacts>): SavingFacts => ({ asked: changed, isRefused: false, saved, isBusy: false, answer: null, ...more });

describe("saving", () => {
  it("is saved when the same is asked, and not otherwise", () => {
    expect(saveStateOf(facts({ asked: { ...brief } })).kind).toBe("saved");
    expect(saveStateOf(facts({})).kind).toBe("unsaved");
    expect(saveStateOf(facts({ isBusy: true })).kind).toBe("saving");
    expect(saveStateOf(facts({ isRefused: true })).kind).toBe("refused");
  });

  it("tells a conflict, a lost connection and a problem apart", () => {
    const theirs = { ...saved, rowVersion: 4, updatedBy: "Nia" };
    expect(saveStateOf(facts({ answer: { conflict: theirs } }))).toEqual({ kind: "conflict", theirs });
    expect(saveStateOf(facts({ answer: { offline: true } }))).toMatchObject({ kind: "failed", isOffline: true });
    expect(saveStateOf(facts({ answer: { problem: problemFor("database-lost") } }))).toMatchObject({ kind: "failed", isOffline: true });
    expect(saveStateOf(facts({ answer: { problem: problemFor("signed-out") } }))).toMatchObject({ kind: "failed", isOffline: false });
  });

  it("forgets a failure when there is nothing left to save", () => {
    expect(saveStateOf(facts({ asked: brief, answer: { offline: true } })).kind).toBe("saved");
  });

  it("lists what two briefs ask differently", () => {
    const theirs = { ...brief, board: "sbb-300", options: { glue: 9 } };
    expect(differences(changed, theirs)).toEqual([
      { parameter: "W", mine: 67, theirs: 71 },
      { parameter: "board", mine: "e-flute", theirs: "sbb-300" },
      { parameter: "glue", mine: undefined, theirs: 9 },
    ]);
  });
});
