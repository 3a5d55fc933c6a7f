// What bench.ts runs: stages of one carton over many sizes of each construction, and the same outline made by a general
// geometry library (Maker.js combineUnion of the panels) as the yardstick.
import makerjs from "makerjs";
import { declare, document } from "~/cartons/assemble";
import { findBoard } from "~/cartons/boards/catalogue";
import { foldCheckOf } from "~/cartons/checks/fold-check";
import { findConstruction, listConstructions } from "~/cartons/constructions/registry";
import { dxfOf } from "~/cartons/export/dxf";
import { pdfOf } from "~/cartons/export/pdf/document";
import type { FontBytes } from "~/cartons/export/pdf/fonts";
import { svgOf } from "~/cartons/export/svg";
import { foldModelOf } from "~/cartons/fold/fold-model";
import { flatten } from "~/cartons/geometry/path";
import { layersOf, lengthsOf } from "~/cartons/layers/layers";
import type { Carton, Size } from "~/cartons/types";

type Times = Record<string, number[]>;
const at = (sorted: readonly number[], share: number): number => sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))]!;
const ms = (value: number): string => value.toFixed(value < 10 ? 3 : 1).padStart(8);

/** Sizes round the sample's, never the same twice: a drag of a figure. */
const sizeAt = (sample: Size, i: number): Size => ({ L: sample.L * (1 + (i % 61) / 120), W: sample.W, D: sample.D * (1 + (i % 37) / 150) });

function outlineByUnion(carton: Carton): void {
  const models = carton.panels.map((p) => new makerjs.models.ConnectTheDots(true, flatten(p.outline, 0.05).map((q) => [q.x, q.y] as [number, number])) as import("makerjs").IModel);
  models.reduce((a, b) => makerjs.model.combineUnion(a, b));
}

export async function measure(fonts: FontBytes, runs: number): Promise<void> {
  console.log(`${runs} cartons a construction after as many to warm up; milliseconds`);
  for (const { id, sample } of listConstructions()) {
    const registered = findConstruction(id)!;
    const board = findBoard(sample.board)!;
    const times: Times = {};
    const timed = <T>(stage: string, run: () => T, counts: boolean): T => {
      const start = performance.now();
      const result = run();
      if (counts) (times[stage] ??= []).push(performance.now() - start);
      return result;
    };
    let carton: Carton | null = null;
    for (let i = 0; i < 2 * runs; i++) {
      const counts = i >= runs;
      const size = sizeAt(sample.size, i);
      const start = performance.now();
      const declared = timed("build", () => declare(registered, size, {}, board), counts);
      if (!declared.ok) throw new Error(JSON.stringify(declared.refusals));
      timed("layers", () => lengthsOf(layersOf(declared.blank, { bleed: 3, safe: 3, glueMargin: 1.5 })), counts);
      timed("fold check", () => foldCheckOf(declared.blank, foldModelOf(declared.blank), board), counts);
      const brief = { construction: id, size, basis: "inside", room: 1, board: board.id, options: {}, typed: {} } as const;
      const spent = performance.now() - start;
      carton = document(registered, brief, board, declared.blank, declared.resolved);
      const made = carton;
      const written = performance.now();
      timed("SVG", () => svgOf(made, { side: "inside", revision: "A" }), counts);
      if (counts) (times["all four"] ??= []).push(spent + performance.now() - written);
    }
    if (!carton) throw new Error("no runs");
    const last = carton;
    for (let i = 0; i < 12; i++) timed("DXF", () => dxfOf(last, { side: "inside", revision: "A" }), i >= 4);
    for (let i = 0; i < 8; i++) {
      const start = performance.now();
      await pdfOf(last, { title: "Bench", client: "", revision: "A", date: "2026-12-01", side: "inside", fonts });
      if (i >= 3) (times["PDF"] ??= []).push(performance.now() - start);
    }
    for (let i = 0; i < 5; i++) timed("union", () => outlineByUnion(last), i >= 2);
    console.log(`\n${id}`);
    for (const [stage, values] of Object.entries(times)) {
      const sorted = [...values].sort((a, b) => a - b);
      console.log(`  ${stage.padEnd(11)} p50 ${ms(at(sorted, 0.5))}  p95 ${ms(at(sorted, 0.95))}`);
    }
    const p50 = (stage: string) => at([...times[stage]!].sort((a, b) => a - b), 0.5);
    console.log(`  ratio: build + layers against Maker.js combineUnion of the same panels 1 : ${(p50("union") / (p50("build") + p50("layers"))).toFixed(0)}`);
  }
}
