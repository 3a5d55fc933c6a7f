// What was typed after `carton build`, read into a brief; or a sentence that says what to type instead.
import type { Board } from "../app/cartons/boards/board";
import { withCaliper } from "../app/cartons/boards/allowance-card";
import { BOARDS, findBoard } from "../app/cartons/boards/catalogue";
import { listConstructions } from "../app/cartons/constructions/registry";
import type { Side } from "../app/cartons/export/sheet-view";
import type { Brief, ConstructionInfo, OptionValue, ParameterInfo, SizeBasis } from "../app/cartons/types";
import { parseAngle, parseCount, parseLength, type Parsed } from "../app/cartons/units/expression";
import { describeExpressionError } from "../app/cartons/units/expression-words";

/** Bad input: its sentences go to standard error, and the exit status is 2. */
export class BadInput extends Error {
  constructor(readonly sentences: readonly string[]) {
    super(sentences.join("\n"));
  }
}

export interface BuildRequest {
  readonly brief: Brief;
  readonly board: Board;
  readonly isJson: boolean;
  readonly side: Side;
  readonly files: { readonly svg: string | null; readonly pdf: string | null; readonly dxf: string | null };
  readonly title: string | null;
  readonly client: string;
  readonly revision: string;
  readonly date: string;
}

const BASES: readonly SizeBasis[] = ["inside", "crease", "outside", "product"];
const SIDES: readonly Side[] = ["inside", "print"];
const VALUES = ["L", "W", "D", "board", "caliper", "basis", "room", "set", "svg", "pdf", "dxf", "side", "title", "client", "revision", "date"] as const;
type ValueOption = (typeof VALUES)[number];

