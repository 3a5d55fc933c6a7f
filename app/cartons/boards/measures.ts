// Identities of grammage, thickness and weight, and the flute class by its size.

/** cm³/g from g/m² and mm: thickness in µm over grammage. */
export const specificVolume = (grammage: number, caliper: number): number => (caliper * 1000) / grammage;

/** kg/m³ */
export const density = (grammage: number, caliper: number): number => grammage / caliper;

/** Grams of a piece: area in mm², grammage in g/m². */
export const weightOf = (areaMm2: number, grammage: number): number => (areaMm2 / 1_000_000) * grammage;

export type FluteLetter = "G" | "F" | "E" | "D" | "B" | "C" | "A" | "K";

/** Height from (included) to (excluded) and pitch from (excluded) to (included), mm. Source: limits of DIN 55468-1:2021 as published by a converter. */
const FLUTES: readonly { readonly letter: FluteLetter; readonly height: readonly [number, number]; readonly pitch: readonly [number, number] }[] = [
  { letter: "G", height: [0, 0.6], pitch: [0, 1.8] }, { letter: "F", height: [0.6, 1], pitch: [1.8, 2.6] },
  { letter: "E", height: [1, 1.9], pitch: [2.6, 3.5] }, { letter: "D", height: [1.9, 2.2], pitch: [3.5, 4.8] },
  { letter: "B", height: [2.2, 3.1], pitch: [4.8, 6.5] }, { letter: "C", height: [3.1, 4], pitch: [6.5, 7.9] },
  { letter: "A", height: [4, 5], pitch: [7.9, 10] }, { letter: "K", height: [5, Infinity], pitch: [10, Infinity] },
];

/** The class that both height and pitch (mm) fall in; null when they disagree. */
export function classifyFlute(height: number, pitch: number): FluteLetter | null {
  return FLUTES.find((f) => height >= f.height[0] && height < f.height[1] && pitch > f.pitch[0] && pitch <= f.pitch[1])?.letter ?? null;
}
