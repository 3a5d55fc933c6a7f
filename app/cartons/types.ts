// The shared nouns of the core: types only. Conventions (axes, signs, sides, units) are in README.md beside this file.
import type { Board } from "./boards/board";
import type { Box, Path, Point } from "./geometry/outline";
import type { Mat } from "./geometry/space";

/** L × W × D, mm. L and W lie across the opening (tube, box) or the base (tray); D is the third. */
export interface Size {
  readonly L: number;
  readonly W: number;
  readonly D: number;
}
export type Axis = keyof Size;

/** What the asked figures mean. `product` is a rigid block that must go in: sizing is then to the clear inside plus `room`. */
export type SizeBasis = "inside" | "crease" | "outside" | "product";

export type OptionValue = number | string | boolean;

/** What was asked. The only thing that is stored; all else is worked out again. */
export interface Brief {
  readonly construction: string;
  readonly size: Size;
  readonly basis: SizeBasis;
  /** Room a side around the product, mm; read only when basis is `product`. */
  readonly room: number;
  readonly board: string;
  /** Options that the user set; what is absent takes the construction's default. */
  readonly options: Readonly<Record<string, OptionValue>>;
  /** What was typed for a figure when it was more than a number ("80+2*1"); keyed by parameter. Never computed with. */
  readonly typed: Readonly<Record<string, string>>;
}

/** Asked for the impossible. Sentences are made in app/copy/refusals.ts. */
export interface Refusal {
  readonly code: "unknown-construction" | "unknown-option" | "wrong-kind" | "too-small" | "too-large" | "not-offered" | "does-not-fold";
  readonly parameter: string;
  readonly given: OptionValue;
  readonly limit: { readonly atLeast: number } | { readonly atMost: number } | { readonly oneOf: readonly OptionValue[] } | null;
  /** A value of this parameter that is accepted with everything else unchanged; null when there is none. */
  readonly nearest: OptionValue | null;
  /** Plain words after "because", e.g. "the two tongues would meet". */
  readonly because: string;
}

export type Severity = "error" | "warning" | "note";

/** The blank was judged. `facts` holds the figures of its sentence (app/copy/findings.ts). */
export interface Finding {
  readonly code: string;
  readonly severity: Severity;
  readonly panels: readonly string[];
  readonly at: Point | null;
  readonly measured: number | null;
  readonly required: number | null;
  readonly facts: Readonly<Record<string, number | string>>;
  /** A change to the brief that mends it: one click, one undo. */
  readonly mend: { readonly parameter: string; readonly value: OptionValue } | null;
}

export type LayerName = "cut" | "crease" | "reverseCrease" | "perforation" | "halfCut" | "bleed" | "safe" | "glue";

export interface LayerPath {
  /** Stable name, e.g. "crease:back/side 1", "outline:1", "slit:lid/tongue:1". */
  readonly id: string;
  readonly role: "outline" | "hole" | "slit" | "feature" | "crease" | "bleed" | "safe" | "glue";
  readonly path: Path;
  /** Panels it belongs to: both sides of a crease or slit; the panel of a feature; empty for outlines and bleed. */
  readonly panels: readonly string[];
}
/** All geometry that goes to printer and cutter; mm, seen from the inside, y up. */
export type Layers = { readonly [Name in LayerName]: readonly LayerPath[] };

export type PanelRole = "wall" | "flap" | "lining";

/** A panel as it lies on the flat blank. */
export interface FlatPanel {
  readonly name: string;
  /** Trade words for the drawing, e.g. "Dust flap". */
  readonly label: string;
  readonly role: PanelRole;
  readonly part: string;
  readonly outline: Path;
  readonly holes: readonly Path[];
  /** A point well inside, for its name; and the room there: width across x and height along y, mm. */
  readonly labelAt: Point;
  readonly room: { readonly width: number; readonly height: number };
  readonly bounds: Box;
}

export interface FoldPanel {
  readonly name: string;
  readonly label: string;
  readonly role: PanelRole;
  readonly part: string;
  readonly thickness: number;
  /** Outline and holes in the panel's own frame; board occupies z from −t/2 (print face) to +t/2 (inside face). */
  readonly outline: Path;
  readonly holes: readonly Path[];
  /** Convex pieces of the panel (arcs as chords) in its own frame, CCW. */
  readonly pieces: readonly (readonly Point[])[];
}

export interface FoldStep {
  readonly id: string;
  /** Two or three words for the lever's station, e.g. "Lid dust flaps". */
  readonly label: string;
  /** A sentence a packer can follow. */
  readonly words: string;
  readonly panels: readonly string[];
}

/** Everything `poseAt` (fold/pose.ts) needs; panels in tree order, parents first. */
export interface FoldModel {
  readonly panels: readonly FoldPanel[];
  readonly hinges: readonly FoldHinge[];
  readonly parts: readonly FoldPart[];
  readonly steps: readonly FoldStep[];
  /** Unit vectors in the closed pose: which way is up when the pack stands, and towards whom its front looks. */
  readonly up: readonly [number, number, number];
  readonly front: readonly [number, number, number];
}

export interface FoldHinge {
  readonly parent: number;
  readonly child: number;
  /** Child frame → parent frame when flat. */
  readonly flat: { readonly c: number; readonly s: number; readonly x: number; readonly y: number };
  /** Final angle in radians, + folds towards the inside. */
  readonly angle: number;
  /** Height of the fold's axis above the mid-plane, on the inner side of the fold, mm. */
  readonly height: number;
  readonly step: number;
  readonly kind: "crease" | "reverseCrease" | "perforation" | "halfCut";
}

