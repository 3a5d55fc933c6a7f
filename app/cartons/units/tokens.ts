// Cuts typed arithmetic into tokens. Two dialects: what a person types (comma is a decimal sign, units) and rules of thumb
// in constructions (comma separates arguments, names are variables).

export type Token =
  | { readonly kind: "number"; readonly value: number; readonly at: number; readonly text: string; readonly whole: boolean }
  | { readonly kind: "word"; readonly text: string; readonly at: number }
  | { readonly kind: "sign"; readonly text: "+" | "-" | "*" | "/" | "(" | ")" | "," | "<" | ">"; readonly at: number };

export interface TokenError { readonly at: number; readonly text: string }

const SIGNS: Readonly<Record<string, "+" | "-" | "*" | "/" | "(" | ")" | "," | "<" | ">">> = {
  "+": "+", "-": "-", "−": "-", "–": "-", "*": "*", "×": "*", "·": "*", "/": "/", "÷": "/", "(": "(", ")": ")", ",": ",", "<": "<", ">": ">",
};

const NUMBER_TYPED = /^(\d+(?:[.,]\d*)?|[.,]\d+)/;
const NUMBER_RULE = /^(\d+(?:\.\d*)?|\.\d+)/;
const WORD = /^(?:"|″|”|'{2}|[\p{L}_][\p{L}\p{N}_]*)/u;

/** Tokens of `text`, or where it stops making sense. */
export function tokensOf(text: string, dialect: "typed" | "rule"): { readonly ok: true; readonly tokens: readonly Token[] } | { readonly ok: false; readonly error: TokenError } {
  const tokens: Token[] = [];
  const number = dialect === "typed" ? NUMBER_TYPED : NUMBER_RULE;
  let at = 0;
  while (at < text.length) {
    const rest = text.slice(at);
    const space = /^\s+/.exec(rest);
    if (space) {
      at += space[0].length;
      continue;
    }
    const digits = number.exec(rest);
    if (digits) {
      const written = digits[0];
      tokens.push({ kind: "number", value: Number(written.replace(",", ".")), at, text: written, whole: /^\d+$/.test(written) });
      at += written.length;
      continue;
    }
    const word = WORD.exec(rest);
    if (word) {
      tokens.push({ kind: "word", text: word[0], at });
      at += word[0].length;
      continue;
    }
    const sign = SIGNS[rest[0]!];
    if (!sign || (dialect === "typed" && (sign === "," || sign === "<" || sign === ">"))) return { ok: false, error: { at, text: rest[0]! } };
    tokens.push({ kind: "sign", text: sign, at });
    at++;
  }
  return { ok: true, tokens };
}
