import { askedCarton, readBrief } from "~/services/asked-carton.server";
import { exportFile, fileResponse, NO_SUCH_FILE, readView, refusedFile } from "~/services/export-file.server";
import type { Route } from "./+types/try-export";

/** Files of the Bench that needs no sign-in: everything that is drawn is in the address, and nothing is kept. */
export async function loader({ request, params, url }: Route.LoaderArgs) {
  const view = readView(params.format, url.searchParams);
  if (!view) return refusedFile(404, [NO_SUCH_FILE]);
  const brief = readBrief(url.searchParams.get("brief") ?? "");
  if (!brief.ok) return refusedFile(brief.status, brief.sentences);
  const carton = askedCarton(brief.value);
  if (!carton.ok) return refusedFile(carton.status, carton.sentences);
  const title = (url.searchParams.get("title") ?? "").slice(0, 120).trim() || carton.value.construction.name;
  const file = await exportFile(carton.value, {
    ...view, title, client: "", revision: "draft", date: new Date().toISOString().slice(0, 10), drawnBy: "",
  });
  return fileResponse(request, file);
}
