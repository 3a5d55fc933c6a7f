// The shape of a declaration: who it is, what may be asked, what cannot be, the panels and how they close.
import type { Kit } from "../blank/kit";
import type { Asks } from "../parameters/parameter";
import type { Scope } from "../parameters/resolve";
import type { Axis, ConstructionInfo, Size } from "../types";

export interface Limit {
  readonly parameter: string;
  readonly atLeast?: number;
  readonly atMost?: number;
  readonly because: string;
}

export interface Construction extends Omit<ConstructionInfo, "parameters"> {
  readonly ask: Asks;
  /** Limits that hang on more than one figure; only those that are passed need be returned, all may be. */
  readonly cannot: (scope: Scope) => readonly Limit[];
  /** Grain or flute on the drawing when laid as this construction wants it. */
  readonly grain: { readonly carton: "x" | "y"; readonly micro: "x" | "y" };
  /** True where W may exceed L, as FEFCO allows for some styles. */
  readonly mayBeWiderThanLong?: boolean;
  readonly declare: (k: Kit) => void;
}

export const limit = (parameter: Axis | (string & {}), bound: { atLeast: number } | { atMost: number }, because: string): Limit => ({ parameter, ...bound, because });

export type SizeRange = { readonly [A in keyof Size]: { readonly from: number; readonly to: number } };
