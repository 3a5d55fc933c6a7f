// A panel as a solid for the graphics card: print face, inside face and cut edges as three groups, and its outline as lines.
import { BufferGeometry, Float32BufferAttribute } from "three";
import { flatten } from "~/cartons/geometry/path";
import type { Point } from "~/cartons/geometry/outline";
import type { Run } from "~/cartons/export/picture/faces";
import type { FoldPanel } from "~/cartons/types";

/** mm. Chords of rounded corners on screen. */
const CHORD = 0.05;
/** cos 25°: a corner sharper than this has an edge through the board's thickness. */
const SHARP = 0.9;
/** mm: nearer than this to its own y = 0 a run lies on the panel's crease. */
const ON_CREASE = 0.01;

export const PRINT = 0;
export const INSIDE = 1;
export const CORE = 2;

export function panelGeometry(panel: FoldPanel): BufferGeometry {
  const half = panel.thickness / 2;
  const positions: number[] = [];
  const normals: number[] = [];
  const push = (x: number, y: number, z: number, nx: number, ny: number, nz: number) => {
    positions.push(x, y, z);
    normals.push(nx, ny, nz);
  };
  const geometry = new BufferGeometry();
  const group = (index: number, fill: () => void) => {
    const from = positions.length / 3;
    fill();
    geometry.addGroup(from, positions.length / 3 - from, index);
  };
  const cap = (z: number, normal: number) => {
    for (const piece of panel.pieces) for (let k = 2; k < piece.length; k++) {
      const [a, b, c] = [piece[0]!, piece[k - 1]!, piece[k]!];
      for (const p of normal > 0 ? [a, b, c] : [a, c, b]) push(p.x, p.y, z, 0, 0, normal);
    }
  };
  group(PRINT, () => cap(-half, -1));
  group(INSIDE, () => cap(half, 1));
  group(CORE, () => {
    for (const ring of rings(panel)) ring.forEach((a, i) => {
      const b = ring[(i + 1) % ring.length]!;
      const length = Math.hypot(b.x - a.x, b.y - a.y);
      if (length === 0) return;
      const [nx, ny] = [(b.y - a.y) / length, -(b.x - a.x) / length];
      const quad: readonly (readonly [Point, number])[] = [[a, -half], [b, -half], [b, half], [a, -half], [b, half], [a, half]];
      for (const [p, z] of quad) push(p.x, p.y, z, nx, ny, 0);
    });
  });
  geometry.setAttribute("position", new Float32BufferAttribute(positions, 3));
  geometry.setAttribute("normal", new Float32BufferAttribute(normals, 3));
  return geometry;
}

const rings = (panel: FoldPanel): Point[][] => [flatten(panel.outline, CHORD), ...panel.holes.map((h) => flatten(h, CHORD))];

/** Lines of both faces along free edges, and the edges through the board at sharp corners, as x, y, z pairs. */
export function outlineLines(runs: readonly Run[], thickness: number): number[] {
  const half = thickness / 2;
  const lines: number[] = [];
  runs.forEach((run, i) => {
    if (run.kind !== "outline") return;
    const { a, b } = run;
    for (const z of [-half, half]) lines.push(a.x, a.y, z, b.x, b.y, z);
    const before = runs[(i - 1 + runs.length) % runs.length]!;
    const [ux, uy, vx, vy] = [before.b.x - before.a.x, before.b.y - before.a.y, b.x - a.x, b.y - a.y];
    if (ux * vx + uy * vy < SHARP * Math.hypot(ux, uy) * Math.hypot(vx, vy)) lines.push(a.x, a.y, -half, a.x, a.y, half);
  });
  return lines;
}

/** The crease a panel hangs on, on both faces; empty for a root. */
export function creaseLine(runs: readonly Run[], thickness: number): number[] {
  const half = thickness / 2;
  return runs.filter((r) => r.kind !== "outline" && Math.abs(r.a.y) < ON_CREASE && Math.abs(r.b.y) < ON_CREASE)
    .flatMap(({ a, b }) => [-half, half].flatMap((z) => [a.x, a.y, z, b.x, b.y, z]));
}
