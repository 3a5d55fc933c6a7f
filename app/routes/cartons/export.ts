import { requireViewer } from "~/auth/require.server";
import { briefSchema } from "~/cartons/brief";
import { KnownError } from "~/copy/errors";
import { db } from "~/db/client.server";
import { findCarton } from "~/db/queries/cartons.server";
import { askedCarton, readBrief } from "~/services/asked-carton.server";
import { exportFile, fileResponse, NO_SUCH_FILE, readView, refusedFile } from "~/services/export-file.server";
import type { Route } from "./+types/export";

/** Files of a saved carton; `?brief=` gives those of what stands on the Bench unsaved, and the file says so. */
export async function loader({ request, params, context, url }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const saved = await findCarton(db, viewer, params.cartonId);
  if (!saved) throw new KnownError("not-found");
  const view = readView(params.format, url.searchParams);
  if (!view) return refusedFile(404, [NO_SUCH_FILE]);
  const unsaved = url.searchParams.get("brief");
  const brief = unsaved === null ? { ok: true as const, value: briefSchema.parse(saved.brief) } : readBrief(unsaved);
  if (!brief.ok) return refusedFile(brief.status, brief.sentences);
  const carton = askedCarton(brief.value);
  if (!carton.ok) return refusedFile(carton.status, carton.sentences);
  const isDraft = unsaved !== null && JSON.stringify(brief.value) !== JSON.stringify(briefSchema.parse(saved.brief));
  const file = await exportFile(carton.value, {
    ...view, title: saved.name, client: saved.clientName ?? "", revision: isDraft ? `${saved.rowVersion} and unsaved changes` : String(saved.rowVersion),
    date: (isDraft ? new Date() : saved.updatedAt).toISOString().slice(0, 10), drawnBy: saved.updatedBy,
  });
  return fileResponse(request, file);
}
