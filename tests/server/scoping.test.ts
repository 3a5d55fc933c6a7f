// Two clients' people never see each other's rows: asked of the queries themselves, on the real database.
import { drizzle } from "drizzle-orm/mysql2";
import { createPool, type Pool } from "mysql2";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Viewer } from "~/auth/viewer";
import type { Database } from "~/db/client.server";
import { createCarton, deleteCarton, findCarton, listCartons, restoreCarton, updateCarton } from "~/db/queries/cartons.server";
import { createClient, findClient, listClients } from "~/db/queries/clients.server";
import { listTrash, purgeTrash } from "~/db/queries/trash.server";
import { findCredentials, findViewerById } from "~/db/queries/users.server";
import { checkBrief } from "~/services/brief-to-store.server";
import { prepareData } from "../../scripts/seed";
import { PEOPLE, testDatabaseUrl } from "../support/studio";

let pool: Pool;
let db: Database;
const viewers = {} as Record<keyof typeof PEOPLE, Viewer>;
const brief = checkBrief(JSON.stringify({ construction: "glued-tray", size: { L: 111, W: 83, D: 29 }, basis: "inside", room: 1, board: "sbb-400", options: {}, typed: {} }));
if (!brief.ok) throw new Error(brief.sentences.join(" "));
const toStore = brief.toStore;

beforeAll(async () => {
  await prepareData(testDatabaseUrl(), { demo: true });
  pool = createPool({ uri: testDatabaseUrl(), timezone: "Z", connectionLimit: 4 });
  db = drizzle({ client: pool });
  for (const [who, email] of Object.entries(PEOPLE)) {
    const found = await findCredentials(db, email);
    viewers[who as keyof typeof PEOPLE] = (await findViewerById(db, found!.id))!;
  }
});
afterAll(() => pool.promise().end());

const all = { page: 1, pageSize: 1000 };

describe("a client's contact", () => {
  it("sees only their own client's cartons, in lists, by id and under any filter", async () => {
    const mine = viewers.client;
    const other = viewers["another client"];
    const everything = (await listCartons(db, viewers.owner, all)).rows;
    expect(new Set(everything.map((c) => c.clientId)).size).toBeGreaterThan(2);
    for (const viewer of [mine, other]) {
      const seen = (await listCartons(db, viewer, all)).rows;
      expect(seen.length).toBeGreaterThan(0);
      expect(new Set(seen.map((c) => c.clientId))).toEqual(new Set([viewer.clientId]));
      for (const carton of everything) expect((await findCarton(db, viewer, carton.id)) !== null).toBe(carton.clientId === viewer.clientId);
    }
    expect((await listCartons(db, mine, { ...all, clientId: other.clientId! })).rows).toEqual([]);
    expect((await listClients(db, mine, all)).rows.map((c) => c.id)).toEqual([mine.clientId]);
    expect(await findClient(db, mine, other.clientId!)).toBeNull();
  });

  it("changes, deletes and restores nothing", async () => {
    const [carton] = (await listCartons(db, viewers.client, all)).rows;
    await expect(updateCarton(db, viewers.client, carton!.id, carton!.rowVersion, { name: "x" })).rejects.toMatchObject({ code: "not-allowed" });
    await expect(deleteCarton(db, viewers.client, carton!.id)).rejects.toMatchObject({ code: "not-allowed" });
    await expect(restoreCarton(db, viewers.client, carton!.id)).rejects.toMatchObject({ code: "not-allowed" });
    await expect(listTrash(db, viewers.client)).rejects.toMatchObject({ code: "not-allowed" });
    await expect(createCarton(db, viewers.finisher, { ...toStore, name: "x", note: "", clientId: null })).rejects.toMatchObject({ code: "not-allowed" });
  });

  it("is shut out with a client that is deleted", async () => {
    const { deleteClient, restoreClient } = await import("~/db/queries/clients.server");
    await deleteClient(db, viewers.owner, viewers["another client"].clientId!);
    try {
      expect(await findCredentials(db, PEOPLE["another client"])).toBeNull();
      expect((await listCartons(db, viewers.owner, { ...all, clientId: viewers["another client"].clientId! })).rows).toEqual([]);
    } finally {
      await restoreClient(db, viewers.owner, viewers["another client"].clientId!);
    }
    expect(await findCredentials(db, PEOPLE["another client"])).not.toBeNull();
  });
});

describe("saving", () => {
  const make = (name: string) => createCarton(db, viewers.designer, { ...toStore, name, note: "", clientId: null });

  it("tells the second of two and keeps the first's", async () => {
    const id = await make("Saved by two");
    const first = await updateCarton(db, viewers.designer, id, 1, { name: "First" });
    expect("saved" in first && first.saved.rowVersion).toBe(2);
    const second = await updateCarton(db, viewers.owner, id, 1, { name: "Second" });
    expect("conflict" in second && second.conflict.name).toBe("First");
    expect((await findCarton(db, viewers.owner, id))?.name).toBe("First");
  });

  it("gives back what went in, to the last digit", async () => {
    const id = await make("🦔 “Größe” — חבילה");
    const found = await findCarton(db, viewers.designer, id);
    expect(found?.name).toBe("🦔 “Größe” — חבילה");
    expect(found?.brief).toEqual(toStore.brief);
    expect(found?.fingerprint).toBe(toStore.fingerprint);
  });

  it("brings back what was deleted within 30 days, and not after", async () => {
    const id = await make("Deleted");
    await deleteCarton(db, viewers.designer, id);
    expect(await findCarton(db, viewers.designer, id)).toBeNull();
    expect((await listTrash(db, viewers.designer)).map((t) => t.id)).toContain(id);
    await purgeTrash(db, new Date(Date.now() + 29 * 86_400_000));
    await restoreCarton(db, viewers.designer, id);
    expect((await findCarton(db, viewers.designer, id))?.name).toBe("Deleted");
    await deleteCarton(db, viewers.designer, id);
    await purgeTrash(db, new Date(Date.now() + 31 * 86_400_000));
    await expect(restoreCarton(db, viewers.designer, id)).rejects.toMatchObject({ code: "not-found" });
  });

  it("finds words with the wildcards of a search taken as themselves", async () => {
    await make("100 % cotton_tray");
    expect((await listCartons(db, viewers.designer, { ...all, q: "100 %" })).rows.map((c) => c.name)).toContain("100 % cotton_tray");
    expect((await listCartons(db, viewers.designer, { ...all, q: "%" })).rows.every((c) => c.name.includes("%") || c.clientName?.includes("%"))).toBe(true);
  });

  it("keeps a client's name of any script", async () => {
    const id = await createClient(db, viewers.owner, { name: "O'Brien & Söhne <b>", note: "" });
    expect((await findClient(db, viewers.owner, id))?.name).toBe("O'Brien & Söhne <b>");
  });
});
