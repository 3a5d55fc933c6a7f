// Cartons and templates of the demo studio. Each is built by the core before it is kept: what it would refuse is not shown.
import type { Brief } from "../app/cartons/types";
import type { Queryable } from "../app/db/client.server";
import { newId } from "../app/db/new-id.server";
import { cartons } from "../app/db/schema/cartons";
import { templates } from "../app/db/schema/templates";
import { checkBrief, constructionVersion } from "../app/services/brief-to-store.server";

const brief = (construction: string, L: number, W: number, D: number, board: string, more: Partial<Brief> = {}): Brief =>
  ({ construction, size: { L, W, D }, basis: "inside", room: 1, board, options: {}, typed: {}, ...more });

interface DemoCarton { readonly name: string; readonly client: string; readonly note: string; readonly brief: Brief; readonly daysAgo: number }

const CARTONS: readonly DemoCarton[] = [
  { name: "Puzzle mailer, 500 pieces", client: "pebble", note: "Goes by post as it is.", brief: brief("roll-end-mailer", 270, 195, 55, "e-flute"), daysAgo: 0 },
  { name: "Frame tray, 300 pieces", client: "pebble", note: "The finished puzzle lies flat in its frame.", brief: brief("lid-and-base", 310, 220, 32, "gd2-400"), daysAgo: 3 },
  { name: "Bar carton 90 g", client: "saltmarsh", note: "Bar of 80 × 55 × 26, unwrapped.", brief: brief("straight-tuck", 82, 27, 56, "fbb-gc2-300", { typed: { L: "80 + 2*1" } }), daysAgo: 1 },
  { name: "Bar carton 60 g", client: "saltmarsh", note: "", brief: brief("reverse-tuck", 74, 25, 50, "fbb-gc2-300"), daysAgo: 8 },
  { name: "Caddy carton 100 g", client: "ninefold", note: "A pouch of 63 × 43 × 92 goes in upright.", brief: brief("straight-tuck", 63, 43, 92, "sbb-350", { basis: "product", room: 1 }), daysAgo: 2 },
  { name: "Sampler tray", client: "ninefold", note: "Five bags side by side.", brief: brief("glued-tray", 205, 85, 38, "sbb-400"), daysAgo: 12 },
];

const TEMPLATES: readonly { name: string; note: string; client: string | null; brief: Brief }[] = [
  { name: "Small tuck carton", note: "For light goods up to 300 g; change the size, keep the locks.", client: null, brief: brief("straight-tuck", 60, 25, 90, "sbb-300") },
  { name: "Post mailer, letterbox", note: "Fits most letter slots: leave the depth at 30.", client: null, brief: brief("roll-end-mailer", 230, 160, 30, "f-flute") },
  { name: "Puzzle mailer", note: "The house style of this client: ears, wings, E flute.", client: "pebble", brief: brief("roll-end-mailer", 270, 195, 55, "e-flute") },
];

const DAY = 86_400_000;

/** Puts the demo cartons in; `by` made them all. Throws when the core refuses one: then the demo is wrong. */
export async function seedCartons(db: Queryable, clientIds: Readonly<Record<string, string>>, by: string, now = new Date()): Promise<void> {
  for (const { name, client, note, brief: asked, daysAgo } of CARTONS) {
    const at = new Date(now.getTime() - daysAgo * DAY);
    await db.insert(cartons).values({ id: newId(), name, note, clientId: clientIds[client]!, ...stored(name, asked), createdBy: by, updatedBy: by, createdAt: at, updatedAt: at });
  }
  for (const { name, client, note, brief: asked } of TEMPLATES) {
    const { fingerprint: _, coreVersion: __, ...kept } = stored(name, asked);
    await db.insert(templates).values({ id: newId(), name, note, clientId: client && clientIds[client]!, ...kept, constructionVersion: constructionVersion(asked.construction), createdBy: by, updatedBy: by });
  }
}

function stored(name: string, asked: Brief) {
  const checked = checkBrief(JSON.stringify(asked));
  if (!checked.ok) throw new Error(`The demo carton “${name}” is refused: ${checked.sentences.join(" ")}`);
  return checked.toStore;
}
