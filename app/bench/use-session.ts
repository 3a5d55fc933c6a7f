// The sitting as React sees it: one reducer, one build an edit.
import { useMemo, useReducer } from "react";
import { buildCarton } from "~/cartons/carton";
import type { Board } from "~/cartons/boards/board";
import type { Brief, CartonResult } from "~/cartons/types";
import { type Build, type Command, openSession, reduceSession, type Session } from "./session";

/** Builds from a brief alone: its board is looked up among those that the studio has. */
export function builderFor(boards: readonly Board[]): Build {
  return (brief): CartonResult => {
    const board = boards.find((b) => b.id === brief.board);
    if (board) return buildCarton(brief, board);
    const nearest = boards[0]?.id ?? null;
    return { ok: false, refusals: [{ code: "not-offered", parameter: "board", given: brief.board, limit: { oneOf: boards.map((b) => b.name) }, nearest, because: "it is no longer in board stock" }] };
  };
}

export function useSession(initial: Session, boards: readonly Board[]): readonly [Session, (command: Command) => void] {
  const reduce = useMemo(() => {
    const build = builderFor(boards);
    return (session: Session, command: Command) => reduceSession(build, session, command);
  }, [boards]);
  return useReducer(reduce, initial);
}

export function openFor(brief: Brief, boards: readonly Board[]): Session | null {
  return openSession(builderFor(boards), brief);
}
