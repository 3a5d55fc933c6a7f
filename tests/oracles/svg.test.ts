// SVG read again by readers that know nothing of this product: Maker.js's importer of path data, and a small reader of
// arcs written from the standard (SVG 1.1, appendix F.6.5: end points to centre).
import makerjs from "makerjs";
import { describe, expect, it } from "vitest";
import { svgOf } from "~/cartons/export/svg";
import { LAYER_ORDER, PROCESSING_STEPS } from "~/cartons/export/processing-steps";
import { layersSeen } from "~/cartons/export/sheet-view";
import { arcOf, eachEdge, lengthOf } from "~/cartons/geometry/path";
import { cases, SIDES } from "./cases";

interface Corner { x: number; y: number; centre: { x: number; y: number } | null }

/** Corners of one path's data, with the centre of the arc that ends in each. */
function readPath(d: string): { corners: Corner[]; closed: boolean } {
  const tokens = d.match(/[MLAZ]|-?\d+(?:\.\d+)?/g) ?? [];
  expect(tokens.join("").length, "nothing but M, L, A, Z and plain numbers").toBe(d.replace(/ /g, "").length);
  const corners: Corner[] = [];
  let i = 0;
  let isClosed = false;
  const next = () => Number(tokens[i++]);
  while (i < tokens.length) {
    const command = tokens[i++];
    if (command === "Z") isClosed = true;
    else if (command === "A") {
      const [r, ry, turn, large, sweep] = [next(), next(), next(), next(), next()] as [number, number, number, number, number];
      expect(ry).toBe(r);
      expect(turn).toBe(0);
      const from = corners[corners.length - 1]!;
      const to = { x: next(), y: next() };
      const [hx, hy] = [(from.x - to.x) / 2, (from.y - to.y) / 2];
      const k = Math.sqrt(Math.max(0, (r * r - hx * hx - hy * hy) / (hx * hx + hy * hy))) * (large === sweep ? -1 : 1);
      corners.push({ ...to, centre: { x: k * hy + (from.x + to.x) / 2, y: -k * hx + (from.y + to.y) / 2 } });
    } else corners.push({ x: next(), y: next(), centre: null });
  }
  return { corners, closed: isClosed };
}

describe.each(cases)("SVG of $name", ({ carton }) => {
  describe.each(SIDES)("seen from the %s side", (side) => {
    const svg = svgOf(carton, { side, revision: "B <2>", title: "Tea & \"soap\"" });
    const layers = layersSeen(carton, side);
    const origin = { x: Number(/origin-x="([^"]+)"/.exec(svg)![1]), y: Number(/origin-y="([^"]+)"/.exec(svg)![1]) };
    const groups = [...svg.matchAll(/<g id="([^"]+)" data-processing-group="([^"]+)" data-processing-step="([^"]+)"[^>]*>\n<title>([^<]+)<\/title>\n((?:<path [^>]*\/>\n)*)<\/g>/g)];

    it("has one group a layer, named by ISO 19593-1, and nothing in it but paths", () => {
      const names = LAYER_ORDER.filter((name) => layers[name].length > 0);
      expect(groups.map((g) => g[3])).toEqual(names.map((name) => PROCESSING_STEPS[name].type));
      expect(groups.map((g) => g[2])).toEqual(names.map((name) => PROCESSING_STEPS[name].group));
      expect(groups.map((g) => g[4])).toEqual(names.map((name) => PROCESSING_STEPS[name].label));
      expect(svg.match(/<path /g)!.length).toBe(names.reduce((sum, name) => sum + layers[name].length, 0));
      expect(svg.replace(/<path [^>]*\/>|<\/?g[^>]*>|<\/?svg[^>]*>|<title>[^<]*<\/title>|<desc>[^<]*<\/desc>|<\/?metadata>|<carton [^>]*\/>|<\?xml[^>]*\?>|\s/g, "")).toBe("");
    });

    it("says its units, revision and side, and stands at true size", () => {
      expect(svg).toContain("revision B &lt;2&gt;, units mm, scale 1 : 1");
      expect(svg).toContain("Tea &amp; &quot;soap&quot;");
      expect(svg).toContain(`side="${side}"`);
      const [, width, height, vw, vh] = /width="([\d.]+)mm" height="([\d.]+)mm" viewBox="0 0 ([\d.]+) ([\d.]+)"/.exec(svg)!;
      expect([width, height]).toEqual([vw, vh]);
      expect(Number(width)).toBeGreaterThanOrEqual(carton.blank.width - 1e-4);
      expect(svg).not.toMatch(/-0[^.\d]|\de[-+]?\d|NaN|Infinity|undefined/);
    });

    it("gives the same points back to a thousandth of a millimetre", () => {
      for (const [, , , type, , body] of groups) {
        const name = LAYER_ORDER.find((n) => PROCESSING_STEPS[n].type === type)!;
        const read = [...body!.matchAll(/ d="([^"]+)"/g)].map((m) => readPath(m[1]!));
        expect(read.length).toBe(layers[name].length);
        layers[name].forEach(({ path }, i) => {
          const { corners, closed } = read[i]!;
          expect(closed).toBe(path.closed);
          eachEdge(path, (a, b, k) => {
            const [from, to] = [corners[k]!, corners[k + 1] ?? corners[0]!];
            expect(Math.hypot(from.x - origin.x - a.x, origin.y - from.y - a.y)).toBeLessThan(1e-3);
            expect(Math.hypot(to.x - origin.x - b.x, origin.y - to.y - b.y)).toBeLessThan(1e-3);
            if (a.bulge !== 0) {
              const { centre, radius } = arcOf(a, b);
              // A flat arc's centre moves far for a rounded end; the arc itself does not.
              const slack = 1e-3 * Math.max(1, radius / Math.hypot(b.x - a.x, b.y - a.y)) ** 2;
              expect(Math.hypot(to.centre!.x - origin.x - centre.x, origin.y - to.centre!.y - centre.y)).toBeLessThan(Math.max(slack, Math.sqrt(radius * 1e-3)));
            } else expect(to.centre === null || k === path.vertices.length - 1).toBe(true);
          });
        });
      }
    });

    it("has the same extents and lengths for Maker.js", () => {
      for (const [, , , type, , body] of groups) {
        const name = LAYER_ORDER.find((n) => PROCESSING_STEPS[n].type === type)!;
        const model = { models: Object.fromEntries([...body!.matchAll(/ d="([^"]+)"/g)].map((m, i) => [`p${i}`, makerjs.importer.fromSVGPathData(m[1]!)])) };
        let length = 0;
        makerjs.model.walk(model, { onPath: ({ pathContext }) => { length += makerjs.measure.pathLength(pathContext); } });
        expect(length).toBeCloseTo(layers[name].reduce((sum, p) => sum + lengthOf(p.path), 0), 1);
        if (name !== "cut") continue;
        const { high, low } = makerjs.measure.modelExtents(model)!;
        expect(high[0]! - low[0]!).toBeCloseTo(carton.blank.width, 2);
        expect(high[1]! - low[1]!).toBeCloseTo(carton.blank.height, 2);
      }
    });

    it("comes out the same twice", () => {
      expect(svgOf(carton, { side, revision: "B <2>", title: "Tea & \"soap\"" })).toBe(svg);
    });
  });

  it("writes only the layers that are asked for", () => {
    const svg = svgOf(carton, { side: "inside", revision: "1", layers: ["cut"] });
    expect([...svg.matchAll(/<g id="([^"]+)"/g)].map((m) => m[1])).toEqual(["Cutting"]);
  });
});
