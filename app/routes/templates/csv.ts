import { requireViewer } from "~/auth/require.server";
import { isBrief } from "~/bench/use-cartons";
import { csvResponse, readListAddress } from "~/components/list-address";
import { db } from "~/db/client.server";
import { listTemplates, templateSorts } from "~/db/queries/templates.server";
import type { Route } from "./+types/csv";

const MOST = 5000;

/** The list of templates as it is searched and sorted, all pages of it. Sizes in mm. */
export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const { q, sort, direction } = readListAddress(new URL(request.url).searchParams);
  const { rows } = await listTemplates(db, viewer, { q, page: 1, pageSize: MOST, direction, sort: templateSorts.find((s) => s === sort) });
  return csvResponse("templates.csv", [
    ["name", "note", "for", "construction", "L mm", "W mm", "D mm", "sizes are", "board", "saved (UTC)"],
    ...rows.map((row) => {
      const brief = isBrief(row.brief) ? row.brief : null;
      return [row.name, row.note, row.clientName ?? "every client", row.construction, brief?.size.L ?? "", brief?.size.W ?? "", brief?.size.D ?? "", brief?.basis ?? "", row.board, row.updatedAt.toISOString()];
    }),
  ]);
}
