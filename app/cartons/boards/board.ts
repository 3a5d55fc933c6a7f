// A board as a carton is drawn with it. Grammage without caliper is no board.

/** Cartonboard of 0.2 to 0.9 mm, or micro-flute (E, F and finer) of 0.7 to 1.9 mm. */
export type BoardFamily = "carton" | "micro";

/** A figure for creases that run along the grain and for creases across it; on fluted board, along and across the flutes. */
export interface ByDirection {
  readonly alongGrain: number;
  readonly acrossGrain: number;
}

/** What a board gains or loses at a crease, in one process. All in mm. */
export interface AllowanceCard {
  readonly id: string;
  readonly origin: "handbook" | "measured";
  readonly process: "rule-and-matrix" | "crease-wheel" | "laser-score" | "press-brake";
  /** From the inner corner of a 90° fold to its crease line. */
  readonly a90: ByDirection;
  /** Stand-off between the faces of a hem. */
  readonly g180: ByDirection;
  /** Bulge of a hem beyond its crease line. */
  readonly e180: ByDirection;
  /** Clearance at which one board slides past another. */
  readonly slide: number;
  /** Thickness beside a crease, where it was crushed. */
  readonly crushed: number;
  /** ± */
  readonly tolerance: { readonly crease: number; readonly cut: number; readonly caliper: number };
  readonly note: string;
  readonly source: string;
}

export interface Board {
  readonly id: string;
  readonly revision: number;
  readonly name: string;
  readonly family: BoardFamily;
  /** DIN 19303 code for cartonboard, flute class for fluted board; and in plain words. */
  readonly grade: string;
  readonly plainGrade: string;
  /** g/m² */
  readonly grammage: number;
  /** mm */
  readonly caliper: number;
  readonly caliperTolerance: number;
  readonly caliperMethod: "ISO 534" | "ISO 3034";
  readonly flute: { readonly letter: "E" | "F" | "N" | "G"; readonly height: number; readonly pitch: number } | null;
  readonly front: string;
  readonly back: string;
  /** As seen: front, back and cut edge. */
  readonly colour: { readonly front: string; readonly back: string; readonly core: string };
  readonly card: AllowanceCard;
  readonly source: string;
}
