// A built carton as one JSON object or as a page of plain text. Figures in JSON are never rounded.
import { closedPose } from "../app/cartons/fold/pose";
import { pathData } from "../app/cartons/geometry/path";
import { normalOf, transform } from "../app/cartons/geometry/space";
import { formulaInWords, formulaOf } from "../app/cartons/ledger/formula";
import type { Board } from "../app/cartons/boards/board";
import type { Carton, ConstructionInfo, Finding, LayerName, ParameterInfo, Size } from "../app/cartons/types";
import { findingSentence } from "../app/copy/findings";

/** All digits of a double, without an exponent: readers of path data are not all of one mind about exponents. */
const full = (value: number): string => {
  const text = String(value + 0);
  return text.includes("e") ? value.toFixed(20).replace(/\.?0+$/, "") || "0" : text;
};
const short = (value: number): string => String(Math.round(value * 100) / 100 + 0);
const sizeText = (s: Size): string => `${short(s.L)} × ${short(s.W)} × ${short(s.D)} mm`;

const findingOut = (finding: Finding) => ({ ...finding, sentence: findingSentence(finding) });

/** Panels with their corners when folded shut: mm, on the board's middle; the inside face lies half a caliper along `normal`. */
function panelsOut(carton: Carton) {
  const pose = closedPose(carton.fold);
  return carton.fold.panels.map((panel, i) => {
    const flat = carton.panels.find((p) => p.name === panel.name);
    const { vertices } = panel.outline;
    const xs = vertices.map((v) => v.x);
    const ys = vertices.map((v) => v.y);
    return {
      name: panel.name, label: panel.label, role: panel.role, part: panel.part,
      size: { width: Math.max(...xs) - Math.min(...xs), height: Math.max(...ys) - Math.min(...ys) },
      thickness: panel.thickness,
      flat: flat?.outline.vertices.map((v) => [v.x, v.y]) ?? [],
      folded: vertices.map((v) => transform(pose[i]!, v.x, v.y, 0)),
      normal: normalOf(pose[i]!),
    };
  });
}

export function jsonOf(carton: Carton): unknown {
  const { blank, foldCheck } = carton;
  return {
    construction: carton.construction.id, name: carton.construction.name, units: "mm",
    basis: carton.brief.basis, asked: carton.brief.size,
    inside: carton.inside, clearInside: carton.clearInside, crease: carton.crease, outside: carton.outside,
    board: { id: carton.board.id, name: carton.board.name, caliper: carton.board.caliper }, grain: carton.grain,
    blank: { width: blank.width, height: blank.height, area: blank.area },
    lengths: carton.lengths,
    // y points up, as on the drawing seen from the inside: a sweep flag of 1 turns from x towards y.
    layers: Object.fromEntries((Object.keys(carton.layers) as LayerName[]).map((name) => [name, carton.layers[name].map((p) => pathData(p.path, full))])),
    panels: panelsOut(carton),
    foldCheck: {
      closes: foldCheck.closes, measuredInside: foldCheck.measuredInside, clearInside: foldCheck.clearInside, outside: foldCheck.outside,
      findings: foldCheck.findings.map(findingOut),
      mates: foldCheck.mates, locks: foldCheck.locks, collisions: foldCheck.collisions, tolerance: foldCheck.tolerance,
    },
    findings: carton.findings.map(findingOut),
    parameters: carton.parameters,
    ledger: carton.ledger.map((row) => ({
      id: row.id, name: row.name, value: row.value, unit: row.unit, formula: formulaOf(row, full), words: formulaInWords(row),
      sources: [...new Set([row.source, ...row.terms.map((t) => t.source)])], terms: row.terms, reason: row.reason, parameter: row.parameter,
    })),
  };
}

export function summaryOf(carton: Carton): string {
  const { blank, foldCheck } = carton;
  const lines = [
    `${carton.construction.name} (${carton.construction.id})`,
    `Board          ${carton.board.name}, ${short(carton.board.caliper)} mm`,
    `Inside         ${sizeText(carton.inside)}`,
    `Clear inside   ${sizeText(carton.clearInside)}`,
    `Outside        ${sizeText(carton.outside)}`,
    `Blank          ${short(blank.width)} × ${short(blank.height)} mm, ${short(blank.area / 100)} cm²`,
    ...(Object.keys(carton.lengths) as LayerName[]).filter((name) => carton.lengths[name] > 0).map((name) => `${name.padEnd(15)}${short(carton.lengths[name])} mm`),
    `Fold check     ${foldCheck.closes ? `folds shut on ${sizeText(foldCheck.measuredInside)} inside` : "does not fold shut"}`,
    ...foldCheck.tolerance.map((t) => `Tolerance ${t.axis}    ± ${short(t.rootSumSquare)} mm (root of squares), ± ${short(t.worstCase)} mm at worst`),
    ...carton.findings.map((f) => `${f.severity.padEnd(15)}${findingSentence(f)}`),
    "Calculated: cut and fold a sample before the run.",
  ];
  return `${lines.join("\n")}\n`;
}

const limit = (p: ParameterInfo): string => {
  if (p.kind === "switch") return "on or off";
  if (p.oneOf) return p.oneOf.map((o) => o.value).join(" | ");
  return [p.atLeast === null ? "" : `at least ${p.atLeast}`, p.atMost === null ? "" : `at most ${p.atMost}`].filter((t) => t !== "").join(", ");
};

export const listText = (all: readonly ConstructionInfo[]): string =>
  all.map((c) => [
    `${c.id}: ${c.name}. ${c.summary}`,
    `  ${c.codes.length > 0 ? c.codes.map((k) => `${k.system} ${k.code}`).join(", ") : "no code"}; ${c.meaning}`,
    ...(["L", "W", "D"] as const).map((axis) => `  --${axis}  ${c.size[axis].from} to ${c.size[axis].to} mm`),
    ...c.parameters.map((p) => `  --set ${p.name}=…  ${p.label}; usually ${String(p.default)}${limit(p) === "" ? "" : `; ${limit(p)}`}`),
  ].join("\n")).join("\n\n") + "\n";

export const boardsText = (all: readonly Board[]): string =>
  all.map((b) => `${b.id.padEnd(18)}${b.name}, ${short(b.caliper)} ± ${b.caliperTolerance.toFixed(3)} mm, ${b.grammage} g/m²${b.flute ? `, ${b.flute.letter} flute` : ""}`).join("\n") + "\n";
