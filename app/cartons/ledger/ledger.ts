// The ledger: every figure with its value, its arithmetic and where each term came from.
import type { Board } from "../boards/board";
import type { Blank, Row } from "../blank/blank";
import { apply } from "../geometry/isometry";
import type { Ask } from "../parameters/parameter";
import type { Resolved } from "../parameters/resolve";
import type { LedgerRow, Size, Source, Term } from "../types";

export interface LedgerInput {
  readonly blank: Blank;
  readonly board: Board;
  readonly size: Size;
  readonly asks: Readonly<Record<string, Ask>>;
  readonly resolved: Resolved;
}

const AXIS_NAMES = { L: "Length", W: "Width", D: "Depth" } as const;

/** Full precision, so that the printed arithmetic can be worked out again. */
const plain = (value: number): string => String(Number(value.toPrecision(12)));

export function ledgerOf({ blank, board, size, asks, resolved }: LedgerInput): LedgerRow[] {
  const rows: LedgerRow[] = [];
  const entry = (row: Partial<LedgerRow> & Pick<LedgerRow, "id" | "name" | "group" | "value" | "source">): LedgerRow =>
    ({ unit: "mm", terms: [], rule: null, reason: "", parameter: null, isSet: false, mark: null, ...row });

  for (const axis of ["L", "W", "D"] as const) {
    rows.push(entry({
      id: `asked:${axis}`, name: AXIS_NAMES[axis], group: "asked", value: size[axis], source: "asked", parameter: axis, isSet: true,
      terms: [{ name: axis, value: size[axis], times: 1, source: "asked" }],
      mark: markOf(blank, blank.rows.find((r) => r.id === blank.governs[axis]) ?? null),
    }));
  }

  const { card } = board;
  const handbook = card.origin === "handbook" ? "handbook, until it is measured" : card.note;
  rows.push(entry({ id: "board:caliper", name: "Caliper", group: "board", value: board.caliper, source: "board", parameter: "caliper", reason: `${board.name}, ± ${board.caliperTolerance} by ${board.caliperMethod}` }));
  rows.push(entry({ id: "board:a90-across", name: "Crease allowance, across the grain", group: "board", value: card.a90.acrossGrain, source: "allowance", reason: handbook }));
  if (card.a90.alongGrain !== card.a90.acrossGrain) {
    rows.push(entry({ id: "board:a90-along", name: "Crease allowance, along the grain", group: "board", value: card.a90.alongGrain, source: "allowance", reason: handbook }));
  }

  for (const row of blank.rows) rows.push(entry({ id: row.id, name: row.name, group: "worked-out", value: row.value, source: loudest(row.terms), terms: row.terms, reason: row.reason, mark: markOf(blank, row) }));

  for (const [name, ask] of Object.entries(asks)) {
    const value = resolved.values[name];
    if (typeof value !== "number") continue;
    const isSet = resolved.isSet.has(name);
    const written = entry({
      id: `option:${name}`, name: ask.label, group: "option", value, unit: ask.kind === "angle" ? "deg" : ask.kind === "count" ? "count" : "mm",
      source: isSet ? "asked" : "rule", reason: ask.why, parameter: name, isSet,
      terms: [{ name: ask.label, value, times: 1, source: isSet ? "asked" : "rule" }],
    });
    // Written out only when it is read: forty sums a carton are not read while a figure is dragged.
    if (!isSet) Object.defineProperty(written, "rule", { enumerable: true, get: () => resolved.showRule(name, plain) });
    rows.push(written);
  }
  return rows;
}

const LOUDNESS: Record<Source, number> = { allowance: 3, board: 2, rule: 1, asked: 0 };

/** Which source says most about a worked-out figure: what it adds to what was asked. */
const loudest = (terms: readonly Term[]): Source => terms.reduce<Source>((best, t) => (LOUDNESS[t.source] > LOUDNESS[best] ? t.source : best), "asked");

/** Where a row's figure stands on the flat drawing: across or along its panel, through the middle. */
function markOf(blank: Blank, row: Row | null): LedgerRow["mark"] {
  const panel = row?.panel ? blank.byName.get(row.panel) : undefined;
  if (!row || !panel || !row.along) return null;
  const xs = panel.outline.map((v) => v.x);
  const ys = panel.outline.map((v) => v.y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const [from, to] = row.along === "x"
    ? [{ x: x0, y: (y0 + y1) / 2 }, { x: x1, y: (y0 + y1) / 2 }]
    : [{ x: (x0 + x1) / 2, y: y0 }, { x: (x0 + x1) / 2, y: y1 }];
  return { panel: panel.name, from: apply(panel.flat, from), to: apply(panel.flat, to) };
}
