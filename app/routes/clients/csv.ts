import { requireReach, requireViewer } from "~/auth/require.server";
import { csvResponse } from "~/components/list-address";
import { db } from "~/db/client.server";
import { listClients } from "~/db/queries/clients.server";
import type { Route } from "./+types/csv";

/** All that the list shows, on one page. */
const ALL = 10_000;

export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "client.write");
  const q = new URL(request.url).searchParams.get("q") ?? undefined;
  const { rows } = await listClients(db, viewer, { q, page: 1, pageSize: ALL });
  return csvResponse("clients", [["client", "note", "cartons", "since"], ...rows.map((row) => [row.name, row.note, row.cartonCount, row.createdAt.toISOString()])]);
}
