import { z } from "zod";
import { longestPassword, newPassword } from "./fields";

export const changePasswordSchema = z
  .object({
    currentPassword: z.string({ error: "Type the password you use now." }).min(1, "Type the password you use now.").max(longestPassword),
    newPassword,
  })
  .refine((form) => form.currentPassword !== form.newPassword, {
    path: ["newPassword"],
    message: "Type a password other than the one you use now.",
  });
