import { useState } from "react";
import { requireViewer } from "~/auth/require.server";
import { may } from "~/auth/permissions";
import { Bench } from "~/bench/bench";
import { CartonStrip } from "~/bench/carton-strip";
import { CannotDraw } from "~/bench/cannot-draw";
import type { SaveAnswer } from "~/forms/save-answer";
import { OFFLINE_ANSWER } from "~/bench/saving";
import { openFor } from "~/bench/use-session";
import { BOARDS } from "~/cartons/boards/catalogue";
import { listConstructions } from "~/cartons/constructions/registry";
import { db } from "~/db/client.server";
import { listClientChoices } from "~/db/queries/clients.server";
import { answerCartonForm, loadCarton } from "~/services/carton-page.server";
import type { Route } from "./+types/$cartonId";

export const meta: Route.MetaFunction = ({ loaderData }) => [{ title: loaderData ? `${loaderData.saved.name}: Cartonwright` : "Cartonwright" }];

export async function loader({ params, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const saved = await loadCarton(db, viewer, params.cartonId);
  const canEdit = may(viewer, "carton.write", saved.clientId);
  return { saved, canEdit, clients: canEdit ? await listClientChoices(db, viewer) : [] };
}

export async function action({ params, request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  return answerCartonForm(db, viewer, params.cartonId, await request.formData());
}

/** A lost connection is an answer like any other: the Bench stays as it is. */
export async function clientAction({ serverAction }: Route.ClientActionArgs): Promise<SaveAnswer> {
  try {
    return (await serverAction()) as SaveAnswer;
  } catch (error) {
    // A redirect, or an answer that the server meant.
    if (!(error instanceof Error)) throw error;
    return OFFLINE_ANSWER;
  }
}

/** The Bench holds what it works on: an answer to a form must not load it anew under the hand. */
export const shouldRevalidate = ({ currentParams, nextParams }: { currentParams: { cartonId?: string }; nextParams: { cartonId?: string } }) => currentParams.cartonId !== nextParams.cartonId;

export default function CartonOnTheBench({ loaderData, params }: Route.ComponentProps) {
  return <OneCarton key={params.cartonId} cartonId={params.cartonId} {...loaderData} />;
}

function OneCarton({ cartonId, saved, canEdit, clients }: Route.ComponentProps["loaderData"] & { cartonId: string }) {
  const [opened] = useState(() => openFor(saved.brief, BOARDS));
  if (!opened) return <CannotDraw name={saved.name} brief={saved.brief} />;
  return (
    <Bench
      opened={opened}
      boards={BOARDS}
      constructions={listConstructions()}
      name={saved.name}
      canEdit={canEdit}
      strip={({ side, openHelp }) => <CartonStrip cartonId={cartonId} loaded={saved} clients={clients} side={side} openHelp={openHelp} />}
    />
  );
}
