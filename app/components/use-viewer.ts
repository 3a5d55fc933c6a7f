import { useRouteLoaderData } from "react-router";
import type { Viewer } from "~/auth/viewer";

/** Who is signed in, as the root's loader found out; null for nobody. */
export function useViewer(): Viewer | null {
  return useRouteLoaderData<{ viewer: Viewer | null }>("root")?.viewer ?? null;
}
