// The tiled PDF: true size on every sheet, neighbours that overlap by 10 mm, nothing missing between them. Read by poppler and qpdf.
import { describe, expect, it } from "vitest";
import { OVERLAP, tiledPdfOf, type Paper } from "~/cartons/export/pdf/tiles";
import { latoFonts } from "~/services/fonts.server";
import { cases } from "./cases";
import { withPdf, type Raster } from "./pdf-tools";

const SHEETS: Record<Paper, [number, number]> = { A4: [210, 297], Letter: [215.9, 279.4] };
const facts = { title: "Box", client: "Pebble & Finch Puzzles", revision: "3", date: "2026-11-24", side: "inside" as const };

/** Length in mm of the longest dark run in the rows round a height measured from the foot of the sheet. */
function longestRun(raster: Raster, fromFoot: number, dpi: number, tolerance: number): number {
  let best = 0;
  for (let dy = -tolerance; dy <= tolerance; dy++) {
    const y = Math.round(raster.height - (fromFoot * dpi) / 25.4) + dy;
    let run = 0;
    for (let x = 0; x < raster.width; x++) {
      run = raster.grey(x, y) < 128 ? run + 1 : 0;
      best = Math.max(best, run);
    }
  }
  return (best * 25.4) / dpi;
}

describe.each(cases)("tiles of $name", ({ carton }) => {
  it.each(["A4", "Letter"] as const)("on %s stand at true size, with a bar of 100 mm on each", async (paper) => {
    const bytes = await tiledPdfOf(carton, { ...facts, paper, fonts: await latoFonts() });
    withPdf(bytes, (file) => {
      expect(file.check()).toContain("No syntax or stream encoding errors found");
      const pages = Number(/Pages:\s+(\d+)/.exec(file.info())![1]);
      const size = /Page size:\s+([\d.]+) x ([\d.]+) pts/.exec(file.info())!.slice(1).map((v) => (Number(v) * 25.4) / 72).sort((a, b) => a - b);
      expect(size[0]).toBeCloseTo(SHEETS[paper][0], 1);
      expect(size[1]).toBeCloseTo(SHEETS[paper][1], 1);
      const text = file.text("-raw").replace(/\s+/g, " ");
      expect(text.match(/If this bar does not measure 100 mm, print again at actual size\./g)!.length).toBe(pages);
      if (pages > 1) expect(new Set(text.match(/Row \d+ of \d+, column \d+ of \d+/g)).size).toBe(pages);
      for (const page of [1, pages]) {
        const raster = file.render(150, page);
        expect(longestRun(raster, 18, 150, 3)).toBeGreaterThan(99.5);
        expect(longestRun(raster, 18, 150, 3)).toBeLessThan(101);
      }
    });
  });
});

describe("neighbouring sheets", () => {
  const largest = cases.reduce((a, b) => (a.carton.blank.area > b.carton.blank.area ? a : b));
  it("show the same strip, pixel for pixel but for the frame and the crosses", async () => {
    const bytes = await tiledPdfOf(largest.carton, { ...facts, paper: "A4", fonts: await latoFonts() });
    withPdf(bytes, (file) => {
      const label = /Row 1 of (\d+), column 1 of (\d+)/.exec(file.text())!;
      expect(Number(label[2])).toBeGreaterThan(1);
      const dpi = 254;
      const px = dpi / 25.4;
      const [left, right] = [file.render(dpi, 1), file.render(dpi, 2)];
      // Window: 8 mm from the edge; its last 10 mm on the left sheet are the first 10 mm of the right one.
      const shift = Math.round(left.width - 8 * px - OVERLAP * px - 8 * px);
      let dark = 0;
      let differing = 0;
      for (let y = Math.round(9 * px); y < left.height - 26 * px; y++) {
        for (let x = Math.round(9 * px); x < 17 * px; x++) {
          const isCross = Math.abs(x - 13 * px) < 4.5 * px && [8 + 5, (8 + left.height / px - 24) / 2, left.height / px - 24 - 5].some((c) => Math.abs(y - c * px) < 6 * px);
          if (isCross) continue;
          const [a, b] = [left.grey(x + shift, y) < 160, right.grey(x, y) < 160];
          if (a || b) dark++;
          // A line may fall on the next pixel: look at the neighbours too.
          const near = (r: Raster, at: number) => [-1, 0, 1].some((d) => [-1, 0, 1].some((e) => r.grey(at + d, y + e) < 160));
          if ((a && !near(right, x)) || (b && !near(left, x + shift))) differing++;
        }
      }
      expect(dark).toBeGreaterThan(50);
      expect(differing / dark).toBeLessThan(0.02);
    });
  });
});
