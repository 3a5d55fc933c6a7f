// What a construction declared, complete and not yet judged: panels, mates, steps and what bounds the inside.
import type { Axis, PanelRole, Size, Term } from "../types";
import type { Feature, Panel } from "./panel";

/** `print` is the outside of the flat blank (z = −t/2), `inside` the other face. */
export type Face = "print" | "inside";

export interface FaceOf {
  readonly panel: string;
  readonly face: Face;
}

/** Two faces that bound the inside along an axis, the first at the low end. */
export interface CavityPair {
  readonly axis: Axis;
  readonly low: FaceOf;
  readonly high: FaceOf;
  /** The distance asked, when it is not the carton's own inside (a lid's, say). */
  readonly own: number | null;
}

/** Open at the top: D runs from a face to the free edges of walls. */
export interface OpenTop {
  readonly base: FaceOf;
  readonly walls: readonly string[];
  readonly own: number | null;
}

export interface Mate {
  readonly kind: "glued" | "slides" | "touches";
  readonly a: FaceOf;
  readonly b: FaceOf;
  /** Asked distance of the two faces, mm. */
  readonly gap: number;
  /** Least overlap, mm². */
  readonly minArea: number;
}

/** A free edge held by another panel that lies over it, like a slit lock's. Points in the edge panel's frame. */
export interface Lock {
  readonly name: string;
  readonly edgeOf: string;
  readonly edge: readonly [{ x: number; y: number }, { x: number; y: number }];
  readonly heldBy: string;
  readonly minimum: number;
}

/** Two panels that are meant to reach into each other (flexing as they do), to `depth` mm. */
export interface Interlock {
  readonly panels: readonly [string, string];
  readonly depth: number;
  readonly because: string;
}

/** A meeting on the way to the closed pose that a person passes by flexing the board. */
export interface Transient {
  readonly panels: readonly [string, string];
  readonly steps: readonly string[];
  readonly because: string;
}

export interface Step {
  readonly id: string;
  readonly label: string;
  readonly words: string;
  readonly panels: readonly string[];
}

export interface Part {
  readonly name: string;
  readonly label: string;
  readonly root: string;
  readonly step: string | null;
  readonly turn: number;
  readonly shift: readonly [number, number, number];
  readonly lift: number;
}

export interface Row {
  readonly id: string;
  readonly name: string;
  readonly value: number;
  readonly terms: readonly Term[];
  readonly reason: string;
  readonly panel: string | null;
  /** Along which of the panel's own axes it is measured: x runs along its crease, y away from it. */
  readonly along: "x" | "y" | null;
}

export interface Blank {
  readonly caliper: number;
  readonly size: Size;
  readonly grain: "x" | "y";
  readonly panels: readonly Panel[];
  readonly byName: ReadonlyMap<string, Panel>;
  readonly parts: readonly Part[];
  readonly steps: readonly Step[];
  readonly cavity: readonly CavityPair[];
  readonly openTop: readonly OpenTop[];
  /** Boards outside the inside, by axis and end, mm. */
  readonly outside: Readonly<Record<Axis, readonly [number, number]>>;
  readonly mates: readonly Mate[];
  readonly locks: readonly Lock[];
  readonly interlocks: readonly Interlock[];
  readonly transients: readonly Transient[];
  readonly rows: readonly Row[];
  /** Tubes: how far the glued seam is out of register between flat and erect, mm. */
  readonly flatResidual: number | null;
  /** The row that decides the inside along an axis, for the tolerance stack. */
  readonly governs: Readonly<Record<Axis, string>>;
  /** Panels and panel axes whose crease-to-crease size is quoted when the carton is ordered crease to crease. */
  readonly creaseSize: Readonly<Record<Axis, string>>;
  readonly up: readonly [number, number, number];
  readonly front: readonly [number, number, number];
}

export type { Feature, Panel, PanelRole };
