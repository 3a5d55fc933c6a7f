// Sentences for what the checks found: fact, figure, mend. Every code has one; a test walks the list.
import type { Finding } from "~/cartons/types";
import type { FormatLength } from "./refusals";

const inMillimetres: FormatLength = (mm) => `${Number(mm.toFixed(2))} mm`;
const AXES: Readonly<Record<string, string>> = { L: "length", W: "width", D: "depth" };

type Say = (finding: Finding, mm: FormatLength) => string;
const measured = (f: Finding, mm: FormatLength) => mm(f.measured ?? Number.NaN);
const required = (f: Finding, mm: FormatLength) => mm(f.required ?? Number.NaN);
const axis = (f: Finding) => AXES[String(f.facts["axis"])] ?? "size";
const pair = (f: Finding) => `“${f.facts["a"] ?? f.panels[0]}” and “${f.facts["b"] ?? f.panels[1]}”`;
const area = (value: number | null) => `${Math.round(value ?? Number.NaN)} mm²`;

export const FINDING_SENTENCES: Readonly<Record<string, Say>> = {
  "inside-size": (f, mm) => `Folded, the ${axis(f)} inside is ${measured(f, mm)} at “${f.facts["panel"]}”; ${required(f, mm)} was asked.`,
  "not-square": (f) => `Folded, “${f.panels[0]}” and “${f.panels[1]}” do not stand square to the ${axis(f)}.`,
  "outside-stack": (f, mm) => `“${f.facts["panel"]}” stands ${measured(f, mm)} outside the inside along the ${axis(f)}; its boards account for ${required(f, mm)}.`,
  "in-the-inside": (f, mm) => `“${f.facts["panel"]}” reaches ${measured(f, mm)} into the inside and should not.`,
  "mate-not-parallel": (f) => `${pair(f)} should lie face to face and do not.`,
  "mate-gap": (f, mm) => `${pair(f)} stand ${measured(f, mm)} apart; ${required(f, mm)} is meant.`,
  "mate-area": (f) => `${pair(f)} meet over ${area(f.measured)}; ${area(f.required)} is the least that holds.`,
  "glue-narrow": (f, mm) => `The glued patch of ${pair(f)} is ${measured(f, mm)} wide; under ${required(f, mm)} a bead tends to fail. Make the glue flap wider.`,
  "lock-short": (f, mm) => `The ${f.facts["lock"]} engages by ${measured(f, mm)}; ${required(f, mm)} is the least that holds. Make the slit longer.`,
  collision: (f, mm) => `Closed, ${pair(f)} are in one place, ${measured(f, mm)} deep; the board gives ${required(f, mm)}.`,
  "collision-on-the-way": (f) => `On the way, ${pair(f)} meet during “${f.facts["step"]}”.`,
  "flat-seam": (f, mm) => `Glued flat, the seam is ${measured(f, mm)} out of register with the erected carton; the board takes up about ${required(f, mm)}. Expect the seam corner a little out of square, or try a sample.`,
  "narrow-gap": (f, mm) => `Two cuts leave a slot of ${measured(f, mm)}; this route needs ${required(f, mm)}, a shared cut or an open wedge.`,
  "crease-short": (f, mm) => `The crease at “${f.facts["panel"]}” is ${measured(f, mm)} long; under ${required(f, mm)} it does not fold true.`,
  "creases-close": (f, mm) => `Two creases lie ${measured(f, mm)} apart; their channels need ${required(f, mm)}.`,
};

export function findingSentence(finding: Finding, format: FormatLength = inMillimetres): string {
  const say = FINDING_SENTENCES[finding.code];
  if (!say) throw new Error(`no sentence for the finding ${finding.code}`);
  return say(finding, format);
}
