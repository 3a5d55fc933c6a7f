// The drawing as data. Rules: look.md's line code in words of ISO 129-1 (dimension lines outside the view where they can,
// extension lines that cross no other part of it, each figure once), plus what this product promises of its ledger.
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { buildCarton } from "~/cartons/carton";
import { findBoard } from "~/cartons/boards/catalogue";
import { listConstructions } from "~/cartons/constructions/registry";
import { drawingOf, type Drawing, type Line } from "~/cartons/export/drawing";
import { capitalsWidth, figureWidth } from "~/cartons/export/drawing-space";
import { shown } from "~/cartons/export/number";
import { seenPath, type Side } from "~/cartons/export/sheet-view";
import type { Box, Point } from "~/cartons/geometry/outline";
import { flatten } from "~/cartons/geometry/path";
import { isInside } from "~/cartons/geometry/polygon";
import type { Carton } from "~/cartons/types";
import { cases, SIDES } from "./cases";

const between = (l: Line, f: number): Point => ({ x: l.from.x + (l.to.x - l.from.x) * f, y: l.from.y + (l.to.y - l.from.y) * f });

/** Extension lines that run over a panel, as ids. */
function crossing(carton: Carton, drawing: Drawing, side: Side): string[] {
  const rings = carton.panels.map((p) => flatten(seenPath(p.outline, side), 0.02));
  return drawing.dimensions.flatMap((d) => d.extensions.filter((l) => Array.from({ length: 41 }, (_, i) => between(l, i / 40)).some((p) => rings.some((r) => isInside(p, r)))).map(() => d.id));
}

interface Words { id: string; box: Box }

function wordsOf(drawing: Drawing): Words[] {
  const around = (id: string, at: Point, long: number, high: number, isUpright: boolean): Words => {
    const [w, h] = isUpright ? [high, long] : [long, high];
    return { id, box: { minX: at.x - w / 2, maxX: at.x + w / 2, minY: at.y - h / 2, maxY: at.y + h / 2 } };
  };
  return [
    ...drawing.dimensions.map((d) => around(d.id, d.textAt, figureWidth(d.text, drawing.size) * 0.9, drawing.size * 0.72, d.measures === "y")),
    ...drawing.labels.map((l) => around(`label ${l.panel}`, l.at, capitalsWidth(l.text, l.size) * 0.9, l.size * 0.72, l.angle === 90)),
    ...drawing.callouts.map((c) => around(c.id, c.at, figureWidth(c.text, drawing.size * 0.85) * 0.9, drawing.size * 0.6, false)),
  ];
}

function overlaps(drawing: Drawing): string[] {
  const words = wordsOf(drawing);
  return words.flatMap((a, i) => words.slice(i + 1).filter((b) => a.box.minX < b.box.maxX && b.box.minX < a.box.maxX && a.box.minY < b.box.maxY && b.box.minY < a.box.maxY).map((b) => `${a.id} on ${b.id}`));
}

function keepsItsPromises(carton: Carton, side: Side): void {
  const drawing = drawingOf(carton, { side });
  expect(crossing(carton, drawing, side)).toEqual([]);
  expect(overlaps(drawing)).toEqual([]);
  for (const d of drawing.dimensions) {
    const length = Math.hypot(d.to.x - d.from.x, d.to.y - d.from.y);
    expect(d.text.replace(/[()]/g, "")).toBe(shown(d.value));
    if (d.kind === "panel") expect(Math.abs(length - d.value)).toBeLessThan(0.021);
    else if (d.kind !== "asked") expect(length).toBeCloseTo(d.value, 6);
    if (d.row !== null) {
      const row = carton.ledger.find((r) => r.id === d.row)!;
      expect(row.parameter).toBe(d.parameter);
      expect(Math.abs(row.value - d.value)).toBeLessThan(0.02);
    }
    for (const p of [d.from, d.to, d.textAt]) {
      expect(p.x).toBeGreaterThanOrEqual(drawing.bounds.minX);
      expect(p.y).toBeLessThanOrEqual(drawing.bounds.maxY);
    }
  }
  const marked = carton.ledger.filter((r) => r.mark && r.unit === "mm");
  const said = new Set(drawing.dimensions.flatMap((d) => (d.row ? [d.row] : [])));
  const figures = new Set(drawing.dimensions.map((d) => shown(d.value)));
  // Each figure of the ledger is on the sheet, in its own place or on a panel that is alike; or the sheet owns up to it.
  const absent = marked.filter((r) => !said.has(r.id) && !figures.has(shown(r.value)));
  expect(absent.length).toBeLessThanOrEqual(drawing.leftToFile);
  expect(new Set(drawing.dimensions.map((d) => d.id)).size).toBe(drawing.dimensions.length);
}

