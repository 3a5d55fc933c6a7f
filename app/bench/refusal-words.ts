import { refusalSentence } from "~/copy/refusals";
import type { Refusal } from "~/cartons/types";
import type { UnitName } from "~/components/preferences";
import { withUnit } from "./lengths";

/** The sentence of a refusal that stands beside a button which mends it: the button says what to type. */
export function refusalWords(refusal: Refusal, construction: string, units: UnitName): string {
  const format = (mm: number) => withUnit(mm, "length", units);
  const hasLimit = refusal.code === "too-small" || refusal.code === "too-large" || refusal.code === "wrong-kind";
  return refusalSentence(hasLimit ? { ...refusal, nearest: null } : refusal, construction, format);
}
