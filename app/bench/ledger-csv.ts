import { csvText } from "~/components/list-address";
import { formulaOf } from "~/cartons/ledger/formula";
import type { LedgerRow } from "~/cartons/types";

/** The Ledger as a table in full precision, RFC 4180. */
export function ledgerCsv(rows: readonly LedgerRow[]): string {
  const head = ["figure", "value", "unit", "source", "arithmetic", "terms", "reason"];
  return csvText([
    head,
    ...rows.map((row) => [
      row.name,
      row.value,
      row.unit === "none" ? "" : row.unit,
      row.source === "rule" ? "rule of thumb" : row.source,
      formulaOf(row, String),
      row.terms.map((term) => `${term.times} × ${term.name} ${term.value} (${term.source})`).join("; "),
      row.reason,
    ]),
  ]);
}
