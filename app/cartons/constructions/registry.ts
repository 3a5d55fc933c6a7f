// The list of constructions; the only file that imports them.
import { compileAsks, type CompiledAsks } from "../parameters/resolve";
import { COMMON, infoOf, type Asks } from "../parameters/parameter";
import type { ConstructionInfo } from "../types";
import type { Construction } from "./construction";
import { gluedTray } from "./glued-tray";
import { lidAndBase } from "./lid-and-base";
import { rollEndMailer } from "./roll-end-mailer";
import { reverseTuck, straightTuck } from "./tuck-end";

export interface Registered {
  readonly construction: Construction;
  readonly info: ConstructionInfo;
  readonly asks: Asks;
  readonly compiled: CompiledAsks;
}

const register = (construction: Construction): Registered => {
  const asks: Asks = { ...COMMON, ...construction.ask };
  const { id, name, summary, codes, families, closes, pieces, glued, size, sample, meaning } = construction;
  const info: ConstructionInfo = { id, name, summary, codes, families, closes, pieces, glued, size, sample, meaning, parameters: Object.entries(asks).map(([key, ask]) => infoOf(key, ask)) };
  return { construction, info, asks, compiled: compileAsks(asks) };
};

const REGISTRY: ReadonlyMap<string, Registered> = new Map(
  [straightTuck, reverseTuck, rollEndMailer, gluedTray, lidAndBase].map((c) => [c.id, register(c)]),
);

export const findConstruction = (id: string): Registered | undefined => REGISTRY.get(id);
export const listConstructions = (): readonly ConstructionInfo[] => [...REGISTRY.values()].map((r) => r.info);
