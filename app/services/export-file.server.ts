// From a carton to a file that is sent: bytes, media type, name, validators. Which carton, and who may have it, is the route's business.
import { createHash } from "node:crypto";
import { dxfOf } from "~/cartons/export/dxf";
import { pdfOf } from "~/cartons/export/pdf/document";
import { tiledPdfOf, type Paper } from "~/cartons/export/pdf/tiles";
import type { Side } from "~/cartons/export/sheet-view";
import { svgOf } from "~/cartons/export/svg";
import type { Carton } from "~/cartons/types";
import { latoFonts } from "./fonts.server";

export const exportFormats = ["pdf", "tiled.pdf", "svg", "dxf"] as const;
export const NO_SUCH_FILE = "There is no such kind of file. There are pdf, tiled.pdf, svg and dxf.";
export type ExportFormat = (typeof exportFormats)[number];

const mediaTypes: Record<ExportFormat, string> = {
  pdf: "application/pdf",
  "tiled.pdf": "application/pdf",
  svg: "image/svg+xml; charset=utf-8",
  dxf: "image/vnd.dxf",
};

export interface ExportRequest extends View {
  readonly title: string;
  readonly client: string;
  readonly revision: string;
  /** Day, e.g. "2026-11-24". */
  readonly date: string;
  readonly drawnBy: string;
}

export interface ExportFile {
  readonly bytes: Uint8Array;
  readonly mediaType: string;
  readonly name: string;
}

export interface View {
  readonly format: ExportFormat;
  readonly side: Side;
  readonly paper: Paper;
}

/**
 * Kind of file, side and paper of an address. Null when there is no such kind. `tiles` makes of a PDF its sheets of that
 * paper; anything else than the known words is the usual one: seen from the inside, on A4.
 */
export function readView(format: string | undefined, search: URLSearchParams): View | null {
  const known = exportFormats.find((f) => f === format);
  if (!known) return null;
  const tiles = search.get("tiles");
  return {
    format: known === "pdf" && tiles !== null ? "tiled.pdf" : known,
    side: search.get("side") === "print" ? "print" : "inside",
    paper: (tiles ?? search.get("paper"))?.toLowerCase() === "letter" ? "Letter" : "A4",
  };
}

export async function exportFile(carton: Carton, asked: ExportRequest): Promise<ExportFile> {
  const { format, side, title, revision } = asked;
  const written = { svg: () => Promise.resolve(svgOf(carton, { side, revision, title })), dxf: () => Promise.resolve(dxfOf(carton, { side, revision, title })) };
  const bytes = format === "svg" || format === "dxf"
    ? new TextEncoder().encode(await written[format]())
    : await (async () => {
      const options = { title, client: asked.client, revision, date: asked.date, side, drawnBy: asked.drawnBy, fonts: await latoFonts() };
      return format === "pdf" ? pdfOf(carton, options) : tiledPdfOf(carton, { ...options, paper: asked.paper });
    })();
  return { bytes, mediaType: mediaTypes[format], name: fileName(asked) };
}

/** "Lemon tea, revision 3, print side.pdf", without what file systems refuse. */
export function fileName({ title, revision, side, format, paper }: Pick<ExportRequest, "title" | "revision" | "side" | "format" | "paper">): string {
  const extension = format === "tiled.pdf" ? "pdf" : format;
  const parts = [title, `revision ${revision}`, side === "inside" ? "inside" : "print side", ...(format === "tiled.pdf" ? [`tiled ${paper}`] : [])];
  return `${parts.map(safeName).filter((part) => part !== "").join(", ")}.${extension}`;
}

const safeName = (text: string): string =>
  [...text.normalize("NFC").replace(/[\u0000-\u001f\u007f<>:"/\\|?*]+/g, " ").replace(/\s+/g, " ")].slice(0, 80).join("").replace(/^[. ]+|[. ]+$/g, "");

/** RFC 6266 with the extended form of RFC 5987 for what is not plain ASCII. */
export function contentDisposition(name: string): string {
  const plain = name.normalize("NFKD").replace(/[\u0300-\u036f]/g, "").replace(/[^\x20-\x7e]/g, "_").replace(/["\\]/g, "_");
  const extended = encodeURIComponent(name).replace(/['()*!]/g, (c) => `%${c.charCodeAt(0).toString(16).toUpperCase()}`);
  return `attachment; filename="${plain}"; filename*=UTF-8''${extended}`;
}

/** The file as an answer; 304 when the browser has these very bytes, and without a body to HEAD. */
export function fileResponse(request: Request, file: ExportFile): Response {
  const etag = `"${createHash("sha256").update(file.bytes).digest("hex").slice(0, 32)}"`;
  const headers = new Headers({
    "Content-Type": file.mediaType,
    "Content-Disposition": contentDisposition(file.name),
    "Content-Length": String(file.bytes.byteLength),
    ETag: etag,
    "Cache-Control": "private, no-cache",
    "X-Content-Type-Options": "nosniff",
  });
  const known = (request.headers.get("If-None-Match") ?? "").split(",").map((t) => t.trim().replace(/^W\//, ""));
  if (known.includes(etag) || known.includes("*")) {
    headers.delete("Content-Length");
    headers.delete("Content-Type");
    return new Response(null, { status: 304, headers });
  }
  return new Response(request.method === "HEAD" ? null : (file.bytes as Uint8Array<ArrayBuffer>), { headers });
}

/** A sentence instead of a file. */
export const refusedFile = (status: number, sentences: readonly string[]): Response =>
  new Response(`${sentences.join("\n")}\n`, { status, headers: { "Content-Type": "text/plain; charset=utf-8", "Cache-Control": "no-store", "X-Content-Type-Options": "nosniff" } });
