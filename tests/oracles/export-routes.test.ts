// Answers that carry files: headers by RFC 9110 (validators, HEAD), RFC 6266 and RFC 5987 (names of files).
import { describe, expect, it } from "vitest";
import { listConstructions } from "~/cartons/constructions/registry";
import { loader } from "~/routes/try-export";
import { contentDisposition, fileName } from "~/services/export-file.server";

const info = listConstructions()[0]!;
const brief = { construction: info.id, size: info.sample.size, basis: "inside", room: 0, board: info.sample.board, options: {}, typed: {} };

function ask(format: string, search: Record<string, string>, init: RequestInit = {}): Promise<Response> {
  const url = new URL(`http://localhost/try/export/${format}?${new URLSearchParams(search)}`);
  const request = new Request(url, init);
  return loader({ request, params: { format }, url, pattern: "/try/export/:format", context: {} } as unknown as Parameters<typeof loader>[0]);
}

describe("/try/export/:format", () => {
  it.each([
    ["pdf", {}, "application/pdf", "%PDF-1.7"],
    ["tiled.pdf", { paper: "Letter" }, "application/pdf", "%PDF-1.7"],
    ["pdf", { tiles: "a4" }, "application/pdf", "%PDF-1.7"],
    ["svg", { side: "print" }, "image/svg+xml; charset=utf-8", "<?xml"],
    ["dxf", { side: "print" }, "image/vnd.dxf", "999\n"],
  ])("%s %j comes with type, length, name and validator", async (format, search, type, start) => {
    const response = await ask(format, { ...(search as Record<string, string>), brief: JSON.stringify(brief) });
    expect(response.status).toBe(200);
    expect(response.headers.get("Content-Type")).toBe(type);
    const bytes = new Uint8Array(await response.arrayBuffer());
    expect(Number(response.headers.get("Content-Length"))).toBe(bytes.length);
    expect(new TextDecoder("latin1").decode(bytes.subarray(0, start.length))).toBe(start);
    expect(response.headers.get("Content-Disposition")).toMatch(/^attachment; filename="[^"]+, revision draft, (inside|print side)(, tiled (A4|Letter))?\.(pdf|svg|dxf)"; filename\*=UTF-8''/);
    const etag = response.headers.get("ETag")!;
    const again = await ask(format, { ...(search as Record<string, string>), brief: JSON.stringify(brief) }, { headers: { "If-None-Match": `W/${etag}, "other"` } });
    expect(again.status).toBe(304);
    expect(await again.text()).toBe("");
    const head = await ask(format, { ...(search as Record<string, string>), brief: JSON.stringify(brief) }, { method: "HEAD" });
    expect(head.headers.get("ETag")).toBe(etag);
    expect(head.headers.get("Content-Length")).toBe(String(bytes.length));
    expect(await head.text()).toBe("");
  });

  it.each([
    ["exe", JSON.stringify(brief), 404, "pdf, tiled.pdf, svg and dxf"],
    ["pdf", "", 400, "cannot be read"],
    ["pdf", "{", 400, "cannot be read"],
    ["pdf", JSON.stringify({ ...brief, size: { L: "wide", W: 1, D: 1 } }), 400, "size.L"],
    ["pdf", JSON.stringify({ ...brief, options: { glue: null } }), 400, "options"],
    ["svg", JSON.stringify({ ...brief, board: "gold" }), 422, "There is no board “gold”"],
    ["svg", JSON.stringify({ ...brief, construction: "../x" }), 422, "There is no construction"],
    ["svg", JSON.stringify({ ...brief, size: { L: 1e9, W: 25, D: 90 } }), 422, "the most is"],
    ["dxf", JSON.stringify({ ...brief, typed: { L: "9".repeat(9000) } }), 413, "too long"],
  ])("%s refuses %s", async (format, text, status, words) => {
    const response = await ask(format, { brief: text });
    expect(response.status).toBe(status);
    expect(response.headers.get("Content-Type")).toBe("text/plain; charset=utf-8");
    expect(await response.text()).toContain(words);
  });
});

describe("names of files", () => {
  const about = { revision: "3", side: "print", format: "pdf", paper: "A4" } as const;
  it("say carton, revision and side, without what file systems refuse", () => {
    expect(fileName({ ...about, title: 'Tea: "20 bags"/60 g\n' })).toBe("Tea 20 bags 60 g, revision 3, print side.pdf");
    expect(fileName({ ...about, title: "..", format: "tiled.pdf", side: "inside" })).toBe("revision 3, inside, tiled A4.pdf");
    expect(fileName({ ...about, title: "x".repeat(500) })).toBe(`${"x".repeat(80)}, revision 3, print side.pdf`);
  });
  it("survive any letters", () => {
    const header = contentDisposition("Größe „Ł” 茶.pdf");
    expect(header).toMatch(/^attachment; filename="[\x20-\x7e]+"; filename\*=UTF-8''[A-Za-z0-9%.~_-]+$/);
    expect(decodeURIComponent(/UTF-8''(.+)$/.exec(header)![1]!)).toBe("Größe „Ł” 茶.pdf");
    expect(() => new Headers({ "Content-Disposition": header })).not.toThrow();
  });
});
