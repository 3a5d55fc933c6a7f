import { z } from "zod";
import { roles } from "~/auth/viewer";
import { clientChoice, email, line, newPassword } from "./fields";

export const personSchema = z
  .object({ name: line("a name", 120), email, role: z.enum(roles, { error: "Choose a role." }), clientId: clientChoice, password: newPassword })
  .refine((form) => form.role !== "client" || form.clientId !== null, { path: ["clientId"], message: "Choose whose contact this is." })
  .refine((form) => form.role === "client" || form.clientId === null, { path: ["clientId"], message: "Only the role client belongs to a client. Choose none." });
