// What a list reads from its address: words, page, order. Everything else of a list's state is there too.

export interface ListAddress {
  readonly q: string | undefined;
  readonly page: number;
  readonly sort: string | undefined;
  readonly direction: "up" | "down" | undefined;
}

export function readListAddress(search: URLSearchParams): ListAddress {
  const direction = search.get("direction");
  return {
    q: search.get("q")?.trim().slice(0, 120) || undefined,
    page: Math.max(1, Math.trunc(Number(search.get("page"))) || 1),
    sort: search.get("sort") ?? undefined,
    direction: direction === "up" || direction === "down" ? direction : undefined,
  };
}

/** A cell of a table for other programs, RFC 4180; a sheet must not take a text for a formula. */
export function csvCell(value: string | number): string {
  const text = String(value);
  const safe = typeof value === "string" && /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\n\r]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

export const csvText = (rows: readonly (readonly (string | number)[])[]): string => rows.map((row) => row.map(csvCell).join(",")).join("\r\n") + "\r\n";

export function csvResponse(name: string, rows: readonly (readonly (string | number)[])[]): Response {
  // The mark at the start tells sheet programs that the letters are UTF-8.
  return new Response(`\uFEFF${csvText(rows)}`, { headers: { "Content-Type": "text/csv; charset=utf-8", "Content-Disposition": `attachment; filename="${name}"`, "Cache-Control": "private, no-store" } });
}
