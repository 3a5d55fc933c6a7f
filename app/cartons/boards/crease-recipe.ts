// How a board is creased: rule, channel, and how near two creases may lie. Lengths in mm.
import type { Board } from "./board";

/** Rule thickness by rule point (1/72 in, trade steel): 2 pt 0.71, 3 pt 1.07, 4 pt 1.42 (steel-rule makers' tables). */
export const RULE_THICKNESS = { 2: 0.71, 3: 1.07, 4: 1.42 } as const;
/** Height of cutting rule, 0.937 in (steel-rule and matrix makers, several agree). */
export const CUTTING_HEIGHT = 23.8;
/** Allowed for tape under the rule by one die maker. */
const TAPE = 0.15;
/** Land that must be left between two channels (engineering practice, no published source). */
const BETWEEN_CHANNELS = 0.8;

/** Board of 0.20 to 0.51 mm takes 2 pt rule, thicker 3 pt (matrix maker's table). On fluted board the crushed thickness decides. */
export const ruleThickness = (board: Board): number => (creased(board) <= 0.51 ? RULE_THICKNESS[2] : RULE_THICKNESS[3]);

/** What is under the rule: the board, or the crushed flute. */
const creased = (board: Board): number => (board.family === "carton" ? board.caliper : board.card.crushed);

/** Cartonboard: 1.5 t + d (matrix maker; another gives 1.3 to 1.5 with the grain's direction). */
export const cartonChannelWidth = (caliper: number, rule: number): number => 1.5 * caliper + rule;

/** Corrugated: 1.8 (crease along the flutes) to 2.0 (across) times the crushed thickness, and the rule (matrix maker). */
export const corrugatedChannelWidth = (crushed: number, rule: number, direction: "alongGrain" | "acrossGrain"): number =>
  (direction === "alongGrain" ? 1.8 : 2) * crushed + rule;

/** As deep as what is creased is thick. */
export const channelDepth = creased;

/** Cutting height less the board (matrix maker); with tape under the rule 0.15 less again (a die maker). */
export const creaseRuleHeight = (board: Board, withTape = false): number => CUTTING_HEIGHT - creased(board) - (withTape ? TAPE : 0);

/** Least distance of two parallel creases: one channel and the land between. A 2 pt rule, as nearly all are. */
export function minimumCreaseSpacing(board: Board): number {
  const rule = RULE_THICKNESS[2];
  const channel = board.family === "carton" ? cartonChannelWidth(board.caliper, rule) : 1.9 * board.card.crushed + rule;
  return channel + BETWEEN_CHANNELS;
}
