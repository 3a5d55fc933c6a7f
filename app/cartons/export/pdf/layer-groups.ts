// Optional-content groups with their ISO 19593-1 processing steps, each with its own spot separation, set to overprint.
import { PDFHexString, PDFName, type PDFDocument, type PDFPage, type PDFRef } from "pdf-lib";
import type { LayerName } from "../../types";
import { LAYER_ORDER, PROCESSING_STEPS } from "../processing-steps";

export interface GroupSpec {
  readonly key: string;
  readonly label: string;
  /** ISO 19593-1, table 2. */
  readonly group: "Structural" | "Positions" | "Dimensions" | "Legend";
  /** ISO 19593-1, table 3: only Structural and Positions have a type. */
  readonly type: string | null;
  /** Never All, None or a process colour. */
  readonly spot: string;
  readonly cmyk: readonly [number, number, number, number];
}

export const DIMENSIONS: GroupSpec = { key: "Dimensions", label: "Dimensions", group: "Dimensions", type: null, spot: "Dimensions", cmyk: [0.3, 0.35, 0.45, 0.6] };
export const LEGEND: GroupSpec = { key: "Legend", label: "Legend and title block", group: "Legend", type: null, spot: "Legend", cmyk: [0.2, 0.25, 0.3, 0.95] };

export const groupOf = (name: LayerName): GroupSpec => {
  const step = PROCESSING_STEPS[name];
  return { key: step.spot, label: step.label, group: step.group, type: step.type, spot: step.spot, cmyk: step.cmyk };
};

/** Groups of the layers that hold something, in drawing order, then dimensions and legend. */
export const groupsFor = (hasLayer: (name: LayerName) => boolean): GroupSpec[] => [...LAYER_ORDER.filter(hasLayer).map(groupOf), DIMENSIONS, LEGEND];

export interface Groups {
  attach(page: PDFPage): void;
}

export function registerGroups(document: PDFDocument, specs: readonly GroupSpec[]): Groups {
  const { context } = document;
  const refs = new Map<string, { group: PDFRef; space: PDFRef }>();
  for (const spec of specs) {
    const group = context.register(context.obj({
      Type: "OCG",
      Name: PDFHexString.fromText(spec.label),
      GTS_Metadata: { GTS_ProcStepsGroup: spec.group, ...(spec.type === null ? {} : { GTS_ProcStepsType: spec.type }) },
    }));
    const tint = { FunctionType: 2, Domain: [0, 1], C0: [0, 0, 0, 0], C1: [...spec.cmyk], N: 1 };
    const space = context.register(context.obj(["Separation", spec.spot, "DeviceCMYK", tint]));
    refs.set(spec.key, { group, space });
  }
  const all = [...refs.values()].map((r) => r.group);
  document.catalog.set(PDFName.of("OCProperties"), context.obj({
    OCGs: all,
    D: { Name: PDFHexString.fromText("Layers"), Order: [...all].reverse(), ON: all, OFF: [], RBGroups: [], Locked: [] },
  }));
  const overprint = context.register(context.obj({ Type: "ExtGState", OP: true, op: true, OPM: 1 }));
  return {
    attach(page) {
      const resources = page.node.Resources() ?? context.obj({});
      const properties: Record<string, PDFRef> = {};
      const spaces: Record<string, PDFRef> = {};
      for (const [key, { group, space }] of refs) {
        properties[`Layer${key}`] = group;
        spaces[`Spot${key}`] = space;
      }
      resources.set(PDFName.of("Properties"), context.obj(properties));
      resources.set(PDFName.of("ColorSpace"), context.obj(spaces));
      resources.set(PDFName.of("ExtGState"), context.obj({ Overprint: overprint }));
      page.node.set(PDFName.of("Resources"), resources);
    },
  };
}


