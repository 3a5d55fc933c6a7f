// Sign-ins: a random id in a signed cookie, its hash in the database. Whoever reads the table can sign in as nobody.
import { createHash, randomBytes } from "node:crypto";
import { createCookie } from "react-router";
import type { Queryable } from "~/db/client.server";
import { deleteSession, findSession, insertSession, touchSession } from "~/db/queries/sessions.server";
import { findViewerById } from "~/db/queries/users.server";
import type { SignedIn } from "./session-context";

/** A sign-in that is not used ends after so long. */
const IDLE_SECONDS = 14 * 24 * 3600;
/** How often use is written down. */
const TOUCH_MS = 5 * 60_000;

const kept: { cookie?: ReturnType<typeof createCookie> } = {};

function cookie() {
  const secret = process.env.SESSION_SECRET;
  if (!secret || secret.length < 32) throw new Error("SESSION_SECRET is not set. npm start makes one; by hand give 32 random characters or more.");
  return (kept.cookie ??= createCookie("cartonwright", { httpOnly: true, sameSite: "lax", path: "/", maxAge: IDLE_SECONDS, secrets: [secret], secure: process.env.COOKIE_SECURE === "1" }));
}

export const hashOf = (id: string): string => createHash("sha256").update(id).digest("hex");

async function idOf(request: Request): Promise<string | null> {
  const id: unknown = await cookie().parse(request.headers.get("Cookie"));
  return typeof id === "string" && id.length > 0 ? id : null;
}

/** Who sent this request; null for nobody, for a cookie that was forged or has run out, and for people who are barred. */
export async function readSession(db: Queryable, request: Request, now = new Date()): Promise<SignedIn | null> {
  const id = await idOf(request);
  if (id === null) return null;
  const idHash = hashOf(id);
  const stored = await findSession(db, idHash, now);
  const viewer = stored && (await findViewerById(db, stored.userId));
  if (!stored || !viewer) return null;
  if (now.getTime() - stored.lastSeen.getTime() > TOUCH_MS) {
    await touchSession(db, idHash, { data: stored.data, lastSeen: now, expiresAt: new Date(now.getTime() + IDLE_SECONDS * 1000) });
  }
  return { viewer, idHash };
}

/** A new sign-in with an id of its own, so that an id planted in a browser beforehand is worth nothing. Returns the Set-Cookie header. */
export async function startSession(db: Queryable, request: Request, userId: string, now = new Date()): Promise<string> {
  const old = await idOf(request);
  if (old !== null) await deleteSession(db, hashOf(old));
  const id = randomBytes(32).toString("base64url");
  await insertSession(db, { idHash: hashOf(id), userId, userAgent: (request.headers.get("User-Agent") ?? "").slice(0, 255), data: {}, expiresAt: new Date(now.getTime() + IDLE_SECONDS * 1000) });
  return cookie().serialize(id);
}

/** Ends this sign-in. Returns the header that takes the cookie away. */
export async function endThisSession(db: Queryable, request: Request): Promise<string> {
  const id = await idOf(request);
  if (id !== null) await deleteSession(db, hashOf(id));
  return cookie().serialize("", { maxAge: 0 });
}
