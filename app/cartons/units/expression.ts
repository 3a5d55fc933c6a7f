// Arithmetic that a person types into a field: "4 3/4in", "120+2*1.5", "12,5 mm". Rules of thumb are in rule.ts.
import { millimetresPer, MM_PER_INCH, type LengthUnit } from "./length";
import { tokensOf, type Token } from "./tokens";

export interface ExpressionError {
  readonly code: "empty" | "unknown-unit" | "unknown-word" | "syntax" | "divide-by-zero" | "not-finite" | "not-a-length" | "not-whole" | "too-long";
  /** Place in the text, from 0, and what stands there. */
  readonly at: number;
  readonly word: string;
}
export type Parsed<Value> = ({ readonly ok: true } & Value) | { readonly ok: false; readonly error: ExpressionError };

/** Longer than any figure: what is longer was pasted by mistake. */
const LONGEST = 200;

/** A value and how many lengths are multiplied in it: 0 a plain number, 1 a length (mm), more is refused. */
interface Quantity { readonly value: number; readonly lengths: number; readonly isBare: boolean }

class Stop extends Error {
  constructor(readonly problem: ExpressionError) {
    super(problem.code);
  }
}

class Reader {
  private next = 0;
  constructor(private readonly tokens: readonly Token[], private readonly end: number, private readonly perUnit: number, private readonly suffixes: readonly string[]) {}

  peek = (): Token | undefined => this.tokens[this.next];
  private isSign = (text: string): boolean => {
    const t = this.peek();
    return t?.kind === "sign" && t.text === text;
  };
  fail(code: ExpressionError["code"], t = this.peek()): never {
    throw new Stop({ code, at: t?.at ?? this.end, word: t?.text ?? "" });
  }

  sum(): Quantity {
    let left = this.product();
    while (this.isSign("+") || this.isSign("-")) {
      const sign = this.tokens[this.next++]!.text === "+" ? 1 : -1;
      const at = this.peek();
      const right = this.product();
      // A bare number beside a length takes the field's unit.
      const [a, b] = [left, right].map((q) => (q.lengths === 0 && left.lengths + right.lengths > 0 && q.isBare ? { value: q.value * this.perUnit, lengths: 1 } : q)) as [Quantity, Quantity];
      if (a.lengths !== b.lengths) this.fail("not-a-length", at);
      left = { value: a.value + sign * b.value, lengths: a.lengths, isBare: left.isBare && right.isBare };
    }
    return left;
  }

  private product(): Quantity {
    let left = this.signed();
    while (this.isSign("*") || this.isSign("/")) {
      const divide = this.tokens[this.next++]!.text === "/";
      const at = this.peek();
      const right = this.signed();
      if (divide && right.value === 0) this.fail("divide-by-zero", at);
      const lengths = divide ? left.lengths - right.lengths : left.lengths + right.lengths;
      if (lengths > 1 || lengths < 0) this.fail("not-a-length", at);
      left = { value: divide ? left.value / right.value : left.value * right.value, lengths, isBare: left.isBare && right.isBare };
      left = this.withUnit(left);
    }
    return left;
  }

  private signed(): Quantity {
    if (this.isSign("-") || this.isSign("+")) {
      const negative = this.tokens[this.next++]!.text === "-";
      const q = this.signed();
      return negative ? { ...q, value: -q.value } : q;
    }
    return this.primary();
  }

  private primary(): Quantity {
    const t = this.peek();
    if (!t) this.fail("syntax");
    if (t.kind === "word") this.fail("unknown-word", t);
    if (t.kind === "sign") {
      if (t.text !== "(") this.fail("syntax", t);
      this.next++;
      const inner = this.sum();
      if (!this.isSign(")")) this.fail("syntax");
      this.next++;
      return this.withUnit(inner);
    }
    this.next++;
    // "1/2 in": what stands before a unit is one fraction, not one over two inches.
    const divisor = t.whole ? this.fractionBeforeUnit() : 0;
    if (divisor > 0) return this.withUnit({ value: t.value / divisor, lengths: 0, isBare: true });
    // "4 3/4": a whole number, a space and a fraction are one mixed number.
    return this.withUnit({ value: t.value + (t.whole ? this.fraction() : 0), lengths: 0, isBare: true });
  }

