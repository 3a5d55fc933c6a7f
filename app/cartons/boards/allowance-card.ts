// The handbook's allowances, until a shop has measured its own. Nothing here is a law: each figure says where it is from.
import type { AllowanceCard, Board, BoardFamily } from "./board";

/** Of the caliper. Hinge at mid-caliper gives 0.5; cartonboard reads 0.4 to 0.6, flute board 0.5 to 0.65 (common practice, no source). */
const CREASE_90 = 0.5;
/** Of the caliper: a pressed hem stands off by little and bulges by 0.3 to 0.7 (common practice, no source). */
const HEM_STAND_OFF = 0.1;
const HEM_BULGE = 0.5;

/** Sliding clearance: below it cutting tolerance eats it (common practice, no source). */
const slideOf = (family: BoardFamily, caliper: number, flute: string | undefined): number =>
  family === "carton" ? Math.max(0.3, 0.6 * caliper) : flute === "E" ? 0.5 : 0.4;

/** Crushed flute board is about the sum of its papers: 0.5 to 0.7 mm for F and E (common practice, no source). */
const crushedOf = (family: BoardFamily, caliper: number, flute: string | undefined): number =>
  family === "carton" ? caliper : Math.min(caliper, flute === "E" ? 0.6 : 0.5);

/** ± mm: crease position 0.15 to 0.3, die-cut edge 0.3 on cartonboard and 0.5 on corrugated; caliper 5 % (published figures of printers and die makers). */
const PLACE = { carton: { crease: 0.2, cut: 0.3 }, micro: { crease: 0.3, cut: 0.5 } } as const;
const CALIPER_SHARE = 0.05;

const bothWays = (value: number) => ({ alongGrain: value, acrossGrain: value });

/** The card that stands where nothing was measured; `caliper` in mm. */
export function handbookCard(family: BoardFamily, caliper: number, flute?: string): AllowanceCard {
  return {
    id: "handbook", origin: "handbook", process: "rule-and-matrix",
    a90: bothWays(CREASE_90 * caliper), g180: bothWays(HEM_STAND_OFF * caliper), e180: bothWays(HEM_BULGE * caliper),
    slide: slideOf(family, caliper, flute), crushed: crushedOf(family, caliper, flute),
    tolerance: { ...PLACE[family], caliper: CALIPER_SHARE * caliper },
    note: "Handbook, ± 0.15 of the caliper, until it is measured.",
    source: "hinge at mid-caliper: geometry; clearances and tolerances: common practice, no source",
  };
}

export interface Allowance { readonly a90: number; readonly g180: number; readonly e180: number }

/** For creases along or across the grain, mm. */
export const allowanceFor = (card: AllowanceCard, direction: "alongGrain" | "acrossGrain"): Allowance =>
  ({ a90: card.a90[direction], g180: card.g180[direction], e180: card.e180[direction] });

/** The same kind of board at another thickness, mm, with the handbook's allowances. */
export const withCaliper = (board: Board, caliper: number): Board => ({
  ...board, caliper, caliperTolerance: CALIPER_SHARE * caliper,
  grammage: Math.round((board.grammage * caliper) / board.caliper),
  card: handbookCard(board.family, caliper, board.flute?.letter),
});
