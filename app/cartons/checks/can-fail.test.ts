// Each check is shown to find what it is for, on cartons that the limits would refuse or that are bent on purpose.
import { describe, expect, it } from "vitest";
import { declareWith } from "../assemble";
import type { Kit } from "../blank/kit";
import { findBoard } from "../boards/catalogue";
import { findConstruction } from "../constructions/registry";
import { foldModelOf } from "../fold/fold-model";
import { layersOf } from "../layers/layers";
import type { OptionValue } from "../types";
import { foldCheckOf } from "./fold-check";
import { checkMaking } from "./making";
import { checkMotion } from "./motion";

function bent(id: string, bend: (kit: Kit) => Partial<Kit>, options: Record<string, OptionValue> = {}) {
  const registered = findConstruction(id)!;
  const board = findBoard(registered.info.sample.board)!;
  const declared = declareWith(registered, registered.info.sample.size, options, board, (kit) => ({ ...kit, ...bend(kit) }));
  if (!declared.ok) throw new Error(JSON.stringify(declared.refusals));
  const fold = foldModelOf(declared.blank);
  return { blank: declared.blank, fold, codes: foldCheckOf(declared.blank, fold, board).findings.map((f) => f.code) };
}
const number = (change: Record<string, number>) => (kit: Kit): Partial<Kit> => ({ number: (name) => change[name] ?? kit.number(name) });

describe("the fold check finds", () => {
  it("a slit lock whose shoulder is gone", () => expect(bent("straight-tuck", number({ shoulderShort: 5 })).codes).toContain("lock-short"));
  it("a last panel too long by half a millimetre and more", () => {
    const attach = (kit: Kit): Partial<Kit> => ({ attach: (p, t, n, o, opts) => kit.attach(p, t, n, n === "side 2" ? o.map((v) => (v.y > 5 ? { ...v, y: v.y + 1.5 } : v)) : o, opts) });
    expect(bent("straight-tuck", attach).codes).toContain("outside-stack");
  });
  it("a roll without play", () => {
    const strip = (kit: Kit): Partial<Kit> => ({ strip: (layers, _play, use) => kit.strip(layers, kit.times(kit.option("rollPlay"), 0), use) });
    expect(bent("roll-end-mailer", strip).codes).toEqual(expect.arrayContaining(["inside-size"]));
  });
  it("a fold that is not square", () => {
    const attach = (kit: Kit): Partial<Kit> => ({ attach: (p, t, n, o, opts) => kit.attach(p, t, n, o, n === "left" ? { ...opts, angle: 84 } : opts) });
    expect(bent("glued-tray", attach).codes).toEqual(expect.arrayContaining(["not-square", "mate-not-parallel"]));
  });
  it("a wall that is no lining and stands in the inside", () => {
    const attach = (kit: Kit): Partial<Kit> => ({ attach: (p, t, n, o, opts) => kit.attach(p, t, n, o, n === "lid tuck" ? { ...opts, role: "flap" } : opts) });
    expect(bent("straight-tuck", attach).codes).toContain("in-the-inside");
  });
  it("a glue flap too small to hold, and one too narrow", () => {
    expect(bent("straight-tuck", number({ glueTaper: 74 })).codes).toContain("mate-area");
    expect(bent("straight-tuck", (k) => ({}), { glue: 6.2 }).codes).toContain("glue-narrow");
  });
  it("two boards in one place", () => expect(bent("straight-tuck", number({ dust: 40 })).codes).toContain("collision"));
  it("a lid that does not lie on its dust flaps", () => {
    const edge = (kit: Kit): Partial<Kit> => ({ attach: (p, t, n, o, opts) => kit.attach(p, t, n, o, n === "lid dust 1" ? { ...opts, angle: -90 } : opts) });
    expect(bent("straight-tuck", edge).codes).toEqual(expect.arrayContaining(["mate-not-parallel"]));
  });
});

describe("the motion check finds", () => {
  it("steps in an order in which nobody could fold", () => {
    const { blank, fold } = bent("straight-tuck", () => ({}));
    // The dust flaps of the lid go in after the lid is shut.
    const [dust, lid] = ["lid dust", "lid"].map((id) => fold.steps.findIndex((s) => s.id === id)) as [number, number];
    const turned = { ...fold, hinges: fold.hinges.map((h) => ({ ...h, step: h.step === dust ? lid : h.step === lid ? dust : h.step })) };
    expect(checkMotion(blank, fold).findings).toEqual([]);
    expect(checkMotion(blank, turned).findings.map((f) => f.code)).toContain("collision-on-the-way");
  });
});

describe("the making check finds", () => {
  const layers = (options: Record<string, OptionValue>) => {
    const { blank } = bent("straight-tuck", () => ({}), options);
    return layersOf(blank, { bleed: 0, safe: 0, glueMargin: 1.5 });
  };
  it("a slot narrower than the route allows, and none where it is wide enough", () => {
    const narrow = layers({ slitDrop: 1.1 });
    expect(checkMaking(narrow, { minGap: 1.5, creaseSpacing: 2 }).map((f) => f.code)).toContain("narrow-gap");
    expect(checkMaking(narrow, { minGap: 1, creaseSpacing: 2 }).map((f) => f.code)).not.toContain("narrow-gap");
  });
  it("creases closer than their channels", () => {
    const { blank } = bent("roll-end-mailer", () => ({}), { rollPlay: 0.3 });
    expect(checkMaking(layersOf(blank, { bleed: 0, safe: 0, glueMargin: 1.5 }), { minGap: 1, creaseSpacing: 3.6 }).map((f) => f.code)).toContain("creases-close");
  });
});
