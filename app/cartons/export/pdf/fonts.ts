// Typefaces for a document: bytes come in, a character falls through to the next file that has it. Nothing is drawn unseen.
import fontkit from "@pdf-lib/fontkit";
import type { PDFDocument, PDFFont, PDFPage } from "pdf-lib";
import { PDFName } from "pdf-lib";

/** One weight: TrueType files in the order in which a character is looked for. Packed web fonts (woff2) come out blank: unpack them first. */
export type FontFiles = readonly Uint8Array[];

export interface FontBytes {
  readonly regular: FontFiles;
  readonly bold: FontFiles;
  /** For the wordmark; bold stands in when left out. */
  readonly black?: FontFiles;
}

export interface Run {
  /** Resource name. */
  readonly font: string;
  /** The text as a PDF string of this font. */
  readonly encoded: string;
}

export interface Face {
  runs(text: string): Run[];
  /** mm at this size in mm. */
  width(text: string, size: number): number;
}

export interface Faces {
  readonly regular: Face;
  readonly bold: Face;
  readonly black: Face;
  /** Characters for which no file has a shape; a question mark stands in their place. */
  readonly missing: ReadonlySet<string>;
  attach(page: PDFPage): void;
}

interface Member {
  readonly key: string;
  readonly font: PDFFont;
  readonly has: ReadonlySet<number>;
}

/** One line of text: composed, without control characters. */
export const oneLine = (text: string): string => text.normalize("NFC").replace(/\s+/gu, " ").replace(/\p{Cc}/gu, "").trim();

/** Embeds what the texts need, as subsets. `texts` are those that people typed: the product's own words are all in the first file. */
export async function embedFaces(document: PDFDocument, bytes: FontBytes, texts: readonly string[]): Promise<Faces> {
  document.registerFontkit(fontkit);
  const wanted = new Set([...oneLine(texts.join(" "))].map((c) => c.codePointAt(0)!));
  const missing = new Set<string>();
  const members: Member[] = [];
  const weights = [["Regular", bytes.regular], ["Bold", bytes.bold], ["Black", bytes.black ?? bytes.bold]] as const;
  const faces: Face[] = [];
  for (const [name, files] of weights) {
    const own: Member[] = [];
    for (const [i, file] of files.entries()) {
      if (i > 0 && [...wanted].every((c) => own.some((m) => m.has.has(c)))) break;
      // The wordmark alone is set in black, and it is plain Latin.
      if (i > 0 && name === "Black") break;
      const font = await document.embedFont(file, { subset: true });
      own.push({ key: `Lato${name}${i === 0 ? "" : `Ext${i}`}`, font, has: new Set(font.getCharacterSet()) });
    }
    if (own.length === 0) throw new Error(`no font file for ${name}`);
    members.push(...own);
    faces.push(faceOf(own, missing));
  }
  return {
    regular: faces[0]!, bold: faces[1]!, black: faces[2]!, missing,
    attach(page) { for (const m of members) page.node.setFontDictionary(PDFName.of(m.key), m.font.ref); },
  };
}

function faceOf(members: readonly Member[], missing: Set<string>): Face {
  const split = (text: string): { member: Member; text: string }[] => {
    const parts: { member: Member; text: string }[] = [];
    for (const c of text) {
      const code = c.codePointAt(0)!;
      const has = members.find((m) => m.has.has(code));
      if (!has) missing.add(c);
      const member = has ?? members[0]!;
      const last = parts[parts.length - 1];
      if (last?.member === member) last.text += has ? c : "?";
      else parts.push({ member, text: has ? c : "?" });
    }
    return parts;
  };
  return {
    runs: (text) => split(text).map((p) => ({ font: p.member.key, encoded: p.member.font.encodeText(p.text).toString() })),
    width: (text, size) => split(text).reduce((sum, p) => sum + p.member.font.widthOfTextAtSize(p.text, size), 0),
  };
}
