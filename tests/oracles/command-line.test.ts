// The command line as a script sees it: exit status, the two streams, one JSON object. Figures are checked against what is
// outside the writer: worked sample 1 of a straight tuck (thick-board fold by hand), Maker.js reading the path data, and
// corner points that must keep their distances when folded.
import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import makerjs from "makerjs";
import { afterAll, describe, expect, it } from "vitest";
import { areaRead, readSvgPath } from "./path-readers";
import { BOARDS } from "~/cartons/boards/catalogue";
import { listConstructions } from "~/cartons/constructions/registry";

const folder = mkdtempSync(join(tmpdir(), "cartonwright-cli-"));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const tsx = join("node_modules", ".bin", "tsx");
function carton(...args: string[]): { status: number | null; out: string; err: string } {
  const { status, stdout, stderr } = spawnSync(tsx, ["scripts/carton.ts", ...args], { encoding: "utf8", env: { ...process.env, DATABASE_URL: "" } });
  return { status, out: stdout, err: stderr };
}

const micro = BOARDS.find((b) => b.family === "micro")!;
const card = BOARDS.find((b) => b.family === "carton")!;
const straight = ["build", "straight-tuck", "--L", "60", "--W", "25", "--D", "90", "--board", card.id, "--caliper", "0.4"];

interface Output {
  construction: string;
  inside: Record<"L" | "W" | "D", number>;
  outside: Record<"L" | "W" | "D", number>;
  blank: { width: number; height: number; area: number };
  lengths: Record<string, number>;
  layers: Record<string, string[]>;
  panels: { name: string; size: { width: number; height: number }; flat: [number, number][]; folded: [number, number, number][]; thickness: number; normal: [number, number, number] }[];
  foldCheck: { closes: boolean; measuredInside: Record<"L" | "W" | "D", number>; findings: { sentence: string }[] };
  ledger: { name: string; value: number; formula: string; sources: string[] }[];
}

describe("carton build --json", () => {
  const { status, out, err } = carton(...straight, "--json", "--svg", join(folder, "a.svg"), "--pdf", join(folder, "a.pdf"), "--dxf", join(folder, "a.dxf"), "--side", "print");
  it("prints one object with the keys that scripts rely on, and nothing else", () => {
    expect(err).toBe("");
    expect(status).toBe(0);
    const o = JSON.parse(out) as Output;
    for (const key of ["construction", "inside", "outside", "blank", "lengths", "layers", "panels", "foldCheck", "ledger"]) expect(o).toHaveProperty(key);
    expect(o.construction).toBe("straight-tuck");
    expect(o.inside).toEqual({ L: 60, W: 25, D: 90 });
    expect(o.foldCheck.closes).toBe(true);
    expect(o.ledger.length).toBeGreaterThan(20);
    for (const row of o.ledger) expect(row.sources.every((s) => ["asked", "board", "allowance", "rule"].includes(s))).toBe(true);
  });

  it("comes to the worked sample: blank 183.7 × 165.267, folded 60 × 25 × 90, outside 60.8 × 25.8 × 91.6 (a tuck of 0.4 mm board)", () => {
    const o = JSON.parse(out) as Output;
    expect(o.blank.width).toBeCloseTo(183.7, 3);
    expect(o.blank.height).toBeCloseTo(165.267, 3);
    expect(o.outside.L).toBeCloseTo(60.8, 3);
    expect(o.outside.D).toBeCloseTo(91.6, 3);
    for (const axis of ["L", "W", "D"] as const) expect(o.foldCheck.measuredInside[axis]).toBeCloseTo(o.inside[axis], 2);
  });

  it("gives path data whose lengths Maker.js finds to be those in lengths", () => {
    const o = JSON.parse(out) as Output;
    for (const [name, paths] of Object.entries(o.layers)) {
      let length = 0;
      for (const d of paths) makerjs.model.walk(makerjs.importer.fromSVGPathData(d), { onPath: ({ pathContext }) => { length += makerjs.measure.pathLength(pathContext); } });
      expect(length, name).toBeCloseTo(o.lengths[name]!, 2);
      expect(paths.join("")).not.toMatch(/e|NaN/);
    }
  });

  it("gives an outline that encloses the blank's area", () => {
    const o = JSON.parse(out) as Output;
    const closed = o.layers["cut"]!.map(readSvgPath).filter((p) => p.closed).map((p) => Math.abs(areaRead(p))).sort((a, b) => b - a);
    expect(closed[0]! - closed.slice(1).reduce((sum, a) => sum + a, 0)).toBeCloseTo(o.blank.area, 6);
  });

  it("gives folded corners at the distances they have flat", () => {
    const o = JSON.parse(out) as Output;
    for (const p of o.panels) {
      expect(p.folded.length).toBe(p.flat.length);
      for (let i = 1; i < p.flat.length; i++) {
        const flat = Math.hypot(p.flat[i]![0] - p.flat[0]![0], p.flat[i]![1] - p.flat[0]![1]);
        const folded = Math.hypot(...([0, 1, 2] as const).map((k) => p.folded[i]![k] - p.folded[0]![k]));
        expect(folded).toBeCloseTo(flat, 9);
      }
      expect(Math.hypot(...p.normal)).toBeCloseTo(1, 9);
    }
  });

  it("writes the files from the side that was asked for", () => {
    expect(readFileSync(join(folder, "a.svg"), "utf8")).toContain('side="print"');
    expect(readFileSync(join(folder, "a.dxf"), "utf8")).toContain("Seen from the print side.");
    expect(readFileSync(join(folder, "a.pdf")).subarray(0, 5).toString()).toBe("%PDF-");
  });
});

