// Where glue goes: free of ink and varnish. Drawn on the flap whose face takes it.
import { applyToPath } from "../geometry/isometry";
import type { Blank } from "../blank/blank";
import type { LayerPath } from "../types";
import { insetOf } from "./inset";

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
