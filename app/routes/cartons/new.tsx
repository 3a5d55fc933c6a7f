import { useState } from "react";
import { data, redirect } from "react-router";
import { requireViewer, requireReach } from "~/auth/require.server";
import { NewCartonForm } from "~/bench/new-carton-form";
import { NoLongerFits } from "~/bench/no-longer-fits";
import { OFFLINE } from "~/bench/saving";
import { startBrief } from "~/bench/start-brief";
import { builderFor, openFor } from "~/bench/use-session";
import { BOARDS } from "~/cartons/boards/catalogue";
import { briefSchema } from "~/cartons/brief";
import { listConstructions } from "~/cartons/constructions/registry";
import { KnownError, problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { createCarton } from "~/db/queries/cartons.server";
import { listClientChoices } from "~/db/queries/clients.server";
import { findTemplate } from "~/db/queries/templates.server";
import { cartonDetailsSchema } from "~/forms/carton";
import { parseForm, typedValues } from "~/forms/parse-form";
import { checkBrief } from "~/services/brief-to-store.server";
import type { Route } from "./+types/new";

export const meta: Route.MetaFunction = () => [{ title: "New carton: Cartonwright" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "carton.write");
  const search = new URL(request.url).searchParams;
  const templateId = search.get("template");
  const template = templateId ? await findTemplate(db, viewer, templateId) : null;
  if (templateId && !template) throw new KnownError("not-found");
  return {
    clients: await listClientChoices(db, viewer),
    template: template && { id: template.id, name: template.name, note: template.note, clientId: template.clientId, brief: briefSchema.parse(template.brief) },
    brief: template ? briefSchema.parse(template.brief) : startBrief(search, listConstructions()),
  };
}

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "carton.write");
  const form = await request.formData();
  const parsed = parseForm(form, cartonDetailsSchema);
  const checked = checkBrief(form.get("brief"));
  if (!parsed.ok || !checked.ok) {
    return data({ errors: parsed.ok ? {} : parsed.errors, values: typedValues(form), refused: checked.ok ? [] : checked.sentences }, 400);
  }
  const id = await createCarton(db, viewer, { ...checked.toStore, ...parsed.value });
  return redirect(`/cartons/${id}`);
}

export async function clientAction({ serverAction }: Route.ClientActionArgs) {
  try {
    return await serverAction();
  } catch (error) {
    if (!(error instanceof Error)) throw error;
    return { errors: {}, values: {}, refused: [OFFLINE] };
  }
}

export default function NewCarton({ loaderData, actionData }: Route.ComponentProps) {
  const { brief, clients, template } = loaderData;
  return <Opened key={JSON.stringify(brief)} brief={brief} clients={clients} template={template} actionData={actionData} />;
}

function Opened({ brief, clients, template, actionData }: Pick<Route.ComponentProps["loaderData"], "brief" | "clients" | "template"> & { actionData: Route.ComponentProps["actionData"] }) {
  const constructions = listConstructions();
  const [{ opened, refusals }] = useState(() => {
    const own = openFor(brief, BOARDS);
    if (own) return { opened: own, refusals: own.refusals };
    // Nothing of it can be drawn, as when its construction is gone: the first construction in its size is a start.
    const other = startBrief(new URLSearchParams({ L: String(brief.size.L), W: String(brief.size.W), D: String(brief.size.D), basis: brief.basis }), constructions);
    const result = builderFor(BOARDS)(brief);
    return { opened: openFor(other, BOARDS) ?? openFor(startBrief(new URLSearchParams(), constructions), BOARDS), refusals: result.ok ? [] : result.refusals };
  });
  if (!opened) throw new Error("the sample of the first construction is refused");
  const answer = actionData as { errors?: Record<string, string[]>; values?: Record<string, string>; refused?: string[] } | undefined;
  return (
    <NewCartonForm
      opened={opened}
      boards={BOARDS}
      constructions={constructions}
      clients={clients}
      values={answer?.values ?? { name: template?.name ?? "", clientId: template?.clientId ?? "" }}
      errors={answer?.errors}
      problem={problemOf(actionData)?.sentence ?? (answer?.refused?.join(" ") || null)}
      title={template ? `New carton from “${template.name}”` : "New carton"}
      above={template && <NoLongerFits template={template} refusals={refusals} />}
    />
  );
}
