// Lato as the packages ship it (WOFF 1, zlib inside), unpacked to TrueType in memory. Nothing is written: the unpacked file is never given away under its name.
import { readFile } from "node:fs/promises";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { inflateSync } from "node:zlib";
import type { FontBytes } from "../cartons/export/pdf/fonts";

const SUBSETS = ["latin", "latin-ext"] as const;

/** WOFF 1 to TrueType. Throws when the bytes are no WOFF 1 file. Source: W3C WOFF File Format 1.0, sections 3 to 5. */
export function unpackWoff(woff: Uint8Array): Uint8Array {
  const source = new DataView(woff.buffer, woff.byteOffset, woff.byteLength);
  if (source.getUint32(0) !== 0x774f4646) throw new Error("not a WOFF 1 file");
  const flavour = source.getUint32(4);
  const count = source.getUint16(12);
  const tables = Array.from({ length: count }, (_, i) => {
    const at = 44 + 20 * i;
    const [tag, offset, packed, length, sum] = [0, 4, 8, 12, 16].map((k) => source.getUint32(at + k)) as [number, number, number, number, number];
    const bytes = woff.subarray(offset, offset + packed);
    const data = packed < length ? new Uint8Array(inflateSync(bytes)) : bytes;
    if (data.length !== length) throw new Error("a WOFF table has not its stated length");
    return { tag, sum, data };
  });
  const padded = (n: number) => (n + 3) & ~3;
  const out = new Uint8Array(12 + 16 * count + tables.reduce((total, t) => total + padded(t.data.length), 0));
  const target = new DataView(out.buffer);
  const power = Math.floor(Math.log2(count));
  target.setUint32(0, flavour);
  target.setUint16(4, count);
  target.setUint16(6, 16 * 2 ** power);
  target.setUint16(8, power);
  target.setUint16(10, 16 * count - 16 * 2 ** power);
  let at = 12 + 16 * count;
  tables.forEach(({ tag, sum, data }, i) => {
    const entry = 12 + 16 * i;
    [tag, sum, at, data.length].forEach((value, k) => target.setUint32(entry + 4 * k, value));
    out.set(data, at);
    at += padded(data.length);
  });
  return out;
}

const weights = { regular: 400, bold: 700, black: 900 } as const;
let pending: Promise<Required<FontBytes>> | null = null;

async function read(): Promise<Required<FontBytes>> {
  const folder = join(dirname(createRequire(import.meta.url).resolve("@fontsource/lato/package.json")), "files");
  const files = (weight: number) => Promise.all(SUBSETS.map(async (subset) => unpackWoff(await readFile(join(folder, `lato-${subset}-${weight}-normal.woff`)))));
  const [regular, bold, black] = await Promise.all([files(weights.regular), files(weights.bold), files(weights.black)]);
  return { regular, bold, black };
}

/** Lato regular, bold and black, latin first and then latin-ext; read once. Rejects when the package is not installed. */
export function latoFonts(): Promise<Required<FontBytes>> {
  pending ??= read().catch((error: unknown) => {
    pending = null;
    throw error;
  });
  return pending;
}
