// DXF read again by dxf-parser, an independent reader.
import DxfParser from "dxf-parser";
import { describe, expect, it } from "vitest";
import { dxfOf } from "~/cartons/export/dxf";
import { LAYER_ORDER, PROCESSING_STEPS } from "~/cartons/export/processing-steps";
import { layersSeen } from "~/cartons/export/sheet-view";
import { boundsOf, lengthOf } from "~/cartons/geometry/path";
import { cases, SIDES } from "./cases";

interface Vertex { x: number; y: number; bulge?: number }
interface Entity { type: string; layer: string; shape?: boolean; vertices?: Vertex[]; center?: Vertex; radius?: number; startAngle?: number; endAngle?: number }

const pathOf = (e: Entity) => ({ closed: e.shape === true, vertices: e.vertices!.map((v) => ({ x: v.x, y: v.y, bulge: v.bulge ?? 0 })) });
/** ARC entities run anticlockwise from start to end; dxf-parser gives radians. */
function lengthRead(e: Entity): number {
  if (e.type !== "ARC") return lengthOf(pathOf(e));
  const turn = (((e.endAngle! - e.startAngle!) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  return e.radius! * turn;
}

describe.each(cases)("DXF of $name", ({ carton }) => {
  describe.each(SIDES)("seen from the %s side", (side) => {
    const text = dxfOf(carton, { side, revision: "C", title: "Größe Łódź" });
    const dxf = new DxfParser().parseSync(text)!;
    const entities = dxf.entities as unknown as Entity[];
    const layers = layersSeen(carton, side);
    const names = LAYER_ORDER.filter((name) => layers[name].length > 0);

    it("declares millimetres, R12, extents, revision and side", () => {
      expect(dxf.header["$INSUNITS"]).toBe(4);
      expect(dxf.header["$ACADVER"]).toBe("AC1009");
      const box = boundsOf(names.flatMap((name) => layers[name].map((p) => p.path)));
      const low = dxf.header["$EXTMIN"] as unknown as Vertex;
      const high = dxf.header["$EXTMAX"] as unknown as Vertex;
      expect(low.x).toBeCloseTo(box.minX, 3);
      expect(high.y).toBeCloseTo(box.maxY, 3);
      expect(text.startsWith("999\nGrosse Lodz, revision C\n")).toBe(true);
      expect(text).toContain("revision C");
      expect(text).toContain("Units: millimetres. Scale 1 : 1.");
      expect(text).toContain(side === "inside" ? "Seen from the inside." : "Seen from the print side.");
      expect(text).toMatch(/^[\x20-\x7E\n]*$/);
      expect(text).not.toMatch(/\de[-+]?\d+\n|NaN|Infinity/);
    });

    it("has one layer a process and loses nothing", () => {
      expect(Object.keys(dxf.tables.layer.layers).sort()).toEqual(["0", ...names.map((n) => PROCESSING_STEPS[n].dxf.layer)].sort());
      for (const name of names) {
        const own = entities.filter((e) => e.layer === PROCESSING_STEPS[name].dxf.layer);
        expect(own.length).toBe(layers[name].length);
        expect(own.filter((e) => e.shape === true).length).toBe(layers[name].filter((p) => p.path.closed).length);
        expect(own.reduce((sum, e) => sum + lengthRead(e), 0)).toBeCloseTo(layers[name].reduce((sum, p) => sum + lengthOf(p.path), 0), 2);
        const arcs = layers[name].reduce((sum, p) => sum + p.path.vertices.filter((v, i) => v.bulge !== 0 && (p.path.closed || i < p.path.vertices.length - 1)).length, 0);
        expect(own.reduce((sum, e) => sum + (e.type === "ARC" ? 1 : e.vertices!.filter((v) => (v.bulge ?? 0) !== 0).length), 0)).toBe(arcs);
      }
      expect(entities.length).toBe(names.reduce((sum, n) => sum + layers[n].length, 0));
    });

    it("holds closed outlines as polylines with the blank's extents", () => {
      const outlines = entities.filter((e) => e.layer === "CUT" && e.shape === true);
      expect(outlines.every((e) => e.type === "POLYLINE")).toBe(true);
      const box = boundsOf(outlines.map(pathOf));
      expect(box.maxX - box.minX).toBeCloseTo(carton.blank.width, 4);
      expect(box.maxY - box.minY).toBeCloseTo(carton.blank.height, 4);
    });

    it("comes out the same twice", () => expect(dxfOf(carton, { side, revision: "C", title: "Größe Łódź" })).toBe(text));
  });
});
