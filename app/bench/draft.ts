// What is on the Bench and not yet saved, kept in this browser: a lost connection, a crash or an ended sign-in loses nothing.
import type { Brief } from "~/cartons/types";
import { isBrief } from "./use-cartons";

export interface Draft {
  readonly brief: Brief;
  /** Version that it started from. */
  readonly rowVersion: number;
  /** When it was typed, ISO. */
  readonly at: string;
}

const keyOf = (cartonId: string) => `bench:${cartonId}`;

export function readDraft(cartonId: string): Draft | null {
  try {
    const parsed: unknown = JSON.parse(localStorage.getItem(keyOf(cartonId)) ?? "null");
    if (typeof parsed !== "object" || parsed === null || !("brief" in parsed) || !("rowVersion" in parsed) || !("at" in parsed)) return null;
    const { brief, rowVersion, at } = parsed;
    return isBrief(brief) && typeof rowVersion === "number" && typeof at === "string" ? { brief, rowVersion, at } : null;
  } catch {
    // Storage that is switched off or holds something foreign has no draft for us.
    return null;
  }
}

/** False where the browser keeps nothing. */
export function writeDraft(cartonId: string, draft: Draft): boolean {
  try {
    localStorage.setItem(keyOf(cartonId), JSON.stringify(draft));
    return true;
  } catch {
    return false;
  }
}

export function dropDraft(cartonId: string): void {
  try {
    localStorage.removeItem(keyOf(cartonId));
  } catch {
    // Nothing was kept, so there is nothing to drop.
  }
}
