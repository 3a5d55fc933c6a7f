// What the page of a carton and its server say to each other about saving. Types only.
import type { Brief } from "~/cartons/types";
import type { Problem } from "~/copy/errors";

/** A carton as it was last saved. */
export interface SavedCarton {
  readonly brief: Brief;
  readonly rowVersion: number;
  readonly name: string;
  readonly note: string;
  readonly clientId: string | null;
  readonly clientName: string | null;
  readonly updatedAt: string;
  readonly updatedBy: string;
}

/** What the actions of a carton's page answer. */
export type SaveAnswer =
  | { readonly saved: SavedCarton }
  | { readonly conflict: SavedCarton }
  | { readonly refused: readonly string[] }
  | { readonly errors: Readonly<Record<string, readonly string[]>>; readonly values: Readonly<Record<string, string>> }
  | { readonly template: { readonly id: string; readonly name: string } }
  | { readonly copied: { readonly id: string } }
  | { readonly deleted: string }
  | { readonly problem: Problem }
  | { readonly offline: true };
