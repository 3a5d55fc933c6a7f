// From what was sent to what is stored: the brief through its schema and through the core, with the fingerprint of its layers.
import { createHash } from "node:crypto";
import { BOARDS } from "~/cartons/boards/catalogue";
import { briefSchema } from "~/cartons/brief";
import { buildCarton } from "~/cartons/carton";
import { listConstructions } from "~/cartons/constructions/registry";
import type { Brief, Carton, ConstructionInfo } from "~/cartons/types";
import { refusalSentence } from "~/copy/refusals";
import type { BriefToStore } from "~/db/queries/cartons.server";
import { jsonText } from "~/forms/carton";
import { version } from "../../package.json";

export type Checked = { readonly ok: true; readonly brief: Brief; readonly carton: Carton; readonly toStore: BriefToStore } | { readonly ok: false; readonly sentences: readonly string[] };

/** Only a brief that today's core makes a carton of is stored. */
export function checkBrief(text: unknown): Checked {
  const json = jsonText.safeParse(text);
  if (!json.success) return { ok: false, sentences: json.error.issues.map((issue) => issue.message) };
  const parsed = briefSchema.safeParse(json.data);
  if (!parsed.success) return { ok: false, sentences: ["The drawing did not come along whole. Save once more."] };
  const brief: Brief = parsed.data;
  const board = BOARDS.find((b) => b.id === brief.board);
  if (!board) return { ok: false, sentences: [`There is no board “${brief.board}” in stock. Choose another board.`] };
  const result = buildCarton(brief, board);
  if (!result.ok) return { ok: false, sentences: result.refusals.map((refusal) => refusalSentence(refusal, brief.construction)) };
  const { carton } = result;
  return {
    ok: true, brief, carton,
    toStore: { brief, construction: brief.construction, board: brief.board, fingerprint: fingerprintOf(carton), coreVersion: version },
  };
}

/** SHA-256 of the layers to a tenth of a micrometre, hexadecimal: the same lines give the same fingerprint on any machine. */
export function fingerprintOf(carton: Carton): string {
  const hash = createHash("sha256");
  for (const [name, paths] of Object.entries(carton.layers)) {
    hash.update(`${name}\n`);
    for (const { path } of paths) hash.update(`${path.closed ? "closed" : "open"} ${path.vertices.map((v) => [v.x, v.y, v.bulge].map((n) => (Math.round(n * 1e4) / 1e4 + 0).toString()).join(",")).join(" ")}\n`);
  }
  return hash.digest("hex");
}

/** Changes when what may be asked of a construction changes. */
export function constructionVersion(id: string): string {
  const info: ConstructionInfo | undefined = listConstructions().find((construction) => construction.id === id);
  return createHash("sha256").update(JSON.stringify(info ?? id)).digest("hex").slice(0, 16);
}
