// Signing in and out through the whole stack: cookies, limits, ends.
import { beforeAll, describe, expect, it } from "vitest";
import { createApp } from "../../server/app";
import { demoPassword } from "../../scripts/seed";
import { openStudio, PEOPLE, type Studio } from "../support/studio";

let studio: Studio;
let app: ReturnType<typeof createApp>;
beforeAll(async () => {
  studio = await openStudio();
  app = createApp({ loadBuild: () => studio.build, mode: "production" });
});
const post = (address: string, form: Record<string, string>, cookie = "") =>
  app.fetch(new Request(`http://studio.test${address}`, { method: "POST", headers: { Cookie: cookie, Origin: "http://studio.test", Host: "studio.test", "User-Agent": "Test browser" }, body: new URLSearchParams(form) }));
const get = (address: string, cookie: string) => app.fetch(new Request(`http://studio.test${address}`, { headers: { Cookie: cookie } }));
const signIn = async (email: string, password = demoPassword) => (await post("/sign-in", { email, password })).headers.get("Set-Cookie")?.split(";")[0] ?? "";

describe("signing in", () => {
  it("gives a cookie that scripts and other sites do not get, and goes where one was going", async () => {
    const response = await post("/sign-in?next=%2Fcartons%3Fq%3Dtray", { email: ` ${PEOPLE.designer.toUpperCase()} `, password: demoPassword });
    expect(response.status).toBe(302);
    expect(response.headers.get("Location")).toBe("/cartons?q=tray");
    expect(response.headers.get("Set-Cookie")).toMatch(/HttpOnly/);
    expect(response.headers.get("Set-Cookie")).toMatch(/SameSite=Lax/);
  });
  it("never leads to another site", async () => {
    for (const next of ["//evil.test", "https://evil.test", "/\\evil.test"]) {
      expect((await post(`/sign-in?next=${encodeURIComponent(next)}`, { email: PEOPLE.designer, password: demoPassword })).headers.get("Location")).toBe("/");
    }
  });
  it("says the same of a wrong password and of an unknown e-mail, and keeps what was typed but the password", async () => {
    for (const email of [PEOPLE.finisher, "nobody@harrowlane.example"]) {
      const response = await post("/sign-in", { email, password: "not the password" });
      const page = await response.text();
      expect(response.status).toBe(400);
      expect(page).toContain("E-mail and password do not go together.");
      expect(page).toContain(email);
      expect(page).not.toContain("not the password");
    }
  });
  it("gives a new id each time, so that one planted beforehand is worth nothing", async () => {
    const planted = await signIn(PEOPLE.designer);
    const response = await post("/sign-in", { email: PEOPLE.designer, password: demoPassword }, planted);
    expect(response.headers.get("Set-Cookie")?.split(";")[0]).not.toBe(planted);
    expect((await get("/cartons", planted)).status).toBe(302);
  });
  it("takes no cookie that was forged or changed", async () => {
    const real = await signIn(PEOPLE.designer);
    expect((await get("/cartons", real)).status).toBe(200);
    for (const forged of [`${real}x`, real.replace(/=./, "=Z"), "cartonwright=abc", "cartonwright=ImFiYyI%3D"]) expect((await get("/cartons", forged)).status).toBe(302);
  });
  it("makes one wait after eight wrong passwords, even for the right one, and says how long", async () => {
    const email = "waits@harrowlane.example";
    for (let i = 0; i < 8; i++) expect((await post("/sign-in", { email, password: "wrong wrong wrong" })).status).toBe(400);
    const response = await post("/sign-in", { email, password: demoPassword });
    expect(response.status).toBe(429);
    expect(await response.text()).toMatch(/Too many tries\. Sign in again in 1[45] minutes\./);
  });
});

describe("signing out", () => {
  it("ends this browser's sign-in", async () => {
    const cookie = await signIn(PEOPLE.designer);
    expect((await post("/sign-out", {}, cookie)).headers.get("Location")).toBe("/sign-in");
    expect((await get("/cartons", cookie)).status).toBe(302);
  });
  it("everywhere ends all of them", async () => {
    const [one, two] = [await signIn(PEOPLE.finisher), await signIn(PEOPLE.finisher)];
    expect((await get("/cartons", two)).status).toBe(200);
    expect((await post("/account", { intent: "everywhere" }, one)).headers.get("Location")).toBe("/sign-in");
    for (const cookie of [one, two]) expect((await get("/cartons", cookie)).status).toBe(302);
  });
  it("happens to the other browsers when the password is changed", async () => {
    const [mine, other] = [await signIn(PEOPLE["another client"]), await signIn(PEOPLE["another client"])];
    expect((await post("/account", { intent: "password", currentPassword: "not it at all", newPassword: "three-long-words-2" }, mine)).status).toBe(400);
    const changed = await post("/account", { intent: "password", currentPassword: demoPassword, newPassword: "three-long-words-2" }, mine);
    expect(changed.status).toBe(200);
    expect((await get("/cartons", mine)).status).toBe(200);
    expect((await get("/cartons", other)).status).toBe(302);
    // Put back for whoever comes after.
    expect((await post("/account", { intent: "password", currentPassword: "three-long-words-2", newPassword: demoPassword }, mine)).status).toBe(200);
  });
});

describe("people", () => {
  it("are added by the owner, barred and admitted again", async () => {
    const owner = await signIn(PEOPLE.owner);
    const email = `new-${Date.now()}@harrowlane.example`;
    expect((await post("/people", { name: "Noor Vale", email, role: "designer", clientId: "", password: "a-first-password-1" }, owner)).status).toBe(200);
    const theirs = await signIn(email, "a-first-password-1");
    expect((await get("/cartons", theirs)).status).toBe(200);
    expect((await post("/people", { name: "Twice", email, role: "designer", clientId: "", password: "a-first-password-1" }, owner)).status).toBe(400);
    expect((await post("/people", { name: "No client", email: `x${email}`, role: "client", clientId: "", password: "a-first-password-1" }, owner)).status).toBe(400);
    const page = await (await get("/people", owner)).text();
    const id = /name="id" value="([0-9a-z]{16})"[^>]*>(?:(?!name="id").)*Bar Noor Vale/s.exec(page)?.[1] ?? page.slice(0, page.indexOf("Bar Noor Vale")).match(/name="id" value="([0-9a-z]{16})"/g)?.at(-1)?.slice(17, 33) ?? "";
    await post("/people", { intent: "bar", id }, owner);
    expect((await get("/cartons", theirs)).status).toBe(302);
    await post("/people", { intent: "admit", id }, owner);
    expect(await signIn(email, "a-first-password-1")).not.toBe("");
  });
});

describe("every answer", () => {
  it("carries the headers that keep it safe", async () => {
    for (const address of ["/sign-in", "/try", "/health", "/no/such/page"]) {
      const { headers } = await get(address, "");
      expect(headers.get("Content-Security-Policy"), address).toMatch(/frame-ancestors 'none'/);
      expect(headers.get("X-Content-Type-Options"), address).toBe("nosniff");
      expect(headers.get("Referrer-Policy"), address).toBe("same-origin");
    }
    expect((await get("/try", "")).headers.get("Content-Security-Policy")).toMatch(/script-src 'self' 'nonce-[^']+'/);
  });
});
