import { describe, expect, it } from "vitest";
import type { Brief, Carton, CartonResult } from "~/cartons/types";
import { askedValue, type Build, isSameBrief, openSession, reduceSession, type Session, withBasis, withConstruction, withDefault, withValue } from "./session";

const brief: Brief = { construction: "tray", size: { L: 113, W: 71, D: 29 }, basis: "inside", room: 1, board: "e-flute", options: {}, typed: {} };

// A stand-in for the core: it makes anything with L at least 50 and a glue of at most 20.
const build: Build = (asked): CartonResult => {
  const refused = [
    ...(asked.size.L < 50 ? [{ code: "too-small" as const, parameter: "L", given: asked.size.L, limit: { atLeast: 50 }, nearest: 50, because: "the flaps would meet" }] : []),
    ...(Number(asked.options["glue"] ?? 0) > 20 ? [{ code: "too-large" as const, parameter: "glue", given: asked.options["glue"]!, limit: { atMost: 20 }, nearest: null, because: "there is no room" }] : []),
    ...(asked.construction === "gone" ? [{ code: "unknown-construction" as const, parameter: "construction", given: "gone", limit: null, nearest: null, because: "there is no such construction" }] : []),
  ];
  return refused.length > 0 ? { ok: false, refusals: refused } : { ok: true, carton: { brief: asked, parameters: { glue: 12, ...asked.options } } as unknown as Carton };
};

const open = (from: Brief = brief): Session => {
  const session = openSession(build, from);
  if (!session) throw new Error("the sitting did not open");
  return session;
};
const run = (session: Session, ...commands: Parameters<typeof reduceSession>[2][]) => commands.reduce((at, command) => reduceSession(build, at, command), session);
const set = (parameter: string, value: number, gesture?: string, typed?: string) => ({ type: "edit" as const, change: (b: Brief) => withValue(b, parameter, value, typed), ...(gesture ? { gesture } : {}) });

describe("reduceSession", () => {
  it("rebuilds on an edit and remembers what was before", () => {
    const session = run(open(), set("W", 67));
    expect(session.carton.brief.size).toEqual({ L: 113, W: 67, D: 29 });
    expect(session.past).toEqual([brief]);
  });

  it("keeps the last good carton and says what is refused", () => {
    const session = run(open(), set("W", 67), set("L", 41));
    expect(session.asked.size.L).toBe(41);
    expect(session.carton.brief.size).toEqual({ L: 113, W: 67, D: 29 });
    expect(session.refusals).toMatchObject([{ parameter: "L", nearest: 50 }]);
    expect(run(session, set("L", 50)).refusals).toEqual([]);
  });

  it("undoes and redoes everything, refused figures too", () => {
    const edited = run(open(), set("W", 67), set("L", 41), set("D", 31));
    const back = run(edited, { type: "undo" }, { type: "undo" }, { type: "undo" }, { type: "undo" });
    expect(back.asked).toEqual(brief);
    expect(back.refusals).toEqual([]);
    const forth = run(back, { type: "redo" }, { type: "redo" }, { type: "redo" });
    expect(forth.asked).toEqual(edited.asked);
    expect(forth.refusals).toEqual(edited.refusals);
    expect(forth.future).toEqual([]);
  });

  it("takes a drag as one step, and a drag that comes back as none", () => {
    const dragged = run(open(), set("W", 68, "drag:W"), set("W", 66, "drag:W"), set("W", 61, "drag:W"), { type: "end-gesture" });
    expect(dragged.past).toEqual([brief]);
    expect(run(dragged, { type: "undo" }).asked).toEqual(brief);
    const again = run(dragged, set("W", 63, "drag:W"), { type: "end-gesture" });
    expect(again.past).toHaveLength(2);
    const nothing = run(open(), set("W", 68, "drag:W"), set("W", 71, "drag:W"), { type: "end-gesture" });
    expect(nothing.past).toEqual([]);
  });

  it("forgets what was undone once something else is done", () => {
    const session = run(open(), set("W", 67), { type: "undo" }, set("D", 37));
    expect(session.future).toEqual([]);
    expect(run(session, { type: "redo" })).toBe(session);
  });

  it("does nothing for an edit that changes nothing, and none at either end of the history", () => {
    const session = open();
    expect(run(session, set("W", 71))).toBe(session);
    expect(run(session, { type: "undo" })).toBe(session);
    expect(run(session, { type: "end-gesture" })).toBe(session);
  });

  it("takes a whole brief in one step", () => {
    const theirs = { ...brief, size: { L: 90, W: 53, D: 11 }, options: { glue: 9 } };
    const session = run(open(), set("W", 67), { type: "replace", brief: theirs });
    expect(session.carton.brief).toEqual(theirs);
    expect(run(session, { type: "undo" }).asked.size.W).toBe(67);
  });
});

