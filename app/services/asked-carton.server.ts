// From a brief in an address to a carton, or to the sentences that say why not.
import { buildCarton } from "~/cartons/carton";
import { findBoard } from "~/cartons/boards/catalogue";
import { briefSchema } from "~/cartons/brief";
import type { Brief, Carton } from "~/cartons/types";
import { refusalSentence } from "~/copy/refusals";

/** Longest brief that an address may carry, in characters: ten times what a Bench makes. */
const LONGEST = 8000;

export type Asked<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly status: 400 | 413 | 422; readonly sentences: readonly string[] };

export function readBrief(text: string): Asked<Brief> {
  if (text.length > LONGEST) return { ok: false, status: 413, sentences: ["The brief in this address is too long. Export from the Bench again."] };
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch {
    return { ok: false, status: 400, sentences: ["The brief in this address cannot be read. Export from the Bench again."] };
  }
  const parsed = briefSchema.safeParse(input);
  if (parsed.success) return { ok: true, value: parsed.data };
  return { ok: false, status: 400, sentences: parsed.error.issues.slice(0, 5).map((issue) => `${issue.path.map(String).join(".") || "The brief"}: ${issue.message}.`) };
}

export function askedCarton(brief: Brief): Asked<Carton> {
  const board = findBoard(brief.board);
  if (!board) return { ok: false, status: 422, sentences: [`There is no board “${brief.board}”. Choose one from Board stock.`] };
  const result = buildCarton(brief, board);
  if (!result.ok) return { ok: false, status: 422, sentences: result.refusals.map((r) => refusalSentence(r, brief.construction)) };
  return { ok: true, value: result.carton };
}
