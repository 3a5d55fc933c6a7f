// Writes the operators of a page's content, in millimetres. Knows PDF's page description, nothing of cartons.
import type { Box, Path, Point } from "../../geometry/outline";
import { arcOf, eachEdge } from "../../geometry/path";
import { plain } from "../number";
import type { Face } from "./fonts";

/** Points a millimetre. */
export const POINTS = 72 / 25.4;
/** An arc goes out in pieces of at most this turn: at 45° a cubic leaves it by less than five millionths of its radius. */
const WIDEST = Math.PI / 4;

export interface TextStyle {
  readonly face: Face;
  readonly size: number;
  readonly align?: "left" | "centre" | "right";
  /** Degrees, + turns left. */
  readonly angle?: number;
  /** Space between letters, mm. */
  readonly tracking?: number;
}

export interface Ink {
  /** Operators as they are. */
  raw(operators: string): void;
  /** What is written inside belongs to one optional-content group, in its own separation, set to overprint. */
  layer(key: string, write: () => void): void;
  /** Saves and restores the graphics state around `write`. */
  apart(write: () => void): void;
  stroke(width: number, dash?: readonly number[]): void;
  tint(share: number): void;
  line(a: Point, b: Point): void;
  paths(paths: readonly Path[], paint: "S" | "f" | "f*" | "W n" | "W* n"): void;
  box(box: Box, paint: "S" | "f" | "W n"): void;
  /** Moves what is written inside by dx, dy. */
  moved(dx: number, dy: number, write: () => void): void;
  text(text: string, at: Point, style: TextStyle): void;
  content(): string;
}

export function createInk(): Ink {
  const parts: string[] = [];
  const raw = (operators: string) => { parts.push(operators); };
  let key = "";
  const ink: Ink = {
    raw,
    layer(name, write) {
      key = name;
      raw(`/OC /Layer${name} BDC q /Overprint gs /Spot${name} CS 1 SCN /Spot${name} cs 1 scn`);
      write();
      raw("Q EMC");
    },
    apart(write) { raw("q"); write(); raw("Q"); },
    stroke(width, dash = []) { raw(`${plain(width)} w [${dash.map(plain).join(" ")}] 0 d`); },
    tint(share) { raw(`/Spot${key} cs ${plain(share)} scn`); },
    line(a, b) { raw(`${plain(a.x)} ${plain(a.y)} m ${plain(b.x)} ${plain(b.y)} l S`); },
    paths(paths, paint) { raw(`${paths.map(operatorsOf).join(" ")} ${paint}`); },
    box(b, paint) { raw(`${plain(b.minX)} ${plain(b.minY)} ${plain(b.maxX - b.minX)} ${plain(b.maxY - b.minY)} re ${paint}`); },
    moved(dx, dy, write) { raw(`q 1 0 0 1 ${plain(dx)} ${plain(dy)} cm`); write(); raw("Q"); },
    text(text, at, { face, size, align = "left", angle = 0, tracking = 0 }) {
      const runs = face.runs(text);
      const width = face.width(text, size) + tracking * [...text].length;
      const back = align === "left" ? 0 : align === "right" ? width : (width - tracking) / 2;
      const turn = (angle * Math.PI) / 180;
      const [c, s] = [Math.cos(turn), Math.sin(turn)];
      raw(`BT ${plain(tracking)} Tc ${plain(c)} ${plain(s)} ${plain(-s)} ${plain(c)} ${plain(at.x - c * back)} ${plain(at.y - s * back)} Tm`);
      for (const run of runs) raw(`/${run.font} ${plain(size)} Tf ${run.encoded} Tj`);
      raw("ET");
    },
    content: () => parts.join("\n"),
  };
  return ink;
}

function operatorsOf(path: Path): string {
  const first = path.vertices[0];
  if (!first) return "";
  let text = `${plain(first.x)} ${plain(first.y)} m`;
  eachEdge(path, (a, b, i) => {
    if (a.bulge !== 0) {
      text += curves(a, b);
      return;
    }
    // Does the closing edge only return to the start? "h" draws it.
    if (!(path.closed && i === path.vertices.length - 1)) text += ` ${plain(b.x)} ${plain(b.y)} l`;
  });
  return path.closed ? `${text} h` : text;
}

function curves(a: Path["vertices"][number], b: Point): string {
  const { centre, radius, from, sweep } = arcOf(a, b);
  const pieces = Math.ceil(Math.abs(sweep) / WIDEST);
  const turn = sweep / pieces;
  const k = (4 / 3) * Math.tan(turn / 4) * radius;
  let text = "";
  for (let i = 0; i < pieces; i++) {
    const [t0, t1] = [from + turn * i, from + turn * (i + 1)];
    const p = { x: centre.x + radius * Math.cos(t0), y: centre.y + radius * Math.sin(t0) };
    const q = i === pieces - 1 ? b : { x: centre.x + radius * Math.cos(t1), y: centre.y + radius * Math.sin(t1) };
    text += ` ${plain(p.x - k * Math.sin(t0))} ${plain(p.y + k * Math.cos(t0))} ${plain(q.x + k * Math.sin(t1))} ${plain(q.y - k * Math.cos(t1))} ${plain(q.x)} ${plain(q.y)} c`;
  }
  return text;
}
