import { z } from "zod";
import { line, lines } from "./fields";

export const clientSchema = z.object({ name: line("the client's name", 120), note: lines(4000) });
export type ClientForm = z.output<typeof clientSchema>;
