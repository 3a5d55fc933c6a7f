import { describe, expect, it } from "vitest";
import { z } from "zod";
import { changePasswordSchema } from "./account";
import { firstRunSchema, signInSchema } from "./auth";
import { cartonDetailsSchema, jsonText } from "./carton";
import { clientSchema } from "./client";
import { parseForm } from "./parse-form";

function form(entries: Record<string, string | string[]>): FormData {
  const made = new FormData();
  for (const [name, value] of Object.entries(entries)) for (const one of [value].flat()) made.append(name, one);
  return made;
}

describe("parseForm", () => {
  it("gives the parsed value", () => {
    expect(parseForm(form({ email: " Orla@HarrowLane.example ", password: "x" }), signInSchema)).toEqual({
      ok: true,
      value: { email: "orla@harrowlane.example", password: "x" },
    });
  });

  it("gives sentences by field and what was typed, without the passwords", () => {
    const parsed = parseForm(form({ name: "  ", email: "nia", password: "short", passwordAgain: "short" }), firstRunSchema);
    expect(parsed).toEqual({
      ok: false,
      errors: {
        name: ["Type your name."],
        email: ["Type an e-mail, such as orla@harrowlane.example."],
        password: ["Type at least 12 characters: three or four words are easy to remember."],
      },
      values: { name: "  ", email: "nia" },
    });
  });

  it("asks for what is missing in words, not in types", () => {
    const parsed = parseForm(new FormData(), firstRunSchema);
    expect(parsed.ok).toBe(false);
    for (const sentences of Object.values(parsed.ok ? {} : parsed.errors)) for (const sentence of sentences) expect(sentence).toMatch(/^Type /);
  });

  it("takes a field sent twice as a list, and a file as nothing", () => {
    const schema = z.object({ layer: z.array(z.string()), file: z.undefined().optional() });
    const sent = form({ layer: ["cut", "crease"] });
    sent.append("file", new Blob(["x"]), "x.txt");
    expect(parseForm(sent, schema)).toEqual({ ok: true, value: { layer: ["cut", "crease"] } });
  });
});

describe("form schemas", () => {
  it("refuses a new password that is the old one, beside the field", () => {
    const parsed = parseForm(form({ currentPassword: "fold-and-crease-1", newPassword: "fold-and-crease-1" }), changePasswordSchema);
    expect(parsed.ok === false && parsed.errors).toEqual({ newPassword: ["Type a password other than the one you use now."] });
  });

  it("keeps the lines of a note and closes up a name", () => {
    const parsed = parseForm(form({ name: "  Ninefold \t Tea ", note: "one\r\ntwo\r\n" }), clientSchema);
    expect(parsed).toEqual({ ok: true, value: { name: "Ninefold Tea", note: "one\ntwo" } });
  });

  it("reads an empty choice of client as the studio, and refuses what is no id", () => {
    const read = (clientId: string) => parseForm(form({ name: "Mailer", clientId, note: "" }), cartonDetailsSchema);
    expect(read("")).toMatchObject({ ok: true, value: { clientId: null } });
    expect(read("0123456789abcdef")).toMatchObject({ ok: true, value: { clientId: "0123456789abcdef" } });
    expect(read("' OR 1=1 --")).toMatchObject({ ok: false });
  });

  it("names too long a text by its limit", () => {
    const parsed = parseForm(form({ name: "n".repeat(121), note: "x".repeat(4001) }), clientSchema);
    expect(parsed.ok === false && parsed.errors).toEqual({ name: ["Type at most 120 characters."], note: ["Type at most 4,000 characters."] });
  });

  it("refuses broken JSON with a sentence", () => {
    expect(jsonText.safeParse("{").error?.issues[0]?.message).toMatch(/Save once more/);
    expect(jsonText.parse('{"L":3}')).toEqual({ L: 3 });
  });
});
