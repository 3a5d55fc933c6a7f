import { formulaOf } from "~/cartons/ledger/formula";
import type { LedgerRow } from "~/cartons/types";

const cell = (text: string) => {
  // A sheet program must not take a formula in words for one of its own.
  const safe = /^[=+\-@\t\r]/.test(text) && !/^-?\d+(\.\d+)?$/.test(text) ? `'${text}` : text;
  return /[",\n\r]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
};

/** The Ledger as a table in full precision, RFC 4180. */
export function ledgerCsv(rows: readonly LedgerRow[]): string {
  const head = ["figure", "value", "unit", "source", "arithmetic", "terms", "reason"];
  const lines = rows.map((row) => [
    row.name,
    String(row.value),
    row.unit === "none" ? "" : row.unit,
    row.source === "rule" ? "rule of thumb" : row.source,
    formulaOf(row, (mm) => String(mm)),
    row.terms.map((term) => `${term.times} × ${term.name} ${term.value} (${term.source})`).join("; "),
    row.reason,
  ]);
  return [head, ...lines].map((line) => line.map(cell).join(",")).join("\r\n") + "\r\n";
}
