export const roles = ["owner", "designer", "finisher", "client"] as const;
export type Role = (typeof roles)[number];

/** The person who is signed in, as queries and pages see them. */
export interface Viewer {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  /** Set for the role `client`, and only for it. */
  readonly clientId: string | null;
  readonly clientName: string | null;
}