/** A separate piece: where its root lies on the drawing, and how it is brought to its place in the closed pack. */
export interface FoldPart {
  readonly name: string;
  readonly label: string;
  readonly root: number;
  readonly flat: { readonly c: number; readonly s: number; readonly x: number; readonly y: number };
  /** Step at which the piece is moved; −1 = it stays where it is drawn. */
  readonly step: number;
  /** Turn about the x axis through the piece's own root origin, radians, then the shift from its place on the drawing, mm. */
  readonly turn: number;
  readonly shift: readonly [number, number, number];
  readonly lift: number;
}

/** 3 × 4 matrices, panel frame → world, in the order of FoldModel.panels. */
export type Pose = readonly Mat[];

export type Source = "asked" | "board" | "allowance" | "rule";

/** One signed term of a figure: times × value. `name` says what it is ("caliper", "crease allowance", "L"). */
export interface Term {
  readonly name: string;
  readonly value: number;
  readonly times: number;
  readonly source: Source;
}

export interface LedgerRow {
  readonly id: string;
  readonly name: string;
  readonly group: "asked" | "board" | "worked-out" | "option";
  readonly value: number;
  readonly unit: "mm" | "deg" | "count" | "none";
  /** Loudest source: who decided. */
  readonly source: Source;
  readonly terms: readonly Term[];
  /** For a rule of thumb: its text with the values put in; else null (the terms are the arithmetic). */
  readonly rule: string | null;
  readonly reason: string;
  /** Parameter that this row edits when typed over: "L", "W", "D", "caliper" or an option's name; null = worked out. */
  readonly parameter: string | null;
  /** True when the user set it and it differs from the default. */
  readonly isSet: boolean;
  /** Where it stands on the flat drawing. */
  readonly mark: { readonly panel: string; readonly from: Point; readonly to: Point } | null;
}

export interface MateReport {
  readonly kind: "glued" | "slides" | "touches" | "interlock";
  readonly panels: readonly [string, string];
  readonly askedGap: number;
  readonly measuredGap: number;
  /** Overlap of the two faces, mm². */
  readonly area: number;
  readonly minArea: number;
  readonly ok: boolean;
}

export interface LockReport {
  readonly name: string;
  readonly panels: readonly [string, string];
  /** How far the two engage, mm, and the least that holds. */
  readonly engagement: number;
  readonly minimum: number;
  readonly ok: boolean;
}

export interface CollisionReport {
  readonly panels: readonly [string, string];
  readonly depth: number;
  readonly allowed: number;
}

export interface ToleranceStack {
  readonly axis: Axis;
  readonly terms: readonly { readonly name: string; readonly value: number; readonly times: number }[];
  /** ± mm on the inside size. */
  readonly worstCase: number;
  readonly rootSumSquare: number;
}

export interface FoldCheck {
  readonly closes: boolean;
  readonly measuredInside: Size;
  readonly clearInside: Size;
  readonly outside: Size;
  readonly mates: readonly MateReport[];
  readonly locks: readonly LockReport[];
  readonly collisions: readonly CollisionReport[];
  readonly tolerance: readonly ToleranceStack[];
  readonly findings: readonly Finding[];
}

export type ParameterKind = "length" | "angle" | "count" | "choice" | "switch";

/** One thing that may be asked, as forms, help and the command line see it. */
export interface ParameterInfo {
  readonly name: string;
  readonly label: string;
  readonly kind: ParameterKind;
  /** Rules of thumb as text over L, W, D, t, c, a and other options; or a fixed value. */
  readonly default: OptionValue;
  readonly atLeast: number | string | null;
  readonly atMost: number | string | null;
  readonly oneOf: readonly { readonly value: string; readonly label: string }[] | null;
  readonly why: string;
  readonly source: string;
  readonly group: string;
}

export interface ConstructionInfo {
  readonly id: string;
  readonly name: string;
  readonly summary: string;
  readonly codes: readonly { readonly system: "ECMA" | "FEFCO"; readonly code: string; readonly source: string }[];
  readonly families: readonly ("carton" | "micro")[];
  readonly closes: string;
  readonly pieces: number;
  readonly glued: boolean;
  readonly size: { readonly [A in Axis]: { readonly from: number; readonly to: number } };
  /** A sample that is always accepted: for pictures and for a first carton. */
  readonly sample: { readonly size: Size; readonly board: string };
  readonly parameters: readonly ParameterInfo[];
  /** What L, W and D mean here, in words. */
  readonly meaning: string;
}

/** The one document: made by buildCarton, read by everything else, never changed. */
export interface Carton {
  readonly brief: Brief;
  readonly board: Board;
  readonly construction: ConstructionInfo;
  /** Nominal inside (layer 0), as built. */
  readonly inside: Size;
  readonly clearInside: Size;
  readonly crease: Size;
  readonly outside: Size;
  readonly blank: { readonly width: number; readonly height: number; readonly area: number; readonly bounds: Box };
  /** Parameter values in force: asked, or the default. */
  readonly parameters: Readonly<Record<string, OptionValue>>;
  readonly grain: "x" | "y";
  readonly panels: readonly FlatPanel[];
  readonly layers: Layers;
  /** Total length by layer, mm (outline of areas for bleed, safe and glue). */
  readonly lengths: { readonly [Name in LayerName]: number };
  readonly fold: FoldModel;
  readonly ledger: readonly LedgerRow[];
  readonly foldCheck: FoldCheck;
  /** All findings: fold check and making, loudest first. */
  readonly findings: readonly Finding[];
}

export type CartonResult =
  | { readonly ok: true; readonly carton: Carton }
  | { readonly ok: false; readonly refusals: readonly Refusal[] };
