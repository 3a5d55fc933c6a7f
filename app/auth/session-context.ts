import { createContext } from "react-router";
import type { Viewer } from "./viewer";

export interface SignedIn {
  readonly viewer: Viewer;
  /** SHA-256 of the cookie's id: what the sessions table knows this sign-in by. */
  readonly idHash: string;
}

/** Set by the root's middleware for every request; null when nobody is signed in. */
export const sessionContext = createContext<SignedIn | null>(null);
