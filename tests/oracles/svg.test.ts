// SVG read again by readers that know nothing of this product: Maker.js's importer of path data, and a reader of path data
// written from the standard (path-readers.ts).
import makerjs from "makerjs";
import { describe, expect, it } from "vitest";
import { svgOf } from "~/cartons/export/svg";
import { LAYER_ORDER, PROCESSING_STEPS } from "~/cartons/export/processing-steps";
import { layersSeen } from "~/cartons/export/sheet-view";
import { arcOf, eachEdge, lengthOf } from "~/cartons/geometry/path";
import { cases, SIDES } from "./cases";
import { areaRead, readSvgPath } from "./path-readers";

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
        const read = [...body!.matchAll(/ d="([^"]+)"/g)].map((m) => readSvgPath(m[1]!));
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
              expect(Math.hypot(to.arc!.x - origin.x - centre.x, origin.y - to.arc!.y - centre.y)).toBeLessThan(Math.max(slack, Math.sqrt(radius * 1e-3)));
            } else expect(to.arc === null || k === path.vertices.length - 1).toBe(true);
          });
        });
      }
    });

    it("encloses the blank's area: outlines less holes", () => {
      const cut = groups.find((g) => g[3] === "Cutting")![5]!;
      const areas = [...cut.matchAll(/ d="([^"]+)"/g)].map((m) => readSvgPath(m[1]!)).filter((p) => p.closed).map((p) => Math.abs(areaRead(p)));
      const roles = layers.cut.filter((p) => p.path.closed).map((p) => p.role);
      const area = areas.reduce((sum, a, i) => sum + (roles[i] === "outline" ? a : -a), 0);
      const holes = roles.map((r, i) => (r === "outline" ? 0 : areas[i]!)).reduce((sum, a) => sum + a, 0);
      // The made-up blank's area is given without its hole.
      const wanted = carton.construction.id === "made-up" ? carton.blank.area - holes : carton.blank.area;
      expect(Math.abs(area - wanted)).toBeLessThan(0.05);
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