  /** The divisor of "/ 2 in" when just that follows; else 0. */
  private fractionBeforeUnit(): number {
    const [slash, d, unit] = [this.tokens[this.next], this.tokens[this.next + 1], this.tokens[this.next + 2]];
    if (!(slash?.kind === "sign" && slash.text === "/" && d?.kind === "number" && d.whole && unit?.kind === "word" && millimetresPer(unit.text) !== undefined)) return 0;
    if (d.value === 0) this.fail("divide-by-zero", d);
    this.next += 2;
    return d.value;
  }

  /** A fraction that follows a whole number at once, as in "4 3/4"; 0 when there is none. */
  private fraction(): number {
    const [n, slash, d] = [this.tokens[this.next], this.tokens[this.next + 1], this.tokens[this.next + 2]];
    const isFraction = n?.kind === "number" && n.whole && slash?.kind === "sign" && slash.text === "/" && d?.kind === "number" && d.whole;
    if (!isFraction) return 0;
    if (d.value === 0) this.fail("divide-by-zero", d);
    this.next += 3;
    return n.value / d.value;
  }

  /** A unit behind a plain figure or a bracket makes it a length. */
  private withUnit(q: Quantity): Quantity {
    const t = this.peek();
    if (t?.kind !== "word") return q;
    if (this.suffixes.includes(t.text.toLowerCase())) {
      this.next++;
      return q;
    }
    const per = millimetresPer(t.text);
    if (per === undefined || this.suffixes.length > 0) this.fail("unknown-unit", t);
    if (q.lengths !== 0) this.fail("not-a-length", t);
    this.next++;
    return { value: q.value * per, lengths: 1, isBare: false };
  }

  finish(): void {
    if (this.peek()) this.fail("syntax");
  }
}

function evaluate(text: string, perUnit: number, suffixes: readonly string[]): Parsed<{ readonly quantity: Quantity }> {
  if (text.trim() === "") return { ok: false, error: { code: "empty", at: 0, word: "" } };
  if (text.length > LONGEST) return { ok: false, error: { code: "too-long", at: LONGEST, word: "" } };
  const cut = tokensOf(text, "typed");
  if (!cut.ok) return { ok: false, error: { code: "syntax", at: cut.error.at, word: cut.error.text } };
  const reader = new Reader(cut.tokens, text.length, perUnit, suffixes);
  try {
    const quantity = reader.sum();
    reader.finish();
    if (!Number.isFinite(quantity.value)) return { ok: false, error: { code: "not-finite", at: 0, word: text.trim() } };
    return { ok: true, quantity };
  } catch (error) {
    if (error instanceof Stop) return { ok: false, error: error.problem };
    throw error;
  }
}

/** A length in mm from typed text; a bare number is in the field's unit. `parseLength("4 3/4in", { unit: "mm" })` gives 120.65. */
export function parseLength(text: string, field: { readonly unit: LengthUnit }): Parsed<{ readonly mm: number }> {
  const perUnit = field.unit === "mm" ? 1 : MM_PER_INCH;
  const result = evaluate(text, perUnit, []);
  if (!result.ok) return result;
  const { value, lengths } = result.quantity;
  const mm = lengths === 1 ? value : value * perUnit;
  return Number.isFinite(mm) ? { ok: true, mm: mm === 0 ? 0 : mm } : { ok: false, error: { code: "not-finite", at: 0, word: text.trim() } };
}

function plain(text: string, suffixes: readonly string[]): Parsed<{ readonly value: number }> {
  const result = evaluate(text, 1, suffixes.length > 0 ? suffixes : ["\0"]);
  return result.ok ? { ok: true, value: result.quantity.value === 0 ? 0 : result.quantity.value } : result;
}

/** A plain number; no unit is taken. */
export const parseNumber = (text: string): Parsed<{ readonly value: number }> => plain(text, []);

/** Degrees, with or without "deg" or "°" behind the figure. */
export const parseAngle = (text: string): Parsed<{ readonly value: number }> => plain(text.replace(/°/g, " deg"), ["deg", "degree", "degrees"]);

/** A whole number. */
export function parseCount(text: string): Parsed<{ readonly value: number }> {
  const result = parseNumber(text);
  return result.ok && !Number.isInteger(result.value) ? { ok: false, error: { code: "not-whole", at: 0, word: text.trim() } } : result;
}
