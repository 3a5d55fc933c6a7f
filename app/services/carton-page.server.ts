// What the page of one carton asks of the database, and the answers that its forms get.
import { data, redirect } from "react-router";
import type { Viewer } from "~/auth/viewer";
import { briefSchema } from "~/cartons/brief";
import { KnownError } from "~/copy/errors";
import type { Database } from "~/db/client.server";
import { type CartonRecord, createCarton, deleteCarton, findCarton, updateCarton } from "~/db/queries/cartons.server";
import { createTemplate } from "~/db/queries/templates.server";
import { cartonDetailsSchema, rowVersion } from "~/forms/carton";
import { parseForm, typedValues } from "~/forms/parse-form";
import { templateDetailsSchema } from "~/forms/template";
import type { SaveAnswer, SavedCarton } from "~/forms/save-answer";
import { checkBrief, constructionVersion } from "./brief-to-store.server";

/** As the Bench gets it. Throws `unknown` for a stored brief that is none: that is a defect, not something a person typed. */
export function savedFrom(record: CartonRecord): SavedCarton {
  return {
    brief: briefSchema.parse(record.brief),
    rowVersion: record.rowVersion,
    name: record.name,
    note: record.note,
    clientId: record.clientId,
    clientName: record.clientName,
    updatedAt: record.updatedAt.toISOString(),
    updatedBy: record.updatedBy,
  };
}

export async function loadCarton(db: Database, viewer: Viewer, id: string): Promise<SavedCarton> {
  const record = await findCarton(db, viewer, id);
  if (record === null) throw new KnownError("not-found");
  return savedFrom(record);
}

type Answer = ReturnType<typeof data<SaveAnswer>> | Response;

export async function answerCartonForm(db: Database, viewer: Viewer, id: string, form: FormData): Promise<Answer> {
  switch (form.get("intent")) {
    case "save": return saveBrief(db, viewer, id, form);
    case "details": return saveDetails(db, viewer, id, form);
    case "copy": return saveCopy(db, viewer, id, form);
    case "template": return saveTemplate(db, viewer, form);
    case "delete":
      await deleteCarton(db, viewer, id);
      return data<SaveAnswer>({ deleted: id });
    default:
      return data<SaveAnswer>({ refused: ["This page does not know what to do with that. Load it again."] }, 400);
  }
}

async function saveBrief(db: Database, viewer: Viewer, id: string, form: FormData): Promise<Answer> {
  const from = rowVersion.safeParse(form.get("rowVersion"));
  const checked = checkBrief(form.get("brief"));
  if (!from.success || !checked.ok) return data<SaveAnswer>({ refused: checked.ok ? ["Load the page again before you save."] : checked.sentences }, 422);
  return answerTo(await updateCarton(db, viewer, id, from.data, checked.toStore));
}

async function saveDetails(db: Database, viewer: Viewer, id: string, form: FormData): Promise<Answer> {
  const parsed = parseForm(form, cartonDetailsSchema);
  const from = rowVersion.safeParse(form.get("rowVersion"));
  if (!parsed.ok) return data<SaveAnswer>({ errors: parsed.errors, values: parsed.values }, 400);
  if (!from.success) return data<SaveAnswer>({ refused: ["Load the page again before you save."] }, 422);
  const { name, clientId, note } = parsed.value;
  const result = await updateCarton(db, viewer, id, from.data, { name, clientId, note });
  // Somebody saved in between: beside a name there is nothing to lose, so the sentence is enough.
  if ("conflict" in result) return data<SaveAnswer>({ refused: [`${result.conflict.updatedBy} saved this carton in the meantime. Load the page again, then change the name.`] }, 409);
  return answerTo(result);
}

function answerTo(result: { saved: CartonRecord } | { conflict: CartonRecord }): Answer {
  return "saved" in result ? data<SaveAnswer>({ saved: savedFrom(result.saved) }) : data<SaveAnswer>({ conflict: savedFrom(result.conflict) }, 409);
}

async function saveCopy(db: Database, viewer: Viewer, id: string, form: FormData): Promise<Answer> {
  const checked = checkBrief(form.get("brief"));
  if (!checked.ok) return data<SaveAnswer>({ refused: checked.sentences }, 422);
  const record = await findCarton(db, viewer, id);
  if (record === null) throw new KnownError("not-found");
  const name = String(form.get("name") ?? "").replace(/\s+/g, " ").trim().slice(0, 120) || record.name;
  const copy = await createCarton(db, viewer, { ...checked.toStore, name, clientId: record.clientId, note: record.note });
  return redirect(`/cartons/${copy}`);
}

async function saveTemplate(db: Database, viewer: Viewer, form: FormData): Promise<Answer> {
  const parsed = parseForm(form, templateDetailsSchema);
  if (!parsed.ok) return data<SaveAnswer>({ errors: parsed.errors, values: typedValues(form) }, 400);
  const checked = checkBrief(form.get("brief"));
  if (!checked.ok) return data<SaveAnswer>({ refused: checked.sentences }, 422);
  const { construction, board } = checked.toStore;
  const template = await createTemplate(db, viewer, { ...parsed.value, brief: checked.brief, construction, board, constructionVersion: constructionVersion(construction) });
  return data<SaveAnswer>({ template: { id: template, name: parsed.value.name } });
}
