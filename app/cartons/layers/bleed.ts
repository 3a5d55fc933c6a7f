// Bleed: print runs on past the cut, but not onto what is glued.
import type { Path } from "../geometry/outline";
import { offsetAreas, subtractAreas } from "../geometry/offset";
import type { Blank } from "../blank/blank";
import type { LayerPath } from "../types";
import { walkBoundary, type Walked } from "./walk";

/** The edge of the bleed `by` mm outside what is printed. On a flap glued by its print face it goes no further than the glue. */
export function bleedAreas(blank: Blank, walked: Walked, glue: readonly LayerPath[], by: number): LayerPath[] {
  if (by <= 0) return [];
  const gluedByPrint = new Set(blank.mates.filter((m) => m.kind === "glued" && m.a.face === "print").map((m) => m.a.panel));
  const printed = gluedByPrint.size === 0 ? walked : walkBoundary(blank, (p) => !gluedByPrint.has(p.name));
  const grown = offsetAreas(printed.outlines, by);
  const kept: Path[] = gluedByPrint.size === 0 ? grown : subtractAreas(grown, glue.filter((g) => gluedByPrint.has(g.panels[0]!)).map((g) => g.path));
  return kept.map((path, i) => ({ id: `bleed:${i + 1}`, role: "bleed", path, panels: [] }));
}
