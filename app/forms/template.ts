import { z } from "zod";
import { clientChoice, line, lines } from "./fields";

/** `clientId` null: offered for every client of the studio. */
export const templateDetailsSchema = z.object({
  name: line("a name for the template", 120),
  note: lines(4000),
  clientId: clientChoice,
});
export type TemplateDetails = z.output<typeof templateDetailsSchema>;