const inWords = (names: readonly string[], last = "and"): string => (names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} ${last} ${names[names.length - 1]}`);

/** Splits options from plain words; each option may come as `--L 240` or `--L=240`. */
export function readOptions(args: readonly string[], known: readonly string[]): { words: string[]; values: Map<string, string[]>; flags: Set<string> } {
  const words: string[] = [];
  const values = new Map<string, string[]>();
  const flags = new Set<string>();
  for (let i = 0; i < args.length; i++) {
    const arg = args[i]!;
    if (!arg.startsWith("--")) {
      words.push(arg);
      continue;
    }
    const equals = arg.indexOf("=");
    const name = equals < 0 ? arg.slice(2) : arg.slice(2, equals);
    if (name === "json" && equals < 0) {
      flags.add(name);
      continue;
    }
    if (!known.includes(name)) throw new BadInput([`There is no option --${name}. There are ${inWords([...known, "json"].map((k) => `--${k}`))}.`]);
    const value = equals < 0 ? args[++i] : arg.slice(equals + 1);
    if (value === undefined || value === "" || value.startsWith("--")) throw new BadInput([`--${name} needs a value after it.`]);
    values.set(name, [...(values.get(name) ?? []), value]);
  }
  return { words, values, flags };
}

function oneOf<T extends string>(name: string, given: string | undefined, offered: readonly T[], usual: T): T {
  if (given === undefined) return usual;
  const found = offered.find((o) => o === given);
  if (!found) throw new BadInput([`--${name} cannot be “${given}”. Choose ${inWords(offered, "or")}.`]);
  return found;
}

export function constructionOf(given: string | undefined): ConstructionInfo {
  const all = listConstructions();
  const ids = inWords(all.map((c) => c.id));
  if (given === undefined) throw new BadInput([`Say which construction: carton build ${all[0]!.id} --L … There are ${ids}.`]);
  const found = all.find((c) => c.id === given);
  if (!found) throw new BadInput([`There is no construction “${given}”. There are ${ids}.`]);
  return found;
}

function boardOf(given: string | undefined, caliper: number | null): Board {
  const ids = inWords(BOARDS.map((b) => b.id));
  if (given === undefined) throw new BadInput([`Say which board: --board ${BOARDS[0]!.id}. There are ${ids}.`]);
  const board = findBoard(given);
  if (!board) throw new BadInput([`There is no board “${given}”. There are ${ids}.`]);
  if (caliper === null) return board;
  if (!(caliper > 0 && caliper <= 10)) throw new BadInput([`A caliper of ${caliper} mm is no board of this kind. Type between 0.1 and 10 mm; ${board.id} is ${board.caliper} mm.`]);
  return withCaliper(board, caliper);
}

const ON = ["on", "true", "yes", "1"];
const OFF = ["off", "false", "no", "0"];

/** The value of an option by the kind that its construction says it is. What it knows nothing of goes to the core as it is, which names what there is. */
function optionValue(info: ParameterInfo | undefined, name: string, text: string, problems: string[]): OptionValue {
  if (!info || info.kind === "choice") return text;
  if (info.kind === "switch") {
    if (ON.includes(text)) return true;
    if (OFF.includes(text)) return false;
    problems.push(`${info.label} is on or off: --set ${name}=on.`);
    return text;
  }
  const read = info.kind === "length" ? lengthOf(text) : info.kind === "angle" ? parseAngle(text) : parseCount(text);
  if (read.ok) return read.value;
  problems.push(`${info.label}: ${describeExpressionError(read.error, { example: info.kind === "length" ? LENGTHS : info.kind === "angle" ? "8 or 8°" : "a whole number" })}`);
  return text;
}

const LENGTHS = "43, 43mm or 1.69in";

function lengthOf(text: string): Parsed<{ readonly value: number }> {
  const read = parseLength(text, { unit: "mm" });
  return read.ok ? { ok: true, value: read.mm } : read;
}

/** Throws BadInput with one sentence for each thing that is wrong. */
export function readBuild(args: readonly string[], today: string): BuildRequest {
  const { words, values, flags } = readOptions(args, VALUES);
  const last = (name: ValueOption): string | undefined => values.get(name)?.at(-1);
  const construction = constructionOf(words[0]);
  if (words.length > 1) throw new BadInput([`“${words[1]}” stands alone. Options begin with --; put an expression with spaces in quotes.`]);
  const problems: string[] = [];
  const length = (name: "L" | "W" | "D" | "caliper" | "room", label: string): number | null => {
    const text = last(name);
    if (text === undefined) return null;
    const read = lengthOf(text);
    if (read.ok) return read.value;
    problems.push(`${label}: ${describeExpressionError(read.error, { example: LENGTHS })}`);
    return null;
  };
  const [L, W, D] = [length("L", "Length"), length("W", "Width"), length("D", "Depth")];
  const missing = (["L", "W", "D"] as const).filter((axis) => last(axis) === undefined);
  if (missing.length > 0) problems.push(`Say ${inWords(missing.map((m) => `--${m}`))}, e.g. ${missing.map((m) => `--${m} ${construction.sample.size[m]}`).join(" ")}. Here: ${construction.meaning}.`);
  const caliper = length("caliper", "Caliper");
  const room = length("room", "Room");
  const options: Record<string, OptionValue> = {};
  for (const pair of values.get("set") ?? []) {
    const equals = pair.indexOf("=");
    if (equals < 1) {
      problems.push(`--set takes name=value, not “${pair}”.`);
      continue;
    }
    const name = pair.slice(0, equals).trim();
    options[name] = optionValue(construction.parameters.find((p) => p.name === name), name, pair.slice(equals + 1).trim(), problems);
  }
  const basis = oneOf("basis", last("basis"), BASES, "inside");
  const side = oneOf("side", last("side"), SIDES, "inside");
  if (room !== null && basis !== "product") problems.push("--room is the room round a product: it goes with --basis product.");
  if (problems.length > 0) throw new BadInput(problems);
  const board = boardOf(last("board"), caliper);
  return {
    brief: { construction: construction.id, size: { L: L!, W: W!, D: D! }, basis, room: room ?? (basis === "product" ? 1 : 0), board: board.id, options, typed: {} },
    board, isJson: flags.has("json"), side,
    files: { svg: last("svg") ?? null, pdf: last("pdf") ?? null, dxf: last("dxf") ?? null },
    title: last("title") ?? null, client: last("client") ?? "", revision: last("revision") ?? "draft", date: last("date") ?? today,
  };
}