describe("openSession", () => {
  it("opens what is refused on the nearest figures that work, and puts back what has none", () => {
    const session = open({ ...brief, size: { L: 7, W: 71, D: 29 }, options: { glue: 33 } });
    expect(session.carton.brief).toMatchObject({ size: { L: 50, W: 71, D: 29 }, options: {} });
    expect(session.refusals.map((r) => r.parameter)).toEqual(["L", "glue"]);
    expect(session.asked.size.L).toBe(7);
  });

  it("tells all that is wrong at once, though a build stops at the first kind of it", () => {
    // Sizes are judged before options here, and no length works while the option is there.
    const staged: Build = (asked) => {
      const sizes = asked.size.L < 50 ? [{ code: "too-small" as const, parameter: "L", given: asked.size.L, limit: { atLeast: 50 }, nearest: null, because: "the flaps would meet" }] : [];
      const options = "hole" in asked.options ? [{ code: "unknown-option" as const, parameter: "hole", given: 12, limit: null, nearest: null, because: "there is no such option" }] : [];
      const refusals = sizes.length > 0 ? sizes : options;
      return refusals.length > 0 ? { ok: false, refusals } : build(asked);
    };
    const session = openSession(staged, { ...brief, size: { L: 7, W: 71, D: 29 }, options: { hole: 12 } });
    expect(session?.refusals.map((r) => [r.parameter, r.nearest])).toEqual([["L", 50], ["hole", null]]);
    expect(session?.carton.brief).toMatchObject({ size: { L: 50, W: 71, D: 29 }, options: {} });
  });

  it("opens nothing where nothing can be drawn", () => {
    expect(openSession(build, { ...brief, construction: "gone" })).toBeNull();
  });
});

describe("changes of a brief", () => {
  it("keeps an expression only while it says more than the figure", () => {
    const typed = withValue(brief, "L", 82, "80+2*1");
    expect(typed.typed).toEqual({ L: "80+2*1" });
    expect(withValue(typed, "L", 83, "83").typed).toEqual({});
    expect(withValue(typed, "W", 27).typed).toEqual({ L: "80+2*1" });
    expect(withDefault(withValue(brief, "glue", 11, "22/2"), "glue")).toEqual(brief);
  });

  it("sets sizes, room, board and options each in its place", () => {
    expect(withValue(brief, "room", 3).room).toBe(3);
    expect(withValue(brief, "board", "sbb-300").board).toBe("sbb-300");
    expect(withValue(brief, "notch", false).options).toEqual({ notch: false });
    expect(withBasis(brief, "outside").basis).toBe("outside");
  });

  it("takes size and board to another construction and leaves its options behind", () => {
    const from = { ...withValue(withValue(brief, "L", 82, "80+2"), "glue", 9, "4.5*2"), board: "sbb-300" };
    expect(withConstruction(from, "sleeve")).toEqual({ ...brief, construction: "sleeve", board: "sbb-300", size: { L: 82, W: 71, D: 29 }, typed: { L: "80+2" } });
  });

  it("reads what is asked, or what is in force", () => {
    const session = open();
    expect(askedValue(session, "W")).toBe(71);
    expect(askedValue(session, "glue")).toBe(12);
    expect(askedValue({ ...session, asked: withValue(brief, "glue", 33) }, "glue")).toBe(33);
  });

  it("tells briefs apart by what they ask, not by the order of their options", () => {
    const one = { ...brief, options: { glue: 9, taper: 5 } };
    expect(isSameBrief(one, { ...brief, options: { taper: 5, glue: 9 } })).toBe(true);
    expect(isSameBrief(one, { ...brief, options: { taper: 5, glue: 8 } })).toBe(false);
  });
});
