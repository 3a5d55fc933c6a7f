import { describe, expect, it } from "vitest";
import { type Act, acts, may } from "./permissions";
import { type Role, roles } from "./viewer";

const person = (role: Role) => ({ role, clientId: role === "client" ? "pebble" : null });

// Written out by hand from the list of roles in the product's description, and not read from the table it checks.
const things = { own: "pebble", other: "saltmarsh", studio: null } as const;
const expected: Record<Role, Partial<Record<Act, readonly (keyof typeof things)[]>>> = {
  owner: Object.fromEntries(acts.map((act) => [act, ["own", "other", "studio"]])),
  designer: Object.fromEntries(acts.filter((act) => act !== "people.manage").map((act) => [act, ["own", "other", "studio"]])),
  finisher: { "carton.read": ["own", "other", "studio"], "template.read": ["own", "other", "studio"], "client.read": ["own", "other", "studio"] },
  client: { "carton.read": ["own"], "client.read": ["own"] },
};

describe("permissions", () => {
  for (const role of roles) {
    for (const act of acts) {
      for (const [relation, clientId] of Object.entries(things)) {
        const isAllowed = expected[role][act]?.includes(relation as keyof typeof things) ?? false;
        it(`${role} ${isAllowed ? "may" : "may not"} ${act} (${relation})`, () => {
          expect(may(person(role), act, clientId)).toBe(isAllowed);
        });
      }
    }
  }

  it("gives a contact without a client nothing, not even the studio's own things", () => {
    expect(may({ role: "client", clientId: null }, "carton.read", null)).toBe(false);
    expect(may({ role: "client", clientId: null }, "carton.read")).toBe(false);
  });

  it("shows links where there is something to reach", () => {
    expect(may(person("client"), "carton.read")).toBe(true);
    expect(may(person("client"), "carton.write")).toBe(false);
    expect(may(person("finisher"), "people.manage")).toBe(false);
  });
});
