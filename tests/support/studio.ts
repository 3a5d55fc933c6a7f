// The whole product in this process: the build, its routes and a database with the demo studio, without a port.
import path from "node:path";
import { pathToFileURL } from "node:url";
import type { ServerBuild } from "react-router";
import { createApp } from "../../server/app";
import { demoPassword, prepareData } from "../../scripts/seed";

const url = process.env["TEST_DATABASE_URL"];

/** What a person is in the demo studio; `nobody` is not signed in. */
export const PEOPLE = {
  owner: "tess@harrowlane.example", designer: "orla@harrowlane.example", finisher: "nia@harrowlane.example",
  client: "petra@pebblefinch.example", "another client": "ines@saltmarshsoap.example",
} as const;
export type Person = keyof typeof PEOPLE | "nobody";

export interface Studio {
  /** Sends a request as a person. Redirects are not followed. */
  send(who: Person, address: string, form?: Record<string, string>): Promise<Response>;
  readonly build: ServerBuild;
}

export function testDatabaseUrl(): string {
  if (!url) throw new Error("TEST_DATABASE_URL is not set: run these tests with `npm test -- unit`.");
  return url;
}

export async function openStudio(): Promise<Studio> {
  await prepareData(testDatabaseUrl(), { demo: true });
  const directory = path.resolve(process.env["BUILD_DIRECTORY"] ?? "build");
  const build = (await import(pathToFileURL(path.join(directory, "server/index.js")).href)) as ServerBuild;
  const app = createApp({ loadBuild: () => build, mode: "production" });
  const cookies = new Map<Person, string>();
  const request = (address: string, cookie: string | undefined, form: Record<string, string> | undefined) =>
    app.fetch(new Request(new URL(address, "http://studio.test"), {
      method: form ? "POST" : "GET", headers: { ...(cookie ? { Cookie: cookie } : {}), ...(form ? { Origin: "http://studio.test", Host: "studio.test" } : {}) },
      ...(form ? { body: new URLSearchParams(form) } : {}),
    }));
  const cookieOf = async (who: Person): Promise<string | undefined> => {
    if (who === "nobody") return undefined;
    const known = cookies.get(who);
    if (known) return known;
    const response = await request("/sign-in", undefined, { email: PEOPLE[who], password: demoPassword });
    const cookie = response.headers.get("Set-Cookie")?.split(";")[0];
    if (!cookie) throw new Error(`${who} cannot sign in: ${response.status} ${await response.text()}`);
    cookies.set(who, cookie);
    return cookie;
  };
  return { build, send: async (who, address, form) => request(address, await cookieOf(who), form) };
}
