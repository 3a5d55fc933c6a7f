// What a new carton starts from: what the address names, the construction's sample for the rest.
import { BOARDS } from "~/cartons/boards/catalogue";
import type { Axis, Brief, ConstructionInfo, SizeBasis } from "~/cartons/types";

const bases: readonly SizeBasis[] = ["inside", "crease", "outside", "product"];

/** `search`: construction, L, W, D (mm), basis, board; what is missing or unknown takes the sample's. */
export function startBrief(search: URLSearchParams, constructions: readonly ConstructionInfo[]): Brief {
  const construction = constructions.find((c) => c.id === search.get("construction")) ?? constructions[0];
  if (!construction) throw new Error("there is no construction");
  const { size, board } = construction.sample;
  const figure = (axis: Axis) => {
    const value = Number(search.get(axis) ?? "");
    return Number.isFinite(value) && value > 0 ? value : size[axis];
  };
  return {
    construction: construction.id,
    size: { L: figure("L"), W: figure("W"), D: figure("D") },
    basis: bases.find((basis) => basis === search.get("basis")) ?? "inside",
    room: 1,
    board: BOARDS.find((b) => b.id === search.get("board"))?.id ?? board,
    options: {},
    typed: {},
  };
}
