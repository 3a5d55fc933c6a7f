// Can the fold check fail? Each panel of each sample is made 0.5 mm too long or too wide, one at a time, and every such
// mistake must be found, or stand in the list of what is free with the reason.
import { describe, expect, it } from "vitest";
import { declareWith } from "~/cartons/assemble";
import type { Vertex } from "~/cartons/geometry/outline";
import { findBoard } from "~/cartons/boards/catalogue";
import { foldCheckOf } from "~/cartons/checks/fold-check";
import { findConstruction, listConstructions } from "~/cartons/constructions/registry";
import type { Kit } from "~/cartons/blank/kit";
import { foldModelOf } from "~/cartons/fold/fold-model";

const BY = 0.5;
type Dimension = "length" | "width";

/** Made longer away from its crease, or wider along it on the far side. */
function stretched(outline: readonly Vertex[], dimension: Dimension, by: number): Vertex[] {
  const key = dimension === "length" ? "y" : "x";
  const middle = (Math.min(...outline.map((v) => v[key])) + Math.max(...outline.map((v) => v[key]))) / 2;
  return outline.map((v) => (v[key] > middle ? { ...v, [key]: v[key] + by } : v));
}

function findingsOf(id: string, mutate: { panel: string; dimension: Dimension; by: number } | null): string[] {
  const registered = findConstruction(id)!;
  const board = findBoard(registered.info.sample.board)!;
  const bend = (kit: Kit): Kit => {
    if (!mutate) return kit;
    const outline = (name: string, o: readonly Vertex[]) => (name === mutate.panel ? stretched(o, mutate.dimension, mutate.by) : o);
    return { ...kit, base: (name, o, opts) => kit.base(name, outline(name, o), opts), attach: (parent, towards, name, o, opts) => kit.attach(parent, towards, name, outline(name, o), opts) };
  };
  const declared = declareWith(registered, registered.info.sample.size, {}, board, bend);
  if (!declared.ok) throw new Error(JSON.stringify(declared.refusals));
  return foldCheckOf(declared.blank, foldModelOf(declared.blank), board).findings.filter((f) => f.severity === "error").map((f) => f.code);
}

/** Dimensions that no face closes on: half a millimetre more changes nothing that is asked for. Patterns over "panel/dimension". */
const FREE: Readonly<Record<string, readonly (readonly [RegExp, string])[]>> = {
  "straight-tuck": [
    [/dust .*\/length/, "a dust flap is free as long as the two do not meet"],
    [/(bottom|lid) dust .*\/width/, "its shoulder has 0.3 mm before the panel it locks at and its hinge side a clearance of its own"],
    [/tuck\/length/, "a tuck is free in depth"], [/tuck\/width/, "the lid's ease a side is 0.5 mm"],
    [/glue flap\/(length|width)/, "a glue flap is free as long as its patch is large enough"],
    [/(bottom|lid)\/width/, "the lid's ease a side is 0.5 mm"],
    [/side 2\/length/, "the raw edge is pulled back by 0.5 mm and lies within the back's thickness"],
    [/front\/width/, "a free edge at the top, level with the lid's middle"],
  ],
  "reverse-tuck": [
    [/dust .*\/(length|width)/, "as straight tuck"], [/tuck\/(length|width)/, "as straight tuck"], [/glue flap\/(length|width)/, "as straight tuck"],
    [/(bottom|lid)\/width/, "as straight tuck"], [/side 2\/length/, "as straight tuck"],
  ],
  "roll-end-mailer": [
    [/corner flap .*\/(length|width)/, "free under the roll and before the other corner flap"], [/roll .*\/width/, "set in from front and back by its clearance"],
    [/inner .*\/width/, "set in from front and back by its clearance"], [/inner .*\/length/, "half a millimetre shorter, its tabs still go through most of the base"], [/(wing|ear) .*\/(length|width)/, "free inside the side walls"],
    [/tuck\/(length|width)/, "free in depth; narrower than the inside by 2 mm, or set before the inner walls"],
    [/front\/length/, "a free edge that the lid covers"], [/outer .*\/width/, "within the thickness of front and back"],
  ],
  "glued-tray": [[/glue flap .*\/(length|width)/, "free as long as its patch is large enough"], [/(left|right)\/width/, "the raw edge covers front and back by half a caliper"]],
  "lid-and-base": [[/glue flap .*\/(length|width)/, "free as long as its patch is large enough"], [/(left|right)\/width/, "the raw edge covers front and back by half a caliper"]],
};

describe.each(listConstructions().map((c) => c.id))("%s", (id) => {
  it("has nothing to find when nothing is wrong", () => expect(findingsOf(id, null)).toEqual([]));

  it("finds every stretched dimension that is not free", () => {
    const registered = findConstruction(id)!;
    const declared = declareWith(registered, registered.info.sample.size, {}, findBoard(registered.info.sample.board)!, (k) => k);
    if (!declared.ok) throw new Error("the sample is accepted");
    const free = FREE[id] ?? [];
    const missed: string[] = [];
    const used = new Set<RegExp>();
    let caught = 0;
    for (const panel of declared.blank.panels) for (const dimension of ["length", "width"] as const) for (const by of [BY, -BY]) {
      const found = findingsOf(id, { panel: panel.name, dimension, by });
      if (found.length > 0) caught++;
      else {
        const known = free.find(([pattern]) => pattern.test(`${panel.name}/${dimension}`));
        if (known) used.add(known[0]);
        else missed.push(`${panel.name}/${dimension} ${by}`);
      }
    }
    expect(missed).toEqual([]);
    // What the list calls free and a check finds all the same is no longer free.
    expect(free.filter(([pattern]) => !used.has(pattern)).map(([pattern]) => String(pattern))).toEqual([]);
    expect(caught).toBeGreaterThan(8);
  });
});
