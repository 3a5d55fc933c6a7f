// What a construction may be asked, as data: forms, help, limits, the command line and the ledger all read this.
import type { OptionValue, ParameterInfo, ParameterKind } from "../types";

/**
 * One option. `default`, `atLeast` and `atMost` are figures or rules of thumb written as text over what is known
 * before them: L, W, D (inside, mm), t (caliper), a and aLeast (greatest and least crease allowance), micro (1 for flute board), cardSlide and creaseSpacing (from the board), and earlier options.
 */
export interface Ask {
  readonly label: string;
  readonly kind: ParameterKind;
  readonly default: number | string | boolean;
  readonly atLeast?: number | string;
  readonly atMost?: number | string;
  readonly oneOf?: readonly { readonly value: string; readonly label: string }[];
  /** Why this default: shown in the ledger. */
  readonly why: string;
  readonly source: string;
  readonly group?: string;
  /** Words after "because" when a limit is passed. */
  readonly because?: string;
}
export type Asks = Readonly<Record<string, Ask>>;

const DIE = "Die limits: engineering practice for steel rule; route minimum";

/** Options that every construction has. */
export const COMMON: Asks = {
  route: {
    label: "Cut by", kind: "choice", default: "knife", group: "Making",
    oneOf: [{ value: "die", label: "steel-rule die" }, { value: "knife", label: "knife table" }, { value: "laser", label: "laser" }],
    why: "a short run is cut on a table", source: "common practice, no source",
  },
  slide: {
    label: "Sliding clearance", kind: "length", default: "cardSlide", atLeast: 0.1, atMost: 3, group: "Making",
    why: "from the board's allowance card; below this cutting tolerance eats it", source: "common practice, no source",
  },
  minGap: {
    label: "Least gap between cuts", kind: "length", default: "if(route < 1, 2.4, if(route < 2, 1.5, 1))", atLeast: 0, atMost: 10, group: "Making",
    why: "a narrower slot cannot be stripped or cut cleanly", source: `${DIE}; 3/32 in between rules`,
  },
  creaseInset: {
    label: "Crease stops before an outer cut", kind: "length", default: "if(route < 1, if(micro, 1, 0.5), if(route < 2, 0, 0.3))", atLeast: 0, atMost: 3, group: "Making",
    why: "a crease rule must not meet a cutting rule; a wheel runs before the knife", source: "common practice, no source",
  },
  creaseInsetInner: {
    label: "Crease stops before an inner cut", kind: "length", default: "if(route < 1, if(micro, 1, 0.5), if(route < 2, 1, 0.3))", atLeast: 0, atMost: 3, group: "Making",
    why: "keeps a slit from tearing on along the crease", source: "common practice, no source",
  },
  bleed: { label: "Bleed", kind: "length", default: 3, atLeast: 0, atMost: 10, group: "Print", why: "print runs past the cut by this much", source: "3 mm is usual in Europe, 3.18 mm (1/8 in) in the United States" },
  safe: {
    label: "Safe area inside cuts and creases", kind: "length", default: "if(micro, 5, 3)", atLeast: 0, atMost: 30, group: "Print",
    why: "text nearer than this can be lost or fold over", source: "3 to 5 mm; 5 mm from crease and edge on corrugated board",
  },
  glueMargin: {
    label: "Glue keeps off edges and creases", kind: "length", default: 1.5, atLeast: 0, atMost: 6, group: "Print",
    why: "glue pressed to the edge squeezes out", source: "1 to 2 mm, common practice, no source",
  },
  grain: {
    label: "Grain", kind: "choice", default: "usual", group: "Board",
    oneOf: [{ value: "usual", label: "as this construction wants it" }, { value: "turned", label: "turned a quarter" }],
    why: "stiffness across the panels and clean creases", source: "engineering practice by construction",
  },
};

export const infoOf = (name: string, ask: Ask): ParameterInfo => ({
  name, label: ask.label, kind: ask.kind, default: ask.default as OptionValue,
  atLeast: ask.atLeast ?? null, atMost: ask.atMost ?? null, oneOf: ask.oneOf ?? null,
  why: ask.why, source: ask.source, group: ask.group ?? "Shape",
});
