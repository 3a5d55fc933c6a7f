// Readers of outlines in files, written from the standards alone: SVG 1.1 path data (appendix F.6.5 for arcs) and the path
// operators of PDF (ISO 32000-1, 8.5.2). They know nothing of how this product writes.

export interface Corner {
  readonly x: number;
  readonly y: number;
  /** Centre of the arc that ends here, and whether it runs with growing angle; null after a straight line. */
  readonly arc: { readonly x: number; readonly y: number; readonly isPositive: boolean } | null;
}

/** Corners of one subpath of SVG path data with absolute M, L, A and Z. */
export function readSvgPath(d: string): { corners: Corner[]; closed: boolean } {
  const tokens = d.match(/[MLAZ]|-?\d+(?:\.\d+)?/g) ?? [];
  if (tokens.join("").length !== d.replace(/ /g, "").length) throw new Error(`not M, L, A, Z and plain numbers alone: ${d}`);
  const corners: Corner[] = [];
  let i = 0;
  let isClosed = false;
  const next = () => Number(tokens[i++]);
  while (i < tokens.length) {
    const command = tokens[i++];
    if (command === "Z") isClosed = true;
    else if (command === "A") {
      const [r, ry, turn, large, sweep] = [next(), next(), next(), next(), next()] as [number, number, number, number, number];
      if (ry !== r || turn !== 0) throw new Error("not a circular arc");
      const from = corners[corners.length - 1]!;
      const to = { x: next(), y: next() };
      const [hx, hy] = [(from.x - to.x) / 2, (from.y - to.y) / 2];
      const k = Math.sqrt(Math.max(0, (r * r - hx * hx - hy * hy) / (hx * hx + hy * hy))) * (large === sweep ? -1 : 1);
      corners.push({ ...to, arc: { x: k * hy + (from.x + to.x) / 2, y: -k * hx + (from.y + to.y) / 2, isPositive: sweep === 1 } });
    } else corners.push({ x: next(), y: next(), arc: null });
  }
  return { corners, closed: isClosed };
}

/** Signed area of a closed path in its own coordinates, arcs exact (shoelace and circular segments). */
export function areaRead({ corners }: { corners: readonly Corner[] }): number {
  let twice = 0;
  corners.forEach((a, i) => {
    const b = corners[(i + 1) % corners.length]!;
    twice += a.x * b.y - b.x * a.y;
    if (!b.arc) return;
    // The closing line never carries an arc unless the path came back to its start.
    const r = Math.hypot(b.x - b.arc.x, b.y - b.arc.y);
    let turn = Math.atan2(b.y - b.arc.y, b.x - b.arc.x) - Math.atan2(a.y - b.arc.y, a.x - b.arc.x);
    if (b.arc.isPositive && turn < 0) turn += 2 * Math.PI;
    if (!b.arc.isPositive && turn > 0) turn -= 2 * Math.PI;
    twice += r * r * (turn - Math.sin(turn));
  });
  return twice / 2;
}

export interface Polyline {
  readonly points: readonly { readonly x: number; readonly y: number }[];
  readonly isClosed: boolean;
}

/** Subpaths that are stroked in a piece of PDF content, curves sampled at 32 points. */
export function strokedIn(content: string): Polyline[] {
  const stroked: Polyline[] = [];
  let open: { points: { x: number; y: number }[]; isClosed: boolean }[] = [];
  const numbers: number[] = [];
  for (const token of content.split(/\s+/)) {
    if (/^[-+]?(\d+\.?\d*|\.\d+)$/.test(token)) {
      numbers.push(Number(token));
      continue;
    }
    const current = open[open.length - 1];
    const last = current?.points[current.points.length - 1];
    if (token === "m") open.push({ points: [{ x: numbers.at(-2)!, y: numbers.at(-1)! }], isClosed: false });
    else if (token === "l") current!.points.push({ x: numbers.at(-2)!, y: numbers.at(-1)! });
    else if (token === "c") {
      const [x1, y1, x2, y2, x3, y3] = numbers.slice(-6) as [number, number, number, number, number, number];
      for (let i = 1; i <= 32; i++) {
        const t = i / 32;
        const s = 1 - t;
        const mix = (p0: number, p1: number, p2: number, p3: number) => s * s * s * p0 + 3 * s * s * t * p1 + 3 * s * t * t * p2 + t * t * t * p3;
        current!.points.push({ x: mix(last!.x, x1, x2, x3), y: mix(last!.y, y1, y2, y3) });
      }
    } else if (token === "h") current!.isClosed = true;
    else if (token === "S") {
      stroked.push(...open);
      open = [];
    } else if (["f", "f*", "n"].includes(token)) open = [];
    numbers.length = 0;
  }
  return stroked;
}

export function lengthRead({ points, isClosed }: Polyline): number {
  const ring = isClosed ? [...points, points[0]!] : points;
  return ring.slice(1).reduce((sum, p, i) => sum + Math.hypot(p.x - ring[i]!.x, p.y - ring[i]!.y), 0);
}
