// The outline against Maker.js, which knows panels only as loose shapes: the union of all panels of a piece
// (combineUnion) must have the outline's extents and length, its chain must be closed, and its area the panels' sum.
// Source of the method: Maker.js 0.19 (model.combineUnion, model.findChains, measure.modelExtents, measure.pathLength).
import makerjs from "makerjs";
import { describe, expect, it } from "vitest";
import { arcOf, areaOf, eachEdge, lengthOf } from "~/cartons/geometry/path";
import type { Path } from "~/cartons/geometry/outline";
import { cases } from "./cases";

const DEGREES = 180 / Math.PI;

function modelOf(path: Path): makerjs.IModel {
  const paths: Record<string, makerjs.IPath> = {};
  eachEdge(path, (a, b, i) => {
    if (a.bulge === 0) paths[`e${i}`] = new makerjs.paths.Line([a.x, a.y], [b.x, b.y]);
    else {
      const { centre, radius, from, sweep } = arcOf(a, b);
      const start = (sweep > 0 ? from : from + sweep) * DEGREES;
      paths[`e${i}`] = new makerjs.paths.Arc([centre.x, centre.y], radius, start, start + Math.abs(sweep) * DEGREES);
    }
  });
  return { paths };
}

function lengthIn(model: makerjs.IModel): number {
  let sum = 0;
  makerjs.model.walk(model, { onPath: ({ pathContext }) => { sum += makerjs.measure.pathLength(pathContext); } });
  return sum;
}

const made = cases.filter((c) => c.carton.construction.id !== "made-up");

describe.each(made)("outline of $name", ({ carton }) => {
  const parts = [...new Set(carton.panels.map((p) => p.part))];
  it.each(parts)("of piece %s is the union of its panels", (part) => {
    const panels = carton.panels.filter((p) => p.part === part);
    // Fingers of air between neighbouring panels are closed by the creases, slits by definition: both are edges of panels.
    let union = modelOf(panels[0]!.outline);
    for (const panel of panels.slice(1)) union = makerjs.model.combineUnion(union, modelOf(panel.outline));
    const chains = makerjs.model.findChains(union, { pointMatchingDistance: 0.001 }) as makerjs.IChain[];
    const outer = chains.filter((c) => c.endless).sort((a, b) => b.pathLength - a.pathLength)[0];
    expect(outer).toBeDefined();
    const { low, high } = makerjs.measure.modelExtents(union)!;
    const own = carton.layers.cut.filter((c) => c.role === "outline").map((c) => c.path)
      .find((p) => p.vertices.some((v) => Math.hypot(v.x - panels[0]!.outline.vertices[0]!.x, v.y - panels[0]!.outline.vertices[0]!.y) < 500) && Math.abs(Math.min(...p.vertices.map((v) => v.x)) - low[0]!) < 0.01 && Math.abs(Math.max(...p.vertices.map((v) => v.y)) - high[1]!) < 0.01);
    expect(own, "an outline with the union's extents").toBeDefined();
    expect(outer!.pathLength).toBeCloseTo(lengthOf(own!), 2);
    // A chain without branches: what combineUnion leaves is the outline and no stray edge.
    expect(lengthIn(union)).toBeCloseTo(chains.reduce((sum, c) => sum + c.pathLength, 0), 6);
    expect(areaOf(own!)).toBeCloseTo(panels.reduce((sum, p) => sum + areaOf(p.outline), 0), 6);
  });

  it("measures as the carton says: lengths, extents and area", () => {
    for (const name of Object.keys(carton.layers) as (keyof typeof carton.layers)[]) {
      const model: makerjs.IModel = { models: Object.fromEntries(carton.layers[name].map((p, i) => [`m${i}`, modelOf(p.path)])) };
      expect(lengthIn(model)).toBeCloseTo(carton.lengths[name], 6);
    }
    const cut: makerjs.IModel = { models: Object.fromEntries(carton.layers.cut.map((p, i) => [`m${i}`, modelOf(p.path)])) };
    const { low, high } = makerjs.measure.modelExtents(cut)!;
    expect(high[0]! - low[0]!).toBeCloseTo(carton.blank.width, 6);
    expect(high[1]! - low[1]!).toBeCloseTo(carton.blank.height, 6);
  });

  it("closes: every outline and hole is an endless chain", () => {
    for (const { path, role } of carton.layers.cut) {
      if (!path.closed) continue;
      const chains = makerjs.model.findChains(modelOf(path), { pointMatchingDistance: 0.001 }) as makerjs.IChain[];
      expect(chains.map((c) => c.endless), role).toEqual([true]);
      expect(chains[0]!.links.length).toBe(path.vertices.length);
    }
  });
});
