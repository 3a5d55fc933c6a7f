// Who may do what: the one table. Pure, so that pages may ask it too; queries turn `own` into a condition in SQL.
import type { Role, Viewer } from "./viewer";

/** `all`: everybody's things. `own`: the things of the viewer's own client. `none`: not at all. */
export type Reach = "all" | "own" | "none";

export const acts = [
  "carton.read",
  "carton.write",
  "template.read",
  "template.write",
  "client.read",
  "client.write",
  "trash.restore",
  "people.manage",
] as const;
export type Act = (typeof acts)[number];

const table: { readonly [A in Act]: { readonly [R in Role]: Reach } } = {
  "carton.read": { owner: "all", designer: "all", finisher: "all", client: "own" },
  "carton.write": { owner: "all", designer: "all", finisher: "none", client: "none" },
  "template.read": { owner: "all", designer: "all", finisher: "all", client: "none" },
  "template.write": { owner: "all", designer: "all", finisher: "none", client: "none" },
  "client.read": { owner: "all", designer: "all", finisher: "all", client: "own" },
  "client.write": { owner: "all", designer: "all", finisher: "none", client: "none" },
  "trash.restore": { owner: "all", designer: "all", finisher: "none", client: "none" },
  "people.manage": { owner: "all", designer: "none", finisher: "none", client: "none" },
};

export function reachOf(role: Role, act: Act): Reach {
  return table[act][role];
}

/**
 * Whether the viewer may do this to a thing of the client `clientId` (null: the studio's own). Left out, the question
 * is whether there is anything at all that they may do it to: enough to show a link, never enough to do the act.
 */
export function may(viewer: Pick<Viewer, "role" | "clientId">, act: Act, clientId?: string | null): boolean {
  const reach = reachOf(viewer.role, act);
  if (reach === "all") return true;
  if (reach === "none") return false;
  // A contact without a client reaches nothing: null must not match the studio's own things.
  if (viewer.clientId === null) return false;
  return clientId === undefined || clientId === viewer.clientId;
}
