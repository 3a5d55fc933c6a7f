// Briefs and boards for property tests: the whole range of every construction, board and allowance, from a seed.
import fc from "fast-check";
import { withCaliper } from "~/cartons/boards/allowance-card";
import type { Board } from "~/cartons/boards/board";
import { BOARDS } from "~/cartons/boards/catalogue";
import { findConstruction, type Registered } from "~/cartons/constructions/registry";
import type { Brief, OptionValue, Size } from "~/cartons/types";

export interface Case {
  readonly brief: Brief;
  readonly board: Board;
}

/** One seed for all runs, so that a failure is the same for everybody; set PROPERTY_SEED for others. */
export const SEED = Number(process.env["PROPERTY_SEED"] ?? 19593);

/** Evenly between 0 and 1: a plain double would mostly be next to nothing. */
export const share = fc.integer({ min: 0, max: 1_000_000 }).map((n) => n / 1_000_000);

/** Even over the ratio, so that dolls are as frequent as giants. */
const spread = (from: number, to: number) => share.map((f) => from * (to / from) ** f);

/** A board of the catalogue at another thickness, with allowances that a shop might have measured. */
export function boards(families: readonly string[]): fc.Arbitrary<Board> {
  const offered = BOARDS.filter((b) => families.includes(b.family));
  return fc.record({
    kind: fc.constantFrom(...offered), thickness: share,
    along: share.map((f) => 0.35 + 0.3 * f), across: share.map((f) => 0.35 + 0.3 * f), measured: fc.boolean(),
  }).map(({ kind, thickness, along, across, measured }) => {
    const t = kind.family === "micro" ? 0.8 + 1.1 * thickness : 0.25 + 0.6 * thickness;
    const board = withCaliper(kind, t);
    return measured ? { ...board, card: { ...board.card, a90: { alongGrain: along * t, acrossGrain: across * t } } } : board;
  });
}

function sizes({ from, to }: { from: Size; to: Size }): fc.Arbitrary<Size> {
  return fc.record({ L: spread(from.L, to.L), W: spread(from.W, to.W), D: spread(from.D, to.D) });
}

const range = (registered: Registered, wider: number) => {
  const { L, W, D } = registered.info.size;
  return { from: { L: L.from / wider, W: W.from / wider, D: D.from / wider }, to: { L: L.to * wider, W: W.to * wider, D: D.to * wider } };
};

const CHOICES: fc.Arbitrary<Record<string, OptionValue>> = fc.record({
  route: fc.constantFrom<OptionValue>("die", "knife", "laser"), grain: fc.constantFrom<OptionValue>("usual", "turned"),
  bleed: fc.oneof(fc.constant(0), share.map((f) => 0.5 + 7.5 * f)),
}, { requiredKeys: [] }).map((o) => ({ ...o }) as Record<string, OptionValue>);

/** `wider` > 1 asks for sizes beyond the construction's own limits too. W > L is turned round: it is refused by name elsewhere. */
export function cases(construction: string, wider = 1): fc.Arbitrary<Case> {
  const registered = findConstruction(construction);
  if (!registered) throw new Error(`no construction ${construction}`);
  return fc.record({ size: sizes(range(registered, wider)), board: boards(registered.info.families), options: CHOICES }).map(({ size, board, options }) => {
    const turned = wider === 1 && size.W > size.L ? { L: size.W, W: size.L, D: size.D } : size;
    return { board, brief: { construction, size: turned, basis: "inside", room: 1, board: board.id, options, typed: {} } };
  });
}

export const briefOf = (construction: string, size: Size, options: Record<string, OptionValue> = {}): Brief =>
  ({ construction, size, basis: "inside", room: 1, board: "any", options, typed: {} });
