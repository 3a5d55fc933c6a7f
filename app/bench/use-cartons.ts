import { useMemo } from "react";
import { buildCarton } from "~/cartons/carton";
import { BOARDS } from "~/cartons/boards/catalogue";
import type { Brief, Carton, ConstructionInfo, Refusal, Size } from "~/cartons/types";

export type Drawn = { readonly carton: Carton; readonly refusals: null } | { readonly carton: null; readonly refusals: readonly Refusal[] };

/** The brief for a construction's own sample, or round given contents. */
export function sampleBrief(construction: ConstructionInfo, contents: Size | null, room = 1): Brief {
  const { size, board } = construction.sample;
  return { construction: construction.id, size: contents ?? size, basis: contents ? "product" : "inside", room, board, options: {}, typed: {} };
}

export function drawn(brief: Brief): Drawn {
  const board = BOARDS.find((b) => b.id === brief.board);
  if (!board) return { carton: null, refusals: [] };
  const result = buildCarton(brief, board);
  return result.ok ? { carton: result.carton, refusals: null } : { carton: null, refusals: result.refusals };
}

/** A stored brief as a small picture's carton; null where today's construction refuses it or it is no brief at all. */
export function useCarton(brief: unknown): Carton | null {
  return useMemo(() => (isBrief(brief) ? drawn(brief).carton : null), [brief]);
}

/** A stored brief as it came over the wire; null when it is none. */
export const briefOf = (value: unknown): Brief | null => (isBrief(value) ? value : null);

export const isBrief = (value: unknown): value is Brief =>
  typeof value === "object" && value !== null && "construction" in value && "size" in value && "board" in value && "basis" in value && "options" in value && "typed" in value && "room" in value;
