// The command line: the carton core without a database or a server. Bad input: exit status 2 and the sentence on standard error.
import { writeFileSync } from "node:fs";
import { BOARDS } from "../app/cartons/boards/catalogue";
import { buildCarton } from "../app/cartons/carton";
import { listConstructions } from "../app/cartons/constructions/registry";
import type { Carton } from "../app/cartons/types";
import { refusalSentence } from "../app/copy/refusals";
import { BadInput, readBuild, readOptions, type BuildRequest } from "./carton-input";
import { boardsText, jsonOf, listText, summaryOf } from "./carton-output";

const USAGE = `carton list [--json]
carton boards [--json]
carton build <construction> --L 240 --W 170 --D 60 --board e-flute [--caliper 1.6]
             [--basis inside|crease|outside|product] [--room 1] [--set name=value …] [--json]
             [--svg file] [--pdf file] [--dxf file] [--side inside|print]
             [--title text] [--client text] [--revision text] [--date 2026-11-24]

Lengths are millimetres, or expressions with units: 120+2*1.5, 4 3/4in, 8,5.`;

const print = (text: string): void => { process.stdout.write(text); };
const printJson = (value: unknown): void => print(`${JSON.stringify(value, null, 1)}\n`);

async function build(args: readonly string[]): Promise<void> {
  const request = readBuild(args, new Date().toISOString().slice(0, 10));
  const result = buildCarton(request.brief, request.board);
  if (!result.ok) throw new BadInput(result.refusals.map((r) => refusalSentence(r, request.brief.construction)));
  await writeFiles(result.carton, request);
  if (request.isJson) printJson(jsonOf(result.carton));
  else print(summaryOf(result.carton));
}

async function writeFiles(carton: Carton, { files, side, title, client, revision, date }: BuildRequest): Promise<void> {
  const name = title ?? carton.construction.name;
  if (files.svg !== null) {
    const { svgOf } = await import("../app/cartons/export/svg");
    write(files.svg, svgOf(carton, { side, revision, title: name }));
  }
  if (files.dxf !== null) {
    const { dxfOf } = await import("../app/cartons/export/dxf");
    write(files.dxf, dxfOf(carton, { side, revision, title: name }));
  }
  if (files.pdf !== null) {
    const [{ pdfOf }, { latoFonts }] = await Promise.all([import("../app/cartons/export/pdf/document"), import("../app/services/fonts.server")]);
    write(files.pdf, await pdfOf(carton, { title: name, client, revision, date, side, fonts: await latoFonts() }));
  }
}

function write(path: string, content: string | Uint8Array): void {
  try {
    writeFileSync(path, content);
  } catch (error) {
    throw new BadInput([`${path} cannot be written: ${error instanceof Error ? error.message : String(error)}.`]);
  }
}

async function run(args: readonly string[]): Promise<void> {
  const [command, ...rest] = args;
  if (command === "build") return build(rest);
  if (command === "list" || command === "boards") {
    const { words, flags } = readOptions(rest, []);
    if (words.length > 0) throw new BadInput([`“${words[0]}” says nothing to ${command}. Type carton ${command} or carton ${command} --json.`]);
    if (command === "list") return flags.has("json") ? printJson(listConstructions()) : print(listText(listConstructions()));
    return flags.has("json") ? printJson(BOARDS) : print(boardsText(BOARDS));
  }
  if (command === "help" || command === "--help") return print(`${USAGE}\n`);
  throw new BadInput([command === undefined ? "Say what to do." : `There is no command “${command}”. There are list, boards and build.`, USAGE]);
}

try {
  await run(process.argv.slice(2));
} catch (error) {
  if (!(error instanceof BadInput)) throw error;
  process.stderr.write(`${error.sentences.join("\n")}\n`);
  process.exitCode = 2;
}
