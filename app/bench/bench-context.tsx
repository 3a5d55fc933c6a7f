// What every part of the Bench shares: the sitting, the units, and which figure is lit.
import { createContext, useContext } from "react";
import type { Board } from "~/cartons/boards/board";
import type { UnitName } from "~/components/preferences";
import type { Brief, OptionValue, Refusal, SizeBasis } from "~/cartons/types";
import type { Session } from "./session";

export type Side = "inside" | "print";

/** What points at a row of the Ledger; the leader is drawn from a figure on the stage. */
export interface Lit {
  readonly row: string;
  readonly from: "stage" | "ledger" | "strip";
}

export interface BenchActions {
  /** `gesture` joins the edits of one drag or one press of a key into one step of the history. */
  set(parameter: string, value: OptionValue, typed?: string, gesture?: string): void;
  endGesture(): void;
  /** Whether this value would be refused with all else as it is. */
  wouldRefuse(parameter: string, value: OptionValue): boolean;
  reset(option: string): void;
  setBasis(basis: SizeBasis): void;
  setConstruction(construction: string): void;
  /** Takes another brief whole, in one step of the history. */
  replace(brief: Brief): void;
  undo(): void;
  redo(): void;
  light(lit: Lit | null): void;
  lightPanels(panels: readonly string[]): void;
  /** A figure is being typed: what it comes to so far, or null when the field is closed. */
  typing(words: string | null): void;
}

export interface BenchState extends BenchActions {
  readonly session: Session;
  readonly units: UnitName;
  readonly lit: Lit | null;
  readonly litPanels: readonly string[];
  readonly typed: string | null;
  readonly boards: readonly Board[];
  /** False for those who may only look. */
  readonly canEdit: boolean;
}

const BenchContext = createContext<BenchState | null>(null);
export const BenchProvider = BenchContext.Provider;

export function useBench(): BenchState {
  const bench = useContext(BenchContext);
  if (!bench) throw new Error("useBench is for parts of the Bench");
  return bench;
}

export const refusalOf = (session: Session, parameter: string): Refusal | undefined => session.refusals.find((r) => r.parameter === parameter);
