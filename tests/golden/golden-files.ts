// What a golden case holds: its brief, and the files that the brief gives. Made anew by `npx tsx tests/golden/regenerate.ts`,
// by a person who looked at the difference.
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { findBoard } from "~/cartons/boards/catalogue";
import { parseBrief } from "~/cartons/brief";
import { buildCarton } from "~/cartons/carton";
import { drawingOf } from "~/cartons/export/drawing";
import { dxfOf } from "~/cartons/export/dxf";
import { svgOf } from "~/cartons/export/svg";
import type { Carton } from "~/cartons/types";

const here = dirname(fileURLToPath(import.meta.url));
export const goldenCases = readdirSync(here, { withFileTypes: true }).filter((e) => e.isDirectory()).map((e) => e.name).sort();
export const pathOf = (name: string, file: string): string => join(here, name, file);

const rounded = (_key: string, value: unknown): unknown => (typeof value === "number" ? Math.round(value * 1e6) / 1e6 + 0 : value);
const json = (value: unknown): string => `${JSON.stringify(value, rounded, 1)}\n`;

export function filesOf(name: string): Record<string, string> {
  const brief = parseBrief(JSON.parse(readFileSync(pathOf(name, "brief.json"), "utf8")));
  const board = findBoard(brief.board);
  if (!board) throw new Error(`${name}: no board ${brief.board}`);
  const result = buildCarton(brief, board);
  if (!result.ok) throw new Error(`${name}: ${JSON.stringify(result.refusals)}`);
  const { carton } = result;
  return {
    "blank.svg": svgOf(carton, { side: "inside", revision: "golden" }),
    "blank-print-side.dxf": dxfOf(carton, { side: "print", revision: "golden" }),
    "figures.json": json(figures(carton)),
  };
}

const figures = (carton: Carton): unknown => ({
  inside: carton.inside, clearInside: carton.clearInside, crease: carton.crease, outside: carton.outside,
  blank: { width: carton.blank.width, height: carton.blank.height, area: carton.blank.area },
  lengths: carton.lengths,
  ledger: Object.fromEntries(carton.ledger.map((r) => [r.id, r.value])),
  drawing: drawingOf(carton, { side: "inside" }).dimensions.map((d) => `${d.id} ${d.text}`),
  findings: carton.findings.map((f) => `${f.severity} ${f.code} ${f.panels.join("/")}`),
});
