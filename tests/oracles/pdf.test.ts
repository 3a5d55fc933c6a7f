// PDF read by poppler (pdfinfo, pdftotext, pdftoppm, pdffonts) and qpdf. Processing steps: ISO 19593-1:2018, tables 2 and 3.
import { describe, expect, it } from "vitest";
import { drawingOf } from "~/cartons/export/drawing";
import { pdfOf, type PdfOptions } from "~/cartons/export/pdf/document";
import { LAYER_ORDER, PROCESSING_STEPS } from "~/cartons/export/processing-steps";
import { layersSeen } from "~/cartons/export/sheet-view";
import { boundsOf, lengthOf } from "~/cartons/geometry/path";
import type { Carton } from "~/cartons/types";
import { latoFonts } from "~/services/fonts.server";
import { cases, SIDES } from "./cases";
import { lengthRead, strokedIn } from "./path-readers";
import { withPdf, type PdfFile } from "./pdf-tools";

const POINTS = 72 / 25.4;
const facts = { title: "Łemon tea, 20 bags", client: "Ninefold Tea", revision: "7", date: "2026-11-24", drawnBy: "O. Brandt" };
const options = async (side: PdfOptions["side"]): Promise<PdfOptions> => ({ ...facts, side, fonts: await latoFonts() });

type Dict = Record<string, unknown>;
const groupsIn = (file: PdfFile): Dict[] =>
  Object.values(file.objects()).map((o) => (o as { value?: Dict }).value).filter((v): v is Dict => typeof v === "object" && v !== null && v["/Type"] === "/OCG");

function boxOf(info: string, name: string): [number, number, number, number] {
  const match = new RegExp(`${name}:\\s+([\\d.]+)\\s+([\\d.]+)\\s+([\\d.]+)\\s+([\\d.]+)`).exec(info);
  return match!.slice(1).map((v) => Number(v) / POINTS) as [number, number, number, number];
}

/** The extent of each piece, from its outline. */
const sizes = (carton: Carton): string[] => carton.layers.cut.filter((p) => p.role === "outline").map(({ path }) => {
  const b = boundsOf([path]);
  return `${Number((b.maxX - b.minX).toFixed(2))} × ${Number((b.maxY - b.minY).toFixed(2))}`;
});

