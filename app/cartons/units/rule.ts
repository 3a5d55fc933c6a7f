// Rules of thumb as text: "min(L/2 - 1, max(12, 0.75*W))". Compiled once, then worked out by nested closures: no eval.
import { tokensOf, type Token } from "./tokens";

export type RuleScope = Readonly<Record<string, number>>;

export interface CompiledRule {
  readonly variables: readonly string[];
  readonly evaluate: (scope: RuleScope) => number;
  /** The rule with its values put in, e.g. "min(60/2 − 1, max(12, 0.75 × 25))". A choice shows the branch that was taken. */
  readonly show: (scope: RuleScope, format: (value: number) => string) => string;
}

type Format = (value: number) => string;
interface Node {
  readonly evaluate: (scope: RuleScope) => number;
  readonly show: (scope: RuleScope, format: Format) => string;
  /** How tightly it binds when written: 3 single, 2 product, 1 sum, 0 comparison. */
  readonly binds: number;
}

const RADIANS = Math.PI / 180;
const ONE: Readonly<Record<string, (x: number) => number>> = {
  sqrt: Math.sqrt, abs: Math.abs, round: Math.round,
  tan: (x) => Math.tan(x * RADIANS), sin: (x) => Math.sin(x * RADIANS), cos: (x) => Math.cos(x * RADIANS),
};

/** Compiles a rule over the named variables. Throws on an unknown name or bad syntax: a defect of the construction. */
export function compileRule(text: string, known: readonly string[]): CompiledRule {
  const cut = tokensOf(text, "rule");
  if (!cut.ok) throw new Error(`"${cut.error.text}" makes no sense in the rule ${text}`);
  const { tokens } = cut;
  const variables = new Set<string>();
  let next = 0;

  const isSign = (sign: string) => {
    const t = tokens[next];
    return t?.kind === "sign" && t.text === sign;
  };
  const wrong = (t: Token | undefined): never => {
    throw new Error(`${t ? `"${t.text}" is out of place` : "something is missing"} in the rule ${text}`);
  };
  const take = (sign: string) => {
    if (!isSign(sign)) wrong(tokens[next]);
    next++;
  };

  function comparison(): Node {
    const left = sum();
    if (!isSign("<") && !isSign(">")) return left;
    const less = tokens[next++]!.text === "<";
    const right = sum();
    return {
      binds: 0,
      evaluate: less ? (s) => (left.evaluate(s) < right.evaluate(s) ? 1 : 0) : (s) => (left.evaluate(s) > right.evaluate(s) ? 1 : 0),
      show: (s, f) => `${left.show(s, f)} ${less ? "<" : ">"} ${right.show(s, f)}`,
    };
  }

  function sum(): Node {
    let node = product();
    while (isSign("+") || isSign("-")) {
      const adds = tokens[next++]!.text === "+";
      const [left, right] = [node, product()];
      node = {
        binds: 1,
        evaluate: adds ? (s) => left.evaluate(s) + right.evaluate(s) : (s) => left.evaluate(s) - right.evaluate(s),
        show: (s, f) => `${left.show(s, f)} ${adds ? "+" : "−"} ${wrapped(right, 2, s, f)}`,
      };
    }
    return node;
  }

  function product(): Node {
    let node = single();
    while (isSign("*") || isSign("/")) {
      const multiplies = tokens[next++]!.text === "*";
      const [left, right] = [node, single()];
      node = {
        binds: 2,
        evaluate: multiplies ? (s) => left.evaluate(s) * right.evaluate(s) : (s) => left.evaluate(s) / right.evaluate(s),
        show: (s, f) => `${wrapped(left, 2, s, f)}${multiplies ? " × " : "/"}${wrapped(right, 3, s, f)}`,
      };
    }
    return node;
  }

  function single(): Node {
    const t = tokens[next];
    if (!t) return wrong(t);
    next++;
    if (t.kind === "number") return { binds: 3, evaluate: () => t.value, show: (_, f) => f(t.value) };
    if (t.kind === "word") return isSign("(") ? call(t.text) : variable(t.text);
    if (t.text === "(") {
      const inner = sum();
      take(")");
      return inner;
    }
    if (t.text !== "-") return wrong(t);
    const inner = single();
    return { binds: 2, evaluate: (s) => -inner.evaluate(s), show: (s, f) => `−${wrapped(inner, 3, s, f)}` };
  }

  function variable(name: string): Node {
    if (!known.includes(name)) throw new Error(`the rule ${text} speaks of ${name}, which is not known there`);
    variables.add(name);
    return { binds: 3, evaluate: (s) => s[name] ?? Number.NaN, show: (s, f) => f(s[name] ?? Number.NaN) };
  }

  function call(name: string): Node {
    take("(");
    const args = [comparison()];
    while (isSign(",")) {
      next++;
      args.push(comparison());
    }
    take(")");
    return called(name, args, text);
  }

  const node = comparison();
  if (next < tokens.length) wrong(tokens[next]);
  return { variables: [...variables], evaluate: node.evaluate, show: node.show };
}

/** In brackets when it binds less tightly than its place asks. */
const wrapped = (node: Node, place: number, scope: RuleScope, format: Format): string =>
  node.binds < place ? `(${node.show(scope, format)})` : node.show(scope, format);

function called(name: string, args: readonly Node[], text: string): Node {
  const [a, b, c] = args;
  const show = (s: RuleScope, f: Format) => `${name}(${args.map((x) => x.show(s, f)).join(", ")})`;
  const one = ONE[name];
  if (one && a && args.length === 1) return { binds: 3, show, evaluate: (s) => one(a.evaluate(s)) };
  if ((name === "min" || name === "max") && a && b) return { binds: 3, show, evaluate: extreme(args, name === "min") };
  if (name === "clamp" && a && b && c && args.length === 3) return { binds: 3, show, evaluate: (s) => Math.min(c.evaluate(s), Math.max(b.evaluate(s), a.evaluate(s))) };
  if (name === "if" && a && b && c && args.length === 3) {
    return { binds: 3, evaluate: (s) => (a.evaluate(s) !== 0 ? b.evaluate(s) : c.evaluate(s)), show: (s, f) => wrapped(a.evaluate(s) !== 0 ? b : c, 3, s, f) };
  }
  throw new Error(`the rule ${text} calls ${name} with ${args.length} arguments`);
}

function extreme(args: readonly Node[], least: boolean): (scope: RuleScope) => number {
  return (scope) => {
    let best = args[0]!.evaluate(scope);
    for (let i = 1; i < args.length; i++) {
      const value = args[i]!.evaluate(scope);
      if (least ? value < best : value > best) best = value;
    }
    return best;
  };
}