describe("carton list and boards", () => {
  it("name what there is, for people and as JSON", () => {
    const list = JSON.parse(carton("list", "--json").out) as { id: string; parameters: unknown[]; size: unknown }[];
    expect(list.map((c) => c.id)).toEqual(listConstructions().map((c) => c.id));
    expect(list.every((c) => c.parameters.length > 0)).toBe(true);
    const boards = JSON.parse(carton("boards", "--json").out) as { id: string; caliper: number }[];
    expect(boards.map((b) => [b.id, b.caliper])).toEqual(BOARDS.map((b) => [b.id, b.caliper]));
    const text = carton("list").out;
    for (const c of listConstructions()) expect(text).toContain(c.id);
    for (const b of BOARDS) expect(carton("boards").out).toContain(b.id);
  });

  it("runs as npm run --silent carton", () => {
    const out = execFileSync("npm", ["run", "--silent", "carton", "--", "boards", "--json"], { encoding: "utf8" });
    expect(JSON.parse(out)).toHaveLength(BOARDS.length);
  });
});

describe("lengths", () => {
  it("are expressions with units, points or commas", () => {
    const o = JSON.parse(carton("build", "straight-tuck", "--L=50+2*5", "--W", "25,0 mm", "--D", "90mm", "--board", card.id, "--set", "bleed=2.5", "--json").out) as Output & { parameters: Record<string, unknown> };
    expect(o.inside).toEqual({ L: 60, W: 25, D: 90 });
    expect(o.parameters["bleed"]).toBe(2.5);
    const inches = JSON.parse(carton("build", "straight-tuck", "--L", "4 3/4in", "--W", "2in", "--D", "6in", "--board", card.id, "--json").out) as Output;
    expect(inches.inside.L).toBeCloseTo(120.65, 9);
  });

  it("may mean the outside", () => {
    const o = JSON.parse(carton("build", "roll-end-mailer", "--L", "250", "--W", "180", "--D", "70", "--board", micro.id, "--basis", "outside", "--json").out) as Output;
    for (const [axis, asked] of [["L", 250], ["W", 180], ["D", 70]] as const) expect(o.outside[axis]).toBeCloseTo(asked, 5);
  });
});

describe("bad input: status 2, nothing on standard output, a sentence on standard error", () => {
  const ok = straight.slice(0, 10);
  it.each([
    [["build", "no-such"], "There is no construction “no-such”. There are straight-tuck"],
    [["build", "straight-tuck", "--L", "60", "--W", "25", "--D", "90", "--board", "no-such"], "There is no board “no-such”. There are "],
    [["build", "straight-tuck", "--L", "60", "--board", card.id], "Say --W and --D"],
    [[...ok, "--set", "nonsense=1"], "There is no option “nonsense” here. There are "],
    [[...ok, "--nonsense", "1"], "There is no option --nonsense. There are --L"],
    [[...ok, "--basis", "middle"], "Choose inside, crease, outside or product."],
    [[...ok, "--svg", "/no/such/folder/a.svg"], "cannot be written"],
    [["build", "straight-tuck", "--L", "60", "--W", "25", "--D", "90 parsecs", "--board", card.id], "Depth: "],
    [["build", "straight-tuck", "--L", "25", "--W", "60", "--D", "90", "--board", card.id], "swap length and width"],
    [["build", "straight-tuck", "--L", "-60", "--W", "25", "--D", "90", "--board", card.id], "Length"],
    [["build", "straight-tuck", "--L", "0.001", "--W", "25", "--D", "90", "--board", card.id], "the least is"],
    [["build", "straight-tuck", "--L", "10000", "--W", "25", "--D", "90", "--board", card.id], "the most is"],
    [[...ok, "--caliper", "NaN"], "Caliper"],
    [[...ok, "--set", "bleed"], "--set takes name=value"],
    [["build", "straight-tuck", "--L"], "--L needs a value"],
    [["fold"], "There is no command “fold”"],
    [[], "Say what to do."],
  ])("%j", (args, words) => {
    const { status, out, err } = carton(...args);
    expect(err).toContain(words);
    expect(err).not.toMatch(/\n\s+at /);
    expect(out).toBe("");
    expect(status).toBe(2);
  });
});