describe.each(cases)("PDF of $name", ({ carton }) => {
  describe.each(SIDES)("seen from the %s side", (side) => {
    let made: Promise<Uint8Array> | null = null;
    const once = async (): Promise<Uint8Array> => (made ??= pdfOf(carton, await options(side)));

    it("is sound, on one page, with trim round the blank and bleed round its bleed", async () => {
      const bytes = await once();
      withPdf(bytes, (file) => {
        expect(file.check()).toContain("No syntax or stream encoding errors found");
        const info = file.info("-box");
        expect(info).toMatch(/Pages:\s+1\n/);
        const media = boxOf(info, "MediaBox");
        const trim = boxOf(info, "TrimBox");
        const bleed = boxOf(info, "BleedBox");
        expect(trim[2] - trim[0]).toBeCloseTo(carton.blank.width, 1);
        expect(trim[3] - trim[1]).toBeCloseTo(carton.blank.height, 1);
        const around = boundsOf(carton.layers.bleed.map((p) => p.path));
        const { bounds } = carton.blank;
        expect(bleed[2] - bleed[0]).toBeCloseTo(Math.max(around.maxX, bounds.maxX) - Math.min(around.minX, bounds.minX), 1);
        expect(bleed[3] - bleed[1]).toBeCloseTo(Math.max(around.maxY, bounds.maxY) - Math.min(around.minY, bounds.minY), 1);
        for (const [outer, inner] of [[media, bleed], [bleed, trim]] as const) {
          expect(inner[0]).toBeGreaterThanOrEqual(outer[0] - 0.01);
          expect(inner[3]).toBeLessThanOrEqual(outer[3] + 0.01);
        }
        expect(info).toMatch(/Title:\s+.*revision 7/);
        expect(info).toMatch(/CreationDate:\s+.*Nov 24/);
      });
    });

    it("puts each layer in a group with its processing step, in its own overprinting separation", async () => {
      const bytes = await once();
      withPdf(bytes, (file) => {
        const names = LAYER_ORDER.filter((name) => carton.layers[name].length > 0);
        const steps = groupsIn(file).map((g) => g["/GTS_Metadata"] as Dict);
        const wanted = names.map((n) => ({ "/GTS_ProcStepsGroup": `/${PROCESSING_STEPS[n].group}`, "/GTS_ProcStepsType": `/${PROCESSING_STEPS[n].type}` }));
        expect(steps).toEqual([...wanted, { "/GTS_ProcStepsGroup": "/Dimensions" }, { "/GTS_ProcStepsGroup": "/Legend" }]);
        const separations = Object.values(file.objects()).map((o) => (o as { value?: unknown }).value).filter((v): v is unknown[] => Array.isArray(v) && v[0] === "/Separation");
        expect(separations.map((s) => s[1])).toEqual([...names.map((n) => `/${PROCESSING_STEPS[n].spot}`), "/Dimensions", "/Legend"]);
        expect(separations.every((s) => s[2] === "/DeviceCMYK")).toBe(true);
        for (const reserved of ["/All", "/None", "/Cyan", "/Magenta", "/Yellow", "/Black"]) expect(separations.some((s) => s[1] === reserved)).toBe(false);
        const content = file.unpacked();
        expect(content).toMatch(/\/OP true/);
        expect(content).toMatch(/\/op true/);
        expect(content).toMatch(/\/OPM 1/);
        for (const name of names) {
          const { spot } = PROCESSING_STEPS[name];
          // Each group opens with overprint and its own separation, and paints nothing in another.
          const inside = [...content.matchAll(new RegExp(`/OC /Layer${spot} BDC([\\s\\S]*?)EMC`, "g"))].map((m) => m[1]!);
          expect(inside.length).toBe(1);
          expect(inside[0]).toContain("/Overprint gs");
          expect(new Set([...inside[0]!.matchAll(/\/Spot(\w+) (?:CS|cs)/g)].map((m) => m[1]))).toEqual(new Set([spot]));
          expect(inside[0]).not.toMatch(/\s(?:k|K|rg|RG|g|G)\s/);
          expect((inside[0]!.match(/ S(?:\s|$)/g) ?? []).length).toBeGreaterThanOrEqual(carton.layers[name].length);
        }
      });
    });

    it("strokes each layer at its length and extent, arcs to a hundredth of a millimetre", async () => {
      const bytes = await once();
      withPdf(bytes, (file) => {
        const content = file.unpacked();
        const layers = layersSeen(carton, side);
        for (const name of LAYER_ORDER) {
          if (layers[name].length === 0 || name === "glue") continue;
          const own = strokedIn(new RegExp(`/OC /Layer${PROCESSING_STEPS[name].spot} BDC([\\s\\S]*?)EMC`).exec(content)![1]!);
          expect(own.length).toBe(layers[name].length);
          own.forEach((line, i) => {
            const { path } = layers[name][i]!;
            expect(line.isClosed).toBe(path.closed);
            expect(Math.abs(lengthRead(line) - lengthOf(path))).toBeLessThan(0.02);
            const box = boundsOf([path]);
            const xs = line.points.map((p) => p.x);
            const ys = line.points.map((p) => p.y);
            expect(Math.max(...xs)).toBeCloseTo(box.maxX, 2);
            expect(Math.min(...xs)).toBeCloseTo(box.minX, 2);
            expect(Math.max(...ys)).toBeCloseTo(box.maxY, 2);
            expect(Math.min(...ys)).toBeCloseTo(box.minY, 2);
          });
        }
      });
    });

    it("prints the figures, the sentence of the check bar and the caution as text", async () => {
      const bytes = await once();
      withPdf(bytes, (file) => {
        const text = file.text("-layout").replace(/\s+/g, " ");
        for (const words of [
          "Łemon tea, 20 bags", "Ninefold Tea", "2026-11-24", "O. Brandt", carton.construction.name,
          "If this bar does not measure 100 mm, print again at actual size.", "Calculated: cut and fold a sample before the run.",
          ...sizes(carton),
          `${Number(carton.inside.L.toFixed(2))} × ${Number(carton.inside.W.toFixed(2))} × ${Number(carton.inside.D.toFixed(2))}`,
          side === "inside" ? "inside" : "print side",
        ]) expect(text).toContain(words);
        // Poppler reads Lato's narrow spaces round the colon as none.
        expect(text).toMatch(/1 ?: ?1/);
        for (const d of drawingOf(carton, { side }).dimensions) expect(file.text("-raw"), d.id).toContain(d.text);
        const fonts = file.fonts().split("\n").slice(2).filter((l) => l.trim() !== "");
        expect(fonts.length).toBeGreaterThanOrEqual(3);
        expect(fonts.every((l) => /Lato-/.test(l) && / yes yes yes| yes no {2}yes/.test(l)), fonts.join("\n")).toBe(true);
      });
    });

    it("shows ink where lines and words must be (rendered by poppler)", async () => {
      const bytes = await once();
      withPdf(bytes, (file) => {
        const trim = boxOf(file.info("-box"), "TrimBox");
        const dpi = 100;
        const raster = file.render(dpi);
        const px = (mm: number) => (mm * dpi) / 25.4;
        const layers = layersSeen(carton, side);
        const outline = boundsOf(layers.cut.filter((p) => p.role === "outline").map((p) => p.path));
        const at = (x: number, y: number) => ({ x: px(trim[0] + x - outline.minX), y: raster.height - px(trim[1] + y - outline.minY) });
        let found = 0;
        let looked = 0;
        for (const { path } of layers.cut) {
          path.vertices.forEach((v, i) => {
            const n = path.vertices[i + 1] ?? (path.closed ? path.vertices[0] : undefined);
            if (!n || v.bulge !== 0 || Math.hypot(n.x - v.x, n.y - v.y) < 2) return;
            const p = at((v.x + n.x) / 2, (v.y + n.y) / 2);
            looked++;
            if (raster.dark({ x: p.x - 2, y: p.y - 2, width: 4, height: 4 }, 150) > 0) found++;
          });
        }
        expect(looked).toBeGreaterThan(3);
        expect(found).toBe(looked);
        // Every word: poppler's own boxes must hold dark pixels, else a glyph is there that nobody sees.
        const page = Number(/height="([\d.]+)"/.exec(file.text("-bbox"))![1]);
        const words = [...file.text("-bbox").matchAll(/<word xMin="([\d.]+)" yMin="([\d.]+)" xMax="([\d.]+)" yMax="([\d.]+)">([^<]+)</g)];
        expect(words.length).toBeGreaterThan(40);
        const scale = raster.height / page;
        for (const [, x0, y0, x1, y1, word] of words) {
          const box = { x: Number(x0) * scale, y: Number(y0) * scale, width: Math.max(2, (Number(x1) - Number(x0)) * scale), height: Math.max(2, (Number(y1) - Number(y0)) * scale) };
          expect(raster.dark(box, 200), word).toBeGreaterThan(0.02);
        }
      });
    });

    it("is the same file for the same input", async () => {
      const [a, b] = [await once(), await pdfOf(carton, await options(side))];
      expect(Buffer.compare(Buffer.from(a), Buffer.from(b))).toBe(0);
      const other = await pdfOf(carton, { ...(await options(side)), revision: "8" });
      expect(Buffer.compare(Buffer.from(a), Buffer.from(other))).not.toBe(0);
    });
  });
});

describe("typeface", () => {
  it("says so when a character has no shape, and never draws it unseen", async () => {
    const bytes = await pdfOf(cases[0]!.carton, { ...(await options("inside")), title: "Tea ✓ 茶" });
    withPdf(bytes, (file) => {
      const text = file.text("-layout");
      expect(text).toContain("Tea ? ?");
      expect(text).toContain("U+2713, U+8336");
    });
  });

  it("cuts a name that is too long with an ellipsis instead of running over its cell", async () => {
    const bytes = await pdfOf(cases[0]!.carton, { ...(await options("inside")), title: "A very long name ".repeat(12) });
    withPdf(bytes, (file) => expect(file.text("-layout")).toMatch(/A very long name .*…/));
  });
});