describe.each(cases)("drawing of $name", ({ carton }) => {
  it.each(SIDES)("from the %s side: no figure twice, none wrong, none over another, no line across a panel", (side) => keepsItsPromises(carton, side));

  it("shows L, W and D as asked, tied to what edits them", () => {
    const asked = drawingOf(carton, { side: "inside" }).dimensions.filter((d) => d.kind === "asked");
    for (const axis of carton.ledger.filter((r) => r.group === "asked" && r.mark)) {
      const found = asked.find((d) => d.parameter === axis.parameter);
      expect(found, axis.id).toBeDefined();
      expect(found!.text).toBe(`(${shown(axis.value)})`);
    }
  });

  it("measures the whole blank, piece by piece", () => {
    const overall = drawingOf(carton, { side: "inside" }).dimensions.filter((d) => d.kind === "overall");
    expect(overall.length).toBe(2 * carton.fold.parts.length);
    if (carton.fold.parts.length === 1) expect(overall.map((d) => d.value).sort()).toEqual([carton.blank.width, carton.blank.height].sort());
  });

  it("turns over with the blank: the same figures, readable words", () => {
    const [inside, print] = SIDES.map((side) => drawingOf(carton, { side })) as [Drawing, Drawing];
    expect(print.labels.map((l) => [l.panel, l.text, l.angle])).toEqual(inside.labels.map((l) => [l.panel, l.text, l.angle]));
    print.labels.forEach((l, i) => expect(l.at.x).toBeCloseTo(-inside.labels[i]!.at.x, 9));
    const chain = (d: Drawing) => d.dimensions.filter((x) => x.kind === "chain" && x.measures === "x").map((x) => x.text);
    expect([...chain(print)].sort()).toEqual([...chain(inside)].sort());
  });

  it("keeps figures apart at a reduced scale, as on a narrow screen", () => {
    const drawing = drawingOf(carton, { side: "inside", size: 8, gap: 16, pitch: 20, callouts: false });
    expect(overlaps(drawing)).toEqual([]);
    expect(crossing(carton, drawing, "inside")).toEqual([]);
  });
});

describe("drawings of cartons at random", () => {
  it.each(listConstructions().map((c) => [c.id, c] as const))("%s", (id, info) => {
    const board = findBoard(info.sample.board)!;
    const around = (value: number) => fc.double({ min: value * 0.6, max: value * 2.2, noNaN: true }).map((v) => Math.round(v * 10) / 10);
    let drawn = 0;
    fc.assert(fc.property(around(info.sample.size.L), around(info.sample.size.W), around(info.sample.size.D), fc.constantFrom<Side>("inside", "print"), (L, W, D, side) => {
      const result = buildCarton({ construction: id, size: { L, W, D }, basis: "inside", room: 0, board: board.id, options: {}, typed: {} }, board);
      if (!result.ok) return;
      drawn++;
      keepsItsPromises(result.carton, side);
    }), { numRuns: 100, seed: 20261124 });
    expect(drawn).toBeGreaterThan(40);
  });
});

describe("these checks can fail", () => {
  const { carton } = cases[0]!;
  const drawing = drawingOf(carton, { side: "inside" });
  it("sees an extension line across a panel", () => {
    const { bounds } = carton.blank;
    const line = { from: { x: bounds.minX - 1, y: 0 }, to: { x: bounds.maxX + 1, y: 0 } };
    const spoilt = { ...drawing, dimensions: drawing.dimensions.map((d, i) => (i === 0 ? { ...d, extensions: [{ from: { ...line.from, y: (bounds.minY + bounds.maxY) / 2 }, to: { ...line.to, y: (bounds.minY + bounds.maxY) / 2 } }] } : d)) };
    expect(crossing(carton, spoilt, "inside")).toEqual([drawing.dimensions[0]!.id]);
  });
  it("sees a figure on another", () => {
    const spoilt = { ...drawing, dimensions: drawing.dimensions.map((d, i) => (i === 1 ? { ...d, textAt: drawing.dimensions[0]!.textAt } : d)) };
    expect(overlaps(spoilt).length).toBeGreaterThan(0);
  });
});
