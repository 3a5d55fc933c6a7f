import { z } from "zod";
import { clientChoice, line, lines } from "./fields";

/** What a person types about a carton, beside its brief. */
export const cartonDetailsSchema = z.object({
  name: line("a name for the carton", 120),
  clientId: clientChoice,
  note: lines(4000),
});
export type CartonDetails = z.output<typeof cartonDetailsSchema>;

/** The version a save started from: a whole number that the page was given. */
export const rowVersion = z.coerce.number("Load the page again before you save.").int().positive();

/** JSON in a hidden field, before its own schema looks at it. Briefs are a few kilobytes. */
export const jsonText = z
  .string({ error: "The drawing did not come along. Load the page again before you save." })
  .max(100_000, "The drawing is larger than this page takes.")
  .transform((text, context): unknown => {
    try {
      return JSON.parse(text);
    } catch {
      context.addIssue({ code: "custom", message: "The drawing did not come along whole. Save once more." });
      return z.NEVER;
    }
  });
