// Plain plane figures: vertices with bulge. Knows no board, panel or crease.

/** A corner of a path. `bulge` belongs to the edge that STARTS here: tan(sweep / 4), positive turns left (CCW), 0 is straight. */
export interface Vertex {
  readonly x: number;
  readonly y: number;
  readonly bulge: number;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** A run of straight edges and arcs, mm. A closed path returns from its last vertex to its first; no vertex is repeated. */
export interface Path {
  readonly closed: boolean;
  readonly vertices: readonly Vertex[];
}

export interface Box {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}
