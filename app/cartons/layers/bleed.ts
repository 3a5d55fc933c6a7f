// Bleed: print runs on past the cut, but not onto what is glued.
import type { Path } from "../geometry/outline";
import { offsetAreas, subtractAreas } from "../geometry/offset";
import { grownRing, ringLess } from "../geometry/outward";
import { boundsOf, flatten } from "../geometry/path";
import { withoutRepeats } from "../geometry/polygon";
import { CHORD_FOR_AREAS } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import type { LayerPath } from "../types";
import { walkBoundary, type Walked } from "./walk";

/** The edge of the bleed `by` mm outside what is printed. On a flap glued by its print face it goes no further than the glue. */
export function bleedAreas(blank: Blank, walked: Walked, glue: readonly LayerPath[], by: number): LayerPath[] {
  if (by <= 0) return [];
  const gluedByPrint = new Set(blank.mates.filter((m) => m.kind === "glued" && m.a.face === "print").map((m) => m.a.panel));
  const printed = gluedByPrint.size === 0 ? walked : walkBoundary(blank, (p) => !gluedByPrint.has(p.name));
  const glued = glue.filter((g) => gluedByPrint.has(g.panels[0]!)).map((g) => g.path);
  return (quickly(printed.outlines, glued, by) ?? thoroughly(printed.outlines, glued, by)).map((path, i) => ({ id: `bleed:${i + 1}`, role: "bleed", path, panels: [] }));
}

/** By walking the outermost line of each outline; null when a walk fails or two outlines' bleeds could meet. */
function quickly(outlines: readonly Path[], glued: readonly Path[], by: number): Path[] | null {
  const areas = glued.map((g) => flatten(g, CHORD_FOR_AREAS));
  const paths: Path[] = [];
  for (const outline of outlines) {
    const grown = grownRing(withoutRepeats(flatten(outline, CHORD_FOR_AREAS)), by);
    if (!grown) return null;
    const box = boundsOf([outline]);
    const near = areas.filter((a) => a.some((p) => p.x > box.minX - by && p.x < box.maxX + by && p.y > box.minY - by && p.y < box.maxY + by));
    const kept = near.length > 0 ? ringLess(grown, near) : grown;
    if (!kept) return null;
    paths.push({ closed: true, vertices: withoutRepeats(kept).map(({ x, y }) => ({ x, y, bulge: 0 })) });
  }
  const boxes = paths.map((p) => boundsOf([p]));
  const meet = boxes.some((a, i) => boxes.some((b, j) => j > i && a.minX < b.maxX && b.minX < a.maxX && a.minY < b.maxY && b.minY < a.maxY));
  return meet ? null : paths;
}

function thoroughly(outlines: readonly Path[], glued: readonly Path[], by: number): Path[] {
  const grown = offsetAreas(outlines, by);
  return glued.length > 0 ? subtractAreas(grown, glued) : grown;
}
