// The record of what goes to printer and cutter, made from the walk and the panels' own features.
import { applyToPath } from "../geometry/isometry";
import type { Path } from "../geometry/outline";
import { lengthOf } from "../geometry/path";
import type { Blank } from "../blank/blank";
import type { LayerName, LayerPath, Layers } from "../types";
import { bleedAreas } from "./bleed";
import { glueAreas } from "./glue-areas";
import { safeAreas } from "./safe-area";
import { tidied, walkBoundary, type SharedLine } from "./walk";

export interface AreaSizes {
  readonly bleed: number;
  readonly safe: number;
  readonly glueMargin: number;
}

const line = (l: SharedLine): Path => ({ closed: false, vertices: [{ ...l.from, bulge: 0 }, { ...l.to, bulge: 0 }] });

/** Areas come from clipping, which may leave points in the middle of a straight run: a cutter's file has none. */
const tidy = (area: LayerPath): LayerPath => ({ ...area, path: { closed: true, vertices: tidied(area.path.vertices) } });

export function layersOf(blank: Blank, sizes: AreaSizes): Layers {
  const walked = walkBoundary(blank);
  const layers: Record<LayerName, LayerPath[]> = { cut: [], crease: [], reverseCrease: [], perforation: [], halfCut: [], bleed: [], safe: [], glue: [] };
  walked.outlines.forEach((path, i) => layers.cut.push({ id: `outline:${i + 1}`, role: "outline", path, panels: [] }));
  walked.holes.forEach((path, i) => layers.cut.push({ id: `hole:${i + 1}`, role: "hole", path, panels: [] }));
  const count = new Map<string, number>();
  for (const l of walked.lines) {
    const base = `${l.kind === "slit" ? "slit" : "crease"}:${l.panels[0]}/${l.panels[1]}`;
    const nth = (count.get(base) ?? 0) + 1;
    count.set(base, nth);
    const id = nth === 1 ? base : `${base}:${nth}`;
    if (l.kind === "slit") layers.cut.push({ id, role: "slit", path: line(l), panels: l.panels });
    else layers[l.kind].push({ id, role: "crease", path: line(l), panels: l.panels });
  }
  for (const panel of blank.panels) {
    panel.features.forEach((f, i) => {
      layers[f.kind].push({ id: `feature:${panel.name}:${i + 1}`, role: "feature", path: applyToPath(panel.flat, f.path), panels: [panel.name] });
    });
  }
  layers.glue = glueAreas(blank, sizes.glueMargin).map(tidy);
  layers.bleed = bleedAreas(blank, walked, layers.glue, sizes.bleed).map(tidy);
  layers.safe = safeAreas(blank, sizes.safe).map(tidy);
  return layers;
}

export function lengthsOf(layers: Layers): Record<LayerName, number> {
  const sum = (paths: readonly LayerPath[]) => paths.reduce((total, p) => total + lengthOf(p.path), 0);
  return {
    cut: sum(layers.cut), crease: sum(layers.crease), reverseCrease: sum(layers.reverseCrease), perforation: sum(layers.perforation),
    halfCut: sum(layers.halfCut), bleed: sum(layers.bleed), safe: sum(layers.safe), glue: sum(layers.glue),
  };
}
