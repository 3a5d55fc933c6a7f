// A first stock of boards: invented stock names, figures from published tables. A shop enters its own.
import { handbookCard } from "./allowance-card";
import type { Board } from "./board";

const COATED = "coated for print";
const WHITE = { front: "#FFFDF8", back: "#FBF8F0", core: "#F1ECE0" };
const CREAM = { front: "#FFFDF8", back: "#F3EADB", core: "#E4D6BC" };
const GREY = { front: "#FCFAF5", back: "#B9B4AA", core: "#A9A398" };
const KRAFT = { front: "#FCFAF5", back: "#B98F5E", core: "#A87E4F" };
const BROWN = { front: "#C49A6C", back: "#C49A6C", core: "#B58A5B" };

const SBB = "a maker's table for bleached board coated one side; the same grade runs from 1.09 to 1.38 cm³/g at other mills: measure yours";
const FBB = "worked out at 1.65 cm³/g; published range of the grade 1.6 to 1.75 cm³/g";
const WLC = "within the limits of DIN 19303 for this bulk class, its middle taken";

interface Sheet { readonly id: string; readonly name: string; readonly grade: string; readonly plainGrade: string; readonly grammage: number; readonly caliper: number; readonly back: string; readonly colour: Board["colour"]; readonly source: string }

const carton = (s: Sheet): Board => ({
  ...s, revision: 1, family: "carton", caliperTolerance: 0.05 * s.caliper, caliperMethod: "ISO 534", flute: null, front: COATED,
  card: handbookCard("carton", s.caliper),
});

const micro = (id: string, name: string, letter: "E" | "F", height: number, pitch: number, grammage: number, caliper: number, source: string): Board => ({
  id, revision: 1, name, family: "micro", grade: `${letter} flute`, plainGrade: `micro-flute, class ${letter} of DIN 55468-1`, grammage, caliper,
  caliperTolerance: 0.1, caliperMethod: "ISO 3034", flute: { letter, height, pitch }, front: "kraft liner", back: "kraft liner", colour: BROWN,
  card: handbookCard("micro", caliper, letter), source,
});

const sbb = (grammage: number, caliper: number) => carton({ id: `sbb-${grammage}`, name: `Bleached ${grammage}`, grade: "GZ", plainGrade: "solid bleached board, coated, white through", grammage, caliper, back: "white, uncoated", colour: WHITE, source: SBB });
const fbb = (kind: "gc1" | "gc2", grammage: number, caliper: number) => carton({
  id: `fbb-${kind}-${grammage}`, name: `Folding ${kind === "gc1" ? "white" : "cream"} ${grammage}`, grade: kind.toUpperCase(),
  plainGrade: `folding boxboard, coated, ${kind === "gc1" ? "white" : "cream"} back`, grammage, caliper, back: kind === "gc1" ? "white" : "cream", colour: kind === "gc1" ? WHITE : CREAM, source: FBB,
});
const gd = (grammage: number, caliper: number) => carton({ id: `gd2-${grammage}`, name: `Recycled grey ${grammage}`, grade: "GD2", plainGrade: "coated recycled board, grey back, middle bulk", grammage, caliper, back: "grey", colour: GREY, source: WLC });

export const BOARDS: readonly Board[] = [
  sbb(250, 0.33), sbb(300, 0.4), sbb(350, 0.47), sbb(400, 0.55),
  fbb("gc1", 250, 0.415), fbb("gc1", 300, 0.495), fbb("gc2", 300, 0.495), fbb("gc2", 350, 0.58),
  gd(350, 0.48), gd(400, 0.55),
  carton({ id: "sub-gn4-350", name: "Unbleached brown 350", grade: "GN4", plainGrade: "solid unbleached board, coated, brown back", grammage: 350, caliper: 0.48, back: "brown", colour: KRAFT, source: "thickness from memory, unverified: measure yours" }),
  // F board is quoted from 0.8 (one seller) to 0.9 to 1.2 mm (common practice); E 1.5 and 1.6 mm are both printed.
  micro("f-flute", "Fine flute F 1.0", "F", 0.75, 2.3, 420, 1, "0.8 to 1.2 mm are quoted; 1.0 chosen, flute 0.75 / 2.3 mm within DIN 55468-1"),
  micro("e-flute", "Fine flute E 1.6", "E", 1.15, 3.3, 400, 1.6, "about 1/16 in = 1.6 mm (a paper seller; 1.5 mm elsewhere); flute 1.15 / 3.3 mm within DIN 55468-1"),
];

export const findBoard = (id: string): Board | undefined => BOARDS.find((b) => b.id === id);
