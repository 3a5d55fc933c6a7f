import { z } from "zod";
import { email, line, longestPassword, newPassword } from "./fields";

export const signInSchema = z.object({
  email,
  password: z.string({ error: "Type your password." }).min(1, "Type your password.").max(longestPassword, `Type at most ${longestPassword} characters.`),
});

export const firstRunSchema = z.object({
  name: line("your name", 120),
  email,
  password: newPassword,
});
