// One row a layer: its name in each kind of file, its ISO 19593-1 processing step, its line. Screen colours live in app.css.
import type { LayerName } from "../types";

export interface ProcessingStep {
  /** Words for people. */
  readonly label: string;
  /** ISO 19593-1:2018, tables 2 and 3. */
  readonly group: "Structural" | "Positions";
  readonly type: "Cutting" | "Creasing" | "ReverseCreasing" | "Perforating" | "PartialCutting" | "Bleed" | "ContentArea" | "Gluing";
  readonly dxf: { readonly layer: string; readonly colour: number };
  /** Spot separation: name and the process colours that stand in for it, 0 to 1. */
  readonly spot: string;
  readonly cmyk: readonly [number, number, number, number];
  /** sRGB of the same hue, for SVG. */
  readonly rgb: string;
  /** Stroke width and dashes, mm. */
  readonly width: number;
  readonly dash: readonly number[];
}

/** Drawn in this order: areas first, then lines, the cut last and on top. */
export const LAYER_ORDER: readonly LayerName[] = ["bleed", "safe", "glue", "halfCut", "perforation", "reverseCrease", "crease", "cut"];

// Dashes: the drawing's line code at a quarter of a millimetre a screen pixel, so that 13·5 px reads as 3.25·1.25 mm on paper.
export const PROCESSING_STEPS: { readonly [Name in LayerName]: ProcessingStep } = {
  cut: {
    label: "Cut", group: "Structural", type: "Cutting", dxf: { layer: "CUT", colour: 7 },
    spot: "Cut", cmyk: [0.2, 0.25, 0.3, 0.95], rgb: "#1F1B16", width: 0.4, dash: [],
  },
  crease: {
    label: "Crease", group: "Structural", type: "Creasing", dxf: { layer: "CREASE", colour: 3 },
    spot: "Crease", cmyk: [0.95, 0.05, 0.65, 0.1], rgb: "#009E73", width: 0.32, dash: [3.25, 1.25],
  },
  reverseCrease: {
    label: "Reverse crease", group: "Structural", type: "ReverseCreasing", dxf: { layer: "REVERSE_CREASE", colour: 94 },
    spot: "ReverseCrease", cmyk: [0.9, 0.3, 0.75, 0.4], rgb: "#00614A", width: 0.32, dash: [3.25, 1, 1, 1],
  },
  perforation: {
    label: "Perforation", group: "Structural", type: "Perforating", dxf: { layer: "PERFORATION", colour: 30 },
    spot: "Perforation", cmyk: [0.05, 0.45, 1, 0.1], rgb: "#E69F00", width: 0.4, dash: [1, 0.65],
  },
  halfCut: {
    label: "Half-cut", group: "Structural", type: "PartialCutting", dxf: { layer: "HALF_CUT", colour: 6 },
    spot: "HalfCut", cmyk: [0.2, 0.7, 0.1, 0.1], rgb: "#CC79A7", width: 0.4, dash: [2.5, 0.5, 0.5, 0.5],
  },
  bleed: {
    label: "Bleed", group: "Structural", type: "Bleed", dxf: { layer: "BLEED", colour: 4 },
    spot: "Bleed", cmyk: [0.65, 0.15, 0, 0], rgb: "#56B4E9", width: 0.18, dash: [],
  },
  safe: {
    label: "Safe area", group: "Positions", type: "ContentArea", dxf: { layer: "SAFE", colour: 5 },
    spot: "SafeArea", cmyk: [1, 0.45, 0, 0], rgb: "#0072B2", width: 0.15, dash: [0.8, 0.8],
  },
  glue: {
    label: "Glue", group: "Structural", type: "Gluing", dxf: { layer: "GLUE", colour: 8 },
    spot: "Glue", cmyk: [0, 0, 0, 0.55], rgb: "#6B6256", width: 0.18, dash: [],
  },
};
