import type { z } from "zod";

export type FieldErrors = Readonly<Record<string, readonly string[]>>;

export type ParsedForm<Value> =
  | { readonly ok: true; readonly value: Value }
  | {
      readonly ok: false;
      /** Sentences by field; those of the form as a whole are under "". */
      readonly errors: FieldErrors;
      /** What was typed, to be shown again. Never passwords. */
      readonly values: Readonly<Record<string, string>>;
    };

/** Reads a form by its schema. A field named twice or more comes as a list; a file as nothing. */
export function parseForm<Schema extends z.ZodType>(form: FormData, schema: Schema): ParsedForm<z.output<Schema>> {
  const input: Record<string, string | string[]> = {};
  for (const name of new Set(form.keys())) {
    const all = form.getAll(name).filter((entry): entry is string => typeof entry === "string");
    const [only] = all;
    if (only !== undefined) input[name] = all.length > 1 ? all : only;
  }
  const parsed = schema.safeParse(input);
  if (parsed.success) return { ok: true, value: parsed.data };
  return { ok: false, errors: toFieldErrors(parsed.error), values: typedValues(form) };
}

/** What was typed, for showing the form again when something other than its schema refuses it. */
export function typedValues(form: FormData): Record<string, string> {
  const entries = [...form].filter((entry): entry is [string, string] => typeof entry[1] === "string");
  return Object.fromEntries(entries.filter(([name]) => !/password/i.test(name)));
}

export function toFieldErrors(error: z.ZodError): FieldErrors {
  const errors: Record<string, string[]> = {};
  for (const issue of error.issues) {
    const field = issue.path.map(String).join(".");
    const list = (errors[field] ??= []);
    if (!list.includes(issue.message)) list.push(issue.message);
  }
  return errors;
}
