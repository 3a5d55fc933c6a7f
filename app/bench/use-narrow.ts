import { useSyncExternalStore } from "react";

/** wide: Ledger beside the stage. drawer: it comes from the right. phone: everything stacked. */
export type Width = "wide" | "drawer" | "phone";

const WIDE = "(min-width: 1180px)";
const PHONE = "(max-width: 767.98px)";

function subscribe(listener: () => void): () => void {
  const queries = [WIDE, PHONE].map((query) => window.matchMedia(query));
  for (const query of queries) query.addEventListener("change", listener);
  return () => {
    for (const query of queries) query.removeEventListener("change", listener);
  };
}

const read = (): Width => (window.matchMedia(WIDE).matches ? "wide" : window.matchMedia(PHONE).matches ? "phone" : "drawer");

/** The server does not know the window: it lays out for a desk, and the page is put right before it is seen to move. */
export const useNarrow = (): Width => useSyncExternalStore(subscribe, read, () => "wide");
