// The fold check in plain sentences, figures with their units. Findings have words of their own (findings.ts).
import type { Axis, Carton, LockReport, MateReport, ToleranceStack } from "~/cartons/types";

export type FormatLength = (mm: number) => string;

export const axisWords: { readonly [A in Axis]: string } = { L: "Length", W: "Width", D: "Depth" };

/** "Length: 82 mm asked, 82 mm measured. A rigid block of up to 81.6 mm passes; outside it is 83 mm." */
export function axisSentence(carton: Carton, axis: Axis, format: FormatLength): string {
  const { measuredInside, clearInside, outside } = carton.foldCheck;
  return `${format(carton.inside[axis])} meant inside, ${format(measuredInside[axis])} measured on the folded carton. A rigid block of up to ${format(clearInside[axis])} passes; outside it is ${format(outside[axis])}.`;
}

/** "Board, creases and cuts move it by ± 0.8 mm at worst, ± 0.4 mm as a rule (root of squares)." */
export function toleranceSentence(stack: ToleranceStack, format: FormatLength): string {
  return `Board, creases and cuts can move it by ± ${format(hundredths(stack.worstCase))} at worst, by ± ${format(hundredths(stack.rootSumSquare))} as a rule (root of the sum of squares).`;
}

/** "4 × crease ± 0.2 mm, 2 × caliper ± 0.02 mm" */
export function toleranceTerms(stack: ToleranceStack, format: FormatLength): string {
  return stack.terms.map((term) => `${Math.abs(term.times) === 1 ? "" : `${Math.abs(term.times)} × `}${term.name} ± ${format(term.value)}`).join(", ");
}

const mateVerbs: { readonly [Kind in MateReport["kind"]]: string } = {
  glued: "is glued to",
  slides: "slides along",
  touches: "touches",
  interlock: "interlocks with",
};

export function mateSentence(mate: MateReport, labelOf: (panel: string) => string, format: FormatLength): string {
  const [a, b] = mate.panels;
  const gap = mate.kind === "glued" || mate.askedGap === 0 ? `${format(mate.measuredGap)} apart` : `${format(mate.measuredGap)} apart, ${format(mate.askedGap)} meant`;
  const area = mate.area > 0 ? `, over ${Math.round(mate.area)} mm²${mate.minArea > 0 ? ` (${Math.round(mate.minArea)} mm² is the least)` : ""}` : "";
  return `${sentenceCase(labelOf(a))} ${mateVerbs[mate.kind]} ${labelOf(b)}: ${gap}${area}.`;
}

export function lockSentence(lock: LockReport, format: FormatLength): string {
  return `${sentenceCase(lock.name)} engages by ${format(lock.engagement)}; ${format(lock.minimum)} is the least that holds.`;
}

export function collisionSentence(carton: Carton, labelOf: (panel: string) => string, format: FormatLength): string {
  const { collisions } = carton.foldCheck;
  const past = collisions.filter((c) => c.depth > c.allowed);
  if (past.length > 0) return `${past.map((c) => `${labelOf(c.panels[0])} and ${labelOf(c.panels[1])} run ${format(c.depth)} into each other`).join("; ")}.`;
  const deepest = collisions.reduce((most, c) => Math.max(most, c.depth), 0);
  return deepest === 0 ? "Closed, no panel is where another is." : `Closed, no panel is where another is, beyond the ${format(deepest)} that the board gives where they press.`;
}

/** A tolerance to more than a hundredth says more than is known. */
const hundredths = (mm: number) => Math.round(mm * 100) / 100;
const sentenceCase = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** "Folds shut on 82 × 27 × 56 mm inside, as asked." */
export function closesSentence(carton: Carton, showSize: (size: { L: number; W: number; D: number }) => string): string {
  const { basis, room } = carton.brief;
  switch (basis) {
    case "inside":
      return `Folds shut on ${showSize(carton.inside)} inside, as asked.`;
    case "outside":
      return `Folds shut to ${showSize(carton.outside)} outside, as asked.`;
    case "crease":
      return `Folds shut on ${showSize(carton.crease)} from crease to crease, as asked.`;
    case "product":
      return `Folds shut round ${showSize(carton.brief.size)} with ${Number(room.toFixed(2))} mm of room on each side, as asked.`;
  }
}
