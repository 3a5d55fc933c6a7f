// What every exporter is tried on: each construction's sample, and a made-up blank with something on every layer.
import { findBoard } from "~/cartons/boards/catalogue";
import { buildCarton } from "~/cartons/carton";
import { listConstructions } from "~/cartons/constructions/registry";
import type { Brief, Carton } from "~/cartons/types";
import { everyLayer } from "./every-layer";

export interface Case {
  readonly name: string;
  readonly carton: Carton;
}

export const SIDES = ["inside", "print"] as const;

/** Builds or throws with the refusals: a sample that is refused is a defect. */
export function built(brief: Partial<Brief> & Pick<Brief, "construction" | "size" | "board">): Carton {
  const board = findBoard(brief.board);
  if (!board) throw new Error(`no board ${brief.board}`);
  const result = buildCarton({ basis: "inside", room: 0, options: {}, typed: {}, ...brief }, board);
  if (!result.ok) throw new Error(`${brief.construction}: ${JSON.stringify(result.refusals)}`);
  return result.carton;
}

export const cases: readonly Case[] = [
  ...listConstructions().map((c) => ({ name: c.name, carton: built({ construction: c.id, size: c.sample.size, board: c.sample.board }) })),
  { name: "a made-up blank with every layer", carton: everyLayer },
];
