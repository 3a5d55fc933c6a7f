// Pieces that several forms share. Each sentence says what to type.
import { z } from "zod";

/** One line of text, trimmed; `what` begins the sentence, e.g. "a name for the carton". */
export function line(what: string, longest: number) {
  return z
    .string({ error: `Type ${what}.` })
    .transform((text) => text.replace(/\s+/g, " ").trim())
    .pipe(z.string().min(1, `Type ${what}.`).max(longest, `Type at most ${longest} characters.`));
}

/** Several lines that may be empty. Line ends as browsers send them become single ones. */
export function lines(longest: number) {
  return z
    .string()
    .default("")
    .transform((text) => text.replace(/\r\n?/g, "\n").trim())
    .pipe(z.string().max(longest, `Type at most ${longest.toLocaleString("en-GB")} characters.`));
}

export const email = z
  .string({ error: "Type your e-mail, such as orla@harrowlane.example." })
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email("Type an e-mail, such as orla@harrowlane.example.").max(254, "Type at most 254 characters."));

export const shortestPassword = 12;
/** argon2 takes any length; a limit keeps a huge one from being work for the server. */
export const longestPassword = 128;

export const newPassword = z
  .string({ error: `Type a password of at least ${shortestPassword} characters.` })
  .min(shortestPassword, `Type at least ${shortestPassword} characters: three or four words are easy to remember.`)
  .max(longestPassword, `Type at most ${longestPassword} characters.`);

export const publicId = z.string().regex(/^[0-9a-z]{16}$/, "Choose one from the list.");

/** A client from a list whose first choice, the studio itself, is empty. */
export const clientChoice = z
  .union([z.literal(""), publicId])
  .optional()
  .transform((id) => id || null);
