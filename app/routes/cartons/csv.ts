import { requireViewer } from "~/auth/require.server";
import { isBrief } from "~/bench/use-cartons";
import { csvResponse, readListAddress } from "~/components/list-address";
import { db } from "~/db/client.server";
import { cartonSorts, listCartons } from "~/db/queries/cartons.server";
import type { Route } from "./+types/csv";

/** More rows than a studio has cartons; a table without an end would be a way to wear the database out. */
const MOST = 5000;

/** The list of cartons as it is searched and sorted, all pages of it. Sizes in mm. */
export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const search = new URL(request.url).searchParams;
  const { q, sort, direction } = readListAddress(search);
  const { rows } = await listCartons(db, viewer, {
    q, page: 1, pageSize: MOST, direction,
    sort: cartonSorts.find((s) => s === sort),
    clientId: search.get("client") || undefined,
    construction: search.get("construction") || undefined,
  });
  return csvResponse("cartons.csv", [
    ["name", "client", "construction", "L mm", "W mm", "D mm", "sizes are", "board", "saved (UTC)", "saved by"],
    ...rows.map((row) => {
      const brief = isBrief(row.brief) ? row.brief : null;
      return [row.name, row.clientName ?? "", row.construction, brief?.size.L ?? "", brief?.size.W ?? "", brief?.size.D ?? "", brief?.basis ?? "", row.board, row.updatedAt.toISOString(), row.updatedBy];
    }),
  ]);
}
