// Poppler and qpdf, run on a file: readers of PDF that are independent of the writer. Both come from Debian.
import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

export interface Raster {
  readonly width: number;
  readonly height: number;
  /** Grey value 0 (ink) to 255 (paper) at a pixel. */
  grey(x: number, y: number): number;
  /** Share of pixels darker than `below` in a box of pixels. */
  dark(box: { x: number; y: number; width: number; height: number }, below?: number): number;
}

export interface PdfFile {
  info(...options: string[]): string;
  text(...options: string[]): string;
  render(dpi: number, page?: number): Raster;
  /** Objects by qpdf's JSON, version 2: "obj:4 0 R" → value. */
  objects(): Record<string, unknown>;
  /** The page's content with streams unpacked. */
  unpacked(): string;
  /** What qpdf --check says; throws when it finds an error. */
  check(): string;
  fonts(): string;
}

/** Hands the bytes to `use` as a file and clears up after it. */
export function withPdf<T>(bytes: Uint8Array, use: (file: PdfFile) => T): T {
  const folder = mkdtempSync(join(tmpdir(), "cartonwright-pdf-"));
  const path = join(folder, "a.pdf");
  writeFileSync(path, bytes);
  const run = (tool: string, args: readonly string[]) => execFileSync(tool, args, { encoding: "latin1", maxBuffer: 1 << 28, stdio: ["ignore", "pipe", "pipe"] });
  try {
    return use({
      info: (...options) => run("pdfinfo", [...options, path]),
      text: (...options) => execFileSync("pdftotext", [...options, path, "-"], { encoding: "utf8", maxBuffer: 1 << 28 }),
      render(dpi, page = 1) {
        run("pdftoppm", ["-gray", "-r", String(dpi), "-f", String(page), "-l", String(page), "-singlefile", path, join(folder, "p")]);
        return readPgm(readFileSync(join(folder, "p.pgm")));
      },
      objects: () => (JSON.parse(run("qpdf", ["--json=2", "--json-key=qpdf", path])) as { qpdf: [unknown, Record<string, unknown>] }).qpdf[1],
      unpacked: () => run("qpdf", ["--qdf", "--object-streams=disable", path, "-"]),
      check: () => run("qpdf", ["--check", path]),
      fonts: () => run("pdffonts", [path]),
    });
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Portable grey map, binary (Netpbm P5). */
function readPgm(bytes: Uint8Array): Raster {
  const head = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(new TextDecoder("latin1").decode(bytes.subarray(0, 40)));
  if (!head) throw new Error("not a P5 grey map");
  const [width, height, start] = [Number(head[1]), Number(head[2]), head[0].length];
  const grey = (x: number, y: number) => bytes[start + y * width + x] ?? 255;
  return {
    width, height, grey,
    dark(box, below = 140) {
      let count = 0;
      const [x0, y0, w, h] = [box.x, box.y, box.width, box.height].map(Math.round) as [number, number, number, number];
      for (let y = y0; y < y0 + h; y++) for (let x = x0; x < x0 + w; x++) if (grey(x, y) < below) count++;
      return count / (w * h);
    },
  };
}
