// The safe area of each panel that is looked at: text stays this far from cuts and creases.
import { applyToPath } from "../geometry/isometry";
import type { Blank } from "../blank/blank";
import type { LayerPath } from "../types";
import { insetOf } from "./inset";

export function safeAreas(blank: Blank, by: number): LayerPath[] {
  if (by <= 0) return [];
  return blank.panels
    .filter((panel) => panel.role === "wall")
    .flatMap((panel) => insetOf(panel, by).map((path, i): LayerPath => ({ id: `safe:${panel.name}:${i + 1}`, role: "safe", path: applyToPath(panel.flat, path), panels: [panel.name] })));
}
