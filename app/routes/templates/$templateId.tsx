import { useEffect, useState } from "react";
import { data, Form, redirect, useNavigation, useSubmit } from "react-router";
import { may } from "~/auth/permissions";
import { requireViewer } from "~/auth/require.server";
import { FoldedPicture } from "~/bench/folded-picture";
import { NoLongerFits } from "~/bench/no-longer-fits";
import { SizesLine } from "~/bench/sizes-line";
import { FlatPicture } from "~/bench/stage/flat-picture";
import { builderFor, openFor } from "~/bench/use-session";
import { When } from "~/bench/when";
import { BOARDS } from "~/cartons/boards/catalogue";
import { briefSchema } from "~/cartons/brief";
import { Button, ButtonLink } from "~/components/button";
import { classNames } from "~/components/class-names";
import { ErrorSentence, SelectField, TextArea, TextField } from "~/components/field";
import { Page, PageHeader } from "~/components/page";
import { usePreferences } from "~/components/preferences";
import { useToast } from "~/components/toast";
import { KnownError, problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { listClientChoices } from "~/db/queries/clients.server";
import { deleteTemplate, findTemplate, updateTemplate } from "~/db/queries/templates.server";
import { parseForm } from "~/forms/parse-form";
import { templateDetailsSchema } from "~/forms/template";
import type { Route } from "./+types/$templateId";

export const meta: Route.MetaFunction = ({ loaderData }) => [{ title: loaderData ? `${loaderData.template.name}: Cartonwright` : "Cartonwright" }];

export async function loader({ params, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const record = await findTemplate(db, viewer, params.templateId);
  if (record === null) throw new KnownError("not-found");
  const canEdit = may(viewer, "template.write", record.clientId);
  return { template: { ...record, brief: briefSchema.parse(record.brief) }, canEdit, canStart: may(viewer, "carton.write"), clients: canEdit ? await listClientChoices(db, viewer) : [] };
}

export async function action({ params, request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  const form = await request.formData();
  if (form.get("intent") === "delete") {
    await deleteTemplate(db, viewer, params.templateId);
    return redirect("/templates");
  }
  const parsed = parseForm(form, templateDetailsSchema);
  if (!parsed.ok) return data({ errors: parsed.errors, values: parsed.values }, 400);
  await updateTemplate(db, viewer, params.templateId, parsed.value);
  return data({ savedName: parsed.value.name });
}

export default function Template({ loaderData, actionData }: Route.ComponentProps) {
  const { template, canEdit, canStart, clients } = loaderData;
  const { units } = usePreferences();
  const { state } = useNavigation();
  const submit = useSubmit();
  const toast = useToast();
  const [opened] = useState(() => openFor(template.brief, BOARDS));
  const result = builderFor(BOARDS)(template.brief);
  const refusals = opened?.refusals ?? (result.ok ? [] : result.refusals);
  const errors = actionData && "errors" in actionData ? (actionData.errors as Readonly<Record<string, readonly string[]>>) : {};
  const problem = problemOf(actionData);
  useEffect(() => {
    if (actionData && "savedName" in actionData) toast({ sentence: `“${String(actionData.savedName)}” is saved.` });
  }, [actionData, toast]);

  const putAway = async () => {
    await submit({ intent: "delete" }, { method: "post" });
    toast({
      sentence: `“${template.name}” is deleted. It can be brought back for 30 days.`,
      undo: () => void submit({ intent: "restore", id: template.id }, { method: "post", action: "/templates", navigate: false, fetcherKey: `restore-${template.id}` }),
    });
  };
  return (
    <Page>
      <PageHeader title={template.name} aside={`for ${template.clientName ?? "every client"}`}>
        {canStart && <ButtonLink to={`/cartons/new?template=${template.id}`} look="main">Start a carton</ButtonLink>}
      </PageHeader>
      <NoLongerFits template={template} refusals={refusals} />
      <div className="grid gap-x-14 gap-y-8 pt-6 lg:grid-cols-[minmax(0,1fr)_380px]">
        {opened && (
          <section aria-label="What it makes">
            <div className={classNames("flex flex-wrap items-center gap-8", refusals.length > 0 && "opacity-60")}>
              <FlatPicture carton={opened.carton} width={400} height={300} title={`${opened.carton.construction.name}, flat`} className="h-auto max-w-full" />
              <FoldedPicture carton={opened.carton} width={240} height={220} title={`${opened.carton.construction.name}, closed`} className="h-auto max-w-full" />
            </div>
            <p className="pt-4">{opened.carton.construction.name}, {opened.carton.board.name}</p>
            <SizesLine carton={opened.carton} units={units} className="pt-3" />
          </section>
        )}
        <section>
          <h2 className="border-b-2 border-ink pb-2 text-h2 font-black">About it</h2>
          {canEdit ? (
            <Form method="post" className="flex flex-col gap-4 pt-4">
              <TextField label="Name" name="name" defaultValue={template.name} error={errors.name} />
              <TextArea label="Note" name="note" defaultValue={template.note} error={errors.note} hint="what it is good for" />
              <SelectField label="For" name="clientId" defaultValue={template.clientId ?? ""} error={errors.clientId} choices={[{ value: "", label: "every client of the studio" }, ...clients.map((c) => ({ value: c.id, label: `${c.name} only` }))]} />
              {problem && <ErrorSentence>{problem.sentence}</ErrorSentence>}
              <div className="flex items-center gap-4">
                <Button type="submit" busy={state !== "idle"}>Save name and note</Button>
                <Button look="plain" onClick={() => void putAway()}>Delete the template</Button>
              </div>
            </Form>
          ) : (
            <p className="pt-3 text-ink-2">{template.note || "No note."}</p>
          )}
          <p className="pt-4 text-small text-ink-2">Made by {template.createdBy}, <When at={template.createdAt} /></p>
        </section>
      </div>
    </Page>
  );
}
