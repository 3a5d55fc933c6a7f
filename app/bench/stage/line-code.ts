// One line language for stage, legend and pictures: pattern first, colour second. Pixels.
import type { LayerName } from "~/cartons/types";

export interface LineCode {
  readonly colour: string;
  readonly width: number;
  readonly dash: readonly number[];
  /** Drawn over a line of ink, where its colour alone would be too faint on light paper. */
  readonly isCased: boolean;
}

export const lineCode = {
  cut: { colour: "var(--layer-cut)", width: 1.75, dash: [], isCased: false },
  crease: { colour: "var(--layer-crease)", width: 1.4, dash: [13, 5], isCased: false },
  reverseCrease: { colour: "var(--layer-crease)", width: 1.4, dash: [13, 4, 3, 4], isCased: false },
  perforation: { colour: "var(--layer-perforation)", width: 2.1, dash: [4, 2.5], isCased: true },
  halfCut: { colour: "var(--layer-half-cut)", width: 1.75, dash: [10, 2, 2, 2], isCased: true },
} as const satisfies Partial<Record<LayerName, LineCode>>;

export const layerWords: { readonly [Name in LayerName]: string } = {
  cut: "cut",
  crease: "crease",
  reverseCrease: "reverse crease",
  perforation: "perforation",
  halfCut: "half-cut",
  bleed: "bleed",
  glue: "glue",
  safe: "safe area",
};

/** As the legend lists them. */
export const legendOrder: readonly LayerName[] = ["cut", "crease", "reverseCrease", "perforation", "halfCut", "bleed", "glue", "safe"];
