// Where glue goes: free of ink and varnish. Drawn on the flap whose face takes it.
import { applyToPath } from "../geometry/isometry";
import type { Path } from "../geometry/outline";
import { flatten } from "../geometry/path";
import { isConvex, intersectConvex, withoutRepeats } from "../geometry/polygon";
import { offsetAreas } from "../geometry/offset";
import { CHORD_FOR_AREAS } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import type { Panel } from "../blank/panel";
import type { LayerPath } from "../types";

/** A panel's own area pulled in from all its edges, in its own frame. Empty when nothing is left. */
export function insetOf(panel: Panel, by: number): Path[] {
  const points = withoutRepeats(flatten({ closed: true, vertices: panel.outline }, CHORD_FOR_AREAS));
  const holes = panel.features.filter((f) => f.kind === "cut" && f.path.closed);
  if (holes.length > 0 || !isConvex(points)) {
    return offsetAreas([{ closed: true, vertices: panel.outline }, ...holes.map((h) => clockwise(h.path))], -by);
  }
  const inner = intersectConvex(points, points, by);
  return inner.length < 3 ? [] : [{ closed: true, vertices: inner.map(({ x, y }) => ({ x, y, bulge: 0 })) }];
}

/** Holes are drawn CCW; taken out of an area they run the other way. */
const clockwise = (path: Path): Path => ({ closed: true, vertices: [...flatten(path, CHORD_FOR_AREAS)].reverse().map(({ x, y }) => ({ x, y, bulge: 0 })) });

export function glueAreas(blank: Blank, margin: number): LayerPath[] {
  const areas: LayerPath[] = [];
  for (const mate of blank.mates) {
    if (mate.kind !== "glued") continue;
    const flap = blank.byName.get(mate.a.panel)!;
    insetOf(flap, margin).forEach((path, i) => {
      areas.push({ id: `glue:${flap.name}:${i + 1}`, role: "glue", path: applyToPath(flap.flat, path), panels: [flap.name, mate.b.panel] });
    });
  }
  return areas;
}
