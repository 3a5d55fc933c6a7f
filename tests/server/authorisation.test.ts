// Walks every address of the product as every kind of person, from the route table itself: a route without a rule fails.
import { beforeAll, describe, expect, it } from "vitest";
import type { RouteConfigEntry } from "@react-router/dev/routes";
import routes from "~/routes";
import { openStudio, type Person, type Studio } from "../support/studio";

type Answers = Record<Person, number>;
const everybody = (status: number): Answers => ({ nobody: status, owner: status, designer: status, finisher: status, client: status, "another client": status });
/** 302 leads to sign-in; 403 says that the role does not do this; 404 says that there is nothing, also of what is another client's. */
const signedIn = (change: Partial<Answers> = {}): Answers => ({ ...everybody(200), nobody: 302, ...change });
const CLIENTS_NOT = { client: 403, "another client": 403 } as const;
const MAKERS_ONLY = signedIn({ finisher: 403, ...CLIENTS_NOT });

/** What a GET answers. `:cartonId` is a carton of Pebble & Finch (client), `:clientId` that client, `:templateId` its template. */
const GET: Readonly<Record<string, Answers>> = {
  "/": signedIn(), "/constructions": everybody(200), "/cartons": signedIn(), "/cartons/new": MAKERS_ONLY,
  "/cartons/:cartonId": signedIn({ "another client": 404 }), "/cartons/csv": signedIn(), "/cartons/:cartonId/export/:format": signedIn({ "another client": 404 }),
  "/templates": signedIn(CLIENTS_NOT), "/templates/:templateId": signedIn(CLIENTS_NOT), "/templates/csv": signedIn(CLIENTS_NOT),
  "/clients": MAKERS_ONLY, "/clients/:clientId": MAKERS_ONLY, "/clients/csv": MAKERS_ONLY,
  "/trash": MAKERS_ONLY, "/account": signedIn(), "/people": signedIn({ designer: 403, finisher: 403, ...CLIENTS_NOT }),
  "/try": everybody(200), "/try/export/:format": everybody(200), "/health": everybody(200), "/*": everybody(404),
  "/sign-in": { ...everybody(302), nobody: 200 }, "/sign-out": everybody(302), "/first-run": everybody(404),
};

/** Every address that takes a form, and who may not send one. The form itself is nonsense: those who may get 400, not 200. */
const REFUSED = [401, 403, 404];
const POST: Readonly<Record<string, readonly Person[]>> = {
  "/cartons": ["nobody", "finisher", "client", "another client"], "/cartons/new": ["nobody", "finisher", "client", "another client"],
  "/cartons/:cartonId": ["nobody", "finisher", "client", "another client"], "/templates": ["nobody", "finisher", "client", "another client"],
  "/templates/:templateId": ["nobody", "finisher", "client", "another client"], "/clients": ["nobody", "finisher", "client", "another client"],
  "/clients/:clientId": ["nobody", "finisher", "client", "another client"], "/trash": ["nobody", "finisher", "client", "another client"],
  "/account": ["nobody"], "/people": ["nobody", "designer", "finisher", "client", "another client"],
  // Open to all: they decide by what is sent.
  "/sign-in": [], "/sign-out": [], "/first-run": ["nobody", "owner", "designer", "finisher", "client", "another client"],
};

function addresses(entries: readonly RouteConfigEntry[], above = ""): { path: string; file: string }[] {
  return entries.flatMap((entry) => {
    const path = entry.path ? `${above}/${entry.path}` : above;
    return entry.children ? addresses(entry.children, path) : [{ path: path || "/", file: entry.file }];
  });
}
const table = addresses(routes as readonly RouteConfigEntry[]);

let studio: Studio;
const ids: Record<string, string> = { ":format": "svg", "*": "no/such/page" };
beforeAll(async () => {
  studio = await openStudio();
  const linked = async (address: string, words: string): Promise<string> => {
    const page = await (await studio.send("owner", address)).text();
    const at = page.indexOf(words);
    const found = [...page.slice(0, at).matchAll(/href="\/\w+\/([0-9a-z]{16})"/g)].at(-1)?.[1];
    if (!found) throw new Error(`no link before ${words} on ${address}`);
    return found;
  };
  ids[":cartonId"] = await linked("/cartons", "Puzzle mailer, 500 pieces");
  ids[":clientId"] = await linked("/clients", "Pebble &amp; Finch Puzzles");
  ids[":templateId"] = await linked("/templates", "Puzzle mailer");
});
const filled = (path: string) => {
  const address = path.replace(/:\w+|\*/g, (name) => ids[name] ?? name);
  return path === "/try/export/:format" ? `${address}?brief=${encodeURIComponent(JSON.stringify({ construction: "glued-tray", size: { L: 120, W: 80, D: 30 }, basis: "inside", board: "sbb-400" }))}` : address;
};
const WHO: readonly Person[] = ["nobody", "owner", "designer", "finisher", "client", "another client"];

describe("the route table", () => {
  it("has a rule for every address, and no rule without one", () => {
    expect(Object.keys(GET).sort()).toEqual(table.map((r) => r.path).sort());
  });
  it("has a rule for every action", () => {
    const acting = table.filter((r) => {
      const id = r.file.replace(/\.tsx?$/, "");
      return studio.build.routes[id]?.module.action !== undefined;
    }).map((r) => r.path);
    expect(Object.keys(POST).sort()).toEqual(acting.sort());
  });
});

describe("looking", () => {
  it.each(Object.keys(GET).flatMap((path) => WHO.map((who) => [path, who] as const)))("%s as %s", async (path, who) => {
    const response = await studio.send(who, filled(path));
    expect(response.status).toBe(GET[path]![who]);
    if (response.status === 302 && who === "nobody" && path !== "/sign-out") expect(response.headers.get("Location")).toMatch(/^\/sign-in/);
    await response.body?.cancel();
  });

  it("gives data requests no more than pages", async () => {
    for (const who of ["nobody", "another client"] as const) {
      const response = await studio.send(who, `${filled("/cartons/:cartonId")}.data`);
      expect([202, 302, 404]).toContain(response.status);
      expect(await response.text()).not.toContain("500 pieces");
    }
  });
});

describe("changing", () => {
  it.each(Object.entries(POST).flatMap(([path, who]) => who.map((w) => [path, w] as const)))("%s is refused to %s", async (path, who) => {
    const response = await studio.send(who, filled(path), { intent: "delete", kind: "carton", id: ids[":cartonId"]!, name: "taken over" });
    // Nobody is led to sign-in: the page behind the form is not shown either.
    if (who === "nobody" && response.status === 302) expect(response.headers.get("Location")).toMatch(/^\/sign-in/);
    else expect(REFUSED).toContain(response.status);
    await response.body?.cancel();
  });

  it("is refused to a form of another site", async () => {
    const { createApp } = await import("../../server/app");
    const app = createApp({ loadBuild: () => studio.build, mode: "production" });
    const response = await app.fetch(new Request("http://studio.test/sign-out", { method: "POST", headers: { Origin: "http://evil.test", Host: "studio.test" }, body: new URLSearchParams({}) }));
    expect(response.status).toBe(400);
  });
});
